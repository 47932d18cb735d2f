package lyate.acidity.lfer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.Set;
import lyate.molecule.Molecule;
import lyate.site.Role;
import lyate.stock.Medium;
import lyate.table.Row;
import lyate.table.Table;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The published relationships by themselves, before any fit, and the tables behind them. */
class PublishedRelationsTest {

    private final TableFolders tables = TableFolders.packaged();
    private final SiteDescriber describer = SiteDescriber.load(tables);
    private final Published published = Published.load(tables);

    /**
     * Worked by hand from pKa = pKa(parent) - rho x sum of sigma (Perrin, Dempsey & Serjeant 1981; constants of Hansch, Leo & Taft
     * 1991; both from memory): benzoic acids 4.20 - 1.0 sigma, phenols 9.99 - 2.2 sigma minus, anilines 4.60 - 2.9 sigma minus,
     * pyridines 5.2 - 5.9 sigma.
     */
    @ParameterizedTest
    @CsvSource({
        "OC(=O)c1ccc([N+](=O)[O-])cc1, O1, acid, 3.42",
        "OC(=O)c1cccc(Cl)c1, O1, acid, 3.83",
        "OC(=O)c1ccc(OC)cc1, O1, acid, 4.47",
        "Oc1ccc(C#N)cc1, O1, acid, 7.79",
        "Oc1cc(C)cc(C)c1, O1, acid, 10.30",
        "Nc1ccc(C(C)=O)cc1, N1, base, 2.16",
        "Nc1cccc(Cl)c1, N1, base, 3.53",
        "n1cccc(Cl)c1, N1, base, 3.02",
        "n1ccc(C)cc1, N1, base, 6.20"})
    void handWorkedHammettExamplesComeOut(String smiles, String label, String role, double expected) {
        Molecule molecule = Estimates.molecule(smiles);
        Role site = role.equals("acid") ? Role.ACID : Role.BASE;
        SiteDescription description = describer.describe(molecule, site, molecule.atomLabelled(label).orElseThrow()).orElseThrow();
        // sigma m is written as sigma I + 0.35 (sigma p - sigma I), which differs from the tabulated one by up to 0.08
        assertEquals(expected, published.estimate(Medium.WATER, description), 0.3);
    }

    @Test
    void everySubstituentIsFoundOnABenzeneRing() {
        for (Row row : Table.read(Substituents.GROUPS, tables).rows()) {
            Molecule group = Estimates.molecule(row.text("smiles"));
            assertTrue(group.hydrogens(0) > 0 || group.atomCount() > 1, row.id());
            double sigmaM = row.number("sigma_m").getAsDouble();
            assertTrue(sigmaM > -0.6 && sigmaM < 2, row.id() + ": sigma m " + sigmaM);
            assertTrue(Math.abs(row.number("sigma_i").getAsDouble()) <= 1.5, row.id());
        }
    }

    /** Taft: the effect of a group falls to about 0.4 with every saturated carbon between (from memory). */
    @Test
    void inductionFallsOffAlongAChain() {
        Facts facts = Facts.of(Estimates.molecule("OCCCCSC#N"), Substituents.load(tables));
        double[] sigma = new double[4];
        for (int atom = 0; atom < 4; atom++) {
            sigma[atom] = facts.constants()[facts.topology().branchBetween(atom, atom + 1)].induction();
        }
        for (int atom = 1; atom < 3; atom++) {
            double ratio = sigma[atom] / sigma[atom + 1];
            assertTrue(ratio > 0.25 && ratio < 0.5, "ratio " + ratio + " at atom " + atom);
        }
    }

    @Test
    void everySeriesHasAPoolInWater() {
        Pools pools = Pools.load(tables);
        Set<String> orphans = new HashSet<>();
        for (Series series : SeriesTable.load(tables).rows()) {
            if (pools.of(Medium.WATER, series.group()).isEmpty()) {
                orphans.add(series.id());
            }
        }
        assertEquals(Set.of(), orphans);
    }
}
