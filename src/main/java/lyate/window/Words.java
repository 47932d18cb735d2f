package lyate.window;

import java.util.Locale;
import lyate.acidity.Acidity;
import lyate.stock.Medium;

/** How numbers and names are written in the window. */
final class Words {

    private static final String MINUS = "\u2212";

    private Words() {}

    /** One decimal, with a true minus sign. */
    static String oneDecimal(double value) {
        return minus(String.format(Locale.ROOT, "%.1f", value));
    }

    /** A whole number with a true minus sign. */
    static String whole(int value) {
        return minus(Integer.toString(value));
    }

    /** One decimal and always a sign. */
    static String signed(double value) {
        return minus(String.format(Locale.ROOT, "%+.1f", value));
    }

    /** For example {@code 9.9 ± 0.4}. */
    static String withSigma(double value, double sigma) {
        return oneDecimal(value) + " \u00b1 " + minus(String.format(Locale.ROOT, "%.1f", sigma));
    }

    static String withSigma(Acidity acidity) {
        return withSigma(acidity.pKa(), acidity.sigma());
    }

    /** A share in percent: whole numbers in the middle, more digits near the ends. */
    static String percent(double percent) {
        if (percent > 0 && percent < 0.1) {
            return "<\u00a00.1\u00a0%";
        }
        if (percent < 100 && percent > 99.9) {
            return ">\u00a099.9\u00a0%";
        }
        boolean nearAnEnd = percent > 0 && percent < 10 || percent > 90 && percent < 100;
        return String.format(Locale.ROOT, nearAnEnd ? "%.1f\u00a0%%" : "%.0f\u00a0%%", percent);
    }

    /** An equilibrium constant, for example {@code 3×10⁸}. */
    static String equilibriumConstant(double logK) {
        if (Math.abs(logK) < 2) {
            return String.format(Locale.ROOT, logK < 0 ? "%.2f" : "%.1f", Math.pow(10, logK));
        }
        int exponent = (int) Math.floor(logK);
        long mantissa = Math.round(Math.pow(10, logK - exponent));
        if (mantissa == 10) {
            mantissa = 1;
            exponent++;
        }
        return mantissa + "\u00d710" + superscript(exponent);
    }

    /** The medium as it is written on an axis. */
    static String medium(Medium medium) {
        return medium.symbol();
    }

    /** First letter capital. */
    static String sentence(String text) {
        return text.isEmpty() ? text : text.substring(0, 1).toUpperCase(Locale.ROOT) + text.substring(1);
    }

    private static String superscript(int number) {
        StringBuilder text = new StringBuilder(number < 0 ? "\u207b" : "");
        for (char digit : Integer.toString(Math.abs(number)).toCharArray()) {
            text.append("\u2070\u00b9\u00b2\u00b3\u2074\u2075\u2076\u2077\u2078\u2079".charAt(digit - '0'));
        }
        return text.toString();
    }

    private static String minus(String text) {
        return text.replace("-", MINUS);
    }
}
