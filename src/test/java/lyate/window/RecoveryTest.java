package lyate.window;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import lyate.sheet.RouteSheet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class RecoveryTest {

    @Test
    void unsavedChangesAreKeptAndTakenBack(@TempDir Path folder) {
        SheetDocument document = Panels.document(StepText.demo());
        Recovery recovery = new Recovery(folder, document);
        document.edit(document.state().text().with(StepField.BASE, "LDA"));
        recovery.write();
        List<Path> left = Recovery.leftBehind(folder, number -> false);
        assertEquals(1, left.size());
        RouteSheet sheet = Recovery.take(left.get(0)).orElseThrow();
        assertEquals("LDA", StepCells.text(sheet.rows().get(0)).get(StepField.BASE));
        assertTrue(Recovery.leftBehind(folder, number -> false).isEmpty());
    }

    @Test
    void theCopyOfARunningProgramIsLeftAlone(@TempDir Path folder) {
        SheetDocument document = Panels.document(StepText.demo());
        Recovery recovery = new Recovery(folder, document);
        document.edit(document.state().text().with(StepField.BASE, "LDA"));
        recovery.write();
        assertTrue(Recovery.leftBehind(folder, Recovery::isRunning).isEmpty());
    }

    @Test
    void anOrderlyEndLeavesNothingBehind(@TempDir Path folder) {
        SheetDocument document = Panels.document(StepText.demo());
        Recovery recovery = new Recovery(folder, document);
        document.edit(document.state().text().with(StepField.BASE, "LDA"));
        recovery.write();
        recovery.close();
        assertTrue(Recovery.leftBehind(folder, number -> false).isEmpty());
    }

    @Test
    void aDamagedCopyIsNotOfferedAsASheet(@TempDir Path folder) throws Exception {
        Path damaged = Files.write(folder.resolve("unsaved-1.csv"), new byte[] {(byte) 0xff, (byte) 0xfe, 0});
        assertTrue(Recovery.take(damaged).isEmpty());
        assertTrue(Files.exists(damaged));
    }

    @Test
    void aProgramKilledWhileItSavesLeavesAWholeSheetAndItsCopy(@TempDir Path folder) throws Exception {
        Path file = folder.resolve("sheet.csv");
        Process process = new ProcessBuilder(Path.of(System.getProperty("java.home"), "bin", "java").toString(), "-cp",
                System.getProperty("java.class.path"), KilledWhileSaving.class.getName(), folder.toString()).redirectErrorStream(true).start();
        long end = System.nanoTime() + 20_000_000_000L;
        while (!Files.exists(file) && System.nanoTime() < end) {
            Thread.sleep(5);
        }
        Thread.sleep(300);
        process.destroyForcibly();
        assertTrue(process.waitFor(10, TimeUnit.SECONDS));
        assertEquals(KilledWhileSaving.ROWS, RouteSheet.read(file).rows().size());
        List<Path> left = Recovery.leftBehind(folder, Recovery::isRunning);
        assertEquals(1, left.size());
        assertFalse(Recovery.take(left.get(0)).isEmpty());
    }
}
