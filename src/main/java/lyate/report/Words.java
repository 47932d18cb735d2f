package lyate.report;

import java.util.Locale;
import lyate.acidity.Acidity;
import lyate.review.Verdict;
import lyate.stock.Medium;

/** Numbers and names as a report for reading has them. */
final class Words {

    private static final String MINUS = "\u2212";

    /** A space that no line breaks at. */
    private static final String NO_BREAK = "\u00a0";

    private Words() {}

    /** One decimal, with a true minus sign. */
    static String oneDecimal(double value) {
        return minus(Numbers.fixed(value, 1));
    }

    /** One decimal and always a sign. */
    static String signed(double value) {
        return Double.isNaN(value) ? "" : minus(String.format(Locale.ROOT, "%+.1f", value));
    }

    /** For example {@code 9.9 ± 0.4}. */
    static String withSigma(double value, double sigma) {
        return oneDecimal(value) + NO_BREAK + "\u00b1" + NO_BREAK + oneDecimal(sigma);
    }

    static String withSigma(Acidity acidity) {
        return withSigma(acidity.pKa(), acidity.sigma());
    }

    /** A share in percent: whole numbers in the middle, more digits near the ends. */
    static String percent(double percent) {
        if (percent > 0 && percent < 0.1) {
            return "<" + NO_BREAK + "0.1" + NO_BREAK + "%";
        }
        if (percent < 100 && percent > 99.9) {
            return ">" + NO_BREAK + "99.9" + NO_BREAK + "%";
        }
        boolean nearAnEnd = percent > 0 && percent < 10 || percent > 90 && percent < 100;
        return Numbers.fixed(percent, nearAnEnd ? 1 : 0) + NO_BREAK + "%";
    }

    static String probability(double probability) {
        return probability > 0.99 ? ">" + NO_BREAK + "99" + NO_BREAK + "%" : Numbers.fixed(100 * probability, 0) + NO_BREAK + "%";
    }

    /** Three significant digits, without an exponent where that is readable. */
    static String number(double value) {
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
    static String chosen(double value) {
        String text = number(value);
        return text.contains(".") && !text.contains("e") ? text.replaceFirst("\\.?0+$", "") : text;
    }

    static String celsius(double temperature) {
        return minus(Numbers.fixed(temperature, 0)) + NO_BREAK + "\u00b0C";
    }

    static String equivalents(double value) {
        return chosen(value) + NO_BREAK + "eq.";
    }

    static String medium(Medium medium) {
        return medium.symbol();
    }

    /** For example {@code Wrong site}. */
    static String verdict(Verdict verdict) {
        return sentence(verdict.code().replace('-', ' '));
    }

    /** First letter capital. */
    static String sentence(String text) {
        return text.isEmpty() ? text : text.substring(0, 1).toUpperCase(Locale.ROOT) + text.substring(1);
    }

    static String minus(String text) {
        return text.replace("-", MINUS);
    }
}
