package lyate.window;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The outputs are those the commands of the three systems give, as their manuals state them. */
class SystemLookTest {

    private static final String REG = "\r\nHKEY_CURRENT_USER\\Software\\Microsoft\\Windows\\CurrentVersion\\Themes\\Personalize\r\n"
            + "    AppsUseLightTheme    REG_DWORD    %s\r\n\r\n";

    @Test
    void windowsSaysWhetherProgramsAreLight() {
        assertEquals(Optional.of(true), look("Windows 11", "reg", String.format(REG, "0x0")).isDark());
        assertEquals(Optional.of(false), look("Windows 11", "reg", String.format(REG, "0x1")).isDark());
        assertEquals(Optional.empty(), look("Windows 7", "none", "").isDark());
    }

    @Test
    void aMacWithoutTheEntryIsLight() {
        assertEquals(Optional.of(true), look("Mac OS X", "defaults", "Dark\n").isDark());
        assertEquals(Optional.of(false), look("Mac OS X", "none", "").isDark());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {"gdbus|(<<uint32 1>>,)|true", "gdbus|(<<uint32 2>>,)|false", "color-scheme|'prefer-dark'|true",
        "color-scheme|'prefer-light'|false", "gtk-theme|'Adwaita-dark'|true", "gtk-theme|'Adwaita'|false"}, quoteCharacter = '"')
    void aFreeDesktopIsAskedInTurn(String command, String said, boolean dark) {
        assertEquals(Optional.of(dark), look("Linux", command, said).isDark());
    }

    @Test
    void aDesktopWithoutAWishIsAskedFurther() {
        SystemLook look = new SystemLook("Linux", command -> Optional.of(command.contains("gdbus") ? "(<<uint32 0>>,)"
                : command.contains("color-scheme") ? "'default'" : "'Yaru-dark'"));
        assertEquals(Optional.of(true), look.isDark());
    }

    @Test
    void aDesktopThatCannotBeAskedIsNotKnown() {
        assertEquals(Optional.empty(), look("Linux", "none", "").isDark());
    }

    @Test
    void aCommandThatDoesNotExistSaysNothing() {
        assertEquals(Optional.empty(), SystemLook.run(List.of("lyate-no-such-command"), 1000));
    }

    @Test
    void aCommandThatHangsIsLeftAlone() {
        String java = Path.of(System.getProperty("java.home"), "bin", "java").toString();
        long start = System.nanoTime();
        // No Java starts within a millisecond.
        assertEquals(Optional.empty(), SystemLook.run(List.of(java, "-version"), 1));
        assertTrue(System.nanoTime() - start < 5_000_000_000L);
    }

    @Test
    void theOutputOfACommandIsRead() {
        String java = Path.of(System.getProperty("java.home"), "bin", "java").toString();
        assertTrue(SystemLook.run(List.of(java, "--version"), 20_000).orElseThrow().contains(String.valueOf(Runtime.version().feature())));
    }

    /** A system on which one command answers and the others do not exist. */
    private static SystemLook look(String system, String word, String said) {
        return new SystemLook(system, command -> command.contains(word) ? Optional.of(said) : Optional.empty());
    }
}
