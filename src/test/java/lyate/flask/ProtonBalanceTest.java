package lyate.flask;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Closed forms of the law of mass action, derived beside each. */
class ProtonBalanceTest {

    private static final double NINE_DIGITS = 1e-9;

    /** HA + B = A + HB: x² = K (a − x)(b − x), in the form of the root that does not cancel. */
    @ParameterizedTest
    @CsvSource({"1, 1, 10, 10", "1, 1, 10, 12.5", "1, 1.05, 17.3, 30.2", "0.2, 0.01, 4.756, 9.24", "1, 3, 35.1, 24.4",
        "1e-6, 1e3, 12, 9", "5, 5, 50, -2"})
    void acidAndBaseShareTheProtonAsTheQuadraticSays(double acid, double base, double pKaAcid, double pKaBase) {
        double k = Math.pow(10, pKaBase - pKaAcid);
        double root = Math.sqrt(k * k * (acid - base) * (acid - base) + 4 * k * acid * base);
        double moved = 2 * k * acid * base / (k * (acid + base) + root);

        Equilibrium settled = ProtonBalance.solve(Flask.of("dmso",
                ProtonHolder.acid("acid", acid, pKaAcid), ProtonHolder.base("base", base, pKaBase)));

        assertClose(moved / acid, settled.of("acid").deprotonated(0));
        assertClose(moved / base, settled.of("base").protonated(0));
    }

    /** K = 10^25 and equal amounts: the share left behind is 1/(1 + √K), far below what 1 − x could show. */
    @Test
    void whatAOneSidedTransferLeavesBehindIsStillExact() {
        Equilibrium settled = ProtonBalance.solve(Flask.of("dmso",
                ProtonHolder.acid("acid", 1, 10), ProtonHolder.base("base", 1, 35)));
        double left = 1 / (1 + Math.pow(10, 12.5));
        assertEquals(22.5, settled.protonLevel(), 1e-12);
        assertClose(left, settled.of("acid").protonated(0));
        assertClose(left, settled.of("base").deprotonated(0));
    }

    /** A base 10^−12 short beside a K of 10^50: what is left of the acid is the shortfall, not zero. */
    @Test
    void aTraceOfShortfallDecidesWhereKIsHuge() {
        double shortfall = 0x1p-40;
        Equilibrium settled = ProtonBalance.solve(Flask.of("thf",
                ProtonHolder.acid("acid", 1, 0), ProtonHolder.base("base", 1 - shortfall, 50)));
        assertClose(shortfall, settled.of("acid").protonated(0));
        assertClose(50 - 50 + Math.log10(1 / shortfall), settled.protonLevel());
    }

    /** CRC Handbook of Chemistry and Physics, 95th ed., section 5, at 25 degrees C (values from memory). */
    @ParameterizedTest
    @CsvSource({"oxalic acid, 1.25, 3.81", "malonic acid, 2.85, 5.70", "carbonic acid, 6.35, 10.33"})
    void diproticAcidAtAnyDegreeOfNeutralisationFollowsItsQuadratic(String name, double pK1, double pK2) {
        double k1 = Math.pow(10, -pK1);
        double k2 = Math.pow(10, -pK2);
        for (double mean : new double[] {0.01, 0.5, 0.9, 1.2, 1.5, 1.99}) {
            // (2 − n) h² + (1 − n) K1 h − n K1 K2 = 0, n protons left per molecule
            double b = (1 - mean) * k1;
            double root = Math.sqrt(b * b + 4 * (2 - mean) * mean * k1 * k2);
            double h = b >= 0 ? 2 * mean * k1 * k2 / (b + root) : (root - b) / (2 * (2 - mean));
            double sum = h * h + k1 * h + k1 * k2;

            HolderState acid = ProtonBalance.solve(Flask.of("water",
                    ProtonHolder.stages(name, 0.3, mean, pK1, pK2))).of(name);

            assertClose(h * h / sum, acid.microstate(0b11));
            assertClose(k1 * h / sum, acid.microstate(0b10));
            assertClose(k1 * k2 / sum, acid.microstate(0b00));
            assertEquals(0, acid.microstate(0b01), "the second proton never goes before the first");
            assertClose(h * h / sum + k1 * h / sum, acid.protonated(1));
        }
    }

    /** A salt such as hydrogencarbonate disproportionates to 1/(2 + √(K1/K2)) of either neighbour, at (pK1 + pK2)/2. */
    @ParameterizedTest
    @CsvSource({"hydrogenoxalate, 1.25, 3.81", "hydrogenmalonate, 2.85, 5.70", "hydrogencarbonate, 6.35, 10.33"})
    void theHalfNeutralisedSaltSitsHalfWay(String name, double pK1, double pK2) {
        Equilibrium settled = ProtonBalance.solve(Flask.of("water", ProtonHolder.stages(name, 0.1, 1, pK1, pK2)));
        double either = 1 / (2 + Math.pow(10, (pK2 - pK1) / 2));
        assertEquals((pK1 + pK2) / 2, settled.protonLevel(), NINE_DIGITS);
        assertClose(either, settled.of(name).microstate(0b11));
        assertClose(either, settled.of(name).microstate(0b00));
    }

