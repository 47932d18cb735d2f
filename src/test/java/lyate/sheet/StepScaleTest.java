package lyate.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Amounts as a sheet states them. */
class StepScaleTest {

    private static final StepReader READER = new StepReader(new MoleculeReader(), Stockroom.load(TableFolders.packaged()));

    @ParameterizedTest
    @CsvSource({
        // acetone 58.08 g/mol; sodium acetate 82.03 g/mol, counter-ion weighed in
        "CC(C)=O,amount_g,2.904,50,2.904", "CC(C)=O,amount_mmol,'0,5',0.5,0.02904", "[Na+].CC(=O)[O-],amount_g,8.203,100,8.203",
    })
    void substrateInGramsOrMillimoles(String substrate, String column, String amount, double milliMole, double grams)
            throws SheetException, MoleculeException {
        StepScale scale = scale(substrate, column, amount);
        assertEquals(milliMole, scale.batch().orElseThrow().milliMole(), 1e-3 * milliMole);
        assertEquals(grams, scale.batch().orElseThrow().grams(), 1e-3 * grams);
    }

    @Test
    void aRowThatStatesNoAmountHasNone() throws SheetException, MoleculeException {
        assertTrue(scale("CCO", "notes", "x").batch().isEmpty());
        assertTrue(scale("CCO", "notes", "x").titrated().isEmpty());
        assertEquals(1.52, scale("CCO", "base_titrated_M", "1.52").titrated().orElseThrow());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "amount_g|0|column amount_g: found '0', expected a number from 0.000001 to 1000000000 (g)",
        "amount_mmol|much|column amount_mmol: found 'much', expected a number from 0.000001 to 1000000000 (mmol)",
        "base_titrated_M|-1|column base_titrated_M: found '-1', expected a number from 0.001 to 30 (mol/L)",
        "amount_mmol,amount_g|1,2|column amount_g: found an amount in mmol as well, expected one of the two",
    })
    void cellsThatMakeNoSense(String columns, String cells, String problem) throws SheetException {
        SheetRow row = RouteSheet.parse("substrate,base,solvent," + columns + "\nCCO,NaH,THF," + cells + "\n").rows().get(0);
        assertEquals(problem, assertThrows(RowException.class, () -> READER.read(row)).getMessage());
    }

    private static StepScale scale(String substrate, String column, String amount) throws SheetException, MoleculeException {
        SheetRow row = RouteSheet.parse("substrate;" + column + "\n" + substrate + ";" + amount + "\n").rows().get(0);
        return StepScale.of(row, new MoleculeReader().read(substrate));
    }
}
