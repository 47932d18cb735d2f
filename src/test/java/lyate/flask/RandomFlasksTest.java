package lyate.flask;

import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assertions.fail;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** No flask is too odd to settle. */
class RandomFlasksTest {

    @Test
    void twentyThousandRandomFlasksSettle() {
        settleAll(20_000, 4);
    }

    @Test
    @Tag("slow")
    void aMillionRandomFlasksSettle() {
        settleAll(1_000_000, 5);
    }

    private static void settleAll(int count, long seed) {
        RandomFlasks flasks = new RandomFlasks(seed);
        int mostIterations = 0;
        long allIterations = 0;
        for (int index = 0; index < count; index++) {
            Flask flask = flasks.next();
            Equilibrium settled;
            try {
                settled = ProtonBalance.solve(flask);
            } catch (RuntimeException e) {
                fail("flask " + index + ": " + flask, e);
                return;
            }
            assertSound(flask, settled, index);
            mostIterations = Math.max(mostIterations, settled.iterations());
            allIterations += settled.iterations();
        }
        System.out.printf(java.util.Locale.ROOT, "%d flasks, iterations: mean %.1f, most %d%n", count, (double) allIterations / count, mostIterations);
    }

    /** The answer judged from its fractions alone, without the solver's own residual. */
    private static void assertSound(Flask flask, Equilibrium settled, int index) {
        double protons = flask.protons();
        double found = 0;
        for (HolderState state : settled.states()) {
            for (int place = 0; place < state.holder().places().size(); place++) {
                double held = state.protonated(place);
                assertTrue(held >= 0 && held <= 1 + 1e-15, () -> "flask " + index + ": fraction " + held + " in " + flask);
            }
            found += state.holder().amount() * state.meanProtons();
        }
        double error = Math.abs(found - protons);
        assertTrue(error <= 1e-10 * protons, () -> "flask " + index + ": protons off by " + error + " of " + protons + " in " + flask);
        assertTrue(settled.residual() < 1e-10, () -> "flask " + index + ": residual " + settled.residual());
    }
}
