package lyate.window;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Color;
import java.awt.Dimension;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Path;
import java.util.Optional;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import lyate.report.Ladder;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.rendering.PDFRenderer;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class PicturesTest {

    private static final Dimension SIZE = new Dimension(520, 480);
    private final Palette palette = Palette.load(false);

    @Test
    void aPngIsTwiceAsLargeAsOnScreen(@TempDir Path folder) throws IOException {
        Path file = folder.resolve("ladder.png");
        Pictures.save(ladder(), file);
        BufferedImage image = ImageIO.read(file.toFile());
        assertEquals(2 * SIZE.width, image.getWidth());
        assertTrue(inked(image) > 1000);
    }

    @Test
    void anSvgIsWellFormedAndHoldsOutlinesInPlaceOfText(@TempDir Path folder) throws Exception {
        Path file = folder.resolve("ladder.SVG");
        Pictures.save(ladder(), file);
        DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
        factory.setFeature("http://apache.org/xml/features/nonvalidating/load-external-dtd", false);
        var document = factory.newDocumentBuilder().parse(file.toFile());
        assertTrue(document.getElementsByTagName("path").getLength() > 20);
        assertEquals(0, document.getElementsByTagName("text").getLength());
    }

    @Test
    void aPdfShowsWhatTheScreenShows(@TempDir Path folder) throws IOException {
        Path file = folder.resolve("ladder.pdf");
        Pictures.save(ladder(), file);
        try (PDDocument document = Loader.loadPDF(file.toFile())) {
            assertEquals(1, document.getNumberOfPages());
            BufferedImage page = new PDFRenderer(document).renderImage(0, 2);
            double screen = inked(Pictures.image(ladder()));
            assertEquals(1, inked(page) / screen, 0.15);
        }
    }

    @Test
    void anotherEndingIsRefusedInWords(@TempDir Path folder) {
        IOException refusal = assertThrows(IOException.class, () -> Pictures.save(ladder(), folder.resolve("ladder.bmp")));
        assertTrue(refusal.getMessage().contains(".svg"), refusal.getMessage());
    }

    private Picture ladder() {
        Ladder ladder = Panels.ladder(Panels.shown(StepText.demo())).orElseThrow();
        return new Picture("acidity-ladder", SIZE, Color.WHITE,
                g -> new LadderPicture(ladder, palette, g.getFont(), SIZE, g).paint(g, Optional.empty()));
    }

    /** Pixels that are clearly not the ground. */
    private static int inked(BufferedImage image) {
        int count = 0;
        for (int x = 0; x < image.getWidth(); x++) {
            for (int y = 0; y < image.getHeight(); y++) {
                Color colour = new Color(image.getRGB(x, y));
                count += colour.getRed() + colour.getGreen() + colour.getBlue() < 600 ? 1 : 0;
            }
        }
        return count;
    }
}
