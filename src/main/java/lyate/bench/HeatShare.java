package lyate.bench;

/**
 * Heat set free by the protons of one donor.
 *
 * @param donor              site label, {@code water}, or the solvent's name
 * @param milliMole          protons it gives
 * @param kiloJoulePerMole   heat given off per mole of protons; negative where heat is taken up
 * @param tabulated          whether it rests on tabulated enthalpies; otherwise on the pKa difference alone
 * @param how                how it was found, for the user
 * @param source             citation
 */
public record HeatShare(String donor, double milliMole, double kiloJoulePerMole, boolean tabulated, String how, String source) {

    /** Heat given off, kJ. */
    public double kiloJoule() {
        return milliMole / 1000 * kiloJoulePerMole;
    }
}
