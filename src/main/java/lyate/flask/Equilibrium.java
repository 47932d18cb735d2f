package lyate.flask;

import java.util.List;

/**
 * Where the protons of a flask are.
 *
 * @param flask       what was asked
 * @param protonLevel the medium's pH-like level p: a place with pKa = p is half full. Plus infinity where the flask holds
 *                    no proton at all, minus infinity where every place is full, NaN where it holds nothing that counts
 * @param states      one per holder, in the order of the flask
 * @param residual    protons gained or missing by rounding, relative to all protons
 * @param iterations  evaluations of the balance that were needed
 */
public record Equilibrium(Flask flask, double protonLevel, List<HolderState> states, double residual, int iterations) {

    public Equilibrium {
        states = List.copyOf(states);
    }

    /** The state of the holder of that name. */
    public HolderState of(String holderName) {
        return states.get(flask.indexOf(holderName));
    }
}
