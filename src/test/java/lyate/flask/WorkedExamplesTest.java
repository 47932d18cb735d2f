package lyate.flask;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Examples worked out without this program: transfers by the root of their quadratic, pH values by the charge balance solved
 * by bisection to 30 digits (pKa values of the CRC Handbook, pKw 14.00, activities left aside, as Harris, Quantitative Chemical
 * Analysis, ch. 8 to 11, and Skoog et al., ch. 14 and 15, do). {@link TextbookExamplesTest} has those whose answer a book prints.
 */
class WorkedExamplesTest {

    private static final double WATER_MOLAR = 55.3;

    private static double pH(double strongBase, double strongAcid, ProtonHolder... solutes) {
        double own = Math.log10(WATER_MOLAR);
        Flask flask = Flask.of("water", solutes).with(ProtonHolder.stages("water", WATER_MOLAR, 1, -own, 14.00 + own));
        flask = strongBase > 0 ? flask.with(ProtonHolder.base("hydroxide", strongBase, 30)) : flask;
        flask = strongAcid > 0 ? flask.with(ProtonHolder.acid("strong acid", strongAcid, -20)) : flask;
        return ProtonBalance.solve(flask).protonLevel();
    }

    /**
     * HA + B = A + HB with K = 10^ΔpKa: x²(1 − K) + K(a + b)x − Kab = 0; at one equivalent x = √K / (1 + √K), so that ΔpKa = 2 gives
     * 91 %, and 99 % only with two equivalents.
     */
    @ParameterizedTest(name = "delta pKa {0}, {1} eq: {2} %")
    @CsvSource({"0,1,50.0", "1,1,75.9747", "2,1,90.9091", "3,1,96.9347", "4,1,99.0099", "-1,1,24.0253", "-2,1,9.09091", "2,1.1,94.3243",
        "2,2,99.0288", "1,3,95.5361", "0,10,90.9091", "-2,10,26.7084", "5,0.1,9.99999", "2,0.5,49.5144"})
    void oneAcidAndOneBase(double deltaPKa, double equivalents, double percent) {
        Flask flask = Flask.of("dmso", ProtonHolder.acid("acid", 1, 20), ProtonHolder.base("base", equivalents, 20 + deltaPKa));
        assertEquals(percent, 100 * ProtonBalance.solve(flask).of("acid").deprotonated(0), 1e-3);
    }

    /** Two acids, each 1 eq, and n eq of a base far stronger: y/(1 − y) = K z/(1 − z), y + z = n. */
    @ParameterizedTest(name = "delta pKa {0}, {1} eq: {2} % and {3} %")
    @CsvSource({"1,1,75.9747,24.0253", "2,1,90.9091,9.09091", "3,1,96.9347,3.06534", "4,1,99.0099,0.990099", "2,0.5,49.0466,0.9534",
        "2,1.5,99.0466,50.9534"})
    void twoAcidsShareOneStrongBase(double deltaPKa, double equivalents, double stronger, double weaker) {
        Equilibrium settled = ProtonBalance.solve(Flask.of("dmso", ProtonHolder.acid("stronger", 1, 15),
                ProtonHolder.acid("weaker", 1, 15 + deltaPKa), ProtonHolder.base("base", equivalents, 45)));
        assertEquals(stronger, 100 * settled.of("stronger").deprotonated(0), 1e-3);
        assertEquals(weaker, 100 * settled.of("weaker").deprotonated(0), 1e-3);
    }

    /** A diprotic acid and 1 eq of a strong base: neutral form and dianion are equal, mono = 1 / (1 + 2·10^(−ΔpKa/2)). */
    @ParameterizedTest(name = "pKa values {0} apart: {1} % monoanion, {2} % dianion")
    @CsvSource({"0.60206,50.0,25.0", "1,61.2574,19.3713", "2,83.3333,8.33333", "3.02,94.1792,2.91041", "4,98.0392,0.980392"})
    void halfTakenDiproticAcid(double apart, double mono, double dianion) {
        double[] shares = ProtonBalance.solve(Flask.of("dmso", ProtonHolder.stages("diacid", 1, 2, 10, 10 + apart),
                ProtonHolder.base("base", 1, 45))).of("diacid").shareByProtons();
        assertEquals(mono, 100 * shares[1], 1e-3);
        assertEquals(dianion, 100 * shares[0], 1e-3);
        assertEquals(dianion, 100 * shares[2], 1e-3);
    }

