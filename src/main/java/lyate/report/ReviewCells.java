package lyate.report;

import java.util.Collections;
import java.util.List;
import java.util.stream.Collectors;
import lyate.review.Judgement;

/** The columns a review adds to a row. */
final class ReviewCells {

    static final List<String> COLUMNS = List.of("verdict", "probability", "log_k", "first_site", "intended_percent",
            "other_percent", "findings");

    private ReviewCells() {}

    static List<String> of(Judgement review) {
        String findings = review.findings().stream().map(finding -> finding.kind().code()).distinct()
                .collect(Collectors.joining(";"));
        return List.of(review.verdict().code(), Numbers.fixed(review.probability(), 3), Numbers.fixed(review.logK(), 2),
                review.firstSite(), Numbers.fixed(review.intendedPercent(), 1), Numbers.fixed(review.otherPercent(), 1), findings);
    }

    /** The cells of a row that could not be judged. */
    static List<String> none() {
        return Collections.nCopies(COLUMNS.size(), "");
    }
}
