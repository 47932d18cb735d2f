package lyate.acidity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import java.util.stream.Collectors;
import lyate.acidity.AccuracyReport.Comparison;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Medium;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** The estimates on polyfunctional molecules that no fit has seen. The limits leave a little room above what docs/accuracy.md states. */
class DrugLikeAccuracyTest {

    private static final TableFolders TABLES = TableFolders.packaged();

    private static AccuracyReport report;

    @BeforeAll
    static void compare() throws IOException {
        AccuracyCheck check = AccuracyCheck.of(new SiteFinder(SiteClasses.load(TABLES)),
                AcidityEstimator.load(TABLES).withoutMeasured(), Stockroom.load(TABLES));
        try (Reader csv = new InputStreamReader(Objects.requireNonNull(
                DrugLikeAccuracyTest.class.getResourceAsStream("drug-like-pka.csv")), StandardCharsets.UTF_8)) {
            report = check.check(csv);
        }
    }

    @Test
    void everyMoleculeHasAnEstimate() {
        assertEquals(List.of(), report.badRows());
        assertEquals(212, report.comparisons().size());
    }

    @Test
    void halfOfThemAreWithinFourTenths() {
        AccuracyStatistics all = report.overall().orElseThrow();
        assertTrue(all.medianAbsolute() <= 0.45, () -> "median " + all.medianAbsolute());
        assertTrue(all.rmse() <= 1.2, () -> "RMSE " + all.rmse());
    }

    @Test
    void theStatedUncertaintyHolds() {
        AccuracyStatistics all = report.overall().orElseThrow();
        assertTrue(all.withinOneSigma() >= 0.62, () -> "within one sigma " + all.withinOneSigma());
        assertTrue(all.withinTwoSigma() >= 0.88, () -> "within two sigma " + all.withinTwoSigma());
    }

    @Test
    void noneOfThemIsInTheTableTheFitReads() {
        Set<String> tabled = MeasuredAcidities.load(TABLES).values().stream().filter(value -> value.acidity().medium().equals(Medium.WATER))
                .map(value -> value.molecule().canonicalKey()).collect(Collectors.toSet());
        assertEquals(List.of(), report.comparisons().stream().map(Comparison::smiles)
                .filter(smiles -> tabled.contains(Sites.molecule(smiles).canonicalKey())).toList());
    }
}
