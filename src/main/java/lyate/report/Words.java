package lyate.report;

import java.util.Locale;
import lyate.acidity.Acidity;
import lyate.review.SiteOrigin;
import lyate.review.Verdict;
import lyate.stock.Medium;

/** Numbers and names as reports and window write them: true minus signs, no break inside a value. */
public final class Words {

    private static final String MINUS = "\u2212";

    /** A space that no line breaks at. */
    private static final String NO_BREAK = "\u00a0";

    private Words() {}

    /** One decimal, with a true minus sign. */
    public static String oneDecimal(double value) {
        return minus(Numbers.fixed(value, 1));
    }

    /** One decimal and always a sign. */
    public static String signed(double value) {
        return Double.isNaN(value) ? "" : minus(String.format(Locale.ROOT, "%+.1f", value));
    }

    /** For example {@code 9.9 ± 0.4}. */
    public static String withSigma(double value, double sigma) {
        return oneDecimal(value) + NO_BREAK + "\u00b1" + NO_BREAK + oneDecimal(sigma);
    }

    /** A pKa with its standard uncertainty. */
    public static String withSigma(Acidity acidity) {
        return withSigma(acidity.pKa(), acidity.sigma());
    }

    /** A share in percent: whole numbers in the middle, more digits near the ends. */
    public static String percent(double percent) {
        if (percent > 0 && percent < 0.1) {
            return "<" + NO_BREAK + "0.1" + NO_BREAK + "%";
        }
        if (percent < 100 && percent > 99.9) {
            return ">" + NO_BREAK + "99.9" + NO_BREAK + "%";
        }
        boolean nearAnEnd = percent > 0 && percent < 10 || percent > 90 && percent < 100;
        return Numbers.fixed(percent, nearAnEnd ? 1 : 0) + NO_BREAK + "%";
    }

    /** A probability in percent; nothing that rests on estimates is certain. */
    public static String probability(double probability) {
        return probability > 0.99 ? ">" + NO_BREAK + "99" + NO_BREAK + "%" : Numbers.fixed(100 * probability, 0) + NO_BREAK + "%";
    }

    /** Three significant digits, without an exponent where that is readable. */
    public static String number(double value) {
        if (value == 0 || !Double.isFinite(value)) {
            return value == 0 ? "0" : Numbers.fixed(value, 0);
        }
        if (Math.abs(value) < 1e-4 || Math.abs(value) >= 1e6) {
            return minus(String.format(Locale.ROOT, "%.2e", value));
        }
        int decimals = Math.max(0, 2 - (int) Math.floor(Math.log10(Math.abs(value))));
        return minus(Numbers.fixed(value, decimals));
    }

    /** A number somebody chose: three significant digits at most, no idle zeros. */
    public static String chosen(double value) {
        String text = number(value);
        return text.contains(".") && !text.contains("e") ? text.replaceFirst("\\.?0+$", "") : text;
    }

    /** Degrees Celsius without decimals. */
    public static String celsius(double temperature) {
        return minus(Numbers.fixed(temperature, 0)) + NO_BREAK + "\u00b0C";
    }

    /** For example {@code 1.05 eq.} */
    public static String equivalents(double value) {
        return chosen(value) + NO_BREAK + "eq.";
    }

    /** The medium as it is written on an axis. */
    public static String medium(Medium medium) {
        return medium.symbol();
    }

    /** For example {@code Wrong site}. */
    public static String verdict(Verdict verdict) {
        return sentence(verdict.code().replace('-', ' '));
    }

    /** A whole number. */
    public static String whole(int value) {
        return minus(Integer.toString(value));
    }

    /** An equilibrium constant, for example {@code 3×10⁸}. */
    public static String equilibriumConstant(double logK) {
        if (Math.abs(logK) < 2) {
            return Numbers.fixed(Math.pow(10, logK), logK < 0 ? 2 : 1);
        }
        int exponent = (int) Math.floor(logK);
        long mantissa = Math.round(Math.pow(10, logK - exponent));
        return mantissa == 10 ? "1\u00d710" + superscript(exponent + 1) : mantissa + "\u00d710" + superscript(exponent);
    }

    private static String superscript(int number) {
        StringBuilder text = new StringBuilder(number < 0 ? "\u207b" : "");
        for (char digit : Integer.toString(Math.abs(number)).toCharArray()) {
            text.append("\u2070\u00b9\u00b2\u00b3\u2074\u2075\u2076\u2077\u2078\u2079".charAt(digit - '0'));
        }
        return text.toString();
    }

    /** First letter capital. */
    public static String sentence(String text) {
        return text.isEmpty() ? text : text.substring(0, 1).toUpperCase(Locale.ROOT) + text.substring(1);
    }

    static String minus(String text) {
        return text.replace("-", MINUS);
    }

    /** What a drawn reaction says of the site, and how sure it is. */
    static String origin(SiteOrigin origin) {
        return "reaction: " + origin.site().orElse("no site") + ", " + origin.confidence();
    }
}
