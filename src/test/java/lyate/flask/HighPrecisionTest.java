package lyate.flask;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * The solver against an independent one: the plain mass balance Σ n θ(h) = N in 200-digit decimals, microstates counted
 * out one by one, bisected on h = 10^−p. Slow, simple and free of every trick.
 */
class HighPrecisionTest {

    private static final MathContext DIGITS = new MathContext(200);
    private static final int FLASKS = 300;

    @Test
    void threeHundredRandomFlasksAgreeWithTwoHundredDigits() {
        RandomFlasks flasks = new RandomFlasks(77);
        int compared = 0;
        while (compared < FLASKS) {
            Flask flask = roundedTo64ths(flasks.next());
            Equilibrium settled = ProtonBalance.solve(flask);
            if (Double.isFinite(settled.protonLevel())) {
                compare(flask, settled);
                compared++;
            }
        }
    }

    private static void compare(Flask flask, Equilibrium settled) {
        List<BigDecimal[]> polynomials = flask.holders().stream().map(HighPrecisionTest::polynomial).toList();
        BigDecimal h = bisect(flask, polynomials);
        assertEquals(-log10(h), settled.protonLevel(), 1e-10, flask::toString);
        for (int index = 0; index < polynomials.size(); index++) {
            HolderState state = settled.states().get(index);
            for (int place = 0; place < state.holder().places().size(); place++) {
                BigDecimal held = held(state.holder(), place, h);
                double gone = log10(BigDecimal.ONE.subtract(held));
                assertEquals(log10(held), Math.log10(state.protonated(place)), 1e-9, flask::toString);
                assertEquals(gone, Math.log10(state.deprotonated(place)), 1e-9, flask::toString);
            }
        }
    }

    private static BigDecimal bisect(Flask flask, List<BigDecimal[]> polynomials) {
        BigDecimal protons = BigDecimal.ZERO;
        for (ProtonHolder holder : flask.holders()) {
            protons = protons.add(new BigDecimal(holder.amount()).multiply(new BigDecimal(holder.protonsHeld())));
        }
        BigDecimal low = new BigDecimal("1e-150");
        BigDecimal high = new BigDecimal("1e150");
        for (int step = 0; step < 60; step++) {
            BigDecimal middle = low.multiply(high).sqrt(DIGITS);
            if (protonsAt(flask, polynomials, middle).compareTo(protons) < 0) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }

    private static BigDecimal protonsAt(Flask flask, List<BigDecimal[]> polynomials, BigDecimal h) {
        BigDecimal sum = BigDecimal.ZERO;
        for (int index = 0; index < polynomials.size(); index++) {
            BigDecimal all = BigDecimal.ZERO;
            BigDecimal counted = BigDecimal.ZERO;
            BigDecimal power = BigDecimal.ONE;
            for (int held = 0; held < polynomials.get(index).length; held++) {
                BigDecimal weight = polynomials.get(index)[held].multiply(power, DIGITS);
                all = all.add(weight, DIGITS);
                counted = counted.add(weight.multiply(BigDecimal.valueOf(held)), DIGITS);
                power = power.multiply(h, DIGITS);
            }
            sum = sum.add(counted.divide(all, DIGITS).multiply(new BigDecimal(flask.holders().get(index).amount())), DIGITS);
        }
        return sum;
    }

    /** Weights at h = 1 by number of protons held. */
    private static BigDecimal[] polynomial(ProtonHolder holder) {
        int count = holder.places().size();
        BigDecimal[] weights = new BigDecimal[count + 1];
        java.util.Arrays.fill(weights, BigDecimal.ZERO);
        for (int lost = 0; lost < 1 << count; lost++) {
            int held = count - Integer.bitCount(lost);
            weights[held] = weights[held].add(microstate(holder, lost), DIGITS);
        }
        return weights;
    }

    private static BigDecimal held(ProtonHolder holder, int place, BigDecimal h) {
        BigDecimal all = BigDecimal.ZERO;
        BigDecimal held = BigDecimal.ZERO;
        int count = holder.places().size();
        for (int lost = 0; lost < 1 << count; lost++) {
            BigDecimal weight = microstate(holder, lost).multiply(h.pow(count - Integer.bitCount(lost), DIGITS), DIGITS);
            all = all.add(weight, DIGITS);
            held = (lost >> place & 1) == 0 ? held.add(weight, DIGITS) : held;
        }
        return held.divide(all, DIGITS);
    }

    private static BigDecimal microstate(ProtonHolder holder, int lost) {
        double exponent = 0;
        for (int place = 0; place < holder.places().size(); place++) {
            ProtonPlace at = holder.places().get(place);
            if ((lost >> place & 1) == 1) {
                exponent -= at.pKa();
                if (at.after() >= 0 && (lost >> at.after() & 1) == 0) {
                    return BigDecimal.ZERO;
                }
            }
        }
        for (Coupling coupling : holder.couplings()) {
            if ((lost >> coupling.first() & 1) == 1 && (lost >> coupling.second() & 1) == 1) {
                exponent -= coupling.raise();
            }
        }
        return tenTo64ths(Math.toIntExact((long) (exponent * 64)));
    }

    /** 10^(n/64) to all digits, by square roots. */
    private static BigDecimal tenTo64ths(int n) {
        BigDecimal result = BigDecimal.ONE.scaleByPowerOfTen(Math.floorDiv(n, 64));
        for (int bit = 0; bit < 6; bit++) {
            if ((Math.floorMod(n, 64) >> bit & 1) == 1) {
                result = result.multiply(ROOTS.get(bit), DIGITS);
            }
        }
        return result;
    }

    /** 10^(1/64), 10^(2/64) ... 10^(32/64). */
    private static final List<BigDecimal> ROOTS = roots();

    private static List<BigDecimal> roots() {
        List<BigDecimal> roots = new ArrayList<>();
        BigDecimal root = BigDecimal.TEN;
        for (int bit = 0; bit < 6; bit++) {
            root = root.sqrt(DIGITS);
            roots.add(0, root);
        }
        return List.copyOf(roots);
    }

    private static double log10(BigDecimal value) {
        int exponent = value.precision() - value.scale();
        return Math.log10(value.scaleByPowerOfTen(-exponent).doubleValue()) + exponent;
    }

    /** Exponents that the decimals can hold exactly, whole protons, holders that are counted out in full. */
    private static Flask roundedTo64ths(Flask flask) {
        return flask.withHolders(flask.holders().stream()
                .filter(holder -> holder.places().size() <= 8)
                .map(holder -> new ProtonHolder(holder.name(), holder.amount(),
                        holder.places().stream().map(place -> place.withPKa(Math.rint(place.pKa() * 64) / 64)).toList(),
                        holder.couplings().stream().map(coupling -> new Coupling(coupling.first(), coupling.second(),
                                Math.rint(coupling.raise() * 64) / 64)).toList(),
                        holder.protonsHeld()))
                .toList());
    }
}
