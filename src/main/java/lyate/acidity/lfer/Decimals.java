package lyate.acidity.lfer;

/** Writes a number with two decimals. A recipe has dozens of them, and {@code String.format} would cost more than the estimate. */
final class Decimals {

    private Decimals() {}

    static String two(double value) {
        long hundredths = Math.round(Math.abs(value) * 100);
        String sign = value < 0 && hundredths > 0 ? "-" : "";
        long rest = hundredths % 100;
        return sign + hundredths / 100 + (rest < 10 ? ".0" : ".") + rest;
    }
}
