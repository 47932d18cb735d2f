package lyate.acidity;

import static org.junit.jupiter.api.Assertions.assertTrue;

import lyate.molecule.Molecule;
import lyate.site.ProtonSite;
import lyate.site.Role;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Medium;
import lyate.table.TableFolders;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/** Whose proton goes first, by what every chemist knows, whether the values behind it are measured or estimated. */
class OrderingTest {

    private static final TableFolders TABLES = TableFolders.packaged();
    private static final SiteFinder FINDER = new SiteFinder(SiteClasses.load(TABLES));
    /** Some of the pairs lie 0.1 apart (3-methoxybenzoic and benzoic acid); no estimate is as fine as that. */
    private static final double TIE = 0.1;
    private static final AcidityEstimator ESTIMATOR = AcidityEstimator.load(TABLES);

    @ParameterizedTest(name = "{0} in {2}: {3} {4} below {5} {6}")
    @CsvFileSource(resources = "orderings.csv", numLinesToSkip = 1)
    void theLowerOneIsLower(String rule, String role, String medium, String lower, String lowerSite, String higher, String higherSite) {
        assertBelow(ESTIMATOR, 0, role, medium, lower, lowerSite, higher, higherSite);
    }

    @ParameterizedTest(name = "{0} in {2}: {3} {4} below {5} {6}")
    @CsvFileSource(resources = "orderings.csv", numLinesToSkip = 1)
    void andSoWithoutMeasuredValues(String rule, String role, String medium, String lower, String lowerSite, String higher,
                                    String higherSite) {
        assertBelow(ESTIMATOR.withoutMeasured(), TIE, role, medium, lower, lowerSite, higher, higherSite);
    }

    private static void assertBelow(AcidityEstimator estimator, double tie, String role, String medium, String lower, String lowerSite,
                                    String higher, String higherSite) {
        double first = pKa(estimator, role, medium, lower, lowerSite);
        double second = pKa(estimator, role, medium, higher, higherSite);
        assertTrue(first < second + tie, first + " is not below " + second);
    }

    private static double pKa(AcidityEstimator estimator, String role, String medium, String smiles, String label) {
        Molecule molecule = Sites.molecule(smiles);
        int atom = molecule.atomLabelled(label).orElseThrow();
        ProtonSite site = FINDER.sites(molecule, role.equals("acid") ? Role.ACID : Role.BASE).stream()
                .filter(each -> each.equivalent().contains(atom)).findFirst().orElseThrow();
        return estimator.acidity(molecule, site, new Medium(medium)).orElseThrow().pKa();
    }
}
