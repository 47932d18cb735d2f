package lyate.window;

import java.awt.Frame;
import java.awt.GraphicsEnvironment;
import java.awt.Rectangle;
import java.io.IOException;
import java.io.Reader;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Properties;
import javax.swing.JFrame;
import lyate.table.TableFolders;

/**
 * What the window remembers from one time to the next, in one properties file of the user's. A file that cannot be read or
 * written only means that nothing is remembered.
 */
final class WindowMemory {

    private static final int MOST_RECENT = 8;

    private final Path file;
    private final Properties properties = new Properties();

    WindowMemory(Path file) {
        this.file = file;
        if (Files.isReadable(file)) {
            try (Reader reader = Files.newBufferedReader(file)) {
                properties.load(reader);
            } catch (IOException | IllegalArgumentException e) {
                properties.clear();
            }
        }
    }

    /** The file in the place the operating system keeps such files. */
    static WindowMemory ofUser() {
        return new WindowMemory(folder().resolve("window.properties"));
    }

    private static Path folder() {
        String system = System.getProperty("os.name", "").toLowerCase(Locale.ROOT);
        Path home = Path.of(System.getProperty("user.home", "."));
        if (system.contains("win") && System.getenv("APPDATA") != null) {
            return Path.of(System.getenv("APPDATA"), "Lyate");
        }
        if (system.contains("mac")) {
            return home.resolve("Library/Application Support/Lyate");
        }
        String config = System.getenv("XDG_CONFIG_HOME");
        return (config == null || config.isEmpty() ? home.resolve(".config") : Path.of(config)).resolve("lyate");
    }

    /** Where copies of unsaved sheets are kept. */
    Path recoveryFolder() {
        return file.resolveSibling("recovery");
    }

    /** What a new step starts with. */
    StepText newStep() {
        Map<StepField, String> fields = new EnumMap<>(StepField.class);
        for (StepField field : StepField.values()) {
            fields.put(field, get("new." + field.name(), ""));
        }
        return new StepText(fields, "");
    }

    /** The tables to use: a folder of the user's own on top, where one is set and no other was asked for. */
    TableFolders tables(TableFolders asked) {
        String own = get("tables", "");
        return own.isEmpty() || !asked.own().isEmpty() ? asked : TableFolders.overlaidBy(Path.of(own));
    }

    /** Sheets used lately, latest first; only those that still exist. */
    List<Path> recent() {
        return get("recent", "").lines().filter(line -> !line.isBlank()).map(Path::of).filter(Files::isRegularFile).toList();
    }

    /** Notes that a sheet was used. */
    void used(Path sheet) {
        String path = sheet.toAbsolutePath().toString();
        List<String> others = get("recent", "").lines().filter(line -> !line.isBlank() && !line.equals(path)).limit(MOST_RECENT - 1).toList();
        put("recent", path + "\n" + String.join("\n", others));
    }

    String get(String key, String otherwise) {
        return properties.getProperty(key, otherwise);
    }

    void put(String key, String value) {
        properties.setProperty(key, value);
    }

    /** What the window was last time. */
    boolean isDark() {
        return Boolean.parseBoolean(get("dark", "false"));
    }

    void setDark(boolean dark) {
        put("dark", Boolean.toString(dark));
    }

    /** What the user wants. */
    Look look() {
        return Look.of(get("look", ""));
    }

    void setLook(Look look) {
        put("look", look.stored());
    }

    float zoom() {
        try {
            return Math.max(0.7f, Math.min(3, Float.parseFloat(get("zoom", "1"))));
        } catch (NumberFormatException e) {
            return 1;
        }
    }

    /** Where the window was, if that place is still on a screen. */
    Optional<Rectangle> bounds() {
        try {
            Rectangle bounds = new Rectangle(Integer.parseInt(get("x", "")), Integer.parseInt(get("y", "")),
                    Integer.parseInt(get("width", "")), Integer.parseInt(get("height", "")));
            Rectangle screen = GraphicsEnvironment.getLocalGraphicsEnvironment().getMaximumWindowBounds();
            return screen.intersects(bounds) && bounds.width > 0 && bounds.height > 0 ? Optional.of(bounds) : Optional.empty();
        } catch (NumberFormatException e) {
            return Optional.empty();
        }
    }

    void remember(JFrame frame) {
        boolean maximised = (frame.getExtendedState() & Frame.MAXIMIZED_BOTH) == Frame.MAXIMIZED_BOTH;
        put("maximised", Boolean.toString(maximised));
        if (!maximised) {
            put("x", Integer.toString(frame.getX()));
            put("y", Integer.toString(frame.getY()));
            put("width", Integer.toString(frame.getWidth()));
            put("height", Integer.toString(frame.getHeight()));
        }
    }

    /** Writes the file, whole or not at all; returns whether that worked. */
    boolean save() {
        try {
            Files.createDirectories(file.toAbsolutePath().getParent());
            Path next = file.resolveSibling(file.getFileName() + ".new");
            try (Writer writer = Files.newBufferedWriter(next)) {
                properties.store(writer, "Lyate: what the window remembers");
            }
            Files.move(next, file, StandardCopyOption.REPLACE_EXISTING);
            return true;
        } catch (IOException e) {
            return false;
        }
    }
}
