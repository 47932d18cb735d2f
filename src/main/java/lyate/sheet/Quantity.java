package lyate.sheet;

import java.math.BigDecimal;
import java.util.Locale;
import java.util.OptionalDouble;

/**
 * A number a cell may hold: point or comma as decimal mark, with sane limits.
 *
 * @param unit what it is counted in, for messages
 * @param low  lowest value that makes sense
 * @param high highest
 */
public record Quantity(String unit, double low, double high) {

    public static final Quantity EQUIVALENTS = new Quantity("equivalents", 0, 100);
    public static final Quantity TEMPERATURE = new Quantity("degrees Celsius", -120, 250);
    public static final Quantity CONCENTRATION = new Quantity("mol/L", 1e-6, 30);
    public static final Quantity WATER_PPM = new Quantity("mass ppm", 0, 1e6);

    /** The number in a text, or empty where it is none or out of limits. */
    public OptionalDouble parse(String text) {
        String plain = text.strip().replace('\u2212', '-');
        if (plain.matches("[-+]?\\d*,\\d+")) {
            plain = plain.replace(',', '.');
        }
        if (!plain.matches("[-+]?(\\d+\\.?\\d*|\\.\\d+)([eE][-+]?\\d{1,3})?")) {
            return OptionalDouble.empty();
        }
        double value = Double.parseDouble(plain);
        return value >= low && value <= high ? OptionalDouble.of(value) : OptionalDouble.empty();
    }

    /** What a cell should hold, for example {@code a number from 0 to 100 (equivalents)}. */
    public String expected() {
        return "a number from " + plain(low) + " to " + plain(high) + " (" + unit + ")";
    }

    private static String plain(double limit) {
        return limit == Math.rint(limit) ? String.format(Locale.ROOT, "%.0f", limit) : BigDecimal.valueOf(limit).stripTrailingZeros().toPlainString();
    }
}
