package lyate.molecule;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.List;

/**
 * The structure formula of a molecule as vector shapes.
 *
 * <p>Drawing coordinates: one unit is the typical bond length, x to the right, y downwards. Atoms have the indices of the
 * {@link Molecule}. Immutable; safe to share between threads.
 */
public final class MoleculeDrawing {

    private final List<Point2D> positions;
    private final List<DrawingMark> marks;
    private final Rectangle2D bounds;

    MoleculeDrawing(List<Point2D> positions, List<DrawingMark> marks, Rectangle2D bounds) {
        this.positions = List.copyOf(positions);
        this.marks = List.copyOf(marks);
        this.bounds = bounds;
    }

    /** Draws a molecule; keeps the layout that came with the input where it is a usable one. */
    public static MoleculeDrawing of(Molecule molecule) {
        return new DrawingMaker(molecule).make();
    }

    /** Where an atom is; a copy. */
    public Point2D position(int atom) {
        return (Point2D) positions.get(atom).clone();
    }

    /** Number of atoms. */
    public int atomCount() {
        return positions.size();
    }

    /** The shapes, in painting order. */
    public List<DrawingMark> marks() {
        return marks;
    }

    /** What the shapes cover; a copy. */
    public Rectangle2D bounds() {
        return (Rectangle2D) bounds.clone();
    }

    /**
     * The transform that puts the drawing in the middle of an area, as large as it fits.
     *
     * @param area           where to, in device units
     * @param largestBond    bond length not to be exceeded, device units
     */
    public AffineTransform fit(Rectangle2D area, double largestBond) {
        double scale = Math.min(largestBond, Math.min(area.getWidth() / bounds.getWidth(), area.getHeight() / bounds.getHeight()));
        AffineTransform transform = AffineTransform.getTranslateInstance(area.getCenterX(), area.getCenterY());
        transform.scale(scale, scale);
        transform.translate(-bounds.getCenterX(), -bounds.getCenterY());
        return transform;
    }

    /** Paints a seam of one colour round the atom symbols, so that they stay readable over what was painted before. */
    public void paintSeam(Graphics2D graphics, AffineTransform transform, Color ground, double width) {
        Graphics2D own = (Graphics2D) graphics.create();
        own.setColor(ground);
        own.setStroke(new BasicStroke((float) (2 * width), BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND));
        marks.stream().filter(DrawingMark::filled).forEach(mark -> own.draw(transform.createTransformedShape(mark.shape())));
        own.dispose();
    }

    /** Paints onto {@code graphics}, which is left as it was. */
    public void paint(Graphics2D graphics, AffineTransform transform, DrawingColours colours) {
        Graphics2D own = (Graphics2D) graphics.create();
        double scale = Math.sqrt(Math.abs(transform.getDeterminant()));
        for (DrawingMark mark : marks) {
            Shape shape = transform.createTransformedShape(mark.shape());
            own.setColor(colours.of(mark.atomicNumber()));
            if (mark.filled()) {
                own.fill(shape);
            } else {
                own.setStroke(new BasicStroke((float) (mark.strokeWidth() * scale), BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND));
                own.draw(shape);
            }
        }
        own.dispose();
    }
}
