package lyate.review;

import static org.junit.jupiter.api.Assertions.assertEquals;

import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import lyate.table.TableFolders;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RuleSentenceTest {

    private static final Stockroom STOCKROOM = Stockroom.load(TableFolders.packaged());

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            n-BuLi|n-Butyllithium adds.
            t-BuLi|tert-Butyllithium adds.
            DIPEA|N,N-Diisopropylethylamine adds.
            DBU|1,8-Diazabicyclo[5.4.0]undec-7-ene adds.
            NaH|Sodium hydride adds.
            sparteine|(-)-Sparteine adds.
            p-toluidine|p-Toluidine adds.
            """)
    void aNameAtTheFrontOfASentenceGetsItsCapitalWhereChemistsPutIt(String base, String sentence) throws UnknownNameException {
        assertEquals(sentence, RuleCells.fill("{base} adds.", STOCKROOM.base(base), STOCKROOM.solvent("THF")));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            n-BuLi|Warm n-butyllithium attacks tetrahydrofuran.
            """)
    void aNameWithinASentenceStaysAsItIs(String base, String sentence) throws UnknownNameException {
        assertEquals(sentence, RuleCells.fill("Warm {base} attacks {solvent}.", STOCKROOM.base(base), STOCKROOM.solvent("THF")));
    }
}
