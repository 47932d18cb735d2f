package lyate.command;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A batch that is stopped or killed loses no finished row, and is brought to the same end by going on with it. */
class StoppedReviewTest {

    private static final List<String> SUBSTRATES = List.of("CC(C)=O", "Oc1ccccc1", "C(", "CCO", "CC(=O)O", "\"[Na+].[O-]\nC\"", "C#CC");

    @TempDir
    private Path folder;
    private Path sheet;
    private Path result;

    @BeforeEach
    void write() throws IOException {
        sheet = sheet(folder.resolve("sheet.csv"), 1400);
        result = folder.resolve("result.csv");
    }

    @Test
    void aRunThatIsAskedToEndFinishesTheRowsItHasBegun() throws Exception {
        File words = folder.resolve("words").toFile();
        Process process = CommandRun.process(List.of(), arguments()).redirectError(words).start();
        waitForBytes(1);
        process.destroy();
        assertTrue(process.waitFor(60, TimeUnit.SECONDS));
        String part = Files.readString(part());
        assertTrue(part.endsWith("\n"), part.substring(Math.max(0, part.length() - 80)));
        String said = Files.readString(words.toPath());
        assertTrue(said.contains("rows; they are in " + part() + ", --resume goes on from there"), said);
        finish();
        assertSameAsUninterrupted();
    }

    @Test
    void aRunThatIsKilledIsContinued() throws Exception {
        killAt(new Random(3), 2);
        finish();
        assertSameAsUninterrupted();
    }

    @Test
    @Tag("slow")
    void aRunThatIsKilledAtAnyMomentIsContinued() throws Exception {
        for (int seed = 0; seed < 10; seed++) {
            Files.deleteIfExists(result);
            killAt(new Random(seed), 5);
            finish();
            assertSameAsUninterrupted();
        }
    }

    @Test
    void whatAStoppedRunHasFinishedIsNotOverwritten() throws Exception {
        killAt(new Random(4), 1);
        CommandRun again = CommandRun.of("", "review", sheet.toString(), "-o", result.toString());
        assertEquals(1, again.code());
        assertEquals("lyate review: " + part() + " holds what a run that was stopped has finished: continue it with --resume, or delete it\n",
                again.err().replace("\r", ""));
    }

    @Test
    void anotherSheetIsNotTakenForTheSame() throws Exception {
        killAt(new Random(5), 1);
        Files.writeString(sheet, Files.readString(sheet).replaceFirst("row 1,", "row one,"));
        CommandRun other = resume();
        assertEquals(1, other.code());
        assertTrue(other.err().contains(part() + " cannot be continued: its row 2 is not that of the sheet, which was changed since"), other.err());
        Files.writeString(sheet, "substrate,base,solvent\nCCO,NaH,DMF\n");
        assertTrue(resume().err().contains("cannot be continued: it has other columns than the sheet"));
        sheet(sheet, 1);
        assertTrue(resume().err().contains("cannot be continued: it has more rows than the sheet, which has 1"));
    }

    @Test
    void otherTablesAreNotTakenForTheSame() throws Exception {
        killAt(new Random(6), 1);
        Path tables = Files.createDirectory(folder.resolve("tables"));
        Files.writeString(tables.resolve("normalisations.csv"), "# version: 1\nid,what,transformation,before,after,source\n");
        CommandRun other = CommandRun.of("", "review", sheet.toString(), "-o", result.toString(), "--resume", "--tables", tables.toString());
        assertEquals(1, other.code());
        assertTrue(other.err().contains("was made with other tables or another version of the program"), other.err());
    }

    private void killAt(Random random, int times) throws Exception {
        for (int kill = 0; kill < times && !Files.exists(result); kill++) {
            Process process = CommandRun.process(List.of(), arguments()).redirectError(ProcessBuilder.Redirect.DISCARD).start();
            waitForBytes(size() + 1);
            TimeUnit.MICROSECONDS.sleep(random.nextInt(60_000));
            process.destroyForcibly();
            assertTrue(process.waitFor(20, TimeUnit.SECONDS));
        }
    }

    private String[] arguments() {
        return new String[] {"review", sheet.toString(), "-o", result.toString(), "--resume"};
    }

    private void waitForBytes(long bytes) throws Exception {
        long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(60);
        while (size() < bytes && !Files.exists(result) && System.nanoTime() < end) {
            Thread.sleep(1);
        }
    }

    private long size() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.filter(file -> file.toString().endsWith(".part")).mapToLong(file -> file.toFile().length()).sum();
        }
    }

    private Path part() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.filter(file -> file.getFileName().toString().matches("result\\.csv\\.[0-9a-f]{8}\\.part")).findFirst().orElseThrow();
        }
    }

    private CommandRun resume() {
        return CommandRun.of("", arguments());
    }

    private void finish() {
        CommandRun last = resume();
        assertEquals(1, last.code());
        assertTrue(last.err().contains("1400 rows, 400 of them could not be used"), () -> last.err().substring(last.err().length() - 200));
    }

    private void assertSameAsUninterrupted() throws IOException {
        Path whole = folder.resolve("whole.csv");
        assertEquals(1, CommandRun.of("", "review", sheet.toString(), "-o", whole.toString(), "--threads", "1").code());
        assertArrayEquals(Files.readAllBytes(whole), Files.readAllBytes(result));
        Files.delete(whole);
    }

    /** Rows with commas, quotes and line breaks in them, every seventh of which cannot be used. */
    private static Path sheet(Path file, int rows) throws IOException {
        StringBuilder text = new StringBuilder("step,substrate,base,solvent,notes\n");
        for (int row = 0; row < rows; row++) {
            text.append("row ").append(row).append(',').append(SUBSTRATES.get(row % SUBSTRATES.size()))
                    .append(",LDA,THF,\"said \"\"\u00e9\"\",\n=1+1\"\n");
        }
        return Files.writeString(file, text);
    }
}
