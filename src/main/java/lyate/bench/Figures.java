package lyate.bench;

import java.util.Locale;

/** Figures as the sentences of the bench have them. */
final class Figures {

    /** Below this share of the whole a part is none to speak of. */
    static final double NOTABLE_SHARE = 1e-3;

    private Figures() {}

    /** Whether a part is worth a figure beside the whole. */
    static boolean notable(double part, double whole) {
        return part > NOTABLE_SHARE * whole;
    }

    /** Three significant digits without an exponent, for example {@code 0.0240}. */
    static String of(double value) {
        if (value == 0 || !Double.isFinite(value)) {
            return String.format(Locale.ROOT, "%.0f", value);
        }
        int decimals = Math.max(0, 2 - (int) Math.floor(Math.log10(Math.abs(value))));
        return String.format(Locale.ROOT, "%." + Math.min(decimals, 6) + "f", value);
    }
}
