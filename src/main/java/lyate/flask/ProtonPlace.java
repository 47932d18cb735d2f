package lyate.flask;

/**
 * A place on a molecule that holds one proton or none.
 *
 * @param label the name users see, for example {@code C3}
 * @param pKa   for losing this proton while every other place of the molecule holds its own; for a place with
 *              {@code after}, while that one place has lost its proton. In the flask's medium, molar scale, at the
 *              flask's temperature
 * @param after index within the holder of the place that must lose its proton before this one can, as with the stages
 *              of an acid whose protons sit on one atom; {@link #ANY_ORDER} where nothing stands in the way
 */
public record ProtonPlace(String label, double pKa, int after) {

    /** No other place has to lose its proton first. */
    public static final int ANY_ORDER = -1;

    /** The pKa values that can be handled reach from minus this to this. */
    public static final double PKA_LIMIT = 200;

    public ProtonPlace {
        if (!(Math.abs(pKa) <= PKA_LIMIT)) {
            throw new IllegalArgumentException(label + ": pKa " + pKa + ", expected a number from -200 to 200");
        }
    }

    /** A place that may lose its proton before or after any other. */
    public ProtonPlace(String label, double pKa) {
        this(label, pKa, ANY_ORDER);
    }

    /** The same place with another pKa. */
    public ProtonPlace withPKa(double other) {
        return new ProtonPlace(label, other, after);
    }
}
