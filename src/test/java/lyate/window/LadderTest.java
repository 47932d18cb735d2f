package lyate.window;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Dimension;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Point2D;
import java.awt.image.BufferedImage;
import java.util.List;
import java.util.Optional;
import lyate.report.Ladder;
import lyate.report.LetteredSite;
import lyate.report.Rung;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class LadderTest {

    private static final Palette PALETTE = Palette.load(false);
    private final Shown demo = Panels.shown(StepText.demo());

    @Test
    void theGapBetweenSiteAndBaseOnTheAxisIsLogKAtRoomTemperature() {
        Ladder ladder = Panels.ladder(demo).orElseThrow();
        assertEquals(demo.review().logK() * 273.15 / 298.15, ladder.basePKa() - ladder.intended().orElseThrow().pKa(), 1e-9);
    }

    @Test
    void siteLettersRiseWithPKa() {
        List<LetteredSite> sites = demo.tags().sites();
        assertEquals("A", sites.get(0).letter());
        for (int i = 1; i < sites.size(); i++) {
            assertTrue(sites.get(i).transfer().acidity().pKa() >= sites.get(i - 1).transfer().acidity().pKa());
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {1, 1.5, 2, 3})
    void labelsKeepClearOfEachOtherAtEveryScale(double scale) {
        Dimension size = new Dimension((int) (520 * scale), (int) (560 * scale));
        Font font = new Font(Font.DIALOG, Font.PLAIN, (int) (13 * scale));
        for (boolean left : new boolean[] {true, false}) {
            List<LadderLabel> labels = picture(size, font).labels().stream().filter(label -> label.rung().left() == left).toList();
            assertFalse(labels.isEmpty());
            for (int i = 1; i < labels.size(); i++) {
                assertTrue(labels.get(i).y() - labels.get(i - 1).y() >= font.getSize(), labels.get(i - 1) + " and " + labels.get(i));
            }
        }
    }

    @Test
    void theIntendedSiteAndTheBaseKeepTheirLabelsWhereRoomIsShort() {
        List<LadderLabel> labels = picture(new Dimension(500, 150), new Font(Font.DIALOG, Font.PLAIN, 13)).labels();
        assertTrue(labels.stream().anyMatch(label -> label.rung().intended()));
        assertTrue(labels.stream().anyMatch(label -> label.rung().kind() == Rung.Kind.BASE));
    }

    @Test
    void aSiteIsFoundUnderThePointer() {
        LadderPicture picture = picture(new Dimension(520, 560), new Font(Font.DIALOG, Font.PLAIN, 13));
        LadderLabel intended = picture.labels().stream().filter(label -> label.rung().intended()).findFirst().orElseThrow();
        assertEquals(Optional.of("N7"), picture.rungAt(new Point2D.Double(60, intended.y())).map(Rung::name));
    }

    private LadderPicture picture(Dimension size, Font font) {
        Graphics2D g = new BufferedImage(size.width, size.height, BufferedImage.TYPE_INT_RGB).createGraphics();
        LadderPicture picture = new LadderPicture(Panels.ladder(demo).orElseThrow(), PALETTE, font, size, g);
        picture.paint(g, Optional.empty());
        return picture;
    }
}
