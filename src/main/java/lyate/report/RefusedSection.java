package lyate.report;

import java.util.List;
import lyate.sheet.ReviewedRow;

/** A row that could not be judged, as a section: what was given and what is wrong with it. */
final class RefusedSection {

    private RefusedSection() {}

    static String write(ReviewedRow row, String id) {
        Html html = new Html().open("section", "class", "step", "id", id, "aria-labelledby", id + "-h");
        html.element("h2", "Step " + row.row().name(), "id", id + "-h");
        html.open("div", "class", "verdict").open("p", "class", "answer").markup(Signs.notJudged()).element("strong", "Not judged").close();
        html.element("p", row.row().place() + ": " + row.problem()).close();
        html.element("h3", "As given").open("table", "class", "pairs").open("tbody");
        List<String> names = row.row().header().names();
        for (int i = 0; i < names.size(); i++) {
            if (!row.row().cells().get(i).isBlank()) {
                html.open("tr").element("th", names.get(i), "scope", "row").element("td", row.row().cells().get(i)).close();
            }
        }
        return html.close().close().close().toString();
    }
}
