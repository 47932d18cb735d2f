package lyate.flask;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class ProtonBalanceTest {

    /** Equal amounts of acid and base: the ratio of taken to left is the square root of K. */
    @Test
    void equalAmountsShareTheProtonBySquareRootOfK() {
        Flask flask = Flask.of("dmso", ProtonHolder.acid("acid", 1, 10), ProtonHolder.base("base", 1, 35));
        Equilibrium settled = ProtonBalance.solve(flask);
        assertEquals(22.5, settled.protonLevel(), 1e-12);
        double left = Math.pow(10, -12.5);
        assertEquals(1, settled.of("acid").protonated(0) / (left / (1 + left)), 1e-11);
        assertEquals(1, settled.of("base").deprotonated(0) / (left / (1 + left)), 1e-11);
    }

    @Test
    void aFlaskWithoutProtonsIsEmptyAndOneWithoutRoomIsFull() {
        Equilibrium empty = ProtonBalance.solve(Flask.of("water", ProtonHolder.base("base", 1, 10)));
        assertEquals(Double.POSITIVE_INFINITY, empty.protonLevel());
        assertEquals(0, empty.of("base").protonated(0));
        Equilibrium full = ProtonBalance.solve(Flask.of("water", ProtonHolder.acid("acid", 1, 10)));
        assertEquals(Double.NEGATIVE_INFINITY, full.protonLevel());
        assertEquals(1, full.of("acid").protonated(0));
        assertEquals(Double.NaN, ProtonBalance.solve(Flask.of("water")).protonLevel());
    }
}
