package lyate.acidity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.StringReader;
import java.util.List;
import java.util.Optional;
import lyate.acidity.AccuracyReport.BadRow;
import lyate.acidity.AccuracyReport.Comparison;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Medium;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;

class AccuracyCheckTest {

    private static final TableFolders TABLES = TableFolders.packaged();
    private static final AccuracyCheck CHECK = AccuracyCheck.of(new SiteFinder(SiteClasses.load(TABLES)),
            AcidityEstimator.load(TABLES), Stockroom.load(TABLES));

    private static AccuracyReport check(String csv) throws IOException {
        return CHECK.check(new StringReader(csv));
    }

    private static Comparison comparison(double measured, double stated, double sigma) {
        return new Comparison(1, "C", "C1", "made up", measured, Acidity.measured(stated, sigma, Medium.WATER, "made up"), false);
    }

    @Test
    void statisticsAreThoseOfTheErrors() {
        AccuracyStatistics all = new AccuracyReport(List.of(comparison(5, 5.1, 0.2), comparison(5, 4.7, 0.2),
                comparison(5, 5.5, 0.2), comparison(5, 4.1, 1)), List.of()).overall().orElseThrow();
        assertEquals(4, all.n());
        assertEquals(Math.sqrt((0.01 + 0.09 + 0.25 + 0.81) / 4), all.rmse(), 1e-9);
        assertEquals(0.45, all.meanAbsolute(), 1e-9);
        assertEquals(0.4, all.medianAbsolute(), 1e-9);
        assertEquals(0.5, all.withinOneSigma(), 1e-9);
        assertEquals(0.75, all.withinTwoSigma(), 1e-9);
    }

    @Test
    void comparesAtTheSiteNamed() throws IOException {
        AccuracyReport report = check("smiles,site,role,solvent,pka,note\nCC(=O)O,O4,acid,water,4.76,x\nCC(=O)O,O4,acid,DMSO,12.3,y\n");
        assertEquals(List.of(), report.badRows());
        assertEquals(List.of("O4", "O4"), report.comparisons().stream().map(Comparison::site).toList());
        assertTrue(report.overall().orElseThrow().rmse() < 0.05);
        assertEquals(List.of("dmso", "water"), List.copyOf(report.byMedium().keySet()));
    }

    @Test
    void takesTheMostAcidicSiteWhereNoneIsNamed() throws IOException {
        AccuracyReport report = check("smiles,solvent,pka\nCC(=O)CC(C)=O,water,8.9\n");
        assertEquals("C4", report.comparisons().get(0).site());
    }

    @Test
    void takesTheMostBasicSiteForABase() throws IOException {
        AccuracyReport report = check("smiles,role,solvent,pka\nNCCO,base,water,9.5\n");
        assertEquals("N1", report.comparisons().get(0).site());
        assertEquals(9.5, report.comparisons().get(0).stated().pKa(), 0.1);
    }

    /** Aniline: its proton leaves at 30.6 in DMSO, one arrives at 4.6 in water (Bordwell 1988; CRC Handbook; from memory). */
    @Test
    void withoutARoleTheNearerOfAcidAndBaseIsComparedAndCounted() throws IOException {
        AccuracyReport report = check("smiles,site,solvent,pka\nNc1ccccc1,N1,water,4.6\nNc1ccccc1,N1,dmso,30.6\nC[N+](=O)[O-],C1,dmso,17.2\n");
        assertTrue(report.overall().orElseThrow().rmse() < 0.1, report.text());
        assertEquals(List.of(true, true, false), report.comparisons().stream().limit(3).map(Comparison::roleGuessed).toList(), report.text());
        assertTrue(report.text().contains("2 rows give no role"), report.text());
    }

    @Test
    void theRoleMayStandInAColumnKind() throws IOException {
        AccuracyReport report = check("smiles,site,kind,solvent,pka\nNc1ccccc1,N1,acid,water,4.6\n");
        assertEquals(27, report.comparisons().get(0).stated().pKa(), 2, "the acid, as the row says");
    }

    @Test
    void aSolventIsJudgedOnItsOwnScale() throws IOException {
        AccuracyReport report = check("smiles,site,role,solvent,pka\nc1ccncc1,N4,base,THF,5.5\n");
        assertEquals("thf", report.comparisons().get(0).stated().medium().id());
    }

    @Test
    void everyBadRowIsKeptWithItsLineAndReason() throws IOException {
        AccuracyReport report = check("""
                smiles,site,role,solvent,pka
                CC(=O)O,O9,acid,water,4.76
                CC(=O)O,O4,acid,moon,4.76
                CC(=O)O,O4,acid,water,strong
                C(C,O4,acid,water,1
                CC(=O)O,O4,akid,water,4.76
                CC(=O)O,O4,acid,water,4.76
                """);
        assertEquals(1, report.comparisons().size());
        assertEquals(List.of(2L, 3L, 4L, 5L, 6L), report.badRows().stream().map(BadRow::line).toList());
        assertTrue(report.badRows().get(0).reason().contains("'O9'"), report.text());
        assertTrue(report.badRows().get(1).reason().contains("'moon'"), report.text());
        assertTrue(report.badRows().get(2).reason().contains("'strong'"), report.text());
        assertTrue(report.badRows().get(4).reason().contains("'akid'"), report.text());
        assertTrue(report.text().contains("not used, line 2"), report.text());
    }

    @Test
    void aMissingColumnIsNamed() {
        IllegalArgumentException error = assertThrows(IllegalArgumentException.class, () -> check("smiles,pka\nC,1\n"));
        assertTrue(error.getMessage().contains("no column solvent"), error.getMessage());
    }

    @Test
    void nothingToCompareIsNoStatistics() {
        assertEquals(Optional.empty(), new AccuracyReport(List.of(), List.of()).overall());
    }

    @Test
    void theWorstRowsComeFirst() {
        AccuracyReport report = new AccuracyReport(List.of(comparison(5, 5.1, 1), comparison(5, 2, 1), comparison(5, 6, 1)), List.of());
        assertEquals(List.of(-3.0, 1.0), report.worst(2).stream().map(Comparison::error).toList());
    }
}
