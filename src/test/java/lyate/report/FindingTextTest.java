package lyate.report;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.util.List;
import lyate.review.BaseHazards;
import lyate.review.Finding;
import lyate.review.FindingKind;
import org.junit.jupiter.api.Test;

/** Findings as text. */
class FindingTextTest {

    @Test
    void thePersonsWhoDecideAreNamedOnceHoweverManyTheHazards() throws IOException {
        StringBuilder out = new StringBuilder();
        Finding hazard = new Finding(Finding.Severity.NOTE, FindingKind.PYROPHORIC, "It burns.", List.of("Keep air out.", BaseHazards.STANDING_LINE), List.of(), "x");
        new FindingText(out).findings(List.of(hazard, hazard));
        assertEquals("\n  note  pyrophoric: It burns.\n      Keep air out.\n      source: x\n".repeat(2) + "\n  " + BaseHazards.STANDING_LINE + "\n", out.toString());
    }

    @Test
    void findingsThatAreNoHazardsDoWithoutThem() throws IOException {
        StringBuilder out = new StringBuilder();
        new FindingText(out).findings(List.of(new Finding(Finding.Severity.NOTE, FindingKind.EXCESS_BASE, "Too much.", List.of(), List.of(), "x")));
        assertEquals("\n  note  excess-base: Too much.\n      source: x\n", out.toString());
    }
}
