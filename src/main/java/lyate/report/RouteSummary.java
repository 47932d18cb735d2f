package lyate.report;

import java.util.EnumMap;
import java.util.Map;
import java.util.stream.Collectors;
import lyate.review.Finding;
import lyate.review.Review;
import lyate.review.Step;
import lyate.review.Verdict;
import lyate.sheet.ReviewedRow;

/** The first page: one line per step, and how many steps got which verdict. */
final class RouteSummary {

    private final Map<Verdict, Integer> counts = new EnumMap<>(Verdict.class);
    private int refused;

    /** Counts a row and makes its line; {@code id} is where its section is. */
    String line(ReviewedRow row, String id) {
        row.review().ifPresentOrElse(review -> counts.merge(review.verdict(), 1, Integer::sum), () -> refused++);
        Html html = new Html();
        html.open("tr").open("th", "scope", "row").element("a", row.row().name(), "href", "#" + id).close();
        row.review().ifPresentOrElse(review -> judged(html, review), () -> refused(html, row));
        return html.close().toString();
    }

    private static void judged(Html html, Review review) {
        Step step = review.step();
        html.element("td", Words.celsius(step.temperatureCelsius()) + ": " + step.base().name() + " (" + Words.equivalents(step.equivalents())
                + ") in " + step.solvent().name());
        html.open("td").markup(Signs.of(review.verdict())).element("strong", Words.verdict(review.verdict())).close();
        html.element("td", Words.probability(review.probability()));
        html.element("td", review.intendedSite() + (review.firstSite().equals(review.intendedSite()) ? "" : "; first: " + review.firstSite()));
        html.open("td");
        if (review.findings().isEmpty()) {
            html.text("none");
        } else {
            Finding worst = review.findings().get(0);
            html.markup(Signs.of(worst.severity())).element("strong", Words.sentence(worst.severity().word()) + ":").text(" " + worst.sentence());
        }
        html.close();
    }

    private static void refused(Html html, ReviewedRow row) {
        html.element("td", "").open("td").markup(Signs.notJudged()).element("strong", "Not judged").close();
        html.element("td", "").element("td", "").element("td", row.problem());
    }

    /** For example {@code 12 steps: 6 selective, 2 wrong site}. */
    String counts() {
        int all = refused + counts.values().stream().mapToInt(Integer::intValue).sum();
        String words = counts.entrySet().stream().map(entry -> entry.getValue() + " " + entry.getKey().code().replace('-', ' '))
                .collect(Collectors.joining(", "));
        String rest = refused == 0 ? "" : (words.isEmpty() ? "" : ", ") + refused + " not judged";
        return all + (all == 1 ? " step" : " steps") + (all == 0 ? "" : ": " + words + rest) + ".";
    }
}
