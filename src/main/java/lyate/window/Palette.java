package lyate.window;

import com.formdev.flatlaf.util.UIScale;
import java.awt.Color;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Map;
import java.util.Properties;
import java.util.TreeMap;
import lyate.molecule.DrawingColours;

/** The colours and spaces of {@code palette.properties} for one of the two grounds. Immutable. */
final class Palette {

    private static final String CARBON = "atom.6";

    private final boolean dark;
    private final Map<String, String> values;

    private Palette(boolean dark, Map<String, String> values) {
        this.dark = dark;
        this.values = values;
    }

    static Palette load(boolean dark) {
        Properties properties = new Properties();
        try (InputStream stream = Palette.class.getResourceAsStream("palette.properties")) {
            properties.load(stream);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        Map<String, String> values = new TreeMap<>();
        properties.forEach((key, value) -> values.put(key.toString(), value.toString().strip()));
        return new Palette(dark, values);
    }

    boolean dark() {
        return dark;
    }

    /** A colour by its name without the leading {@code light.} or {@code dark.}. */
    Color color(String name) {
        return Color.decode(value(prefix() + name));
    }

    /** The pale ground that goes with an accent. */
    Color ground(String accent) {
        return color(accent + ".ground");
    }

    /** A space by its name, scaled to the user's scale. */
    int space(String name) {
        return UIScale.scale(Integer.parseInt(value("space." + name)));
    }

    /** Colours of atom symbols; elements the file does not name look like carbon. */
    DrawingColours drawing() {
        return atomicNumber -> {
            String key = "atom." + atomicNumber;
            return color(values.containsKey(prefix() + key) ? key : CARBON);
        };
    }

    private String prefix() {
        return dark ? "dark." : "light.";
    }

    private String value(String key) {
        String value = values.get(key);
        if (value == null) {
            throw new IllegalArgumentException("palette.properties has no " + key);
        }
        return value;
    }
}
