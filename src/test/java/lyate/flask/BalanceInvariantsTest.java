package lyate.flask;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

/** What must hold in any flask, in 10,000 of them each. */
class BalanceInvariantsTest {

    private static final int FLASKS = 10_000;
    private static final double ROUNDING = 1e-9;

    @Test
    void moreBaseNeverPutsAProtonBack() {
        RandomFlasks flasks = new RandomFlasks(11);
        for (int index = 0; index < FLASKS; index++) {
            Flask flask = flasks.next();
            double dose = flasks.amount(-6, 2);
            ProtonHolder base = ProtonHolder.base("added base", dose, flasks.pKa());
            Equilibrium before = ProtonBalance.solve(flask.with(base));
            Equilibrium after = ProtonBalance.solve(flask.with(base.withAmount(dose * (1 + flasks.random().nextDouble()))));
            assertTrue(after.protonLevel() >= before.protonLevel() - ROUNDING, () -> "level fell in " + flask);
            for (int holder = 0; holder < flask.holders().size(); holder++) {
                HolderState least = before.states().get(holder);
                HolderState most = after.states().get(holder);
                assertTrue(most.meanProtons() <= least.meanProtons() + ROUNDING, () -> "protons came back in " + flask);
                if (flask.holders().get(holder).couplings().isEmpty()) {
                    for (int place = 0; place < least.holder().places().size(); place++) {
                        assertTrue(most.deprotonated(place) >= least.deprotonated(place) - ROUNDING, flask::toString);
                    }
                }
            }
        }
    }

    @Test
    void splittingADonorIntoTwoHalvesChangesNothing() {
        RandomFlasks flasks = new RandomFlasks(12);
        for (int index = 0; index < FLASKS; index++) {
            Flask flask = flasks.next();
            int split = flasks.random().nextInt(flask.holders().size());
            ProtonHolder whole = flask.holders().get(split);
            List<ProtonHolder> holders = new ArrayList<>(flask.holders());
            holders.set(split, whole.withAmount(whole.amount() / 2));
            holders.add(new ProtonHolder("other half", whole.amount() / 2, whole.places(), whole.couplings(), whole.protonsHeld()));
            Equilibrium halves = ProtonBalance.solve(flask.withHolders(holders));
            assertSame(flask, ProtonBalance.solve(flask), halves);
            assertSameState(flask, halves.states().get(split), halves.of("other half"));
        }
    }

    /** A hydrocarbon has no place a proton could leave; a trace of indicator weighs nothing. */
    @Test
    void anInertAdditionChangesNothing() {
        RandomFlasks flasks = new RandomFlasks(13);
        for (int index = 0; index < FLASKS; index++) {
            Flask flask = flasks.next();
            Flask more = flask.with(new ProtonHolder("hexane", flasks.amount(-3, 3), List.of(), List.of(), 0))
                    .with(flasks.holder("indicator", 3, -3, 3).withAmount(0));
            assertSame(flask, ProtonBalance.solve(flask), ProtonBalance.solve(more));
        }
    }

    /** Two neighbouring microstates stand as 10^(level − pKa of the place in that surrounding). */
    @Test
    void neighbouringMicrostatesAreInDetailedBalance() {
        RandomFlasks flasks = new RandomFlasks(14);
        for (int index = 0; index < FLASKS; index++) {
            ProtonHolder holder = flasks.holder("molecule", flasks.random().nextInt(1, 8), -3, 1);
            Flask flask = Flask.of("water", holder, ProtonHolder.acid("buffer acid", 1, flasks.pKa()),
                    ProtonHolder.base("buffer base", 1, flasks.pKa()));
            Equilibrium settled = ProtonBalance.solve(flask);
            HolderState state = settled.of("molecule");
            for (int held = 0; held < 1 << holder.places().size(); held++) {
                for (int place = 0; place < holder.places().size(); place++) {
                    double full = state.microstate(held | 1 << place);
                    double empty = state.microstate(held & ~(1 << place));
                    if (full > 1e-250 && empty > 1e-250) {
                        double difference = settled.protonLevel() - pKaAmong(holder, place, held);
                        assertEquals(difference, Math.log10(empty) - Math.log10(full), 1e-8, flask::toString);
                    }
                }
            }
        }
    }

