package lyate.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

/** Questions of the bench, asked on the command line. */
class BenchQuestionsTest {

    private final ByteArrayOutputStream out = new ByteArrayOutputStream();
    private final ByteArrayOutputStream err = new ByteArrayOutputStream();

    /** 5 g of propionyl dimethylamide (101.15 g/mol) are 49.4 mmol; at 2.31 mol/L that is 21.4 mL. */
    @Test
    void howMuchTitratedButyllithiumForFiveGrams() {
        check("--substrate", "CCC(=O)N(C)C", "--base", "n-BuLi", "--solvent", "THF", "--temperature", "-78", "--amount", "5g", "--titre", "2.31");
        assertTrue(text().matches("(?s).*n-butyllithium +49\\.4 +[0-9.]+ +21\\.4 .*titrated.*"), text());
        assertTrue(text().contains("L of butane") && text().contains("drying matters more than the stoichiometry"), text());
    }

    /** 60 % dispersion: 20 mmol of hydride, 24.00 g/mol, are 0.480 g of the pure substance and 0.800 g as weighed. */
    @Test
    void aDispersionIsWeighedWithItsOil() {
        check("--substrate", "CCOC(=O)CC(=O)OCC", "--base", "NaH", "--solvent", "THF", "--amount", "20 mmol");
        assertTrue(text().matches("(?s).*sodium hydride +20\\.0 +0\\.800 .*60 % by mass.*"), text());
    }

    /** Benzoic acid, pKa 4.20, is 99 % benzoate two units higher. */
    @Test
    void atWhichPHToExtractAnEsterFromUnreactedAcid() {
        check("--substrate", "OC(=O)c1ccccc1", "--base", "K2CO3", "--solvent", "DMF", "--product", "COC(=O)c1ccccc1",
                "--separate-from", "benzoic acid");
        assertTrue(text().contains("Between pH 6.2 and 14.0 product goes into the organic layer and benzoic acid stays in the water."), text());
        assertFalse(text().contains("Amounts for"), "no batch was named");
    }

    @Test
    void theQuenchNamesItsAcidAndWhatItHurts() {
        check("--substrate", "CC(C)(C)OC(=O)N1CCC(=O)CC1", "--base", "LiHMDS", "--solvent", "THF", "--temperature", "-78", "--work-up",
                "--quench", "conc. HCl", "--quench-ph", "0.5");
        assertTrue(text().contains("Concentrated hydrochloric acid to pH 0.5"), text());
        assertTrue(text().contains("The Boc group is lost in acid this strong."), text());
    }

    @Test
    void whatCannotBeReadIsNamed() {
        assertEquals(2, run("check", "--substrate", "Oc1ccccc1", "--base", "NaH", "--solvent", "THF", "--amount", "five"));
        assertTrue(err().contains("--amount: found 'five', expected a number above 0 with its unit"), err());
        err.reset();
        assertEquals(2, run("check", "--substrate", "Oc1ccccc1", "--base", "NaH", "--solvent", "THF", "--work-up", "--quench", "vinegar"));
        assertTrue(err().contains("--quench: no acid called 'vinegar'"), err());
    }

    @Test
    void aBetterSolventIsNamedWhereTheSolventIsTheProblem() {
        check("--substrate", "O=C1CCCCC1", "--base", "LDA", "--solvent", "methanol");
        assertTrue(text().contains("The solvent is the problem: in "), text());
    }

    private void check(String... arguments) {
        String[] all = new String[arguments.length + 1];
        all[0] = "check";
        System.arraycopy(arguments, 0, all, 1, arguments.length);
        assertEquals(0, run(all), err());
    }

    private int run(String... arguments) {
        return Lyate.run(Terminal.of(new ByteArrayInputStream(new byte[0]), out, err, false), arguments);
    }

    private String text() {
        return out.toString(StandardCharsets.UTF_8);
    }

    private String err() {
        return err.toString(StandardCharsets.UTF_8);
    }
}
