package lyate.report;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.function.Supplier;
import lyate.review.BaseHazards;
import lyate.sheet.ReviewedRow;
import lyate.table.TableListing;

/**
 * A reviewed route as one self-contained HTML document: a summary, then a section per step, then what it was made with.
 * No script, nothing loaded from elsewhere; the markup is well-formed XML as well. Rows go to the disk as they come, so
 * that memory does not grow with the sheet.
 */
public final class HtmlReport implements ResultWriter<ReviewedRow>, AutoCloseable {

    private static final String HOW_TO_READ = "How to read the pictures of a step. Drawing: every proton site has its letter, pKa \u00b1 standard"
            + " uncertainty, a thick arc for the share of protons taken at equilibrium, and a double ring where it is the intended one. Acidity"
            + " ladder: sites left, base (triangle) and solvent (square) right; bars are standard uncertainties. Dose curve: share of protons taken"
            + " at equilibrium; solid line: the intended site.";

    private final Appendable out;
    private final ReportContext context;
    private final Supplier<String> headExtras;
    private final RouteSummary summary = new RouteSummary();
    private final Spool lines = new Spool();
    private final Spool sections = new Spool();
    private int rows;

    /** Nothing is written to {@code out} before {@link #finish()}. */
    public HtmlReport(Appendable out, ReportContext context) throws IOException {
        this(out, context, () -> "");
    }

    /** With markup of this package's own added to the head, asked for when all rows are known. */
    HtmlReport(Appendable out, ReportContext context, Supplier<String> headExtras) throws IOException {
        this.out = out;
        this.context = context;
        this.headExtras = headExtras;
    }

    @Override
    public void write(ReviewedRow row) throws IOException {
        rows++;
        String id = "step-" + rows;
        lines.append(summary.line(row, id));
        sections.append(row.review().map(review -> new StepSection(StepFacts.of(row, review, context), id).write())
                .orElseGet(() -> RefusedSection.write(row, id)));
    }

    @Override
    public void finish() throws IOException {
        out.append("<!DOCTYPE html>\n<html lang=\"en\" xmlns=\"http://www.w3.org/1999/xhtml\">\n<head>\n<meta charset=\"utf-8\"/>\n"
                + "<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\"/>\n");
        out.append(new Html().element("title", context.title() + " \u2013 route review").element("style", "@@").toString()
                .replace("@@", resource("report.css"))).append(headExtras.get()).append("</head>\n<body>\n");
        out.append(new Html().open("header").element("h1", context.title()).element("p", "Route review. " + summary.counts()
                + " Made by " + context.program() + ".").close().toString());
        out.append("<main>\n<section aria-labelledby=\"summary-h\">\n<h2 id=\"summary-h\">Summary</h2>\n<table class=\"summary\">\n"
                + "<caption>The steps in the order of the sheet</caption>\n<thead><tr>");
        for (String column : List.of("Step", "Conditions", "Verdict", "Probability", "Site meant", "Worst finding")) {
            out.append(new Html().element("th", column, "scope", "col").toString());
        }
        out.append("</tr></thead>\n<tbody>\n");
        lines.copyTo(out);
        out.append("</tbody>\n</table>\n").append(new Html().element("p", HOW_TO_READ, "class", "source").toString()).append("</section>\n");
        sections.copyTo(out);
        out.append("</main>\n").append(foot()).append("</body>\n</html>\n");
        close();
    }

    private String foot() {
        Html html = new Html().open("footer").element("h2", "Made with");
        html.element("p", context.program() + ". The same sheet, program and tables give the same report. Verdicts rest on pKa values with their"
                + " uncertainties; they are advice for people who know the trade. " + BaseHazards.STANDING_LINE);
        HtmlTable table = new HtmlTable(html, "tables", "Tables in use", List.of("Table", "Version", "Rows", "Digest", "Read from"));
        for (TableListing.Copy copy : context.tables()) {
            table.row(copy.fileName(), copy.version(), Integer.toString(copy.rows()), copy.digest(), copy.origin());
        }
        table.end();
        return html.close().toString();
    }

    static String resource(String name) throws IOException {
        try (InputStream stream = HtmlReport.class.getResourceAsStream("/lyate/report/" + name)) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
        }
    }

    @Override
    public void close() throws IOException {
        lines.close();
        sections.close();
    }
}
