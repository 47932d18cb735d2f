package lyate.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Documents from the command line: under their name when complete, beside the usual result. */
class ReportCommandTest {

    private static final String SHEET = "step,substrate,base,solvent\nS1,CC(C)=O,LDA,THF\n";

    @TempDir
    private Path folder;

    /** What a run left behind. */
    private record Run(int code, String out, String err) {}

    @Test
    void aReviewCanBeHandedOnAsHtml() throws IOException {
        Path report = folder.resolve("route.html");
        Run run = run("review", sheet(), "--report", report.toString());
        assertEquals(0, run.code());
        assertTrue(run.out().contains("S1,CC(C)=O,LDA,THF,selective"), run.out());
        String html = Files.readString(report);
        assertTrue(html.startsWith("<!DOCTYPE html>"));
        assertTrue(html.contains("<h1>sheet</h1>") && html.contains("Step S1") && html.endsWith("</html>\n"));
    }

    @Test
    void aReviewCanBeHandedOnAsPdf() throws IOException {
        Path report = folder.resolve("route.PDF");
        assertEquals(0, run("review", sheet(), "--report", report.toString()).code());
        assertEquals("%PDF-", Files.readString(report, StandardCharsets.ISO_8859_1).substring(0, 5));
    }

    @Test
    void aNameThatPromisesAnotherKindOfDocumentIsWrongUsage() throws IOException {
        Path report = folder.resolve("route.docx");
        Run run = run("review", sheet(), "--report", report.toString());
        assertEquals(2, run.code());
        assertTrue(run.err().contains("expected a name that ends in .html or .pdf"), run.err());
        assertFalse(Files.exists(report));
    }

    @Test
    void aCheckCanBeADocumentToo() {
        Run run = run("check", "--substrate", "CC(C)=O", "--base", "LDA", "--solvent", "THF", "--format", "html");
        assertEquals(0, run.code());
        assertTrue(run.out().contains("<h1>lithium diisopropylamide in tetrahydrofuran</h1>"), run.out().substring(0, 200));
    }

    private String sheet() throws IOException {
        return Files.writeString(folder.resolve("sheet.csv"), SHEET).toString();
    }

    private static Run run(String... arguments) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int code = Lyate.run(Terminal.of(new ByteArrayInputStream(new byte[0]), out, err, false), arguments);
        return new Run(code, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
    }
}
