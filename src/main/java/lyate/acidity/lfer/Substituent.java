package lyate.acidity.lfer;

/**
 * The constants of one group as it acts on the atom it is bound to. Dimensionless, except {@code carbanion} in pKa units.
 *
 * @param name            what a chemist calls it
 * @param induction       sigma I
 * @param resonance       sigma p less sigma I
 * @param resonanceMinus  sigma minus less sigma I: with an electron-rich centre
 * @param resonancePlus   sigma plus less sigma I: with an electron-poor centre
 * @param carbanion       lowering of the pKa of CH3-X below methane's in DMSO
 * @param listed          whether it stands in {@code substituents.csv}; else it was put together from its atoms
 */
record Substituent(String name, double induction, double resonance, double resonanceMinus, double resonancePlus,
                   double carbanion, boolean listed) {

    /** The same group with this carbanion constant. */
    Substituent withCarbanion(double value) {
        return new Substituent(name, induction, resonance, resonanceMinus, resonancePlus, value, listed);
    }

    /** By how much more the group takes electrons from a rich centre than from benzene; 0 or more. */
    double acceptance() {
        return Math.max(0, resonanceMinus - resonance);
    }

    /** By how much more the group gives electrons to a poor centre than to benzene; 0 or less. */
    double donation() {
        return Math.min(0, resonancePlus - resonance);
    }
}
