package lyate.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import lyate.review.Finding;
import lyate.review.Review;
import lyate.sheet.DemoRoute;
import lyate.sheet.ReviewedRow;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDResources;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.apache.pdfbox.pdmodel.graphics.PDXObject;
import org.apache.pdfbox.pdmodel.graphics.form.PDFormXObject;
import org.apache.pdfbox.pdmodel.interactive.documentnavigation.outline.PDOutlineItem;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** The PDF report says what the HTML report says, can be searched, and brings its fonts. */
class PdfReportTest {

    private static final List<ReviewedRow> DEMO = Reports.reviewed(DemoRoute.sheet());
    private static PDDocument document;
    private static String words;

    @BeforeAll
    static void make() throws IOException {
        document = Loader.loadPDF(Reports.pdf("Demo \u2192 <route>", DEMO));
        words = Reports.letters(new PDFTextStripper().getText(document));
    }

    @AfterAll
    static void close() throws IOException {
        document.close();
    }

    @Test
    void saysTheSameVerdictsAndFindingsAsTheHtml() {
        String html = Reports.letters(Reports.parse(Reports.html("Demo", DEMO)).getDocumentElement().getTextContent());
        for (ReviewedRow row : DEMO) {
            Review review = row.review().orElseThrow();
            List<String> said = new ArrayList<>(List.of("Step " + row.row().name(),
                    Words.verdict(review.verdict()) + "probability " + Words.probability(review.probability())));
            review.findings().forEach(finding -> said.add(heading(finding) + finding.sentence()));
            review.findings().forEach(finding -> said.add("Source: " + finding.source()));
            for (String text : said) {
                assertTrue(html.contains(Reports.letters(text)), "not in HTML: " + text);
                assertTrue(words.contains(Reports.letters(text)), "not in PDF: " + text);
            }
        }
    }

    @Test
    void everyFontIsEmbedded() throws IOException {
        List<PDFont> fonts = new ArrayList<>();
        for (PDPage page : document.getPages()) {
            collect(page.getResources(), fonts);
        }
        assertFalse(fonts.isEmpty());
        fonts.forEach(font -> assertTrue(font.isEmbedded(), font.getName()));
    }

    @Test
    void signsThatTheMainFontLacksAreThereAllTheSame() {
        assertTrue(words.contains("Demo\u2192<route>"), words.substring(0, 200));
    }

    @Test
    void isTaggedTitledAndNamesItsLanguage() {
        assertEquals("en", document.getDocumentCatalog().getLanguage());
        assertTrue(document.getDocumentCatalog().getMarkInfo().isMarked());
        assertNotNull(document.getDocumentCatalog().getStructureTreeRoot());
        assertTrue(document.getDocumentInformation().getTitle().startsWith("Demo"), document.getDocumentInformation().getTitle());
    }

    @Test
    void hasABookmarkPerStepWithItsVerdict() {
        List<String> titles = new ArrayList<>();
        for (PDOutlineItem item : document.getDocumentCatalog().getDocumentOutline().children()) {
            titles.add(item.getTitle());
        }
        assertEquals(DEMO.size() + 1, titles.size());
        assertTrue(titles.contains("T03: Wrong site"), titles.toString());
    }

    @Test
    void everyStepStartsAPage() throws IOException {
        for (int step = 1; step <= DEMO.size(); step++) {
            String name = DEMO.get(step - 1).row().name();
            boolean found = false;
            for (int page = 1; page <= document.getNumberOfPages(); page++) {
                found |= text(page).lines().limit(4).anyMatch(("Step " + name)::equals);
            }
            assertTrue(found, name);
        }
    }

    @Test
    void aUsualStepTakesOnePageAndNoneMoreThanTwo() throws IOException {
        List<Integer> starts = new ArrayList<>();
        for (int page = 1; page <= document.getNumberOfPages(); page++) {
            List<String> top = text(page).lines().limit(4).toList();
            if (DEMO.stream().anyMatch(row -> top.contains("Step " + row.row().name())) || top.contains("Made with")) {
                starts.add(page);
            }
        }
        assertEquals(DEMO.size() + 1, starts.size());
        List<Integer> pages = new ArrayList<>();
        for (int step = 0; step < DEMO.size(); step++) {
            pages.add(starts.get(step + 1) - starts.get(step));
        }
        assertTrue(pages.stream().allMatch(count -> count <= 2), pages.toString());
        assertTrue(pages.stream().filter(count -> count == 1).count() >= 9, pages.toString());
    }

    @Test
    void takesNothingThatUsersTypeForMarkup() throws IOException {
        byte[] bytes = Reports.pdf("\"; } @import url(file:/etc/passwd); <b>", Reports.reviewed(
                "step,substrate,base,solvent,notes\n<script>alert(1)</script>,CC(C)=O,LDA,THF,<img src='file:/etc/passwd'>\n"));
        try (PDDocument hostile = Loader.loadPDF(bytes)) {
            String text = Reports.letters(new PDFTextStripper().getText(hostile));
            assertTrue(text.contains("<script>alert(1)</script>"));
            assertTrue(text.contains("<imgsrc='file:/etc/passwd'>"));
            assertTrue(text.contains("\";}@importurl(file:/etc/passwd);<b>"));
        }
    }

    @Test
    void moreStepsThanFitAreRefusedInWordsBeforeMemoryRunsOut() throws IOException {
        try (PdfReport report = new PdfReport(new ByteArrayOutputStream(), Reports.context("Long"), 2)) {
            for (ReviewedRow row : DEMO.subList(0, 3)) {
                report.write(row);
            }
            String said = assertThrows(IOException.class, report::finish).getMessage();
            assertTrue(said.startsWith("a PDF of 3 steps needs more memory than there is; at most 2 fit"), said);
        }
    }

    private static String heading(Finding finding) {
        return Words.sentence(finding.severity().word()) + ", " + finding.kind().code().replace('-', ' ') + ":";
    }

    private static String text(int page) throws IOException {
        PDFTextStripper stripper = new PDFTextStripper();
        stripper.setStartPage(page);
        stripper.setEndPage(page);
        return stripper.getText(document).strip();
    }

    private static void collect(PDResources resources, List<PDFont> fonts) throws IOException {
        if (resources == null) {
            return;
        }
        for (COSName name : resources.getFontNames()) {
            fonts.add(resources.getFont(name));
        }
        for (COSName name : resources.getXObjectNames()) {
            PDXObject object = resources.getXObject(name);
            if (object instanceof PDFormXObject form) {
                collect(form.getResources(), fonts);
            }
        }
    }
}
