package lyate.acidity.lfer;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class DecimalsTest {

    @ParameterizedTest
    @CsvSource({"0, 0.00", "-0.001, 0.00", "1.006, 1.01", "-12.3, -12.30", "0.07, 0.07", "-0.5, -0.50", "99.999, 100.00"})
    void twoDecimalsAreWritten(double value, String text) {
        assertEquals(text, Decimals.two(value));
    }
}
