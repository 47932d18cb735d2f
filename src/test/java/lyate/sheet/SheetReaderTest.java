package lyate.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.io.StringReader;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Sheets come from many programs; all of them are read, and a bad row spoils no other. */
class SheetReaderTest {

    @ParameterizedTest
    @ValueSource(strings = {
        "step,substrate,base\nA,CCO,NaH\nB,CO,\"KOH\"\n",
        "step,substrate,base\r\nA,CCO,NaH\r\nB,CO,KOH",
        "step,substrate,base\rA,CCO,NaH\rB,CO,KOH\r",
        "\uFEFFstep,substrate,base\nA,CCO,NaH\nB,CO,KOH\n",
        "\uFEFF# made by hand\nstep,substrate,base\nA,CCO,NaH\n\n# between\nB,CO,KOH\n# end",
        "step;substrate;base\nA;CCO;NaH\nB;CO;KOH\n",
        "sep=;\r\nstep;substrate;base\r\nA;CCO;NaH\r\nB;CO;KOH\r\n",
        "step\tsubstrate\tbase\nA\tCCO\tNaH\nB\tCO\tKOH\n",
        "\"step\", Substrate ,BASE\nA,  CCO,NaH  \nB,CO,KOH,,\n",
    })
    void oneSheetWrittenManyWays(String text) throws IOException, SheetException {
        List<SheetRow> rows = rows(text);
        assertEquals(List.of("A", "B"), rows.stream().map(SheetRow::name).toList());
        assertEquals(List.of("CCO", "CO"), texts(rows, SheetColumn.SUBSTRATE));
        assertEquals(List.of("NaH", "KOH"), texts(rows, SheetColumn.BASE));
        assertEquals(List.of("", ""), rows.stream().map(SheetRow::problem).toList());
    }

    @Test
    void lineBreaksInQuotedCellsKeepTheLineNumbers() throws IOException, SheetException {
        List<SheetRow> rows = rows("substrate,notes\nCCO,\"one\n# two\n\nfour\"\nCO,\n");
        assertEquals("one\n# two\n\nfour", rows.get(0).text(SheetColumn.NOTES));
        assertEquals(List.of(2, 6), rows.stream().map(SheetRow::line).toList());
        assertEquals("row 2 (line 6)", rows.get(1).place());
    }

    @Test
    void missingColumnsAndCellsAreEmpty() throws IOException, SheetException {
        SheetRow row = rows("substrate,base,solvent\nCCO\n").get(0);
        assertEquals("", row.text(SheetColumn.SOLVENT));
        assertEquals("", row.text(SheetColumn.TEMPERATURE));
        assertEquals("1", row.name());
    }

    @Test
    void forgottenQuoteCostsOneRow() throws IOException, SheetException {
        List<SheetRow> rows = rows("step,substrate\nA,\"CCO\nB,CO\nC,CC\n");
        assertEquals(List.of("a quoted cell is not closed, or text follows its closing quote", "", ""),
                rows.stream().map(SheetRow::problem).toList());
        assertEquals(List.of("B", "C"), rows.stream().skip(1).map(SheetRow::name).toList());
        assertEquals(List.of(2, 3, 4), rows.stream().map(SheetRow::line).toList());
    }

    @Test
    void cellsBeyondTheHeaderAreNotDropped() throws IOException, SheetException {
        List<SheetRow> rows = rows("step,substrate\nA,CCO,lost\nB,CO\n");
        assertEquals("3 cells, but the header has 2 columns", rows.get(0).problem());
        assertEquals("", rows.get(1).problem());
    }

    @Test
    void headerWithoutRowsHasNoRows() throws IOException, SheetException {
        assertFalse(new SheetReader(new StringReader("substrate,base")).hasNext());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "step,structure,base|the header has neither a column substrate nor a column reaction; it has step, structure, base. Not known: structure (perhaps substrate).",
        "substrate,base,Base|the header has the column base twice",
        "''|the sheet is empty; its first line should be step,substrate,site,base,base_equiv,solvent,temperature_C,concentration_M,water_ppm,electrophile,amount_mmol,amount_g,base_titrated_M,notes,reaction",
        "'\"substrate,base'|line 1: the quotes of the header are not in order",
    })
    void sheetsThatCannotBeUsed(String text, String reason) {
        assertEquals(reason, assertThrows(SheetException.class, () -> rows(text)).getMessage());
    }

    private static List<SheetRow> rows(String text) throws IOException, SheetException {
        List<SheetRow> rows = new ArrayList<>();
        new SheetReader(new StringReader(text)).forEachRemaining(rows::add);
        return rows;
    }

    private static List<String> texts(List<SheetRow> rows, SheetColumn column) {
        return rows.stream().map(row -> row.text(column)).toList();
    }
}
