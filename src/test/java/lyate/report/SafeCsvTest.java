package lyate.report;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Nothing written as CSV is taken for a formula by a spreadsheet. */
class SafeCsvTest {

    @ParameterizedTest
    @ValueSource(strings = {"=1+1", "+A1", "-A1", "@SUM(A1)", "\t=1", "\r=1", "-", "=", "-1+cmd", "+1;2"})
    void formulasAreMadeText(String cell) {
        assertEquals("'" + cell, SafeCsv.safe(cell));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "-78", "+1.05", "-1,5", "1e-5", "-inf", "C=O", "[O-]C", "a=b", "N#N", ".5", "-.5"})
    void numbersAndStructuresStay(String cell) {
        assertEquals(cell, SafeCsv.safe(cell));
    }

    @Test
    void cellsAreQuotedWhereTheyMustBe() throws IOException {
        StringBuilder out = new StringBuilder();
        new SafeCsv(out).row(List.of("a,b", "say \"x\"", "two\nlines", "", "plain"));
        assertEquals("\"a,b\",\"say \"\"x\"\"\",\"two\nlines\",,plain\n", out.toString());
    }

    @Test
    void numbersHaveNoNegativeZeroAndNoFalsePrecision() {
        assertEquals("0.0", Numbers.fixed(-0.04, 1));
        assertEquals("", Numbers.fixed(Double.NaN, 2));
        assertEquals("-inf", Numbers.fixed(Double.NEGATIVE_INFINITY, 2));
        assertEquals(0.0, Numbers.rounded(-1e-9, 3));
        assertEquals(null, Numbers.rounded(Double.POSITIVE_INFINITY, 3));
    }
}
