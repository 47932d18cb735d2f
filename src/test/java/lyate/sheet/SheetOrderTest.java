package lyate.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;

class SheetOrderTest {

    private static final String TEXT = "step,substrate,base,solvent,mine\n# first\na,CO,NaH,THF,1\nb,CCO,LDA,THF,2\nc,CCCO,DBU,MeCN,3";

    @Test
    void rowsMoveWithTheCommentsBeforeThem() throws SheetException {
        RouteSheet sheet = RouteSheet.parse(TEXT).withOrder(List.of(2, 0, 1));
        assertEquals("step,substrate,base,solvent,mine\nc,CCCO,DBU,MeCN,3\n# first\na,CO,NaH,THF,1\nb,CCO,LDA,THF,2\n", sheet.text());
        assertEquals(List.of(1, 2, 3), sheet.rows().stream().map(SheetRow::number).toList());
    }

    @Test
    void aRowLeftOutIsGone() throws SheetException {
        assertEquals(List.of("a", "c"), RouteSheet.parse(TEXT).withOrder(List.of(0, 2)).rows().stream().map(SheetRow::name).toList());
    }

    @Test
    void theReorderedSheetIsReadBackAsItIs() throws SheetException {
        RouteSheet sheet = RouteSheet.parse(TEXT).withOrder(List.of(1, 2, 0));
        assertEquals(sheet.rows().stream().map(SheetRow::cells).toList(), RouteSheet.parse(sheet.text()).rows().stream().map(SheetRow::cells).toList());
    }
}
