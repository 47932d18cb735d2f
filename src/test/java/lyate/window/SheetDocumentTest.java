package lyate.window;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.atomic.AtomicLong;
import lyate.sheet.RouteSheet;
import lyate.sheet.SheetRow;
import org.junit.jupiter.api.Test;

class SheetDocumentTest {

    private static final long SECOND = 1_000_000_000L;
    private final AtomicLong clock = new AtomicLong();
    private final SheetDocument document = new SheetDocument(StepCells.sheetOf(StepText.demo()), clock::get);

    @Test
    void aStepSurvivesTheWayIntoASheetAndBack() throws Exception {
        StepText odd = StepText.demo().with(StepField.SUBSTRATE, "\n  molfile\n\n  0  0").with(StepField.PARTNER, "CI").with(StepField.BASE, "a, \"b\"");
        RouteSheet read = RouteSheet.parse(StepCells.sheetOf(odd).text());
        assertEquals(odd.with(StepField.SUBSTRATE, "").fields(), StepCells.text(read.rows().get(0)).with(StepField.SUBSTRATE, "").fields());
        assertEquals(odd.site(), StepCells.text(read.rows().get(0)).site());
    }

    @Test
    void reactionSmilesGoIntoTheColumnForReactions() {
        document.edit(StepText.demo().with(StepField.SUBSTRATE, "CCO.CI>[Na+].[H-]>CCOC"));
        SheetRow row = document.state().sheet().rows().get(0);
        assertEquals("", row.text(lyate.sheet.SheetColumn.SUBSTRATE));
        assertEquals("CCO.CI>[Na+].[H-]>CCOC", row.text(lyate.sheet.SheetColumn.REACTION));
        assertEquals("CCO.CI>[Na+].[H-]>CCOC", document.state().text().get(StepField.SUBSTRATE));
    }

    @Test
    void fastKeystrokesInOneFieldAreUndoneTogether() {
        for (String text : List.of("L", "LD", "LDA")) {
            clock.addAndGet(SECOND / 5);
            document.edit(document.state().text().with(StepField.BASE, text));
        }
        document.undo();
        assertEquals("NaH", document.state().text().get(StepField.BASE));
        document.redo();
        assertEquals("LDA", document.state().text().get(StepField.BASE));
    }

    @Test
    void changesInDifferentFieldsAreUndoneOneByOne() {
        document.edit(document.state().text().with(StepField.BASE, "LDA"));
        document.edit(document.state().text().with(StepField.SOLVENT, "THF"));
        document.undo();
        assertEquals("LDA", document.state().text().get(StepField.BASE));
        assertEquals("DMF", document.state().text().get(StepField.SOLVENT));
        document.undo();
        assertEquals("NaH", document.state().text().get(StepField.BASE));
        assertFalse(document.canUndo());
    }

    @Test
    void theWholeSheetComesBackAfterUndoingEverything() {
        String before = document.state().sheet().text();
        document.change(document.state().duplicated());
        document.change(document.state().moved(-1));
        document.edit(document.state().text().with(StepField.WATER, "20"));
        document.change(document.state().removed());
        while (document.canUndo()) {
            document.undo();
        }
        assertEquals(before, document.state().sheet().text());
        assertFalse(document.isModified());
    }

    @Test
    void aNewStepStandsAfterTheSelectedOneAndIsSelected() {
        document.change(document.state().duplicated());
        document.select(0);
        document.change(document.state().added());
        assertEquals(3, document.state().sheet().rows().size());
        assertEquals(1, document.state().selected());
        assertEquals("", document.state().text().get(StepField.SUBSTRATE));
    }

    @Test
    void theLastStepIsBlankedNotRemoved() {
        document.change(document.state().removed());
        assertEquals(1, document.state().sheet().rows().size());
        assertEquals("", document.state().text().get(StepField.BASE));
    }

    @Test
    void savingMakesTheSheetUnmodified() {
        document.edit(document.state().text().with(StepField.BASE, "LDA"));
        assertTrue(document.isModified());
        document.saved(Path.of("x.csv"));
        assertFalse(document.isModified());
        document.undo();
        assertTrue(document.isModified());
    }

    @Test
    void anAddedStepBeginsWithWhatThePreferencesSay() {
        StepText usual = new StepText(Map.of(StepField.SOLVENT, "THF"), "");
        SheetDocument document = new SheetDocument(StepCells.sheetOf(StepText.demo()), System::nanoTime, () -> usual);
        document.add();
        assertEquals(usual, document.state().text());
        document.undo();
        assertEquals(StepText.demo(), document.state().text());
    }
}
