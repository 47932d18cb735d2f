package lyate.window;

import java.awt.geom.Dimension2D;
import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import lyate.report.LetteredSite;

/**
 * Finds a place near its atom for every tag, most important tag first: inside the area, off atoms, bonds and other tags.
 * A tag that finds no free place in full is asked for again as a letter alone, then left out.
 *
 * @param area  where tags may be
 * @param atoms atom positions
 * @param bonds bond lines
 * @param symbols boxes of atom symbols
 * @param ring  radius kept clear round atoms
 */
record TagPlacer(Rectangle2D area, List<Point2D> atoms, List<Line2D> bonds, List<Rectangle2D> symbols,
                 double ring) {

    private static final int DIRECTIONS = 24;
    private static final double[] REACH = {0.15, 0.7, 1.5, 2.6, 4.2};
    private static final double BOND_COST = 3;
    private static final double TURN_COST = 0.6;

    /** What is to be placed: a tag at an atom, in full size and as a letter; a letter alone where {@code full} is null. */
    record Wish(LetteredSite tag, Dimension2D full, Dimension2D letter) {}

    /** Where it came to be. */
    record Placed(LetteredSite tag, Rectangle2D box, boolean full) {}

    List<Placed> place(List<Wish> wishes) {
        List<Placed> placed = new ArrayList<>();
        for (Wish wish : wishes) {
            Optional<Rectangle2D> box = wish.full() == null ? Optional.empty() : best(wish.tag().atom(), wish.full(), placed);
            if (box.isPresent()) {
                placed.add(new Placed(wish.tag(), box.get(), true));
            } else {
                best(wish.tag().atom(), wish.letter(), placed).ifPresent(small -> placed.add(new Placed(wish.tag(), small, false)));
            }
        }
        return placed;
    }

    private Optional<Rectangle2D> best(int atom, Dimension2D size, List<Placed> placed) {
        Point2D at = atoms.get(atom);
        double outward = outward(atom);
        Rectangle2D best = null;
        double lowest = Double.POSITIVE_INFINITY;
        for (double reach : REACH) {
            for (int i = 0; i < DIRECTIONS; i++) {
                double turn = i * 2 * Math.PI / DIRECTIONS - Math.PI;
                Rectangle2D box = boxAt(at, outward + turn, ring * (1 + reach), size);
                if (area.contains(box) && isFree(box, placed)) {
                    double cost = reach + TURN_COST * Math.abs(turn) + BOND_COST * crossings(box);
                    if (cost < lowest) {
                        lowest = cost;
                        best = box;
                    }
                }
            }
        }
        return Optional.ofNullable(best);
    }

    /** The direction away from the neighbours, or from the middle of the molecule where they balance. */
    private double outward(int atom) {
        Point2D at = atoms.get(atom);
        double x = 0;
        double y = 0;
        for (Line2D bond : bonds) {
            if (bond.getP1().equals(at)) {
                x += at.getX() - bond.getX2();
                y += at.getY() - bond.getY2();
            } else if (bond.getP2().equals(at)) {
                x += at.getX() - bond.getX1();
                y += at.getY() - bond.getY1();
            }
        }
        if (Math.hypot(x, y) < ring / 4) {
            x = at.getX() - area.getCenterX();
            y = at.getY() - area.getCenterY();
        }
        return Math.atan2(y, x);
    }

    /** The box whose nearest edge lies {@code distance} from the point, in a direction. */
    private static Rectangle2D boxAt(Point2D point, double angle, double distance, Dimension2D size) {
        double centreX = point.getX() + Math.cos(angle) * (distance + size.getWidth() / 2);
        double centreY = point.getY() + Math.sin(angle) * (distance + size.getHeight() / 2);
        return new Rectangle2D.Double(centreX - size.getWidth() / 2, centreY - size.getHeight() / 2, size.getWidth(), size.getHeight());
    }

    private boolean isFree(Rectangle2D box, List<Placed> placed) {
        double clear = ring * 0.75;
        boolean offAtoms = atoms.stream().noneMatch(atom -> distance(box, atom) < clear);
        boolean offSymbols = symbols.stream().noneMatch(box::intersects);
        return offAtoms && offSymbols && placed.stream().noneMatch(other -> grown(other.box(), ring / 6).intersects(box));
    }

    private long crossings(Rectangle2D box) {
        return bonds.stream().filter(bond -> bond.intersects(box)).count();
    }

    private static double distance(Rectangle2D box, Point2D point) {
        double dx = Math.max(0, Math.max(box.getMinX() - point.getX(), point.getX() - box.getMaxX()));
        double dy = Math.max(0, Math.max(box.getMinY() - point.getY(), point.getY() - box.getMaxY()));
        return Math.hypot(dx, dy);
    }

    private static Rectangle2D grown(Rectangle2D box, double by) {
        return new Rectangle2D.Double(box.getX() - by, box.getY() - by, box.getWidth() + 2 * by, box.getHeight() + 2 * by);
    }
}
