package lyate.window;

import static lyate.window.Driver.onEventThread;
import static lyate.window.Driver.press;
import static lyate.window.Driver.type;
import static lyate.window.Driver.waitFor;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeFalse;

import java.awt.GraphicsEnvironment;
import java.awt.event.KeyEvent;
import java.util.List;
import javax.swing.JFrame;
import javax.swing.JTextField;
import lyate.review.Step;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** What can be done without a mouse; needs a display, for example Xvfb. */
class KeyboardTest {

    private JFrame frame;
    private Workbench bench;

    @BeforeEach
    void openWindow() throws Exception {
        assumeFalse(GraphicsEnvironment.isHeadless(), "the window needs a display");
        onEventThread(() -> {
            Theme theme = new Theme(false);
            theme.install();
            bench = new Workbench(theme, Panels.engine(), Panels.document(StepText.demo()));
            frame = new JFrame();
            frame.setContentPane(bench);
            frame.setSize(1500, 920);
            frame.setVisible(true);
            return null;
        });
        waitFor("a review", () -> bench.shown().isPresent());
    }

    @AfterEach
    void closeWindow() throws Exception {
        if (frame != null) {
            onEventThread(() -> {
                bench.close();
                frame.dispose();
                return null;
            });
        }
    }

    @Test
    void aBaseIsFoundByPartOfItsNameAndTakenWithEnter() throws Exception {
        JTextField field = focused(StepField.BASE);
        onEventThread(() -> {
            field.selectAll();
            return null;
        });
        type(field, "hmds");
        Suggestions offers = bench.strip().suggestions(StepField.BASE);
        waitFor("offers", offers::isOpen);
        List<Suggestions.Hit> hits = onEventThread(offers::offered);
        assertTrue(hits.stream().allMatch(hit -> hit.value().startsWith("pKaH")), hits.toString());
        int wanted = hits.stream().map(Suggestions.Hit::name).toList().indexOf("LiHMDS");
        for (int i = 0; i <= wanted; i++) {
            press(field, KeyEvent.VK_DOWN);
        }
        press(field, KeyEvent.VK_ENTER);
        assertEquals("LiHMDS", onEventThread(field::getText));
        assertFalse(onEventThread(offers::isOpen));
        waitFor("the base", () -> step().base().id().equals("lihmds"));
    }

    @Test
    void aSolventIsFoundByItsAbbreviationAndEscapeClosesTheOffers() throws Exception {
        JTextField field = focused(StepField.SOLVENT);
        onEventThread(() -> {
            field.selectAll();
            return null;
        });
        type(field, "meth");
        Suggestions offers = bench.strip().suggestions(StepField.SOLVENT);
        waitFor("offers", offers::isOpen);
        assertTrue(onEventThread(offers::offered).stream().anyMatch(hit -> hit.name().equals("methanol") && hit.value().equals("bp 65 \u00b0C")));
        press(field, KeyEvent.VK_ESCAPE);
        assertFalse(onEventThread(offers::isOpen));
        assertEquals("meth", onEventThread(field::getText));
    }

    @Test
    void arrowsMoveANumberFromWhatAnEmptyFieldStandsFor() throws Exception {
        JTextField field = focused(StepField.CONCENTRATION);
        press(field, KeyEvent.VK_UP);
        assertEquals("0.25", onEventThread(field::getText));
        waitFor("the concentration", () -> step().concentrationMolar() == 0.25);
    }

    @Test
    void theCardOfASiteOpensAndClosesWithTheKeyboard() throws Exception {
        SubstrateView view = bench.substrate();
        focus(view);
        waitFor("a painted picture", () -> view.placeOf("O14").isPresent());
        press(view, KeyEvent.VK_RIGHT);
        press(view, KeyEvent.VK_I);
        assertTrue(onEventThread(view::showsCard));
        press(view, KeyEvent.VK_ESCAPE);
        assertFalse(onEventThread(view::showsCard));
    }

    @Test
    void theFirstSiteOfTheDrawingIsChosenWithArrowAndEnter() throws Exception {
        SubstrateView view = bench.substrate();
        focus(view);
        press(view, KeyEvent.VK_RIGHT);
        press(view, KeyEvent.VK_ENTER);
        waitFor("the phenol", () -> bench.shown().orElseThrow().review().intendedSite().equals("O14"));
    }

    @Test
    void theLowestRungOfTheLadderIsChosenWithArrowAndEnter() throws Exception {
        focus(bench.ladder());
        press(bench.ladder(), KeyEvent.VK_UP);
        press(bench.ladder(), KeyEvent.VK_ENTER);
        waitFor("the phenol", () -> bench.shown().orElseThrow().review().intendedSite().equals("O14"));
    }

    @Test
    void aBaseTickedInTheBaseChoiceStandsOnTheLadderUntilDeleted() throws Exception {
        onEventThread(() -> {
            bench.drawer().setSelectedComponent(bench.drawer().choice());
            return null;
        });
        RowsTable table = bench.drawer().choice().table();
        waitFor("the ranking", () -> bench.isSettled() && table.getRowCount() > 100);
        int ticks = BaseChoiceModel.Column.LADDER.ordinal();
        int other = onEventThread(() -> row(table, "DBU"));
        onEventThread(() -> {
            assertTrue(table.isCellEditable(other, ticks));
            table.setValueAt(true, other, ticks);
            return null;
        });
        assertEquals(List.of("DBU"), onEventThread(() -> bench.ladder().compared().stream().map(base -> base.shortName()).toList()));
        assertEquals(true, onEventThread(() -> table.getValueAt(other, ticks)));
        onEventThread(() -> {
            table.setValueAt(false, other, ticks);
            return null;
        });
        assertEquals(List.of(), onEventThread(() -> bench.ladder().compared()));
    }

    @Test
    void transfersAreCopiedAsTheyAreWritten() throws Exception {
        RowsTable table = bench.drawer().transfers().table();
        String text = onEventThread(() -> {
            table.setRowSelectionInterval(0, 0);
            return table.selectedText();
        });
        String[] lines = text.split("\n");
        assertEquals(2, lines.length);
        assertTrue(lines[0].startsWith("Site\tDonor\tpKa"), text);
        assertTrue(lines[1].startsWith("A\tO14\t18.0\t"), text);
    }

    private static int row(RowsTable table, String base) {
        for (int row = 0; row < table.getRowCount(); row++) {
            if (table.getValueAt(row, BaseChoiceModel.Column.BASE.ordinal()).equals(base)) {
                return row;
            }
        }
        throw new AssertionError(base + " is not ranked");
    }

    private Step step() {
        return bench.shown().orElseThrow().review().step();
    }

    private JTextField focused(StepField field) throws Exception {
        JTextField text = bench.strip().box(field).field();
        focus(text);
        return text;
    }

    private static void focus(javax.swing.JComponent component) throws Exception {
        onEventThread(component::requestFocusInWindow);
        waitFor("the focus", component::isFocusOwner);
    }
}
