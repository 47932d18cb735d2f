package lyate.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.AffineTransform;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.StringReader;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.xml.sax.InputSource;

class MoleculeDrawingTest {

    private static final String[] SHAPES = {"C", "[Na+].[O-]C(=O)C", "CC(=O)Nc1ccc(O)cc1", "C[C@H](N)C(=O)O",
        "C1CC2CCC1C2", "[13CH3]O", "F/C=C/F", "c1ccc2[nH]ccc2c1"};

    @Test
    void bondedAtomsLieAboutOneBondLengthApart() throws MoleculeException {
        Molecule molecule = new MoleculeReader().read("CC(=O)Nc1ccc(O)cc1");
        MoleculeDrawing drawing = MoleculeDrawing.of(molecule);
        for (int atom = 0; atom < molecule.atomCount(); atom++) {
            for (int other : molecule.neighbours(atom)) {
                assertEquals(1, drawing.position(atom).distance(drawing.position(other)), 0.1,
                        molecule.label(atom) + "-" + molecule.label(other));
            }
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {1, 1.5, 2, 3})
    void everyDrawingStaysInsideTheAreaItIsFittedTo(double scale) throws MoleculeException {
        for (String smiles : SHAPES) {
            Rectangle2D area = new Rectangle2D.Double(10 * scale, 10 * scale, 180 * scale, 100 * scale);
            BufferedImage image = new BufferedImage((int) (200 * scale), (int) (120 * scale), BufferedImage.TYPE_INT_RGB);
            Graphics2D graphics = image.createGraphics();
            MoleculeDrawing drawing = MoleculeDrawing.of(new MoleculeReader().read(smiles));
            drawing.paint(graphics, drawing.fit(area, 40 * scale), DrawingColours.plain(Color.WHITE));
            int inside = 0;
            int outside = 0;
            for (int x = 0; x < image.getWidth(); x++) {
                for (int y = 0; y < image.getHeight(); y++) {
                    boolean marked = (image.getRGB(x, y) & 0xff) > 0;
                    boolean within = area.getBounds2D().createUnion(area).intersects(x - 1, y - 1, 3, 3);
                    inside += marked && within ? 1 : 0;
                    outside += marked && !within ? 1 : 0;
                }
            }
            assertTrue(inside > 20, smiles + " leaves marks");
            assertEquals(0, outside, smiles + " stays inside");
        }
    }

    @Test
    void aHeteroatomIsPaintedInItsOwnColourAndBondsInThatOfCarbon() throws MoleculeException {
        MoleculeDrawing drawing = MoleculeDrawing.of(new MoleculeReader().read("CCO"));
        assertTrue(drawing.marks().stream().anyMatch(mark -> mark.atomicNumber() == 8 && mark.filled()));
        assertTrue(drawing.marks().stream().anyMatch(mark -> mark.atomicNumber() == 6 && !mark.filled()));
    }

    @Test
    void drawingDoesNotTouchTheMolecule() throws MoleculeException {
        Molecule molecule = new MoleculeReader().read("CCO");
        MoleculeDrawing.of(molecule);
        assertEquals(null, molecule.container().getAtom(0).getPoint2d());
    }

    @Test
    void svgIsWellFormedAndHoldsEveryMark() throws Exception {
        MoleculeDrawing drawing = MoleculeDrawing.of(new MoleculeReader().read("CC(=O)Nc1ccc(O)cc1"));
        String svg = MoleculeSvg.write(drawing, DrawingColours.plain(Color.BLACK), 30);
        var document = DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(new InputSource(new StringReader(svg)));
        assertEquals(drawing.marks().size(), document.getElementsByTagName("path").getLength());
    }

    @Test
    void fittingNeverExceedsTheLargestBond() throws MoleculeException {
        MoleculeDrawing drawing = MoleculeDrawing.of(new MoleculeReader().read("CO"));
        AffineTransform fit = drawing.fit(new Rectangle2D.Double(0, 0, 1000, 1000), 40);
        assertEquals(40, fit.getScaleX(), 1e-9);
    }
}