    /**
     * Two equal, uncoupled places look like stages 2 log10 2 apart: the statistical factor. Two that feel one another lie
     * apart by the coupling besides.
     */
    @ParameterizedTest
    @CsvSource({"0", "1.4", "5.2"})
    void equalPlacesGiveTheStatisticalStages(double raise) {
        double micro = 4.0;
        double log2 = Math.log10(2);
        ProtonHolder places = new ProtonHolder("acid", 1, List.of(new ProtonPlace("O1", micro), new ProtonPlace("O2", micro)),
                List.of(new Coupling(0, 1, raise)), 1.3);
        ProtonHolder stages = ProtonHolder.stages("acid", 1, 1.3, micro - log2, micro + raise + log2);
        Equilibrium byPlaces = ProtonBalance.solve(Flask.of("water", places));
        Equilibrium byStages = ProtonBalance.solve(Flask.of("water", stages));
        assertEquals(byStages.protonLevel(), byPlaces.protonLevel(), NINE_DIGITS);
        assertClose(byStages.of("acid").microstate(0b11), byPlaces.of("acid").microstate(0b11));
    }

    /**
     * Glycine: pK1 2.34, pK2 9.60, isoelectric at their mean 5.97 (CRC Handbook, 95th ed., section 7; Voet and Voet,
     * Biochemistry; from memory). With the ammonium's own pKa 7.7 beside COOH, as in its esters, zwitterion and neutral
     * form stand as 10^(7.7 − 2.34) (Edsall and Wyman, Biophysical Chemistry, 1958, ch. 8; from memory).
     */
    @Test
    void glycineIsAZwitterionAtItsIsoelectricPoint() {
        double ammoniumBesideAcid = 7.7;
        double acidBesideAmmonium = -Math.log10(Math.pow(10, -2.34) - Math.pow(10, -ammoniumBesideAcid));
        double raise = 2.34 + 9.60 - acidBesideAmmonium - ammoniumBesideAcid;
        ProtonHolder glycine = new ProtonHolder("glycine", 0.1,
                List.of(new ProtonPlace("O1", acidBesideAmmonium), new ProtonPlace("N4", ammoniumBesideAcid)),
                List.of(new Coupling(0, 1, raise)), 1);
        Equilibrium settled = ProtonBalance.solve(Flask.of("water", glycine));
        assertEquals(5.97, settled.protonLevel(), NINE_DIGITS);
        HolderState state = settled.of("glycine");
        assertClose(Math.pow(10, ammoniumBesideAcid - acidBesideAmmonium), state.microstate(0b10) / state.microstate(0b01));
        assertClose(1 / (2 + Math.pow(10, (9.60 - 2.34) / 2)), state.microstate(0b11));
    }

    /** p = pKa + log10(base/acid), Henderson and Hasselbalch. */
    @ParameterizedTest
    @CsvSource({"0.10, 0.10", "0.10, 0.15", "3, 0.002", "1e-9, 1e2"})
    void aBufferObeysHendersonAndHasselbalch(double acid, double base) {
        double level = ProtonBalance.solve(Flask.of("water",
                ProtonHolder.acid("acetic acid", acid, 4.756), ProtonHolder.base("acetate", base, 4.756))).protonLevel();
        assertEquals(4.756 + Math.log10(base / acid), level, NINE_DIGITS);
    }

    @Test
    void aFlaskWithoutProtonsIsEmptyAndOneWithoutRoomIsFull() {
        Equilibrium empty = ProtonBalance.solve(Flask.of("water", ProtonHolder.base("base", 1, 10)));
        assertEquals(Double.POSITIVE_INFINITY, empty.protonLevel());
        assertEquals(0, empty.of("base").protonated(0));
        assertEquals(1, empty.of("base").deprotonated(0));
        Equilibrium full = ProtonBalance.solve(Flask.of("water", ProtonHolder.stages("acid", 1, 2, 3, 10)));
        assertEquals(Double.NEGATIVE_INFINITY, full.protonLevel());
        assertEquals(1, full.of("acid").microstate(0b11));
        assertEquals(0, full.of("acid").deprotonated(0));
        assertEquals(Double.NaN, ProtonBalance.solve(Flask.of("water")).protonLevel());
    }

    /** An indicator takes no protons away but shows the level it meets: pKa 7 at level 8 is 10/11 deprotonated. */
    @Test
    void anIndicatorOfAmountZeroShowsTheLevel() {
        Equilibrium settled = ProtonBalance.solve(Flask.of("water", ProtonHolder.acid("buffer acid", 1, 8),
                ProtonHolder.base("buffer base", 1, 8), ProtonHolder.acid("indicator", 0, 7)));
        assertEquals(8, settled.protonLevel(), 1e-12);
        assertClose(10.0 / 11, settled.of("indicator").deprotonated(0));
    }

    @Test
    void whatCannotBeIsRefusedInWords() {
        assertMessage("expected a number not below 0", () -> ProtonHolder.acid("water", -1, 15.74));
        assertMessage("expected 0 to 1", () -> ProtonHolder.acid("water", 1, 15.74).withProtonsHeld(2));
        assertMessage("pKa NaN", () -> ProtonHolder.acid("water", 1, Double.NaN));
        assertMessage("no place 4", () -> new ProtonHolder("acid", 1, List.of(new ProtonPlace("O1", 4)),
                List.of(new Coupling(0, 4, 1)), 1));
        assertMessage("circle", () -> new ProtonHolder("acid", 1, List.of(new ProtonPlace("O1", 4, 1),
                new ProtonPlace("O2", 4, 0)), List.of(), 1));
        assertMessage("two holders are called 'water'",
                () -> Flask.of("dmso", ProtonHolder.acid("water", 1, 31), ProtonHolder.acid("water", 1, 31)));
        assertMessage("expected one of [water]", () -> Flask.of("dmso", ProtonHolder.acid("water", 1, 31)).indexOf("base"));
    }

    private static void assertMessage(String part, org.junit.jupiter.api.function.Executable wrong) {
        String message = assertThrows(IllegalArgumentException.class, wrong).getMessage();
        assertTrue(message.contains(part), message);
    }

    private static void assertClose(double expected, double found) {
        assertEquals(expected, found, NINE_DIGITS * Math.abs(expected));
    }
}
