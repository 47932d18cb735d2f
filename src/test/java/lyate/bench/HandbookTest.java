package lyate.bench;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.OptionalDouble;
import lyate.bench.Enthalpies.Donor;
import lyate.table.TableFolders;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The bench against figures that stand in handbooks and on labels; the arithmetic beside each is that of a textbook. */
class HandbookTest {

    private static final Enthalpies ENTHALPIES = Enthalpies.load(TableFolders.packaged());
    /** A share of 99 % lies log10 99 pH units from the pKa. */
    private static final double TWO_NINES = Math.log10(99);

    /**
     * 10 mmol as weighed or measured: molar mass over strength and density. Molar masses from IUPAC atomic weights, densities at
     * 20 degrees C from the CRC Handbook, strengths from usual labels.
     */
    @ParameterizedTest
    @CsvSource({
        "nah, 0.400, ",          // 23.998 g/mol, 60 % in oil
        "n-buli, , 4.00",        // 2.5 mol/L
        "lda, , 5.00",           // 2.0 mol/L
        "et3n, 1.012, 1.395",    // 101.19 g/mol, 0.7255 g/mL
        "dbu, 1.522, 1.495",     // 152.24 g/mol, 1.018 g/mL
        "dipea, 1.292, 1.742",   // 129.24 g/mol, 0.742 g/mL
        "pyridine, 0.791, 0.806", // 79.10 g/mol, 0.982 g/mL
        "piperidine, 0.8515, 0.988", // 85.15 g/mol, 0.862 g/mL
        "k2co3, 1.382, ",        // 138.21 g/mol
        "cs2co3, 3.258, ",       // 325.82 g/mol
        "kotbu, 1.122, ",        // 112.21 g/mol
        "k3po4, 2.123, "})       // 212.27 g/mol
    void tenMillimolesAsSupplied(String base, Double grams, Double milliLitre) throws Exception {
        Portion portion = Portion.of(Reviews.STOCK.base(base), 10, OptionalDouble.empty());
        if (grams != null) {
            assertEquals(grams, portion.grams().orElseThrow(), 0.005 * grams);
        }
        if (milliLitre != null) {
            assertEquals(milliLitre, portion.milliLitre().orElseThrow(), 0.01 * milliLitre);
        }
    }

    /** Molar volumes of an ideal gas: 22.414 L at 0 degrees C and 101.325 kPa, 22.711 L at 100 kPa (CODATA); the others by p V = n R T. */
    @ParameterizedTest
    @CsvSource({
        "1000, 0, 101.325, 22.414",
        "1000, 0, 100, 22.711",
        "1000, 20, 101.325, 24.055",
        "1000, 25, 101.325, 24.465",
        "1000, 25, 100, 24.790",
        "1000, 15, 101.325, 23.645",
        "100, 25, 101.325, 2.4465",
        "42, 20, 101.325, 1.0103",
        "500, 40, 101.325, 12.848",
        "250, -10, 101.325, 5.3984",
        "1000, 20, 80, 30.467"})
    void gasFillsItsMolarVolume(double milliMole, double celsius, double kiloPascal, double litres) {
        assertEquals(litres, new GivenOffGas("hydrogen", milliMole, 0, celsius, kiloPascal).litresInStep(), 5e-4 * litres);
    }

    /**
     * A solid and a strong acid in water: enthalpy of solution (CRC Handbook, enthalpy of solution of electrolytes) and that of the
     * ion with the proton (hydroxide -55.84, carbonate with two protons to carbon dioxide -2.2, hydrogencarbonate 12.6 kJ/mol);
     * solid with water: from standard enthalpies of formation (CRC Handbook, from memory). kJ per mole of protons. Handbooks differ
     * by up to 2.6 kJ/mol (lithium hydroxide -484.9 or -487.5), hence the tolerance.
     */
    @ParameterizedTest
    @CsvSource({
        "lioh, ACID, -79.4",     // -23.56 - 55.84
        "naoh, ACID, -100.4",    // -44.51 - 55.84
        "koh, ACID, -113.4",     // -57.61 - 55.84
        "na2co3, ACID, -14.5",   // (-26.7 - 2.2) / 2
        "k2co3, ACID, -16.6",    // (-30.9 - 2.2) / 2
        "nahco3, ACID, 31.3",    // 18.65 + 12.6
        "khco3, ACID, 34",       // 21.3 + 12.6
        "nah, WATER, -83.7",     // NaOH(s) -425.8 + 285.8 + 56.3
        "lih, WATER, -108.6",    // LiOH(s) -484.9 + 285.8 + 90.5
        "kh, WATER, -81.0",      // KOH(s) -424.6 + 285.8 + 57.7
        "cah2, WATER, -116.6"})  // (Ca(OH)2(s) -985.2 + 2 * 285.8 + 181.5) / 2
    void heatsAgreeWithEnthalpiesOfSolutionAndFormation(String base, Donor donor, double perProton) throws Exception {
        double found = ENTHALPIES.of(Reviews.STOCK.base(base), donor).orElseThrow().kiloJoulePerProton();
        assertEquals(perProton, found, 3.0);
    }

    /** pKa from the CRC Handbook; an acid or base leaves a neutral compound log10 99 pH units beyond it. */
    @ParameterizedTest
    @CsvSource({
        "benzoic acid, 4.20, true",
        "acetic acid, 4.76, true",
        "2-naphthol, 9.51, true",
        "phenol, 9.99, true",
        "acetylsalicylic acid, 3.49, true",
        "aniline, 4.60, false",
        "pyridine, 5.23, false",
        "imidazole, 6.99, false",
        "morpholine, 8.49, false",
        "triethylamine, 10.75, false",
        "piperidine, 11.12, false"})
    void anAcidOrBaseLeavesANeutralCompound(String name, double pKa, boolean acid) {
        AqueousForm neutral = new AqueousForm("naphthalene", new lyate.flask.ProtonHolder("naphthalene", 1, List.of(), List.of(), 0), 0, true, List.of());
        AqueousForm other = acid ? AqueousForm.acid(name, pKa) : AqueousForm.base(name, pKa);
        ExtractionWindow window = ExtractionWindow.between(neutral, other).get(0);
        assertEquals("naphthalene", window.organicLayer());
        assertEquals(acid ? pKa + TWO_NINES : 0, window.fromPH(), 1e-6);
        assertEquals(acid ? 14 : pKa - TWO_NINES, window.toPH(), 1e-6);
    }
}
