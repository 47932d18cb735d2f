package lyate.report;

import com.openhtmltopdf.outputdevice.helper.BaseRendererBuilder.FSFontUseCase;
import com.openhtmltopdf.outputdevice.helper.BaseRendererBuilder.FontStyle;
import com.openhtmltopdf.pdfboxout.PdfRendererBuilder;
import com.openhtmltopdf.svgsupport.BatikSVGDrawer;
import com.openhtmltopdf.util.XRLog;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.EnumSet;
import java.util.Locale;
import java.util.Set;
import java.util.logging.Level;
import java.util.logging.Logger;
import lyate.sheet.ReviewedRow;
import org.apache.pdfbox.pdmodel.font.FontMappers;

/**
 * The HTML report laid out on pages: the same words and pictures, fonts embedded, text that can be searched, tagged for
 * screen readers (PDF/UA), a bookmark per step. The layout is worked out in memory, so the number of steps is limited.
 */
public final class PdfReport implements ResultWriter<ReviewedRow>, AutoCloseable {

    /** Measured: 120 steps fit into 768 MB and not into 512 MB. */
    private static final long BYTES_PER_STEP = 8L << 20;
    private static final Set<FSFontUseCase> EVERYWHERE = EnumSet.of(FSFontUseCase.DOCUMENT, FSFontUseCase.SVG);
    private static final String ROBOTO = "/com/formdev/flatlaf/fonts/roboto/Roboto-";
    /** Held, because loggers that nobody holds forget their level. */
    private static final Logger QUIET = Logger.getLogger("org.apache.pdfbox");
    /** Has the arrows and signs that Roboto lacks. */
    private static final String LIBERATION = "/org/apache/pdfbox/resources/ttf/LiberationSans-Regular.ttf";

    private final OutputStream out;
    private final String title;
    private final StringBuilder page = new StringBuilder();
    private final Html bookmarks = new Html().open("bookmarks").markup("<bookmark name=\"Summary\" href=\"#summary-h\"/>");
    private final HtmlReport html;
    private final long mostRows;
    private int rows;

    /** Nothing is written to {@code out} before {@link #finish()}. */
    public PdfReport(OutputStream out, ReportContext context) throws IOException {
        this(out, context, Runtime.getRuntime().maxMemory() / BYTES_PER_STEP);
    }

    PdfReport(OutputStream out, ReportContext context, long mostRows) throws IOException {
        this.out = out;
        this.mostRows = mostRows;
        this.title = context.title();
        this.html = new HtmlReport(page, context, this::head);
    }

    @Override
    public void write(ReviewedRow row) throws IOException {
        rows++;
        if (rows > mostRows) {
            return;
        }
        String verdict = row.review().map(review -> Words.verdict(review.verdict())).orElse("Not judged");
        bookmarks.element("bookmark", "", "name", row.row().name() + ": " + verdict, "href", "#step-" + rows);
        html.write(row);
    }

    /** @throws IOException also where there are more steps than memory has room for */
    @Override
    public void finish() throws IOException {
        if (rows > mostRows) {
            throw new IOException("a PDF of " + rows + " steps needs more memory than there is; at most " + mostRows
                    + " fit, an HTML report has no limit");
        }
        html.finish();
        XRLog.setLoggingEnabled(false);
        QUIET.setLevel(Level.SEVERE);
        FontMappers.set(new PackagedFonts(LIBERATION));
        Path regular = copy(ROBOTO + "Regular.ttf");
        Path bold = copy(ROBOTO + "Bold.ttf");
        try {
            PdfRendererBuilder builder = new PdfRendererBuilder();
            builder.useFont(regular.toFile(), "Roboto", 400, FontStyle.NORMAL, true, EVERYWHERE);
            builder.useFont(bold.toFile(), "Roboto", 700, FontStyle.NORMAL, true, EVERYWHERE);
            builder.useFont(() -> open(LIBERATION), "Liberation Sans", 400, FontStyle.NORMAL, true);
            builder.useFont(() -> open(LIBERATION), "Liberation Sans", 700, FontStyle.NORMAL, true);
            builder.usePdfUaAccessibility(true);
            builder.useSVGDrawer(new BatikSVGDrawer());
            builder.withHtmlContent(page.toString(), null);
            builder.toStream(out);
            builder.run();
        } finally {
            Files.delete(regular);
            Files.delete(bold);
        }
    }

    /** The renderer of pictures takes its fonts from files only. */
    private static Path copy(String resource) throws IOException {
        Path file = Files.createTempFile("lyate-font", ".ttf");
        try (InputStream font = open(resource)) {
            Files.copy(font, file, StandardCopyOption.REPLACE_EXISTING);
        }
        return file;
    }

    private String head() {
        try {
            return "<style>" + HtmlReport.resource("pdf.css").replace("@title@", cssText(title)) + "</style>\n" + bookmarks.close();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Letters, digits and spaces as they are, everything else by number. */
    private static String cssText(String text) {
        StringBuilder safe = new StringBuilder();
        text.codePoints().limit(100).forEach(point -> safe.append(Character.isLetterOrDigit(point) || point == ' '
                ? Character.toString(point) : String.format(Locale.ROOT, "\\%06x", point < ' ' ? ' ' : point)));
        return safe.toString();
    }

    private static InputStream open(String resource) {
        return PdfReport.class.getResourceAsStream(resource);
    }

    @Override
    public void close() throws IOException {
        html.close();
    }
}
