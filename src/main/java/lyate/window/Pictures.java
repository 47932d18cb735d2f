package lyate.window;

import java.awt.Dimension;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.AffineTransform;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import javax.imageio.ImageIO;
import javax.swing.UIManager;
import lyate.molecule.MoleculeSvg;

/** Pictures of the substrate for elsewhere. */
final class Pictures {

    /** Twice the size on screen, so that print and slides stay crisp. */
    private static final int ENLARGED = 2;
    private static final double SVG_BOND = 40;

    private Pictures() {}

    static BufferedImage image(Shown shown, Palette palette, Dimension size) {
        BufferedImage image = new BufferedImage(size.width * ENLARGED, size.height * ENLARGED, BufferedImage.TYPE_INT_RGB);
        Graphics2D g = image.createGraphics();
        g.setColor(palette.color("ground"));
        g.fillRect(0, 0, image.getWidth(), image.getHeight());
        g.scale(ENLARGED, ENLARGED);
        g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
        Font font = UIManager.getFont("Label.font");
        g.setFont(font);
        new SubstratePicture(shown, palette, font, size, new AffineTransform(), g).paint(g, List.of(), Optional.empty());
        g.dispose();
        return image;
    }

    /** The ending of the name decides: {@code .svg} the bare structure as vectors, {@code .png} the picture with its tags. */
    static void save(Shown shown, Palette palette, Dimension size, Path file) throws IOException {
        String name = file.getFileName().toString().toLowerCase(Locale.ROOT);
        if (name.endsWith(".svg")) {
            Files.writeString(file, MoleculeSvg.write(shown.drawing(), palette.drawing(), SVG_BOND));
        } else if (name.endsWith(".png")) {
            ImageIO.write(image(shown, palette, size), "png", file.toFile());
        } else {
            throw new IOException("'" + file.getFileName() + "' ends neither in .svg nor in .png");
        }
    }
}
