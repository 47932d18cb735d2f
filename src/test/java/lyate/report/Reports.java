package lyate.report;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import lyate.molecule.MoleculeReader;
import lyate.review.StepReviewer;
import lyate.sheet.BatchReview;
import lyate.sheet.ReviewedRow;
import lyate.sheet.RouteSheet;
import lyate.sheet.SheetException;
import lyate.sheet.StepReader;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.SAXException;

/** Reports for tests, and eyes to read them with. */
final class Reports {

    private static final TableFolders TABLES = TableFolders.packaged();
    private static final StepReviewer REVIEWER = StepReviewer.load(TABLES);
    private static final BatchReview BATCH = new BatchReview(new StepReader(MoleculeReader.load(TABLES), Stockroom.load(TABLES)), REVIEWER);

    private Reports() {}

    static ReportContext context(String title) {
        return ReportContext.of(title, "lyate under test", TABLES, REVIEWER);
    }

    static List<ReviewedRow> reviewed(RouteSheet sheet) {
        List<ReviewedRow> rows = new ArrayList<>();
        BATCH.run(sheet.rows().iterator(), 2, rows::add);
        return rows;
    }

    static List<ReviewedRow> reviewed(String sheet) {
        try {
            return reviewed(RouteSheet.parse(sheet));
        } catch (SheetException e) {
            throw new IllegalArgumentException(e);
        }
    }

    static String html(String title, List<ReviewedRow> rows) {
        StringBuilder text = new StringBuilder();
        try (HtmlReport report = new HtmlReport(text, context(title))) {
            for (ReviewedRow row : rows) {
                report.write(row);
            }
            report.finish();
            return text.toString();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static byte[] pdf(String title, List<ReviewedRow> rows) {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (PdfReport report = new PdfReport(bytes, context(title))) {
            for (ReviewedRow row : rows) {
                report.write(row);
            }
            report.finish();
            return bytes.toByteArray();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The markup as a strict XML parser understands it. */
    static Document parse(String html) {
        try {
            return DocumentBuilderFactory.newInstance().newDocumentBuilder()
                    .parse(new ByteArrayInputStream(html.getBytes(StandardCharsets.UTF_8)));
        } catch (SAXException | IOException | ParserConfigurationException e) {
            throw new AssertionError(e.getMessage(), e);
        }
    }

    static List<Element> elements(Document document, String name) {
        NodeList found = document.getElementsByTagName(name);
        List<Element> elements = new ArrayList<>();
        for (int i = 0; i < found.getLength(); i++) {
            elements.add((Element) found.item(i));
        }
        return elements;
    }

    /** Without spaces of any kind, because a page breaks lines where it likes. */
    static String letters(String text) {
        return text.replaceAll("[\\s\\u00a0\\u00ad]+", "");
    }
}
