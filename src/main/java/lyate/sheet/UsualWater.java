package lyate.sheet;

import lyate.stock.Solvent;

/** How much water is assumed where nobody says. */
public final class UsualWater {

    /** mass ppm, for a solvent whose row states none: a bottle over molecular sieves, common practice. */
    private static final double UNKNOWN = 50;

    private UsualWater() {}

    /** mass ppm of a well-kept bottle; 0 for no solvent and for water itself. */
    public static double ppm(Solvent solvent) {
        if (solvent == null || solvent.id().equals("water")) {
            return 0;
        }
        return solvent.typicalWaterPpm().orElse(UNKNOWN);
    }
}
