package lyate.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** A sheet is written back as it was read, except for what was changed. */
class RouteSheetTest {

    private static final String SHEET = "# my route\r\nstep;substrate;mine;base\r\n\r\n A ;CCO;\"x;\"\"y\"\"\";NaH\r\n# next\r\nB;CO;=1+1;\r\n# end";

    @ParameterizedTest
    @ValueSource(strings = {SHEET, "\uFEFFsubstrate,base\nCCO,\"Na\nH\"\n\n\n", "substrate", "substrate\n", "sep=,\nsubstrate,base\nCCO,NaH",
        "substrate\nCCO\n\"never closed\nCO\n"})
    void unchangedSheetIsWrittenByteByByte(String text) throws SheetException {
        assertEquals(text, RouteSheet.parse(text).text());
    }

    @Test
    void changedCellChangesItsRowAlone() throws SheetException {
        RouteSheet changed = RouteSheet.parse(SHEET).withCell(1, "base", "LDA; fresh");
        assertEquals(SHEET.replace("B;CO;=1+1;", "B;CO;=1+1;\"LDA; fresh\""), changed.text());
        assertEquals("LDA; fresh", RouteSheet.parse(changed.text()).rows().get(1).text(SheetColumn.BASE));
    }

    @Test
    void unknownColumnIsAddedAtTheEnd() throws SheetException {
        RouteSheet wide = RouteSheet.parse("# top\nsubstrate,base\nCCO,NaH\n# mid\nCO,KOH\n").withCell(1, "solvent", "THF");
        assertEquals("# top\nsubstrate,base,solvent\nCCO,NaH,\n# mid\nCO,KOH,THF\n", wide.text());
    }

    @Test
    void rowsAreAddedAndTakenAway() throws SheetException {
        RouteSheet two = RouteSheet.parse("substrate,base\nCCO,NaH").withRow(List.of("CO", "KOH"));
        assertEquals("substrate,base\nCCO,NaH\nCO,KOH\n", two.text());
        assertEquals("substrate,base\nCO,KOH\n", two.withoutRow(0).text().replace("base\n\n", "base\n"));
        assertEquals(15, RouteSheet.empty().header().names().size());
    }

    @Test
    void whateverIsTypedReadsBackTheSame() throws SheetException {
        Random random = new Random(7);
        String letters = "ab,;\"\n\r\t=#'é漢 ";
        for (int i = 0; i < 2000; i++) {
            StringBuilder text = new StringBuilder("x");
            for (int k = random.nextInt(12); k > 0; k--) {
                text.append(letters.charAt(random.nextInt(letters.length())));
            }
            String cell = text.append('x').toString();
            RouteSheet sheet = RouteSheet.parse("substrate,notes\nCCO,\nCO,second\n").withCell(0, "notes", cell);
            RouteSheet again = RouteSheet.parse(sheet.text());
            assertEquals(cell, again.rows().get(0).text(SheetColumn.NOTES));
            assertEquals("second", again.rows().get(1).text(SheetColumn.NOTES));
        }
    }

    @Test
    void savingReplacesTheFileAtOnceAndLeavesNothingBeside(@TempDir Path folder) throws IOException, SheetException {
        Path file = folder.resolve("route.csv");
        RouteSheet.parse(SHEET).save(file);
        RouteSheet.read(file).withCell(0, "step", "A1").save(file);
        assertEquals("A1", RouteSheet.read(file).rows().get(0).name());
        try (Stream<Path> files = Files.list(folder)) {
            assertEquals(List.of(file), files.toList());
        }
    }

    @Test
    void savingKeepsPermissions(@TempDir Path folder) throws IOException, SheetException {
        if (!FileSystems.getDefault().supportedFileAttributeViews().contains("posix")) {
            return;
        }
        Path file = folder.resolve("route.csv");
        RouteSheet.parse(SHEET).save(file);
        assertTrue(PosixFilePermissions.toString(Files.getPosixFilePermissions(file)).startsWith("rw-r--"));
        Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("rw-rw----"));
        RouteSheet.read(file).save(file);
        assertEquals("rw-rw----", PosixFilePermissions.toString(Files.getPosixFilePermissions(file)));
    }

    @Test
    void saveThatFailsLeavesTheOldFile(@TempDir Path folder) throws IOException, SheetException {
        RouteSheet sheet = RouteSheet.parse(SHEET);
        Path directory = Files.createDirectory(folder.resolve("route.csv"));
        Files.createFile(directory.resolve("inside"));
        assertThrows(IOException.class, () -> sheet.save(directory));
        assertTrue(Files.exists(directory.resolve("inside")));
        try (Stream<Path> files = Files.list(folder)) {
            assertEquals(List.of(directory), files.toList());
        }
    }

    @Test
    void aFileThatSomebodyElseHasWrittenIsNoticed(@TempDir Path folder) throws IOException, SheetException {
        Path file = folder.resolve("route.csv");
        RouteSheet mine = RouteSheet.parse("\uFEFF" + SHEET);
        mine.save(file);
        assertFalse(RouteSheet.changedSince(file, mine.text()));
        RouteSheet theirs = RouteSheet.read(file).withCell(0, "base", "LDA");
        theirs.save(file);
        assertTrue(RouteSheet.changedSince(file, mine.text()));
        Files.delete(file);
        assertFalse(RouteSheet.changedSince(file, mine.text()));
    }

    @Test
    void otherEncodingsAreRefusedInWords(@TempDir Path folder) throws IOException {
        Path file = folder.resolve("latin.csv");
        Files.write(file, "substrate,notes\nCCO,d\u00e9j\u00e0 vu\n".getBytes(StandardCharsets.ISO_8859_1));
        assertEquals(file + " is not UTF-8 text; save it as CSV UTF-8",
                assertThrows(SheetException.class, () -> RouteSheet.read(file)).getMessage());
    }
}
