package lyate.window;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicInteger;
import javax.swing.SwingUtilities;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class LookKeeperTest {

    private final Theme theme = new Theme(false);
    private final AtomicInteger asked = new AtomicInteger();
    private volatile Optional<Boolean> desktop = Optional.of(true);
    private WindowMemory memory;
    private LookKeeper looks;

    @BeforeEach
    void start(@TempDir Path folder) {
        memory = new WindowMemory(folder.resolve("window.properties"));
        looks = new LookKeeper(theme, memory, () -> {
            asked.incrementAndGet();
            return desktop;
        });
    }

    @AfterEach
    void light() throws Exception {
        SwingUtilities.invokeAndWait(() -> theme.switchTo(false));
    }

    @Test
    void withoutAChoiceTheWindowFollowsTheDesktop() throws Exception {
        SwingUtilities.invokeAndWait(looks::follow);
        waitUntilDark(true);
        desktop = Optional.of(false);
        SwingUtilities.invokeAndWait(looks::follow);
        waitUntilDark(false);
    }

    @Test
    void aDesktopThatDoesNotSayMeansLight() throws Exception {
        SwingUtilities.invokeAndWait(() -> looks.choose(Look.DARK));
        assertTrue(theme.palette().dark());
        desktop = Optional.empty();
        SwingUtilities.invokeAndWait(() -> looks.choose(Look.SYSTEM));
        waitUntilDark(false);
    }

    @Test
    void aChoiceHoldsWhateverTheDesktopSays() throws Exception {
        SwingUtilities.invokeAndWait(() -> {
            looks.choose(Look.LIGHT);
            looks.follow();
        });
        assertEquals(0, asked.get());
        assertFalse(theme.palette().dark());
        assertEquals(Look.LIGHT, memory.look());
    }

    @Test
    void theWindowOpensInWhatItWasLastTime() throws Exception {
        SwingUtilities.invokeAndWait(looks::follow);
        waitUntilDark(true);
        assertTrue(memory.isDark());
        assertEquals(Look.SYSTEM, memory.look());
    }

    private void waitUntilDark(boolean dark) throws Exception {
        long end = System.nanoTime() + 10_000_000_000L;
        boolean[] is = {!dark};
        while (is[0] != dark) {
            assertTrue(System.nanoTime() < end, "not within 10 s");
            Thread.sleep(10);
            SwingUtilities.invokeAndWait(() -> is[0] = theme.palette().dark());
        }
    }
}
