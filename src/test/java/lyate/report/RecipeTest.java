package lyate.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import lyate.acidity.Acidity;
import lyate.acidity.AcidityEstimator;
import lyate.acidity.MeasuredAcidities;
import lyate.acidity.MediaTransfer;
import lyate.acidity.lfer.LinearFreeEnergyEstimate;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.report.Recipe.Line;
import lyate.report.Recipe.Part;
import lyate.site.ProtonSite;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Medium;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Every pKa can be taken apart. */
class RecipeTest {

    private static final TableFolders TABLES = TableFolders.packaged();
    private static final AcidityEstimator MEASURED_FIRST = AcidityEstimator.load(TABLES);
    private static final AcidityEstimator ESTIMATE_ONLY = MEASURED_FIRST.withoutMeasured();
    private static final SiteFinder FINDER = new SiteFinder(SiteClasses.load(TABLES));

    private static List<Line> lines(AcidityEstimator estimator, String smiles, String label, Medium medium) throws MoleculeException {
        Molecule molecule = new MoleculeReader().read(smiles);
        ProtonSite site = FINDER.sites(molecule).stream().filter(found -> molecule.label(found.atom()).equals(label)).findFirst().orElseThrow();
        Acidity acidity = estimator.acidity(molecule, site, medium).orElseThrow();
        return Recipe.of(acidity, molecule::label).lines();
    }

    private static List<Line> of(Part part, List<Line> lines) {
        return lines.stream().filter(line -> line.part() == part).toList();
    }

    @ParameterizedTest
    @CsvSource({"water, COc1ccc(O)cc1, O7", "water, NCCc1ccccc1, N1", "water, Cc1ccncc1, N5", "dmso, O=C(CC)c1ccccc1, C3",
        "dmso, O=C(N)c1ccccc1, N3", "dmso, CCC#N, C2", "mecn, OC(=O)c1ccccc1, O1", "dmso, CC(=O)N(C)C, C1"})
    void theTermsAddUpToTheValue(String medium, String smiles, String label) throws MoleculeException {
        List<Line> lines = lines(ESTIMATE_ONLY, smiles, label, new Medium(medium));
        double sum = of(Part.CONTRIBUTION, lines).stream().mapToDouble(line -> line.value().getAsDouble()).sum();
        assertEquals(of(Part.PKA, lines).get(0).value().getAsDouble(), sum, 1e-6);
    }

    @Test
    void theClassValueIsAlwaysThere() throws MoleculeException {
        for (AcidityEstimator estimator : List.of(MEASURED_FIRST, ESTIMATE_ONLY)) {
            List<Line> lines = lines(estimator, "Oc1ccccc1", "O1", Medium.WATER);
            assertTrue(lines.stream().anyMatch(line -> line.text().startsWith("class value: ")), lines::toString);
        }
    }

    @Test
    void aPhenolIsTakenApartIntoEffectsWithAtoms() throws MoleculeException {
        List<Line> lines = of(Part.CONTRIBUTION, lines(ESTIMATE_ONLY, "COc1ccc(O)c(Cl)c1", "O7", Medium.WATER));
        assertTrue(lines.stream().anyMatch(line -> line.effect().equals("induction") && line.atoms().contains("Cl9")), lines::toString);
        assertTrue(lines.stream().anyMatch(line -> line.effect().equals("resonance") && line.atoms().contains("O2")), lines::toString);
    }

    @Test
    void relativesAreMeasuredAndTheUncertaintySaysWhereItComesFrom() throws MoleculeException {
        List<Line> lines = lines(ESTIMATE_ONLY, "CCCCc1ccc(O)cc1", "O9", Medium.WATER);
        assertTrue(of(Part.RELATIVE, lines).stream().allMatch(line -> !line.source().isEmpty() && line.value().isPresent()));
        assertTrue(!of(Part.RELATIVE, lines).isEmpty(), lines::toString);
        assertTrue(of(Part.UNCERTAINTY, lines).get(0).text().contains("cross-validation of phenol"), lines::toString);
    }

    @Test
    void aMeasuredValueSaysThatItWasMeasured() throws MoleculeException {
        List<Line> lines = lines(MEASURED_FIRST, "CC(=O)O", "O4", Medium.WATER);
        assertEquals("measured", of(Part.PKA, lines).get(0).effect());
        assertEquals("of the measurement, as the table states it", of(Part.UNCERTAINTY, lines).get(0).text());
    }

    @Test
    void whatCouldOnlyBeDescribedRoughlyIsNamed() throws MoleculeException {
        // no tabulated substituent constants for an arsonic ester group
        AcidityEstimator relationships = new AcidityEstimator(MeasuredAcidities.none(), MediaTransfer.load(TABLES),
                List.of(LinearFreeEnergyEstimate.load(TABLES)));
        List<Line> lines = lines(relationships, "Oc1ccc([As](=O)(OC)OC)cc1", "O1", Medium.WATER);
        assertTrue(of(Part.MISSING, lines).stream().anyMatch(line -> line.text().contains("taken from its atoms")), lines::toString);
    }
}
