package lyate.review;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.Optional;
import lyate.molecule.MoleculeReader;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.aggregator.ArgumentsAccessor;
import org.junit.jupiter.params.provider.CsvFileSource;

/** What the trade goes by when it chooses a base (common practice), on whole reviews. */
class RulesOfThumbTest {

    private static final Stockroom STOCKROOM = Stockroom.load(TableFolders.packaged());
    private static final StepReviewer REVIEWER = StepReviewer.load(TableFolders.packaged());
    private static final double LEFT_AT_MOST_PERCENT = 5;

    @ParameterizedTest(name = "{0}: {1} with {3}")
    @CsvFileSource(resources = "rules-of-thumb.csv", delimiter = '|', numLinesToSkip = 1)
    void theReviewSaysWhatTheTradeSays(ArgumentsAccessor row) throws Exception {
        Review review = REVIEWER.review(new Step("rule", new MoleculeReader().read(row.getString(1)), Optional.of(row.getString(2)),
                STOCKROOM.base(row.getString(3)), row.getDouble(4), STOCKROOM.solvent(row.getString(5)), row.getDouble(6), 0.2, 0,
                Optional.empty()));
        assertTrue(Arrays.asList(row.getString(7).split("/")).contains(review.verdict().code()),
                () -> review.verdict().code() + ", log K " + review.logK() + " " + review.probabilities() + review.explanation());
        if (review.verdict() == Verdict.SELECTIVE && row.getDouble(4) >= 1.05) {
            assertTrue(review.intendedPercent() >= 100 - LEFT_AT_MOST_PERCENT, () -> "taken: " + review.intendedPercent() + " %");
        }
        if (review.verdict() == Verdict.TOO_WEAK) {
            assertTrue(review.intendedPercent() < 20, () -> "taken: " + review.intendedPercent() + " %");
            assertEquals("none", review.firstSite().equals(row.getString(2)) ? "none" : review.firstSite());
        }
    }
}
