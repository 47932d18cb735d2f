package lyate.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import lyate.review.BaseHazards;
import lyate.sheet.DemoRoute;
import lyate.sheet.ReviewedRow;
import nu.validator.client.EmbeddedValidator;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Document;
import org.w3c.dom.Element;

/** The HTML report stands alone, is valid, can be read without eyes or colours, and takes nothing a user typed for markup. */
class HtmlReportTest {

    private static final int LARGEST_STEP = 150_000;
    private static final List<ReviewedRow> DEMO = Reports.reviewed(DemoRoute.sheet());
    private static final String HTML = Reports.html("Demo", DEMO);
    private static final Document DOCUMENT = Reports.parse(HTML);

    /** The judge is the W3C's own checker (Nu Html Checker). */
    @Test
    void isValidHtml() throws Exception {
        assertEquals("", complaints(HTML));
    }

    @Test
    void theValidatorWouldComplain() throws Exception {
        assertTrue(complaints(HTML.replaceFirst("<h1>", "<h1 colour=\"red\">")).contains("colour"));
    }

    @Test
    void staysValidWhateverUsersType() throws Exception {
        String html = Reports.html("<i>\"'&", Reports.reviewed(hostileSheet()));
        assertEquals("", complaints(html));
    }

    @Test
    void takesNothingThatUsersTypeForMarkup() {
        String html = Reports.html("<script>title()</script>", Reports.reviewed(hostileSheet()));
        Document document = Reports.parse(html);
        assertEquals(Set.of("a", "body", "caption", "circle", "desc", "div", "figcaption", "figure", "footer", "g", "h1", "h2", "h3", "head",
                "header", "html", "li", "line", "main", "meta", "em", "p", "path", "rect", "section", "span", "strong", "style", "svg", "table",
                "tbody", "td", "text", "th", "thead", "title", "tr", "ul"), names(document));
        for (Element link : Reports.elements(document, "a")) {
            assertTrue(link.getAttribute("href").matches("#step-\\d+"), link.getAttribute("href"));
        }
        String words = document.getDocumentElement().getTextContent();
        for (String typed : List.of("<script>title()</script>", "<script>alert(1)</script>", "\"><img src=x onerror=alert(2)>", "</td></table><h1>",
                "javascript:alert(3)", "]]>&lt;")) {
            assertTrue(words.contains(typed), typed);
        }
    }

    @Test
    void showsThatACharacterWasThereWhichNoDocumentMayHold() {
        String html = Reports.html("a\u0000b\u0007c\ud800d\u202ee\uffff", List.of());
        assertEquals("a\ufffdb\ufffdc\ufffdd\ufffde\ufffd", Reports.elements(Reports.parse(html), "h1").get(0).getTextContent());
    }

    @Test
    void loadsNothingAndRunsNothing() {
        assertTrue(Reports.elements(DOCUMENT, "script").isEmpty());
        for (String name : List.of("link", "img", "iframe", "object", "image", "use", "base")) {
            assertTrue(Reports.elements(DOCUMENT, name).isEmpty(), name);
        }
        assertFalse(HTML.contains("url("));
        assertFalse(HTML.contains("@import"));
    }

    @Test
    void aStepWeighsLittle() {
        for (String step : HTML.split("(?=<section class=\"step\")|(?=<footer>)")) {
            assertTrue(step.getBytes(StandardCharsets.UTF_8).length <= LARGEST_STEP, step.substring(0, 60));
        }
    }

    @Test
    void aStepWithALargeSubstrateWeighsLittleToo() {
        // A steroid chain ester: 40 heavy atoms, most of them proton sites.
        String html = Reports.html("Large", Reports.reviewed("substrate,base,solvent\n"
                + "CC(C)CCCC(C)C1CCC2C3CC=C4CC(OC(=O)CCCCCCC)CCC4(C)C3CCC12C,LDA,THF\n"));
        assertTrue(html.length() <= LARGEST_STEP, html.length() + " characters");
    }

    @Test
    void everyVerdictStandsInWordsBesideItsSign() {
        String summary = Reports.elements(DOCUMENT, "table").get(0).getTextContent();
        DEMO.forEach(row -> assertTrue(summary.contains(Words.verdict(row.review().orElseThrow().verdict())), row.row().name()));
    }

    @Test
    void everyFindingStandsWithEvidenceAndSource() {
        String words = DOCUMENT.getDocumentElement().getTextContent();
        DEMO.forEach(row -> row.review().orElseThrow().findings().forEach(finding -> {
            assertTrue(words.contains(finding.sentence()), finding.sentence());
            assertTrue(words.contains("Source: " + finding.source()), finding.source());
            finding.evidence().forEach(fact -> assertTrue(words.contains(fact) || words.contains(Words.sentence(fact)), fact));
        }));
    }

