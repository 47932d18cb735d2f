package lyate.bench;

import lyate.molecule.Molecule;

/**
 * How much substrate is used.
 *
 * @param milliMole amount of substance
 * @param grams     mass as weighed out, counter-ions included
 */
public record Batch(double milliMole, double grams) {

    public Batch {
        if (!(milliMole > 0) || Double.isInfinite(milliMole)) {
            throw new IllegalArgumentException("batch of " + milliMole + " mmol, expected a number above 0");
        }
    }

    /** A batch given in millimoles. */
    public static Batch ofMilliMole(Molecule substrate, double milliMole) {
        return new Batch(milliMole, milliMole * substrate.molarMassWithCounterIons() / 1000);
    }

    /** A batch given in grams as weighed out, counter-ions included. */
    public static Batch ofGrams(Molecule substrate, double grams) {
        return new Batch(1000 * grams / substrate.molarMassWithCounterIons(), grams);
    }
}