    @Test
    void microstatesAddUpToTheFractionsOfTheirPlaces() {
        RandomFlasks flasks = new RandomFlasks(15);
        for (int index = 0; index < FLASKS; index++) {
            ProtonHolder holder = flasks.holder("molecule", flasks.random().nextInt(1, 8), -3, 1);
            Flask flask = Flask.of("water", holder, ProtonHolder.acid("acid", 1, flasks.pKa()));
            HolderState state = ProtonBalance.solve(flask).of("molecule");
            int places = holder.places().size();
            assertEquals(1, IntStream.range(0, 1 << places).mapToDouble(state::microstate).sum(), ROUNDING, flask::toString);
            double[] byProtons = state.shareByProtons();
            for (int count = 0; count <= places; count++) {
                int protons = count;
                double sum = IntStream.range(0, 1 << places).filter(held -> Integer.bitCount(held) == protons)
                        .mapToDouble(state::microstate).sum();
                assertEquals(sum, byProtons[count], ROUNDING, flask::toString);
            }
            for (int place = 0; place < places; place++) {
                int bit = 1 << place;
                double sum = IntStream.range(0, 1 << places).filter(held -> (held & bit) != 0).mapToDouble(state::microstate).sum();
                assertEquals(state.protonated(place), sum, ROUNDING, flask::toString);
            }
        }
    }

    /** Acid + base ends where conjugate base + conjugate acid ends: only the number of protons counts. */
    @Test
    void swappingWhichPartnerBringsTheProtonChangesNothing() {
        RandomFlasks flasks = new RandomFlasks(16);
        for (int index = 0; index < FLASKS; index++) {
            Flask bystanders = flasks.next();
            double amount = flasks.amount(-6, 2);
            ProtonHolder one = ProtonHolder.acid("one", amount, flasks.pKa());
            ProtonHolder other = ProtonHolder.acid("other", amount, flasks.pKa());
            Equilibrium forward = ProtonBalance.solve(bystanders.with(one).with(other.withProtonsHeld(0)));
            Equilibrium backward = ProtonBalance.solve(bystanders.with(one.withProtonsHeld(0)).with(other));
            assertSame(forward.flask(), forward, backward);
        }
    }

    @Test
    void theOrderOfTheHoldersDoesNotMatter() {
        RandomFlasks flasks = new RandomFlasks(17);
        for (int index = 0; index < FLASKS; index++) {
            Flask flask = flasks.next();
            List<ProtonHolder> reversed = new ArrayList<>(flask.holders());
            Collections.reverse(reversed);
            Equilibrium there = ProtonBalance.solve(flask);
            Equilibrium back = ProtonBalance.solve(flask.withHolders(reversed));
            for (ProtonHolder holder : flask.holders()) {
                assertSameState(flask, there.of(holder.name()), back.of(holder.name()));
            }
        }
    }

    /** Calling every proton a hole and every hole a proton turns the scale round and nothing else. */
    @Test
    void protonsAndHolesMirrorOneAnother() {
        RandomFlasks flasks = new RandomFlasks(18);
        for (int index = 0; index < FLASKS; index++) {
            Flask flask = singlePlaces(flasks.next());
            Flask mirrored = flask.withHolders(flask.holders().stream()
                    .map(holder -> holder.withPKas(place -> -holder.places().get(place).pKa())
                            .withProtonsHeld(holder.places().size() - holder.protonsHeld())).toList());
            Equilibrium here = ProtonBalance.solve(flask);
            Equilibrium there = ProtonBalance.solve(mirrored);
            for (int holder = 0; holder < flask.holders().size(); holder++) {
                double held = here.states().get(holder).protonated(0);
                assertEquals(held, there.states().get(holder).deprotonated(0), ROUNDING * Math.max(held, 1e-30), flask::toString);
            }
        }
    }

    private static Flask singlePlaces(Flask flask) {
        return flask.withHolders(flask.holders().stream().map(holder -> new ProtonHolder(holder.name(), holder.amount(),
                holder.places().subList(0, 1).stream().map(place -> new ProtonPlace(place.label(), place.pKa())).toList(),
                List.of(), holder.protonsHeld() >= 1 ? 1 : 0)).toList());
    }

    /** pKa of a place while exactly the given others hold their protons, straight from the definition. */
    private static double pKaAmong(ProtonHolder holder, int place, int held) {
        double pKa = holder.places().get(place).pKa();
        for (Coupling coupling : holder.couplings()) {
            int other = coupling.first() == place ? coupling.second() : coupling.second() == place ? coupling.first() : -1;
            if (other >= 0 && (held >> other & 1) == 0) {
                pKa += coupling.raise();
            }
        }
        return pKa;
    }

    private static void assertSame(Flask flask, Equilibrium expected, Equilibrium found) {
        for (int holder = 0; holder < expected.states().size(); holder++) {
            assertSameState(flask, expected.states().get(holder), found.states().get(holder));
        }
    }

    private static void assertSameState(Flask flask, HolderState expected, HolderState found) {
        for (int place = 0; place < expected.holder().places().size(); place++) {
            double held = expected.protonated(place);
            double lost = expected.deprotonated(place);
            assertEquals(held, found.protonated(place), ROUNDING, flask::toString);
            assertEquals(lost, found.deprotonated(place), ROUNDING, flask::toString);
        }
    }
}
