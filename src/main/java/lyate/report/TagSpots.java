package lyate.report;

import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;

/**
 * Finds a place for every tag near its atom: off atoms, symbols and other tags, off bonds where possible, pointing away
 * from the molecule. px.
 *
 * @param area    where tags may be
 * @param atoms   atom positions
 * @param bonds   bond lines
 * @param symbols boxes of atom symbols
 * @param ring    radius kept clear round atoms
 */
record TagSpots(Rectangle2D area, List<Point2D> atoms, List<Line2D> bonds, List<Rectangle2D> symbols, double ring) {

    private static final int DIRECTIONS = 24;
    private static final double[] REACH = {1.2, 1.8, 2.8, 4.2, 6, 8.5};
    private static final double PER_BOND = 4;
    private static final double PER_TURN = 0.8;
    private static final double PER_CLASH = 40;

    /** The best box of that size for an atom, given the boxes taken already. */
    Rectangle2D find(int atom, double width, double height, List<Rectangle2D> taken) {
        double outward = outward(atom);
        Rectangle2D best = null;
        double lowest = Double.POSITIVE_INFINITY;
        for (double reach : REACH) {
            for (int i = 0; i < DIRECTIONS; i++) {
                double turn = i * 2 * Math.PI / DIRECTIONS - Math.PI;
                Rectangle2D box = box(atoms.get(atom), outward + turn, reach * ring, width, height);
                double cost = reach + PER_TURN * Math.abs(turn) + cost(box, taken);
                if (cost < lowest) {
                    lowest = cost;
                    best = box;
                }
            }
        }
        return best;
    }

    private double cost(Rectangle2D box, List<Rectangle2D> taken) {
        long clashes = atoms.stream().filter(other -> distance(box, other) < ring).count()
                + symbols.stream().filter(box::intersects).count() + taken.stream().filter(box::intersects).count()
                + (area.contains(box) ? 0 : 3);
        return PER_CLASH * clashes + PER_BOND * bonds.stream().filter(bond -> bond.intersects(box)).count();
    }

    /** Away from the neighbours, or from the middle of the molecule where they balance. */
    private double outward(int atom) {
        Point2D at = atoms.get(atom);
        List<Point2D> near = new ArrayList<>();
        for (Line2D bond : bonds) {
            if (bond.ptSegDist(at) < ring / 3) {
                near.add(bond.getP1().distance(at) > bond.getP2().distance(at) ? bond.getP1() : bond.getP2());
            }
        }
        double x = near.stream().mapToDouble(other -> at.getX() - other.getX()).sum();
        double y = near.stream().mapToDouble(other -> at.getY() - other.getY()).sum();
        return Math.hypot(x, y) < ring / 2 ? Math.atan2(at.getY() - area.getCenterY(), at.getX() - area.getCenterX()) : Math.atan2(y, x);
    }

    private static Rectangle2D box(Point2D point, double angle, double distance, double width, double height) {
        double x = point.getX() + Math.cos(angle) * (distance + width / 2) - width / 2;
        double y = point.getY() + Math.sin(angle) * (distance + height / 2) - height / 2;
        return new Rectangle2D.Double(x, y, width, height);
    }

    private static double distance(Rectangle2D box, Point2D point) {
        double dx = Math.max(0, Math.max(box.getMinX() - point.getX(), point.getX() - box.getMaxX()));
        double dy = Math.max(0, Math.max(box.getMinY() - point.getY(), point.getY() - box.getMaxY()));
        return Math.hypot(dx, dy);
    }
}
