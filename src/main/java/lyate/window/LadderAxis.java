package lyate.window;

/**
 * A vertical pKa axis, high values at the top.
 *
 * @param low    value at the bottom
 * @param high   value at the top
 * @param top    y of the top
 * @param bottom y of the bottom
 */
record LadderAxis(double low, double high, double top, double bottom) {

    private static final double LEAST_SPAN = 8;

    /** An axis with some air beyond the values it must show, from whole number to whole number. */
    static LadderAxis around(double low, double high, double top, double bottom) {
        double air = Math.max(1, (LEAST_SPAN - (high - low)) / 2);
        return new LadderAxis(Math.floor(low - air), Math.ceil(high + air), top, bottom);
    }

    double y(double pKa) {
        return bottom - (pKa - low) / (high - low) * (bottom - top);
    }

    /** Distance of labelled ticks: 1, 2, 5 or 10 units, so that labels keep {@code room} apart. */
    int tickStep(double room) {
        for (int step : new int[] {1, 2, 5, 10, 20}) {
            if (step * (bottom - top) / (high - low) >= room) {
                return step;
            }
        }
        return 50;
    }
}
