package lyate.report;

import java.io.IOException;
import java.util.List;
import java.util.Locale;
import lyate.review.BaseHazards;
import lyate.review.Finding;

/** Findings and other lists of a review for reading. */
final class FindingText {

    private final Appendable out;

    FindingText(Appendable out) {
        this.out = out;
    }

    /** Names the kinds of findings that say stop; nothing where there is none. */
    void stops(List<Finding> findings) throws IOException {
        List<String> stops = findings.stream().filter(finding -> finding.severity() == Finding.Severity.STOP)
                .map(finding -> finding.kind().code()).distinct().toList();
        if (!stops.isEmpty()) {
            line("stop: %s (see below)", String.join(", ", stops));
        }
    }

    /** Each finding with its evidence and source; the line that stands under every safety finding closes them, once. */
    void findings(List<Finding> findings) throws IOException {
        for (Finding finding : findings) {
            line("");
            line("  %s  %s: %s", finding.severity().word(), finding.kind().code(), finding.sentence());
            for (String evidence : finding.evidence()) {
                if (!evidence.equals(BaseHazards.STANDING_LINE)) {
                    line("      %s", evidence);
                }
            }
            line("      source: %s", finding.source());
        }
        if (findings.stream().anyMatch(finding -> finding.evidence().contains(BaseHazards.STANDING_LINE))) {
            line("");
            line("  %s", BaseHazards.STANDING_LINE);
        }
    }

    /** A heading and its lines; nothing where there is none. */
    void list(String heading, List<String> lines) throws IOException {
        if (!lines.isEmpty()) {
            line("");
            line("  %s", heading);
            for (String text : lines) {
                line("    %s", text);
            }
        }
    }

    void line(String format, Object... values) throws IOException {
        out.append(String.format(Locale.ROOT, format, values).stripTrailing()).append('\n');
    }
}
