package lyate.review;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import lyate.table.TableFolders;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.aggregator.ArgumentsAccessor;
import org.junit.jupiter.params.provider.CsvFileSource;

/** Rules must speak up where textbooks do and keep quiet where a step is known to work. */
class TextbookStepsTest {

    private static final Stockroom STOCKROOM = Stockroom.load(TableFolders.packaged());
    private static final StepReviewer REVIEWER = StepReviewer.load(TableFolders.packaged());
    private static final Set<Verdict> LOST = Set.of(Verdict.INCOMPATIBLE, Verdict.LEVELLED);

    @ParameterizedTest(name = "{0} with {2}")
    @CsvFileSource(resources = "steps-that-work.csv", delimiter = '|', numLinesToSkip = 1)
    void noRuleStopsAStepThatWorks(ArgumentsAccessor row) throws Exception {
        Review review = review(row);
        assertAll(() -> assertTrue(!LOST.contains(review.verdict()), review.verdict() + ": " + review.findings()),
                () -> assertEquals(List.of(), review.findings().stream()
                        .filter(finding -> finding.severity() == Finding.Severity.STOP).map(Finding::sentence).toList()));
    }

    @ParameterizedTest(name = "{0} with {2}")
    @CsvFileSource(resources = "steps-that-fail.csv", delimiter = '|', numLinesToSkip = 1)
    void aStepThatFailsIsStoppedAndTheReasonNamed(ArgumentsAccessor row) throws Exception {
        Review review = review(row);
        assertAll(() -> assertTrue(LOST.contains(review.verdict()), review.verdict().code()),
                () -> assertTrue(review.findings().stream().anyMatch(finding -> finding.kind().code().equals(row.getString(6))
                        && finding.severity() == Finding.Severity.STOP), review.findings().toString()));
    }

    private static Review review(ArgumentsAccessor row) throws UnknownNameException, MoleculeException, ReviewException {
        Solvent solvent = STOCKROOM.solvent(row.getString(4));
        return REVIEWER.review(new Step("textbook", new MoleculeReader().read(row.getString(0)), Optional.of(row.getString(1)),
                STOCKROOM.base(row.getString(2)), row.getDouble(3), solvent, row.getDouble(5), 0.2, 0, Optional.empty()));
    }
}
