package lyate.report;

import java.util.Locale;

/** Numbers as they are printed, the same in every locale. */
final class Numbers {

    private Numbers() {}

    /** With so many decimals; empty for a number that is not known. */
    static String fixed(double value, int decimals) {
        if (Double.isNaN(value)) {
            return "";
        }
        if (Double.isInfinite(value)) {
            return value > 0 ? "inf" : "-inf";
        }
        String text = String.format(Locale.ROOT, "%." + decimals + "f", value);
        return text.matches("-0(\\.0*)?") ? text.substring(1) : text;
    }


    /** Rounded to so many decimals for JSON; null for a number that is not finite. */
    static Double rounded(double value, int decimals) {
        double scale = Math.pow(10, decimals);
        return Double.isFinite(value) ? Double.valueOf(Math.rint(value * scale) / scale + 0.0) : null;
    }
}
