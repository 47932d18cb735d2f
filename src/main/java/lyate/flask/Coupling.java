package lyate.flask;

/**
 * How two places of one molecule feel one another. Symmetric, as the thermodynamic cycle demands.
 *
 * @param first  index of one place within its holder
 * @param second index of the other
 * @param raise  pKa units by which the loss of either proton raises the pKa of the other place; negative where the loss
 *               of one makes the other easier
 */
public record Coupling(int first, int second, double raise) {

    public Coupling {
        if (first == second) {
            throw new IllegalArgumentException("place " + first + " is coupled to itself, expected two different places");
        }
        if (!(Math.abs(raise) <= ProtonPlace.PKA_LIMIT)) {
            throw new IllegalArgumentException("places " + first + " and " + second + " are coupled by " + raise
                    + " pKa units, expected a number from -200 to 200");
        }
    }
}
