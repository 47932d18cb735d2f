package lyate.flask;

/**
 * One point of a {@link DoseCurve}.
 *
 * @param equivalents base added, per mole of what the curve counts by
 * @param equilibrium where the protons are then
 */
public record DosePoint(double equivalents, Equilibrium equilibrium) {

    /** Fraction of the molecules whose place has lost its proton. */
    public double taken(int holder, int place) {
        return equilibrium.states().get(holder).deprotonated(place);
    }
}
