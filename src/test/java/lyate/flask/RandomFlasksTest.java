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
        for (int index = 0; index < count; index++) {
            Flask flask = flasks.next();
            try {
                assertSound(flask, ProtonBalance.solve(flask), index);
            } catch (RuntimeException e) {
                fail("flask " + index + ": " + flask, e);
            }
        }
    }

    /** The answer judged from its fractions alone, without the solver's own residual. */
    private static void assertSound(Flask flask, Equilibrium settled, int index) {
        double found = 0;
        for (HolderState state : settled.states()) {
            for (int place = 0; place < state.holder().places().size(); place++) {
                double held = state.protonated(place);
                double lost = state.deprotonated(place);
                assertTrue(held >= 0 && lost >= 0 && Math.abs(held + lost - 1) < 1e-14,
                        () -> "flask " + index + ": " + held + " held and " + lost + " lost in " + flask);
            }
            found += state.holder().amount() * state.meanProtons();
        }
        double error = Math.abs(found - flask.protons());
        assertTrue(error <= 1e-10 * flask.protons(),
                () -> "flask " + index + ": protons off by " + error + " of " + flask.protons() + " in " + flask);
        assertTrue(settled.residual() < 1e-10, () -> "flask " + index + ": residual " + settled.residual());
        assertTrue(settled.iterations() <= 40, () -> "flask " + index + ": " + settled.iterations() + " iterations");
    }
}
