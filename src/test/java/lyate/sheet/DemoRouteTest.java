package lyate.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import lyate.molecule.MoleculeReader;
import lyate.review.FindingKind;
import lyate.review.Review;
import lyate.review.StepReviewer;
import lyate.review.Verdict;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;

/** The mistakes put into the example on purpose are textbook ones; each must be found, and the sound steps left alone. */
class DemoRouteTest {

    private static final Map<String, Review> REVIEWS = reviews();

    private static Map<String, Review> reviews() {
        TableFolders tables = TableFolders.packaged();
        BatchReview batch = new BatchReview(new StepReader(MoleculeReader.load(tables), Stockroom.load(tables)), StepReviewer.load(tables));
        Map<String, Review> reviews = new LinkedHashMap<>();
        batch.run(DemoRoute.sheet().rows().iterator(), 2, row -> reviews.put(row.row().name(), row.review().orElseThrow(
                () -> new AssertionError(row.row().place() + ": " + row.problem()))));
        return reviews;
    }

    @Test
    void theExampleInTheDocumentsIsTheOneInTheProgram() throws IOException {
        assertEquals(DemoRoute.text(), Files.readString(Path.of("docs/example-route.csv"), StandardCharsets.UTF_8));
    }

    @Test
    void hasTwelveStepsThatCanAllBeJudged() {
        assertEquals(12, REVIEWS.size());
    }

    @Test
    void oneEquivalentOfAmideTakesTheProtonBetweenTheAcceptorsFirst() {
        assertEquals(Verdict.WRONG_SITE, REVIEWS.get("T03").verdict());
        assertEquals("C7", REVIEWS.get("T03").firstSite());
    }

    @Test
    void aForgottenCarboxylicAcidTakesTheBase() {
        assertEquals(Verdict.WRONG_SITE, REVIEWS.get("T05").verdict());
        assertEquals("O1", REVIEWS.get("T05").firstSite());
    }

    @Test
    void anAmineDoesNotReachAnIndole() {
        assertEquals(Verdict.TOO_WEAK, REVIEWS.get("T09").verdict());
    }

    @Test
    void butyllithiumAddsToAKetone() {
        assertEquals(Verdict.INCOMPATIBLE, REVIEWS.get("T10").verdict());
        assertTrue(found("T10", FindingKind.NUCLEOPHILIC_ADDITION));
    }

    @Test
    void methoxideExchangesTheAlkoxyGroupsOfAButylMalonate() {
        assertTrue(found("T11", FindingKind.ESTER_EXCHANGE));
    }

    @Test
    void methanolLevelsSodiumHydride() {
        assertEquals(Verdict.LEVELLED, REVIEWS.get("T12").verdict());
    }

    @Test
    void soundStepsAreLeftAlone() {
        for (String step : List.of("T01", "T02", "T04", "T06", "T07")) {
            assertEquals(Verdict.SELECTIVE, REVIEWS.get(step).verdict(), step);
        }
    }

    private static boolean found(String step, FindingKind kind) {
        return REVIEWS.get(step).findings().stream().anyMatch(finding -> finding.kind() == kind);
    }
}
