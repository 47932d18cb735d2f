package lyate.report;

import java.util.List;

/** A table whose column headers and row headers are marked as such. */
final class HtmlTable {

    private final Html html;

    /** Opens the table; its first column names the row. */
    HtmlTable(Html html, String kind, String caption, List<String> columns) {
        this.html = html;
        html.open("table", "class", kind).element("caption", caption).open("thead").open("tr");
        columns.forEach(column -> html.element("th", column, "scope", "col"));
        html.close().close().open("tbody");
    }

    void row(String... cells) {
        html.open("tr").element("th", cells[0], "scope", "row");
        for (int i = 1; i < cells.length; i++) {
            html.element("td", cells[i]);
        }
        html.close();
    }

    void end() {
        html.close().close();
    }
}
