package lyate.acidity.lfer;

import static lyate.acidity.lfer.Estimates.acid;
import static lyate.acidity.lfer.Estimates.base;
import static lyate.acidity.lfer.Estimates.molecule;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import lyate.acidity.Acidity;
import lyate.acidity.Acidity.Contribution;
import lyate.acidity.Acidity.Effect;
import lyate.acidity.Acidity.Relative;
import lyate.acidity.MeasuredAcidities;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.Renumbering;
import lyate.site.Role;
import lyate.stock.Medium;
import lyate.table.Row;
import lyate.table.Table;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class LinearFreeEnergyEstimateTest {

    /** One molecule of every kind of series, several sites each. */
    private static final String[] MOLECULES = {"CC(=O)c1ccc(O)cc1C(=O)O", "NCCNCc1ccncc1", "CCOC(=O)CC(=O)c1ccccc1", "OCC(F)(F)F",
        "Cn1cncc1CCN", "CS(=O)(=O)Nc1ccc(S)cc1", "O=C1CCC(=O)N1", "NC(=N)c1ccc(Cl)cc1", "CC([N+](=O)[O-])[N+](=O)[O-]",
        "c1ccc2[nH]cnc2c1", "CC(=O)N(O)c1ccccc1", "C[N+](C)(C)CC(=O)OC", "CP(=O)(O)Oc1ccccc1", "N#CCc1ccc([N+](=O)[O-])cc1"};

    private static List<Acidity> everyEstimate(Molecule molecule) {
        List<Acidity> estimates = new ArrayList<>();
        for (Role role : Role.values()) {
            for (int atom = 0; atom < molecule.atomCount(); atom++) {
                if (role == Role.BASE || molecule.hydrogens(atom) > 0) {
                    for (Medium medium : List.of(Medium.WATER, Medium.DMSO)) {
                        Estimates.estimate(molecule, atom, role, medium).ifPresent(estimates::add);
                    }
                }
            }
        }
        return estimates;
    }

    @Test
    void theRecipeAddsUpToThePKa() {
        int checked = 0;
        for (String smiles : MOLECULES) {
            for (Acidity estimate : everyEstimate(molecule(smiles))) {
                double sum = estimate.contributions().stream().mapToDouble(Contribution::value).sum();
                assertEquals(estimate.pKa(), sum, 1e-9, smiles);
                checked++;
            }
        }
        assertTrue(checked > 40, "only " + checked + " sites had an estimate");
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5})
    void theOrderOfTheAtomsMakesNoDifference(long seed) throws MoleculeException {
        for (String smiles : MOLECULES) {
            Molecule molecule = molecule(smiles);
            Renumbering other = Renumbering.of(molecule, seed);
            for (Role role : Role.values()) {
                for (int atom = 0; atom < molecule.atomCount(); atom++) {
                    Optional<Acidity> here = Estimates.estimate(molecule, atom, role, Medium.WATER);
                    Optional<Acidity> there = Estimates.estimate(other.molecule(), other.placeThen()[atom], role, Medium.WATER);
                    assertEquals(here.isPresent(), there.isPresent(), other.toString());
                    if (here.isPresent()) {
                        assertEquals(here.get().pKa(), there.get().pKa(), 1e-9, other.toString());
                        assertEquals(here.get().sigma(), there.get().sigma(), 1e-9, other.toString());
                    }
                }
            }
        }
    }

    /** Measured values: Perrin 1965; Serjeant & Dempsey 1979; Bordwell 1988 (all from memory). The order is what is tested. */
    @ParameterizedTest
    @CsvSource({
        "Oc1ccc([N+](=O)[O-])cc1, O1, Oc1ccccc1, O1, Oc1ccc(C)cc1, O1",
        "OC(=O)c1ccc([N+](=O)[O-])cc1, O1, OC(=O)c1ccccc1, O1, OC(=O)c1ccc(OC)cc1, O1",
        "OC(=O)C(Cl)(Cl)Cl, O1, OC(=O)C(Cl)Cl, O1, OC(=O)CCl, O1",
        "OC(=O)C(Cl)CC, O1, OC(=O)CC(Cl)C, O1, OC(=O)CCCCl, O1",
        "Sc1ccc([N+](=O)[O-])cc1, S1, Sc1ccccc1, S1, SCC, S1",
        "CC(=O)CC(C)=O, C4, CCOC(=O)CC(C)=O, C6, COC(=O)CC(=O)OC, C5",
        "OCC(F)(F)F, O1, OCCF, O1, OCC, O1"})
    void acidsComeInTheOrderOfTheBook(String a, String siteA, String b, String siteB, String c, String siteC) {
        assertTrue(acid(a, siteA) < acid(b, siteB), a + " is the stronger acid than " + b);
        assertTrue(acid(b, siteB) < acid(c, siteC), b + " is the stronger acid than " + c);
    }

    @ParameterizedTest
    @CsvSource({
        "Nc1ccc([N+](=O)[O-])cc1, N1, Nc1ccccc1, N1, Nc1ccc(OC)cc1, N1",
        "n1ccc(C#N)cc1, N1, n1ccccc1, N1, n1ccc(N(C)C)cc1, N1",
        "N1CCOCC1, N1, N1CCNCC1, N1, N1CCCCC1, N1",
        "NCC#N, N1, NCCC#N, N1, NCCC, N1",
        "n1cocc1, N1, Cn1ccnc1, N5, NC(=N)C, N3"})
    void basesComeInTheOrderOfTheBook(String a, String siteA, String b, String siteB, String c, String siteC) {
        assertTrue(base(a, siteA) < base(b, siteB), a + " is the weaker base than " + b);
        assertTrue(base(b, siteB) < base(c, siteC), b + " is the weaker base than " + c);
    }

    @Test
    void aSecondActivatingGroupDoesLessThanTheFirstInDmso() {
        double toluene = Estimates.of("Cc1ccccc1", "C1", Role.ACID, Medium.DMSO).pKa();
        double diphenylmethane = Estimates.of("C(c1ccccc1)c1ccccc1", "C1", Role.ACID, Medium.DMSO).pKa();
        double triphenylmethane = Estimates.of("C(c1ccccc1)(c1ccccc1)c1ccccc1", "C1", Role.ACID, Medium.DMSO).pKa();
        assertTrue(diphenylmethane < toluene - 5);
        assertTrue(diphenylmethane - triphenylmethane < toluene - diphenylmethane);
    }

    @Test
    void twoEquivalentPlacesAreTwiceAsEasyToFind() {
        Contribution statistics = Estimates.of("NCCN", "N1", Role.BASE, Medium.WATER).contributions().stream()
                .filter(contribution -> contribution.effect() == Effect.STATISTICS).findFirst().orElseThrow();
        assertEquals(Math.log10(2), statistics.value(), 1e-9);
        assertEquals(List.of(0, 3), statistics.atoms());
    }

    @Test
    void aGroupThatNoTableListsIsNamedAndWidensTheUncertainty() {
        Acidity listed = Estimates.of("Oc1ccc(C(C)(C)C)cc1", "O1", Role.ACID, Medium.WATER);
        Acidity unlisted = Estimates.of("Oc1ccc([Ge](C)(C)C)cc1", "O1", Role.ACID, Medium.WATER);
        assertEquals(List.of(), listed.missing());
        assertTrue(unlisted.missing().get(0).contains("Ge6"), unlisted.missing().toString());
        assertTrue(unlisted.sigma() > 1.3 * listed.sigma());
    }

    @Test
    void uncertaintyGrowsAwayFromMeasuredRelatives() {
        Acidity close = Estimates.of("CCCCc1ccc(O)cc1", "O9", Role.ACID, Medium.WATER);
        Acidity far = Estimates.of("O=S1(=O)N=C(C(F)(F)F)c2c(O)c(Br)cc(C#CC3CC3)c2N1", "O12", Role.ACID, Medium.WATER);
        assertTrue(far.sigma() > 2 * close.sigma(), far.sigma() + " and " + close.sigma());
    }

    @Test
    void relativesAreRowsOfTheMeasuredTable() {
        Map<String, Row> rows = Table.read(MeasuredAcidities.SCHEMA, TableFolders.packaged()).rows().stream()
                .collect(Collectors.toMap(Row::id, Function.identity()));
        List<Relative> relatives = Estimates.of("Oc1ccc(CCCO)cc1", "O1", Role.ACID, Medium.WATER).relatives();
        assertFalse(relatives.isEmpty());
        for (Relative relative : relatives) {
            assertTrue(rows.values().stream().anyMatch(row -> row.number("pka").getAsDouble() == relative.pKa()
                    && row.text("source").equals(relative.source())), relative.toString());
            assertTrue(relative.similarity() > 0.4 && relative.similarity() <= 1, relative.toString());
        }
    }

    @ParameterizedTest
    @CsvSource({"c1ccccc1, C1", "CCCC, C2", "C=C, C1"})
    void aSiteOfNoSeriesHasNoEstimate(String smiles, String label) {
        Molecule molecule = molecule(smiles);
        assertEquals(Optional.empty(), Estimates.estimate(molecule, molecule.atomLabelled(label).orElseThrow(), Role.ACID, Medium.WATER));
    }

    @Test
    void anotherSolventHasNoEstimate() {
        Molecule molecule = molecule("Oc1ccccc1");
        assertEquals(Optional.empty(), Estimates.estimate(molecule, 0, Role.ACID, new Medium("thf")));
    }

    @Test
    void manyThreadsAgree() {
        List<Double> one = IntStream.range(0, 60).mapToObj(i -> sum(MOLECULES[i % MOLECULES.length])).toList();
        List<Double> many = IntStream.range(0, 60).parallel().mapToObj(i -> sum(MOLECULES[i % MOLECULES.length])).toList();
        assertEquals(one, many);
    }

    private static double sum(String smiles) {
        return everyEstimate(molecule(smiles)).stream().mapToDouble(Acidity::pKa).sum();
    }
}
