package lyate.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import lyate.review.BaseHazards;
import lyate.review.Finding;
import lyate.review.Review;

/** What else the chemist should know: a sentence, then in small letters what it rests on. */
final class FindingList {

    private FindingList() {}

    static void write(Html html, Review review) {
        html.element("h3", "Findings");
        if (review.findings().isEmpty()) {
            html.element("p", "None.");
        }
        html.halves("div", review.findings().stream().map(finding -> piece(finding, review)).toList());
    }

    private static String piece(Finding finding, Review review) {
        Html html = new Html().open("div", "class", "finding");
        html.open("p").markup(Signs.of(finding.severity())).element("strong", Words.sentence(finding.severity().word()) + ", "
                + finding.kind().code().replace('-', ' ') + ":").text(" " + finding.sentence() + " ").element("span", details(finding, review), "class", "source").close();
        return html.close().toString();
    }

    /** The standing line closes the safety note of every step; once is enough. */
    private static String details(Finding finding, Review review) {
        List<String> facts = new ArrayList<>(finding.evidence().stream().filter(fact -> !fact.equals(BaseHazards.STANDING_LINE)).toList());
        if (!finding.atoms().isEmpty()) {
            facts.add("Atoms: " + String.join(", ", finding.atoms().stream().map(review.step().substrate()::label).toList()));
        }
        facts.add("Source: " + finding.source());
        return facts.stream().map(Words::sentence).map(fact -> fact.endsWith(".") ? fact : fact + ".").collect(Collectors.joining(" "));
    }
}
