package lyate.flask;

import java.util.ArrayList;
import java.util.List;

/**
 * Lets the protons of a flask settle: protons are neither made nor lost, and every place is as full as the common proton
 * level demands. Σ n_i θ_i(p) = N falls monotonically with p and has exactly one root.
 */
public final class ProtonBalance {

    private ProtonBalance() {}

    /** Where the protons are once nothing changes any more. Pure; a flask without any proton or any room is no error. */
    public static Equilibrium solve(Flask flask) {
        List<List<BindingPolynomial>> polynomials = new ArrayList<>(flask.holders().size());
        for (ProtonHolder holder : flask.holders()) {
            polynomials.add(holder.clusters());
        }
        List<Species> species = Species.of(flask.holders(), polynomials);
        DoubleDouble protons = DoubleDouble.ZERO;
        for (ProtonHolder holder : flask.holders()) {
            protons = protons.plus(DoubleDouble.product(holder.amount(), holder.protonsHeld()));
        }
        if (species.isEmpty()) {
            return settled(flask, polynomials, Double.NaN, 0, 0);
        }
        GroundState ground = GroundState.of(species, protons);
        if (Double.isInfinite(ground.guess())) {
            return settled(flask, polynomials, ground.guess(), 0, 0);
        }
        LevelSearch search = new LevelSearch(species, ground);
        double level = search.find();
        return settled(flask, polynomials, level, Math.abs(search.imbalance()) / protons.value(), search.iterations());
    }

    private static Equilibrium settled(Flask flask, List<List<BindingPolynomial>> polynomials, double level,
                                       double residual, int iterations) {
        List<HolderState> states = new ArrayList<>(polynomials.size());
        for (int index = 0; index < polynomials.size(); index++) {
            states.add(new HolderState(flask.holders().get(index), polynomials.get(index), level));
        }
        return new Equilibrium(flask, level, states, residual, iterations);
    }
}