    /** HA of c mol/L with strong base or acid: charge balance, a cubic in [H+]. */
    @ParameterizedTest(name = "{0}: pH {5}")
    @CsvSource({"acetic acid, 0.1, 4.756, 0, 0, 2.881", "sodium acetate, 0.1, 4.756, 0.1, 0, 8.878", "phenol, 0.01, 9.99, 0, 0, 5.993",
        "acetic acid beside HCl, 0.1, 4.756, 0, 0.1, 1.000", "acetate buffer 10:1, 0.1, 4.756, 0.0909091, 0, 5.756",
        "acetate buffer 1:1, 0.1, 4.756, 0.05, 0, 4.756", "acetate buffer 1:10, 0.1, 4.756, 0.00909091, 0, 3.765"})
    void weakAcids(String name, double molar, double pKa, double strongBase, double strongAcid, double expected) {
        assertEquals(expected, pH(strongBase, strongAcid, ProtonHolder.acid("acid", molar, pKa)), 1e-3);
    }

    @ParameterizedTest(name = "{0}: pH {4}")
    @CsvSource({"ammonia, 0.1, 0, 0, 11.122", "ammonium chloride, 0.1, 0, 0.1, 5.125", "ammonia beside NaOH, 0.1, 0.1, 0, 13.000"})
    void aWeakBase(String name, double molar, double strongBase, double strongAcid, double expected) {
        assertEquals(expected, pH(strongBase, strongAcid, ProtonHolder.base("ammonia", molar, 9.25)), 1e-3);
    }

    @ParameterizedTest(name = "ammonium salt of an acid of pKa {0}: pH {1}")
    @CsvSource({"4.756, 7.003", "9.21, 9.230"})
    void saltsOfAWeakBaseAndAWeakAcid(double pKa, double expected) {
        assertEquals(expected, pH(0, 0, ProtonHolder.base("ammonia", 0.1, 9.25), ProtonHolder.acid("acid", 0.1, pKa)), 1e-3);
    }

    @Test
    void twoWeakAcids() {
        assertEquals(2.363, pH(0, 0, ProtonHolder.acid("acetic", 0.1, 4.756), ProtonHolder.acid("formic", 0.1, 3.75)), 1e-3);
    }

    /** Where the water's own protons count: h² − ch − Kw = 0. */
    @ParameterizedTest
    @CsvSource({"0, 1e-8, 6.978", "0, 1e-7, 6.791", "1e-7, 0, 7.209"})
    void traces(double strongBase, double strongAcid, double expected) {
        assertEquals(expected, pH(strongBase, strongAcid), 1e-3);
    }

    /** 50 mL of 0.1 M acid with v mL of 0.1 M NaOH: the tables of Harris and Skoog give 2.88, 4.16, 4.76, 5.36, 8.73 and 11.96 for acetic acid. */
    @ParameterizedTest(name = "{0} mL: pH {2}")
    @CsvSource({"0,4.76,2.883", "10,4.76,4.160", "25,4.76,4.760", "40,4.76,5.362", "50,4.76,8.730", "60,4.76,11.959",
        "0,-7,1.000", "10,-7,1.176", "25,-7,1.477", "50,-7,7.000", "60,-7,11.959"})
    void titration(double millilitres, double pKa, double expected) {
        double volume = 50 + millilitres;
        assertEquals(expected, pH(0.1 * millilitres / volume, 0, ProtonHolder.acid("acid", 0.1 * 50 / volume, pKa)), 1e-3);
    }

    @ParameterizedTest(name = "phosphoric acid 0.1 mol/L with {0} mol/L NaOH: pH {1}")
    @CsvSource({"0, 1.632", "0.1, 4.688", "0.15, 7.198", "0.2, 9.740", "0.3, 12.583"})
    void phosphates(double strongBase, double expected) {
        assertEquals(expected, pH(strongBase, 0, ProtonHolder.stages("phosphate", 0.1, 3, 2.148, 7.198, 12.375)), 1e-3);
    }

    @Test
    void otherPolyproticSolutes() {
        assertEquals(1.284, pH(0, 0, ProtonHolder.stages("oxalic acid", 0.1, 2, 1.252, 4.266)), 1e-3);
        assertEquals(2.082, pH(0, 0, ProtonHolder.stages("citric acid", 0.1, 3, 3.128, 4.761, 6.396)), 1e-3);
        assertEquals(8.340, pH(0, 0, ProtonHolder.stages("hydrogen carbonate", 0.1, 1, 6.352, 10.329)), 1e-3);
        assertEquals(11.655, pH(0, 0, ProtonHolder.stages("carbonate", 0.1, 0, 6.352, 10.329)), 1e-3);
        assertEquals(6.082, pH(0, 0, ProtonHolder.stages("glycine", 0.05, 1, 2.350, 9.778)), 1e-3);
        assertEquals(1.890, pH(0, 0, ProtonHolder.stages("glycine hydrochloride", 0.05, 2, 2.350, 9.778)), 1e-3);
    }
}
