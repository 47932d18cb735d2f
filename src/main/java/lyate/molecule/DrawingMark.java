package lyate.molecule;

import java.awt.Shape;

/**
 * One mark of a drawing: a bond line or the outline of an atom symbol.
 *
 * @param shape        outline in drawing coordinates; nobody may change it
 * @param strokeWidth  line width in bond lengths; 0 for a filled shape
 * @param atomicNumber element whose colour it has; 6 for bonds
 */
public record DrawingMark(Shape shape, double strokeWidth, int atomicNumber) {

    /** Whether the shape is filled and not stroked. */
    public boolean filled() {
        return strokeWidth == 0;
    }
}
