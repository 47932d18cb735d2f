package lyate.flask;

/**
 * A number carried as an unevaluated sum of two, to about 32 digits (Dekker, Numer. Math. 18, 224 (1971)). The amounts in
 * a flask may differ by fifteen orders of magnitude and cancel; what is left over then decides the proton level.
 */
record DoubleDouble(double high, double low) {

    static final DoubleDouble ZERO = new DoubleDouble(0, 0);

    /** The exact product of two numbers. */
    static DoubleDouble product(double first, double second) {
        double high = first * second;
        return new DoubleDouble(high, Math.fma(first, second, -high));
    }

    DoubleDouble plus(DoubleDouble other) {
        double sum = high + other.high;
        double part = sum - high;
        double error = (high - (sum - part)) + (other.high - part) + low + other.low;
        double total = sum + error;
        return new DoubleDouble(total, error - (total - sum));
    }

    DoubleDouble minus(DoubleDouble other) {
        return plus(new DoubleDouble(-other.high, -other.low));
    }

    boolean isZero() {
        return high == 0 && low == 0;
    }

    double value() {
        return high + low;
    }
}
