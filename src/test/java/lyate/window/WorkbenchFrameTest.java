package lyate.window;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeFalse;

import java.awt.Frame;
import java.awt.GraphicsEnvironment;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.concurrent.atomic.AtomicReference;
import javax.swing.SwingUtilities;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class WorkbenchFrameTest {

    @Test
    void opensWithTheRealTablesAndRemembersItsPlace(@TempDir Path folder) throws Exception {
        assumeFalse(GraphicsEnvironment.isHeadless(), "the window needs a display");
        Path file = folder.resolve("window.properties");
        WorkbenchFrame.open(Engine.load(TableFolders.packaged()), new WindowMemory(file));
        WorkbenchFrame frame = waitForReview();
        SwingUtilities.invokeAndWait(() -> frame.setSize(1234, 777));
        SwingUtilities.invokeAndWait(frame::dispose);
        waitUntil(() -> Files.exists(file));
        assertEquals("1234", new WindowMemory(file).get("width", ""));
    }

    @Test
    void aMemoryThatCannotBeWrittenOnlyForgets(@TempDir Path folder) throws Exception {
        Path blocked = Files.writeString(folder.resolve("file"), "").resolve("window.properties");
        WindowMemory memory = new WindowMemory(blocked);
        memory.put("dark", "true");
        assertFalse(memory.save());
        assertFalse(new WindowMemory(blocked).isDark());
    }

    @Test
    void aDamagedMemoryIsForgotten(@TempDir Path folder) throws Exception {
        Path file = Files.writeString(folder.resolve("window.properties"), "x=\\u00zz\nzoom=big");
        WindowMemory memory = new WindowMemory(file);
        assertEquals(1, memory.zoom());
        assertEquals("none", memory.get("x", "none"));
    }

    private static WorkbenchFrame waitForReview() throws Exception {
        AtomicReference<WorkbenchFrame> found = new AtomicReference<>();
        waitUntil(() -> {
            SwingUtilities.invokeAndWait(() -> found.set(Arrays.stream(Frame.getFrames()).filter(WorkbenchFrame.class::isInstance)
                    .map(WorkbenchFrame.class::cast).filter(frame -> frame.isShowing() && frame.reviewed()).findFirst().orElse(null)));
            return found.get() != null;
        });
        return found.get();
    }

    private interface Condition {
        boolean holds() throws Exception;
    }

    private static void waitUntil(Condition condition) throws Exception {
        long end = System.nanoTime() + 20_000_000_000L;
        while (!condition.holds()) {
            assertTrue(System.nanoTime() < end, "not within 20 s");
            Thread.sleep(20);
        }
    }
}
