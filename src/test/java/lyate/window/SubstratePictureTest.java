package lyate.window;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Dimension;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.AffineTransform;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.List;
import java.util.Optional;
import lyate.window.TagPlacer.Placed;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SubstratePictureTest {

    @ParameterizedTest
    @CsvSource({"1,CCO", "1.5,CC(=O)CC(=O)OCC", "2,O=C(C1CCC1)Nc1ccc(C)c(O)c1", "3,OCC(O)C(O)C(O)C(O)CO",
        "1,CC(C)CC(NC(=O)C(CC(N)=O)NC(=O)C(Cc1ccc(O)cc1)NC(=O)C(C)N)C(=O)NC(CO)C(=O)NC(Cc1c[nH]cn1)C(=O)NC(CS)C(=O)NCC(=O)O"})
    void tagsStayInsideAndNeverOverlap(double scale, String smiles) {
        Dimension size = new Dimension((int) (560 * scale), (int) (560 * scale));
        List<Placed> placed = picture(smiles, size, scale).placed();
        assertFalse(placed.isEmpty());
        for (int i = 0; i < placed.size(); i++) {
            Rectangle2D box = placed.get(i).box();
            assertTrue(new Rectangle2D.Double(0, 0, size.width, size.height).contains(box), placed.get(i).tag().label());
            for (int j = 0; j < i; j++) {
                assertFalse(box.intersects(placed.get(j).box()), placed.get(i).tag().label() + " and " + placed.get(j).tag().label());
            }
        }
    }

    @Test
    void theIntendedSiteAlwaysCarriesItsValue() {
        List<Placed> placed = picture("O=C(C1CCC1)Nc1ccc(C)c(O)c1", new Dimension(300, 260), 1).placed();
        assertTrue(placed.stream().anyMatch(tag -> tag.tag().intended() && tag.full()));
    }

    @Test
    void aTagIsFoundUnderThePointer() {
        SubstratePicture picture = picture("CCO", new Dimension(400, 300), 1);
        Placed tag = picture.placed().get(0);
        Point2D middle = new Point2D.Double(tag.box().getCenterX(), tag.box().getCenterY());
        assertEquals(Optional.of(tag.tag()), picture.siteAt(middle));
        assertEquals(Optional.empty(), picture.siteAt(new Point2D.Double(1, 1)));
    }

    private static SubstratePicture picture(String smiles, Dimension size, double scale) {
        Shown shown = Panels.shown(StepText.demo().with(StepField.SUBSTRATE, smiles).withSite(""));
        Graphics2D g = new BufferedImage(size.width, size.height, BufferedImage.TYPE_INT_RGB).createGraphics();
        Font font = new Font(Font.DIALOG, Font.PLAIN, (int) (13 * scale));
        g.setFont(font);
        SubstratePicture picture = new SubstratePicture(shown, Palette.load(false), font, size, new AffineTransform(), g);
        picture.paint(g, List.of(), Optional.empty());
        return picture;
    }
}
