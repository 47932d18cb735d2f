package lyate.window;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.formdev.flatlaf.util.UIScale;
import java.awt.Color;
import java.awt.Component;
import java.awt.Container;
import java.awt.Rectangle;
import java.awt.image.BufferedImage;
import java.util.ArrayList;
import java.util.List;
import javax.swing.JLabel;
import javax.swing.SwingUtilities;
import javax.swing.UIManager;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Lays panels out and paints them without a display, at the scales people use. */
class PanelScaleTest {

    private static final int WIDTH = 1500;
    private static final int FINDINGS_WIDTH = 360;

    @AfterEach
    void usualSize() throws Exception {
        SwingUtilities.invokeAndWait(() -> UIScale.setZoomFactor(1));
    }

    @ParameterizedTest
    @CsvSource({"1,false", "1.5,true", "2,false", "3,true"})
    void noLabelOfTheStepStripIsCut(float scale, boolean dark) throws Exception {
        SwingUtilities.invokeAndWait(() -> {
            Theme theme = theme(scale, dark);
            StepStrip strip = new StepStrip(theme, Panels.engine(), StepText.demo(), text -> {}, file -> {});
            strip.setSize((int) (WIDTH * scale), strip.getPreferredSize().height);
            layOut(strip);
            paint(strip);
            assertEquals(List.of(), cutLabels(strip));
        });
    }

    @ParameterizedTest
    @CsvSource({"1,false", "1.5,true", "2,false", "3,true"})
    void theVerdictIsPaintedAndNoTextLeavesItsParent(float scale, boolean dark) throws Exception {
        SwingUtilities.invokeAndWait(() -> {
            Theme theme = theme(scale, dark);
            FindingsPanel findings = new FindingsPanel(theme, atoms -> {});
            findings.setSize((int) (FINDINGS_WIDTH * scale), (int) (900 * scale));
            findings.show(Panels.shown(StepText.demo()).review());
            for (int pass = 0; pass < 3; pass++) {
                layOut(findings);
            }
            BufferedImage image = paint(findings);
            assertTrue(share(image, theme.color("stop")) > 0.001, "the accent of a wrong site is on screen");
            assertEquals(List.of(), textsOutside(findings));
        });
    }

    @ParameterizedTest
    @CsvSource({"1,false", "1.5,true", "2,false", "3,true"})
    void theFirstStopIsInSightAboveTheSafetyNotesOnASmallScreen(float scale, boolean dark) throws Exception {
        SwingUtilities.invokeAndWait(() -> {
            Theme theme = theme(scale, dark);
            FindingsPanel findings = new FindingsPanel(theme, atoms -> {});
            findings.setSize((int) (320 * scale), (int) (450 * scale));
            findings.show(Panels.shown(StepText.demo()).review());
            for (int pass = 0; pass < 3; pass++) {
                layOut(findings);
            }
            FindingRow first = rows(findings).get(0);
            Rectangle place = SwingUtilities.convertRectangle(first.getParent(), first.getBounds(), findings);
            int safety = SwingUtilities.convertPoint(rows(findings).get(rows(findings).size() - 1).getParent(), 0, 0, findings).y;
            int line = first.getFontMetrics(UIManager.getFont("Label.font")).getHeight();
            assertTrue(safety - place.y > 3 * line, "heading and sentence of the finding end above the safety notes");
            assertTrue(findings.getHeight() - safety > 3 * line, "a safety note is in sight");
        });
    }

    @ParameterizedTest
    @CsvSource({"1,false", "1.5,true", "2,false", "3,true"})
    void noHeadOfTheTransfersIsCut(float scale, boolean dark) throws Exception {
        SwingUtilities.invokeAndWait(() -> {
            Theme theme = theme(scale, dark);
            TransfersTable transfers = new TransfersTable(theme, atoms -> {}, site -> {});
            transfers.show(Panels.shown(StepText.demo()));
            transfers.setSize((int) (WIDTH * scale), (int) (200 * scale));
            layOut(transfers);
            RowsTable table = transfers.table();
            for (int column = 0; column < table.getColumnCount(); column++) {
                int head = table.getTableHeader().getFontMetrics(table.getTableHeader().getFont()).stringWidth(table.getColumnName(column));
                assertTrue(head < table.getColumnModel().getColumn(column).getPreferredWidth(), table.getColumnName(column));
            }
        });
    }

    @ParameterizedTest
    @CsvSource({"1,false", "1.5,true", "2,false", "3,true"})
    void anEmptyWindowOffersExamplesThatAreNotCut(float scale, boolean dark) throws Exception {
        SwingUtilities.invokeAndWait(() -> {
            Theme theme = theme(scale, dark);
            EmptyView empty = new EmptyView(theme, example -> {});
            empty.setSize((int) (700 * scale), (int) (400 * scale));
            layOut(empty);
            assertEquals(List.of(), cutLabels(empty));
            for (Component child : empty.getComponents()) {
                assertTrue(new Rectangle(empty.getSize()).contains(child.getBounds()), child.toString());
            }
        });
    }

    private static List<FindingRow> rows(Container parent) {
        List<FindingRow> found = new ArrayList<>();
        for (Component child : parent.getComponents()) {
            if (child instanceof FindingRow row) {
                found.add(row);
            } else if (child instanceof Container container) {
                found.addAll(rows(container));
            }
        }
        return found;
    }

    private static Theme theme(float scale, boolean dark) {
        Theme theme = new Theme(dark);
        theme.install();
        UIScale.setZoomFactor(scale);
        return theme;
    }

    /** What validate does for a component on screen. */
    private static void layOut(Container parent) {
        parent.doLayout();
        for (Component child : parent.getComponents()) {
            if (child instanceof Container container) {
                layOut(container);
            }
        }
    }

    private static BufferedImage paint(Component component) {
        BufferedImage image = new BufferedImage(component.getWidth(), component.getHeight(), BufferedImage.TYPE_INT_RGB);
        component.paint(image.createGraphics());
        return image;
    }

    private static double share(BufferedImage image, Color wanted) {
        long hits = 0;
        for (int x = 0; x < image.getWidth(); x++) {
            for (int y = 0; y < image.getHeight(); y++) {
                hits += (image.getRGB(x, y) & 0xffffff) == (wanted.getRGB() & 0xffffff) ? 1 : 0;
            }
        }
        return (double) hits / image.getWidth() / image.getHeight();
    }

    private static List<String> cutLabels(Container parent) {
        List<String> cut = new ArrayList<>();
        for (Component child : parent.getComponents()) {
            if (child instanceof JLabel label && label.getPreferredSize().width > label.getWidth()) {
                cut.add(label.getText());
            } else if (child instanceof Container container) {
                cut.addAll(cutLabels(container));
            }
        }
        return cut;
    }

    private static List<String> textsOutside(Container parent) {
        List<String> outside = new ArrayList<>();
        for (Component child : parent.getComponents()) {
            boolean inside = new Rectangle(0, 0, parent.getWidth(), parent.getHeight()).contains(child.getBounds());
            boolean tallEnough = child.getHeight() >= child.getPreferredSize().height;
            if (child instanceof WrappedText text && child.isVisible() && !(inside && tallEnough)) {
                outside.add(text.getText());
            } else if (child instanceof Container container && child.isVisible()) {
                outside.addAll(textsOutside(container));
            }
        }
        return outside;
    }
}
