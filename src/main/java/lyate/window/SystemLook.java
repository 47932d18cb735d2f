package lyate.window;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.TimeUnit;

/**
 * Asks the desktop whether it is set to dark. Java has no call for it, so the desktop's own command is asked, within a time
 * limit; where there is none, or it does not say, nothing is known. Not for the event thread.
 */
final class SystemLook {

    /** Runs a command; its output, or nothing where it cannot be run, fails or takes too long. */
    @FunctionalInterface
    interface Commands {
        Optional<String> output(List<String> command);
    }

    private static final long PATIENCE_MILLIS = 1500;

    private static final List<String> WINDOWS = List.of("reg", "query",
            "HKCU\\Software\\Microsoft\\Windows\\CurrentVersion\\Themes\\Personalize", "/v", "AppsUseLightTheme");
    private static final List<String> MAC = List.of("defaults", "read", "-g", "AppleInterfaceStyle");
    private static final List<String> PORTAL = List.of("gdbus", "call", "--session", "--timeout", "1", "--dest", "org.freedesktop.portal.Desktop",
            "--object-path", "/org/freedesktop/portal/desktop", "--method", "org.freedesktop.portal.Settings.Read",
            "org.freedesktop.appearance", "color-scheme");
    private static final List<String> GNOME = List.of("gsettings", "get", "org.gnome.desktop.interface", "color-scheme");
    private static final List<String> GTK = List.of("gsettings", "get", "org.gnome.desktop.interface", "gtk-theme");

    private final String system;
    private final Commands commands;

    /** @param system name of the operating system, as Java gives it */
    SystemLook(String system, Commands commands) {
        this.system = system.toLowerCase(Locale.ROOT);
        this.commands = commands;
    }

    /** The desktop the program runs on. */
    static SystemLook ofDesktop() {
        return new SystemLook(System.getProperty("os.name", ""), command -> run(command, PATIENCE_MILLIS));
    }

    /** Whether the desktop is dark; empty where it does not say. */
    Optional<Boolean> isDark() {
        if (system.startsWith("windows")) {
            return commands.output(WINDOWS).map(said -> said.strip().endsWith("0x0"));
        }
        if (system.startsWith("mac")) {
            // A light desktop has no such entry, and the command fails.
            return Optional.of(commands.output(MAC).map(said -> said.strip().equals("Dark")).orElse(false));
        }
        return commands.output(PORTAL).flatMap(SystemLook::ofPortal)
                .or(() -> commands.output(GNOME).flatMap(SystemLook::ofGnome))
                .or(() -> commands.output(GTK).map(said -> said.toLowerCase(Locale.ROOT).contains("dark")));
    }

    /** 1 asks for dark, 2 for light, 0 has no wish. */
    private static Optional<Boolean> ofPortal(String said) {
        return said.contains("uint32 1") ? Optional.of(true) : said.contains("uint32 2") ? Optional.of(false) : Optional.empty();
    }

    private static Optional<Boolean> ofGnome(String said) {
        return said.contains("prefer-dark") ? Optional.of(true) : said.contains("prefer-light") ? Optional.of(false) : Optional.empty();
    }

    /** The output of a command that ends well within the time; its output is short enough for the pipe to hold. */
    static Optional<String> run(List<String> command, long patienceMillis) {
        try {
            Process process = new ProcessBuilder(command).redirectError(ProcessBuilder.Redirect.DISCARD).start();
            process.getOutputStream().close();
            if (!process.waitFor(patienceMillis, TimeUnit.MILLISECONDS)) {
                process.destroyForcibly();
                return Optional.empty();
            }
            String said = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
            return process.exitValue() == 0 ? Optional.of(said) : Optional.empty();
        } catch (IOException e) {
            // There is no such command here.
            return Optional.empty();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            return Optional.empty();
        }
    }
}
