package lyate.flask;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Worked examples of textbooks, to the two decimals they print. Water is just another holder: 55.3 mol/L, its two stages
 * on the molar scale, so that the ion product 10^−14 comes out by itself.
 */
class TextbookExamplesTest {

    private static final double WATER_MOLAR = 55.3;
    private static final double PRINTED = 0.006;

    private static ProtonHolder water() {
        double own = Math.log10(WATER_MOLAR);
        return ProtonHolder.stages("water", WATER_MOLAR, 1, -own, 14.00 + own);
    }

    private static double pH(ProtonHolder... solutes) {
        Flask flask = Flask.of("water", solutes).with(water());
        return ProtonBalance.solve(flask).protonLevel();
    }

    @Test
    void pureWaterIsNeutral() {
        assertEquals(7.00, pH(), 1e-6);
    }

    /** Zumdahl, Chemistry, "The pH of weak acid solutions": 1.00 M HF, Ka 7.2e-4: pH 1.57 (from memory). */
    @Test
    void hydrofluoricAcid() {
        assertEquals(1.57, pH(ProtonHolder.acid("HF", 1.00, -Math.log10(7.2e-4))), 0.011);
    }

    /** Zumdahl, Chemistry, "The pH of weak base solutions": 15.0 M NH3, Kb 1.8e-5: pH 12.20 (from memory). */
    @Test
    void ammonia() {
        assertEquals(12.20, pH(ProtonHolder.base("NH3", 15.0, 14 + Math.log10(1.8e-5))), 0.02);
    }

    /**
     * Harris, Quantitative Chemical Analysis, 7th ed., section 9-5: 12.43 g tris (121.135 g/mol) and 4.67 g of its
     * hydrochloride (157.596 g/mol) in 1.00 L, pKa 8.075: pH 8.61; with 12.0 mL of 1.00 M HCl added, 8.41 (from memory).
     */
    @Test
    void trisBufferAndItsShareOfStrongAcid() {
        ProtonHolder free = ProtonHolder.base("tris", 12.43 / 121.135, 8.075);
        ProtonHolder salt = ProtonHolder.acid("tris hydrochloride", 4.67 / 157.596, 8.075);
        assertEquals(8.61, pH(free, salt), PRINTED);
        assertEquals(8.41, pH(free, salt, ProtonHolder.acid("HCl", 0.0120, -7)), PRINTED);
    }

    /** Harris, 7th ed., section 10-1: leucine 0.0500 M, K1 4.69e-3, K2 1.79e-10, as cation, neutral and anion (from memory). */
    @ParameterizedTest
    @CsvSource({"2, 1.88", "1, 6.06", "0, 11.21"})
    void leucineInItsThreeForms(double protons, double printed) {
        assertEquals(printed, pH(ProtonHolder.stages("leucine", 0.0500, protons, -Math.log10(4.69e-3), -Math.log10(1.79e-10))),
                PRINTED);
    }

    /**
     * Brown et al., Chemistry: The Central Science, "Polyprotic acids": 0.0037 M carbonic acid, Ka 4.3e-7 and 5.6e-11: pH 4.40,
     * carbonate 5.6e-11 M; 0.020 M oxalic acid, Ka 5.9e-2 and 6.4e-5: pH 1.80, oxalate 6.4e-5 M (from memory).
     */
    @ParameterizedTest
    @CsvSource({"carbonic acid, 0.0037, 4.3e-7, 5.6e-11, 4.40, 5.6e-11", "oxalic acid, 0.020, 5.9e-2, 6.4e-5, 1.80, 6.4e-5"})
    void diproticAcids(String name, double molar, double k1, double k2, double printed, double dianion) {
        Flask flask = Flask.of("water", ProtonHolder.stages(name, molar, 2, -Math.log10(k1), -Math.log10(k2)), water());
        Equilibrium settled = ProtonBalance.solve(flask);
        assertEquals(printed, settled.protonLevel(), PRINTED);
        assertEquals(dianion, molar * settled.of(name).deprotonated(1), 0.02 * dianion);
    }

    /** Skoog et al., Fundamentals of Analytical Chemistry, ch. 15: 0.100 M NaHCO3, K1 4.45e-7, K2 4.69e-11: pH 8.34 (from memory). */
    @Test
    void hydrogencarbonate() {
        assertEquals(8.34, pH(ProtonHolder.stages("carbonate", 0.100, 1, -Math.log10(4.45e-7), -Math.log10(4.69e-11))), PRINTED);
    }
}
