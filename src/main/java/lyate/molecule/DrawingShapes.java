package lyate.molecule;

import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import java.util.ArrayList;
import java.util.List;
import org.openscience.cdk.renderer.elements.Bounds;
import org.openscience.cdk.renderer.elements.ElementGroup;
import org.openscience.cdk.renderer.elements.GeneralPath;
import org.openscience.cdk.renderer.elements.IRenderingElement;
import org.openscience.cdk.renderer.elements.LineElement;
import org.openscience.cdk.renderer.elements.MarkedElement;
import org.openscience.cdk.renderer.elements.path.PathElement;

/** Turns the toolkit's rendering elements (y upwards, its own unit) into marks (y downwards, bond length 1). */
final class DrawingShapes {

    private final AffineTransform toDrawing;
    private final double unit;
    private final List<DrawingMark> marks = new ArrayList<>();

    DrawingShapes(double bondLength) {
        this.unit = 1 / bondLength;
        this.toDrawing = AffineTransform.getScaleInstance(unit, -unit);
    }

    List<DrawingMark> marks() {
        return marks;
    }

    Point2D toDrawing(double x, double y) {
        return toDrawing.transform(new Point2D.Double(x, y), null);
    }

    void add(IRenderingElement element) {
        if (element instanceof ElementGroup group) {
            group.forEach(this::add);
        } else if (element instanceof MarkedElement marked) {
            add(marked.element());
        } else if (element instanceof Bounds box) {
            add(box.root());
        } else if (element instanceof LineElement line) {
            Shape shape = new Line2D.Double(line.firstPointX, line.firstPointY, line.secondPointX, line.secondPointY);
            add(shape, line.width * unit, line.color.getRed());
        } else if (element instanceof GeneralPath path) {
            add(shapeOf(path), path.fill ? 0 : path.stroke * unit, path.color.getRed());
        } else {
            throw new IllegalStateException("a mark of unknown kind: " + element.getClass().getName());
        }
    }

    private void add(Shape shape, double strokeWidth, int atomicNumber) {
        marks.add(new DrawingMark(toDrawing.createTransformedShape(shape), strokeWidth, atomicNumber));
    }

    private static Shape shapeOf(GeneralPath path) {
        Path2D shape = new Path2D.Double(path.winding == GeneralPath.WIND_EVEN_ODD ? Path2D.WIND_EVEN_ODD : Path2D.WIND_NON_ZERO);
        double[] p = new double[6];
        for (PathElement element : path.elements) {
            element.points(p);
            switch (element.type()) {
                case MoveTo -> shape.moveTo(p[0], p[1]);
                case LineTo -> shape.lineTo(p[0], p[1]);
                case QuadTo -> shape.quadTo(p[0], p[1], p[2], p[3]);
                case CubicTo -> shape.curveTo(p[0], p[1], p[2], p[3], p[4], p[5]);
                case Close -> shape.closePath();
            }
        }
        return shape;
    }
}
