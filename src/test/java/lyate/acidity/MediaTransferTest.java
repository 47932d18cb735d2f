package lyate.acidity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import lyate.acidity.Acidity.Basis;
import lyate.acidity.Acidity.Contribution;
import lyate.acidity.Acidity.Effect;
import lyate.stock.Medium;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.table.TableException;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class MediaTransferTest {

    private static final Medium METHANOL = new Medium("meoh");
    private static final MediaTransfer PACKAGED = MediaTransfer.load(TableFolders.packaged());

    private static MediaRelation line(Medium from, Medium to, String family, double slope, double intercept, double error) {
        return new MediaRelation(from, to, family, slope, intercept, error, 10, 0, 20, "made up");
    }

    private static Acidity value(double pKa, double sigma, Medium medium) {
        return Acidity.measured(pKa, sigma, medium, "made up");
    }

    @Test
    void theErrorOfTheRelationIsAddedInQuadrature() {
        MediaTransfer transfer = new MediaTransfer(List.of(line(Medium.WATER, Medium.DMSO, "phenol", 2, -2, 0.8)));
        Acidity carried = transfer.carry(value(10, 0.3, Medium.WATER), "phenol", Medium.DMSO).orElseThrow();
        assertEquals(18, carried.pKa(), 1e-12);
        assertEquals(Math.sqrt(0.6 * 0.6 + 0.8 * 0.8), carried.sigma(), 1e-12);
        assertEquals(Medium.DMSO, carried.medium());
        assertEquals(Basis.TRANSFERRED, carried.basis());
    }

    @Test
    void oneContributionSaysThatTheValueWasCarried() {
        MediaTransfer transfer = new MediaTransfer(List.of(line(Medium.WATER, Medium.DMSO, "phenol", 2, -2, 0.8),
                line(Medium.DMSO, Medium.ACETONITRILE, "phenol", 1, 11, 1)));
        Acidity carried = transfer.carry(value(10, 0.3, Medium.WATER), "phenol", Medium.ACETONITRILE).orElseThrow();
        List<Contribution> medium = carried.contributions().stream().filter(term -> term.effect() == Effect.MEDIUM).toList();
        assertEquals(1, medium.size());
        assertEquals(19, medium.get(0).value(), 1e-12);
        assertTrue(medium.get(0).text().contains("DMSO = 2.00 x water") && medium.get(0).text().contains("MeCN = 1.00 x DMSO"),
                medium.get(0).text());
        assertTrue(carried.source().contains("carried from water"), carried.source());
    }

    @Test
    void bothStepsOfAChainAddTheirErrors() {
        MediaTransfer transfer = new MediaTransfer(List.of(line(Medium.WATER, Medium.DMSO, "phenol", 1, 8, 0.6),
                line(Medium.DMSO, Medium.ACETONITRILE, "phenol", 1, 11, 0.8)));
        Acidity carried = transfer.carry(value(10, 1e-9, Medium.WATER), "phenol", Medium.ACETONITRILE).orElseThrow();
        assertEquals(1.0, carried.sigma(), 1e-9);
    }

    @Test
    void thereAndBackGivesTheSamePKa() {
        for (MediaRelation relation : PACKAGED.relations()) {
            double middle = (relation.validFrom() + relation.validTo()) / 2;
            assertEquals(middle, relation.inverse().convert(relation.convert(middle)), 1e-9, relation::toString);
            assertEquals(relation.standardError(), relation.inverse().inverse().standardError(), 1e-9, relation::toString);
        }
    }

    @Test
    void withoutARelationThereIsNoValue() {
        MediaTransfer transfer = new MediaTransfer(List.of(line(Medium.WATER, Medium.DMSO, "phenol", 2, -2, 0.8)));
        assertEquals(Optional.empty(), transfer.carry(value(10, 0.3, Medium.WATER), "phenol", METHANOL));
        assertEquals(Optional.empty(), transfer.carry(value(10, 0.3, Medium.WATER), "ammonium", Medium.DMSO));
    }

    @Test
    void aValueAlreadyThereIsLeftAlone() {
        Acidity value = value(10, 0.3, Medium.WATER);
        assertSame(value, PACKAGED.carry(value, "phenol", Medium.WATER).orElseThrow());
    }

    @Test
    void theFamilysOwnRelationGoesBeforeTheOneForAnyAcid() {
        MediaTransfer transfer = new MediaTransfer(List.of(line(Medium.WATER, Medium.DMSO, MediaRelation.ANY, 1, 1, 0.1),
                line(Medium.WATER, Medium.DMSO, "phenol", 2, -2, 0.8)));
        assertEquals(18, transfer.carry(value(10, 0.3, Medium.WATER), "phenol", Medium.DMSO).orElseThrow().pKa(), 1e-12);
        assertEquals(11, transfer.carry(value(10, 0.3, Medium.WATER), "ammonium", Medium.DMSO).orElseThrow().pKa(), 1e-12);
    }

    @Test
    void outsideTheFittedRangeTheUncertaintyGrowsAndIsNamed() {
        MediaTransfer transfer = new MediaTransfer(List.of(line(Medium.WATER, Medium.DMSO, "phenol", 2, -2, 0.8)));
        Acidity inside = transfer.carry(value(20, 0.3, Medium.WATER), "phenol", Medium.DMSO).orElseThrow();
        Acidity outside = transfer.carry(value(56, 0.3, Medium.WATER), "phenol", Medium.DMSO).orElseThrow();
        assertTrue(outside.sigma() > inside.sigma() + 0.5);
        assertEquals(List.of(), inside.missing());
        assertEquals(1, outside.missing().size());
    }

    /** Media with a scale of their own can be reached from water for a carboxylic acid and from DMSO for an ammonium ion. */
    @Test
    void everyMediumWithAScaleCanBeReached() {
        Set<Medium> scales = Stockroom.load(TableFolders.packaged()).solvents().stream().map(Solvent::scale).collect(Collectors.toSet());
        for (Medium medium : scales) {
            assertTrue(PACKAGED.carry(value(4.8, 0.1, Medium.WATER), "carboxylic-acid", medium).isPresent(), medium::id);
            assertTrue(PACKAGED.carry(value(10, 0.1, Medium.DMSO), "ammonium", medium).isPresent(), medium::id);
        }
    }

    /** Acetic acid, phenol, triethylamine and pyridine: Kuett et al. 2006 and Kaljurand et al. 2005 (from memory). */
    @Test
    void acetonitrileIsPredictedFromWaterWithinTwoStandardUncertainties() {
        assertPredicted(4.76, "carboxylic-acid", 23.5);
        assertPredicted(10.0, "phenol", 29.1);
        assertPredicted(10.75, "ammonium", 18.8);
        assertPredicted(5.2, "pyridinium", 12.5);
    }

    private static void assertPredicted(double inWater, String family, double inAcetonitrile) {
        Acidity carried = PACKAGED.carry(value(inWater, 0.1, Medium.WATER), family, Medium.ACETONITRILE).orElseThrow();
        assertEquals(inAcetonitrile, carried.pKa(), 2 * carried.sigma(), carried::source);
        assertTrue(carried.sigma() < 2.5, carried::source);
    }

    @Test
    void aFallingLineIsRefusedByItsRow(@TempDir Path folder) throws IOException {
        Files.writeString(folder.resolve("media-transfer.csv"), "# version: 1\n"
                + "id,from,to,family,slope,intercept,standard_error,n,valid_from,valid_to,source\n"
                + "mine,water,dmso,phenol,-1,4,0.5,3,0,10,my notebook\n");
        TableException error = assertThrows(TableException.class, () -> MediaTransfer.load(TableFolders.overlaidBy(folder)));
        assertTrue(error.getMessage().contains("media-transfer.csv:3: column slope: found '-1'"), error.getMessage());
    }
}
