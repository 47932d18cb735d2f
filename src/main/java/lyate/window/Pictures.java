package lyate.window;

import de.rototor.pdfbox.graphics2d.PdfBoxGraphics2D;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import javax.imageio.ImageIO;
import javax.swing.UIManager;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.w3c.dom.Document;

/** Makes images and files of pictures. Letters become outlines in SVG, so that a file looks the same everywhere. */
final class Pictures {

    /** Twice the size on screen, so that print and slides stay crisp. */
    private static final int ENLARGED = 2;
    private static final String SVG_SPACE = "http://www.w3.org/2000/svg";

    private Pictures() {}

    static BufferedImage image(Picture picture) {
        BufferedImage image = new BufferedImage(picture.size().width * ENLARGED, picture.size().height * ENLARGED, BufferedImage.TYPE_INT_RGB);
        Graphics2D g = image.createGraphics();
        g.scale(ENLARGED, ENLARGED);
        g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
        paint(picture, g);
        return image;
    }

    private static void paint(Picture picture, Graphics2D g) {
        Font font = UIManager.getFont("Label.font");
        g.setColor(picture.ground());
        g.fillRect(0, 0, picture.size().width, picture.size().height);
        g.setFont(font);
        picture.painter().accept(g);
        g.dispose();
    }

    /**
     * The ending of the name decides the kind: {@code .png}, {@code .svg} or {@code .pdf}.
     *
     * @throws IOException where the ending is another, or the file cannot be written
     */
    static void save(Picture picture, Path file) throws IOException {
        String name = file.getFileName().toString().toLowerCase(Locale.ROOT);
        if (name.endsWith(".svg")) {
            svg(picture, file);
        } else if (name.endsWith(".pdf")) {
            pdf(picture, file);
        } else if (name.endsWith(".png")) {
            ImageIO.write(image(picture), "png", file.toFile());
        } else {
            throw new IOException("'" + file.getFileName() + "' ends neither in .png nor in .svg nor in .pdf");
        }
    }

    private static void svg(Picture picture, Path file) throws IOException {
        Document document = emptyDocument();
        SVGGraphics2D g = new SVGGraphics2D(SVGGeneratorContext.createDefault(document), true);
        g.setSVGCanvasSize(picture.size());
        paint(picture, g);
        try (var writer = Files.newBufferedWriter(file, StandardCharsets.UTF_8)) {
            g.stream(writer, false);
        }
    }

    private static Document emptyDocument() {
        try {
            return DocumentBuilderFactory.newDefaultNSInstance().newDocumentBuilder().getDOMImplementation().createDocument(SVG_SPACE, "svg", null);
        } catch (ParserConfigurationException e) {
            throw new IllegalStateException("every Java can make an XML document", e);
        }
    }

    private static void pdf(Picture picture, Path file) throws IOException {
        int width = picture.size().width;
        int height = picture.size().height;
        try (PDDocument document = new PDDocument()) {
            PDPage page = new PDPage(new PDRectangle(width, height));
            document.addPage(page);
            PdfBoxGraphics2D g = new PdfBoxGraphics2D(document, width, height);
            paint(picture, g);
            try (PDPageContentStream content = new PDPageContentStream(document, page)) {
                content.drawForm(g.getXFormObject());
            }
            document.save(file.toFile());
        }
    }
}
