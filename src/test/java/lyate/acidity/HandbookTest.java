package lyate.acidity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import lyate.acidity.AccuracyReport.Comparison;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Values of handbooks, each with its source, written down (from memory) before the program saw them; docs/accuracy.md tells
 * what the first run said. Handbooks differ among themselves: {@link #handbookSigma} is how far, unless the row has a
 * tolerance of its own because two compilations are known to disagree there.
 */
class HandbookTest {

    private static final TableFolders TABLES = TableFolders.packaged();
    private static final AcidityEstimator ESTIMATOR = AcidityEstimator.load(TABLES);
    private static final SiteFinder FINDER = new SiteFinder(SiteClasses.load(TABLES));
    private static final Stockroom STOCKROOM = Stockroom.load(TABLES);

    private static double handbookSigma(String solvent) {
        return solvent.equals("water") ? 0.15 : 0.3;
    }

    @ParameterizedTest(name = "{0}")
    @CsvSource({"handbook-water.csv, 460", "handbook-dmso.csv, 218", "handbook-other.csv, 62"})
    void everyValueLiesWithinTwiceTheCombinedUncertainty(String file, int least) throws IOException {
        List<CSVRecord> rows = rows(file);
        AccuracyReport report = compare(file, ESTIMATOR);
        assertEquals(List.of(), report.badRows());
        assertTrue(rows.size() >= least && report.comparisons().size() == rows.size(), rows.size() + " rows");
        List<String> off = new ArrayList<>();
        for (int i = 0; i < rows.size(); i++) {
            Comparison row = report.comparisons().get(i);
            String tolerance = rows.get(i).get("tolerance");
            double handbook = tolerance.isEmpty() ? handbookSigma(rows.get(i).get("solvent")) : Double.parseDouble(tolerance);
            if (Math.abs(row.error()) > 2 * Math.hypot(handbook, row.stated().sigma())) {
                off.add(rows.get(i).get("name") + ": " + row.measured() + ", stated " + row.stated().pKa() + " +/- "
                        + row.stated().sigma());
            }
        }
        assertEquals(List.of(), off);
    }

    @ParameterizedTest(name = "{0}")
    @CsvSource({"handbook-water.csv, 0.15, 0.02", "handbook-dmso.csv, 0.10, 0.02", "handbook-other.csv, 0.10, 0.02"})
    void theWholeProgramIsCloseToTheHandbooks(String file, double rmse, double median) throws IOException {
        assertNoWorse(compare(file, ESTIMATOR), rmse, median, 0.85, 0.95);
    }

    /** The estimates are anchored on many of the same acids: no cross-validation (that is in docs/accuracy.md), but a floor. */
    @ParameterizedTest(name = "{0}")
    @CsvSource({"handbook-water.csv, 0.35, 0.06", "handbook-dmso.csv, 1.0, 0.15", "handbook-other.csv, 1.2, 0.35"})
    void theEstimatesAloneStayWhereTheyWere(String file, double rmse, double median) throws IOException {
        assertNoWorse(compare(file, ESTIMATOR.withoutMeasured()), rmse, median, 0.80, 0.93);
    }

    private static void assertNoWorse(AccuracyReport report, double rmse, double median, double oneSigma, double twoSigma) {
        AccuracyStatistics all = report.overall().orElseThrow();
        assertTrue(all.rmse() <= rmse && all.medianAbsolute() <= median && all.withinOneSigma() >= oneSigma
                && all.withinTwoSigma() >= twoSigma, report::text);
    }

    private static AccuracyReport compare(String file, AcidityEstimator estimator) throws IOException {
        try (Reader text = open(file)) {
            return AccuracyCheck.of(FINDER, estimator, STOCKROOM).check(text);
        }
    }

    private static List<CSVRecord> rows(String file) throws IOException {
        try (Reader text = open(file)) {
            return CSVFormat.DEFAULT.builder().setHeader().setSkipHeaderRecord(true).setCommentMarker('#').get().parse(text)
                    .getRecords();
        }
    }

    private static Reader open(String file) {
        return new InputStreamReader(HandbookTest.class.getResourceAsStream(file), StandardCharsets.UTF_8);
    }
}
