package lyate.molecule;

import java.awt.Color;
import java.awt.Font;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.StreamSupport;
import org.openscience.cdk.exception.CDKException;
import org.openscience.cdk.geometry.GeometryUtil;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.layout.StructureDiagramGenerator;
import org.openscience.cdk.renderer.RendererModel;
import org.openscience.cdk.renderer.color.IAtomColorer;
import org.openscience.cdk.renderer.elements.IRenderingElement;
import org.openscience.cdk.renderer.generators.BasicSceneGenerator;
import org.openscience.cdk.renderer.generators.standard.StandardGenerator;

/** Lays a molecule out in the plane and turns it into shapes. */
final class DrawingMaker {

    private static final double POINTS_PER_BOND = 40;
    private static final double USUAL_BOND_LENGTH = 1.5;
    private static final Font SYMBOL_FONT = new Font(Font.SANS_SERIF, Font.PLAIN, 15);

    private final IAtomContainer container;

    DrawingMaker(Molecule molecule) {
        try {
            container = molecule.container().clone();
        } catch (CloneNotSupportedException e) {
            throw new IllegalStateException("the toolkit's molecules can be cloned", e);
        }
    }

    /** The molecule with places for its atoms; a copy. */
    IAtomContainer laidOut() {
        if (!hasUsableLayout()) {
            layOut();
        }
        return container;
    }

    MoleculeDrawing make() {
        laidOut();
        double bondLength = medianBondLength();
        DrawingShapes shapes = new DrawingShapes(bondLength);
        shapes.add(render(bondLength));
        List<Point2D> positions = StreamSupport.stream(container.atoms().spliterator(), false)
                .map(atom -> shapes.toDrawing(atom.getPoint2d().x, atom.getPoint2d().y)).toList();
        return new MoleculeDrawing(positions, shapes.marks(), bounds(positions, shapes.marks()));
    }

    /** A layout is usable where every atom has a place and no two atoms share one. */
    private boolean hasUsableLayout() {
        List<IAtom> atoms = new ArrayList<>();
        container.atoms().forEach(atoms::add);
        if (atoms.stream().anyMatch(atom -> atom.getPoint2d() == null)) {
            return false;
        }
        double close = medianBondLength() / 4;
        for (int i = 0; i < atoms.size(); i++) {
            for (int j = 0; j < i; j++) {
                if (atoms.get(i).getPoint2d().distance(atoms.get(j).getPoint2d()) <= close) {
                    return false;
                }
            }
        }
        return true;
    }

    private void layOut() {
        try {
            StructureDiagramGenerator generator = new StructureDiagramGenerator();
            generator.setMolecule(container, false);
            generator.generateCoordinates();
        } catch (CDKException e) {
            throw new IllegalStateException("no layout for " + container.getAtomCount() + " atoms: " + e.getMessage(), e);
        }
    }

    private double medianBondLength() {
        double[] lengths = StreamSupport.stream(container.bonds().spliterator(), false).mapToDouble(GeometryUtil::getLength2D).sorted().toArray();
        double median = lengths.length == 0 ? 0 : lengths[lengths.length / 2];
        return median > 0 ? median : USUAL_BOND_LENGTH;
    }

    private IRenderingElement render(double bondLength) {
        StandardGenerator generator = new StandardGenerator(SYMBOL_FONT);
        RendererModel model = new RendererModel();
        model.registerParameters(new BasicSceneGenerator());
        model.registerParameters(generator);
        model.set(BasicSceneGenerator.BondLength.class, POINTS_PER_BOND);
        model.set(BasicSceneGenerator.Scale.class, POINTS_PER_BOND / bondLength);
        model.set(StandardGenerator.AtomColor.class, new ElementInRed());
        model.set(StandardGenerator.StrokeRatio.class, 1.1);
        return generator.generate(container, model);
    }

    private static Rectangle2D bounds(List<Point2D> positions, List<DrawingMark> marks) {
        Rectangle2D bounds = new Rectangle2D.Double(positions.get(0).getX(), positions.get(0).getY(), 0, 0);
        positions.forEach(bounds::add);
        for (DrawingMark mark : marks) {
            Rectangle2D box = mark.shape().getBounds2D();
            double line = mark.strokeWidth();
            bounds.add(new Rectangle2D.Double(box.getX() - line / 2, box.getY() - line / 2, box.getWidth() + line, box.getHeight() + line));
        }
        return bounds;
    }

    /** Writes the atomic number where the toolkit asks for a colour, so that colours can be chosen when painting. */
    private static final class ElementInRed implements IAtomColorer {
        @Override
        public Color getAtomColor(IAtom atom) {
            return new Color(atom.getAtomicNumber(), 0, 0);
        }

        @Override
        public Color getAtomColor(IAtom atom, Color otherwise) {
            return getAtomColor(atom);
        }
    }
}