    @Test
    void everySafetyNoteDefersToThoseWhoDecide() {
        List<Element> notes = Reports.elements(DOCUMENT, "div").stream().filter(div -> div.getAttribute("class").equals("safety")).toList();
        assertEquals(DEMO.size(), notes.size());
        notes.forEach(note -> assertTrue(note.getTextContent().strip().endsWith(BaseHazards.STANDING_LINE)));
    }

    @Test
    void thePersonsWhoDecideAreNamedOnceAStep() {
        String step = DOCUMENT.getElementsByTagName("section").item(2).getTextContent();
        assertEquals(2, step.split(Pattern.quote(BaseHazards.STANDING_LINE), -1).length);
    }

    @Test
    void amountsAreThoseOfTheSheet() {
        String words = Reports.html("Scale", Reports.reviewed("substrate,base,solvent,amount_g,base_titrated_M\nCC(C)=O,n-BuLi,THF,5.808,1.48\n"));
        // 5.808 g of propanone are 100 mmol; 100 mmol in 1.48 mol/L are 67.6 mL
        assertTrue(words.contains("For 100 mmol of substrate"));
        assertTrue(words.contains("1.48 mol/L, titrated") && words.contains(">67.6<"));
        assertFalse(words.contains("No amount given"));
    }

    @Test
    void headingsComeInOrder() {
        int level = 0;
        for (Element element : Reports.elements(DOCUMENT, "*")) {
            if (element.getTagName().matches("h[1-6]")) {
                int next = element.getTagName().charAt(1) - '0';
                assertTrue(next <= level + 1, element.getTextContent());
                level = next;
            }
        }
        assertEquals(1, Reports.elements(DOCUMENT, "h1").size());
    }

    @Test
    void everyPictureHasATitleAndADescriptionOrIsDecoration() {
        for (Element svg : Reports.elements(DOCUMENT, "svg")) {
            boolean decoration = svg.getAttribute("aria-hidden").equals("true");
            boolean described = svg.getElementsByTagName("title").getLength() == 1 && svg.getElementsByTagName("desc").getLength() == 1
                    && !svg.getElementsByTagName("desc").item(0).getTextContent().isBlank();
            assertTrue(decoration || described, svg.getAttribute("aria-labelledby"));
        }
    }

    @Test
    void everyTableHeaderSaysWhatItHeads() {
        Reports.elements(DOCUMENT, "th").forEach(header -> assertTrue(header.getAttribute("scope").matches("row|col"), header.getTextContent()));
    }

    @Test
    void namesTheTablesSoThatItCanBeMadeAgain() {
        String foot = Reports.elements(DOCUMENT, "footer").get(0).getTextContent();
        Reports.context("").tables().forEach(table -> {
            assertTrue(foot.contains(table.fileName()), table.fileName());
            assertTrue(foot.contains(table.digest()), table.digest());
        });
        assertTrue(foot.contains("lyate under test"));
    }

    @Test
    void saysWhatWasAssumedWhereTheSheetSaidNothing() {
        String words = Reports.html("Bare", Reports.reviewed("substrate,base,solvent\nCCC(C)=O,LDA,THF\n"));
        for (String assumed : List.of("No equivalents given: 1 taken", "No temperature given: 25", "No concentration given: 0.2 mol/L", "No water content given",
                "No intended site given")) {
            assertTrue(words.contains(assumed), assumed);
        }
    }

    @Test
    void aRowThatCouldNotBeJudgedKeepsItsPlaceAndSaysWhy() {
        String words = Reports.html("Broken", Reports.reviewed("step,substrate,base,solvent\nS1,CC(C)=O,LDA,THF\nS2,C(,LDA,THF\n"));
        assertTrue(words.contains("2 steps: 1 selective, 1 not judged."), words.substring(words.indexOf("<header>"), words.indexOf("<main>")));
        assertTrue(words.contains("not SMILES"));
    }

    @Test
    void isTheSameWhereverItIsMade() {
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.forLanguageTag("ar-EG-u-nu-arab"));
            assertEquals(HTML, Reports.html("Demo", DEMO));
        } finally {
            Locale.setDefault(before);
        }
    }

    private static String hostileSheet() {
        return "step,substrate,base,solvent,notes,<b onclick='x'>\n"
                + "<script>alert(1)</script>,CCC(C)=O,LDA,THF,\"\"\"><img src=x onerror=alert(2)>\",</td></table><h1>\n"
                + "\"' onload='alert(4)\",CCO,<base>,javascript:alert(3),]]>&lt;,\u202etxt\n";
    }

    private static Set<String> names(Document document) {
        Set<String> names = new TreeSet<>();
        Reports.elements(document, "*").forEach(element -> names.add(element.getTagName()));
        return names;
    }

    private static String complaints(String html) throws Exception {
        EmbeddedValidator validator = new EmbeddedValidator();
        validator.setOutputFormat(EmbeddedValidator.OutputFormat.GNU);
        return validator.validate(new ByteArrayInputStream(html.getBytes(StandardCharsets.UTF_8)));
    }
}
