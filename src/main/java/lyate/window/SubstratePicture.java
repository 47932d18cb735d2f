package lyate.window;

import java.awt.Dimension;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.AffineTransform;
import java.awt.geom.Dimension2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import lyate.molecule.DrawingMark;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeDrawing;
import lyate.report.LetteredSite;
import lyate.window.TagPlacer.Placed;
import lyate.window.TagPlacer.Wish;

/** The substrate with its tags, laid out for one size and one view; painted on screen, tested and exported alike. */
final class SubstratePicture {

    /** The values of tags may take this part of the picture. */
    private static final double ROOM_PER_VALUE = 12;

    private final Shown shown;
    private final Palette palette;
    private final TagPainter painter;
    private final AffineTransform transform;
    private final List<Point2D> atoms;
    private final double ring;
    private final List<Placed> placed;

    /**
     * @param view zoom and pan on top of the fit; identity for the whole molecule
     */
    SubstratePicture(Shown shown, Palette palette, Font font, Dimension size, AffineTransform view, Graphics2D measure) {
        this.shown = shown;
        this.palette = palette;
        this.painter = new TagPainter(palette, font);
        this.transform = fit(shown.drawing(), size, view, measure);
        this.atoms = positions(shown.drawing());
        this.ring = Math.min(palette.space("ring"), 0.4 * Math.sqrt(Math.abs(transform.getDeterminant())));
        Rectangle2D area = new Rectangle2D.Double(palette.space("small"), palette.space("small"),
                size.width - 2.0 * palette.space("small"), size.height - 2.0 * palette.space("small"));
        this.placed = new TagPlacer(area, atoms, bonds(), symbols(), ring + palette.space("small")).place(wishes(measure, size));
    }

    void paint(Graphics2D g, List<Integer> highlighted, Optional<LetteredSite> focused) {
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
        g.setColor(palette.ground("caution"));
        for (int atom : highlighted) {
            double radius = ring * 1.5;
            g.fill(new Ellipse2D.Double(atoms.get(atom).getX() - radius, atoms.get(atom).getY() - radius, 2 * radius, 2 * radius));
        }
        for (Placed tag : placed) {
            if (tag.full()) {
                tag.tag().transfer().atoms().forEach(atom -> painter.paintRing(g, tag.tag(), atoms.get(atom), ring));
            }
            painter.paintLeader(g, tag.tag(), tag.box(), atoms.get(tag.tag().atom()), tag.full() ? ring : ring / 3);
        }
        shown.drawing().paintSeam(g, transform, palette.color("ground"), palette.space("tiny"));
        shown.drawing().paint(g, transform, palette.drawing());
        shown.atRisk().forEach(atom -> painter.paintAtRisk(g, atoms.get(atom), ring));
        for (Placed tag : placed) {
            painter.paintTag(g, tag.tag(), tag.box(), tag.full(), focused.filter(tag.tag()::equals).isPresent());
        }
    }

    /** The site at a point: its tag, or the ring round one of its atoms. */
    Optional<LetteredSite> siteAt(Point2D point) {
        for (Placed tag : placed) {
            if (tag.box().contains(point)) {
                return Optional.of(tag.tag());
            }
        }
        return shown.tags().sites().stream()
                .filter(site -> site.transfer().atoms().stream().anyMatch(atom -> atoms.get(atom).distance(point) <= ring * 1.2)).findFirst();
    }

    /** Where the tag of a site came to be. */
    Optional<Rectangle2D> placeOf(LetteredSite site) {
        return placed.stream().filter(tag -> tag.tag().equals(site)).map(Placed::box).findFirst();
    }

    /** Where tags came to be. */
    List<Placed> placed() {
        return placed;
    }

    private static AffineTransform fit(MoleculeDrawing drawing, Dimension size, AffineTransform view, Graphics2D g) {
        int roomX = 5 * g.getFontMetrics().getHeight();
        int roomY = 2 * g.getFontMetrics().getHeight();
        double width = Math.max(size.width / 2.0, size.width - 2.0 * roomX);
        double height = Math.max(size.height / 2.0, size.height - 2.0 * roomY);
        Rectangle2D area = new Rectangle2D.Double((size.width - width) / 2, (size.height - height) / 2, width, height);
        AffineTransform transform = new AffineTransform(view);
        transform.concatenate(drawing.fit(area, 4.0 * g.getFontMetrics().getHeight()));
        return transform;
    }

    private List<Point2D> positions(MoleculeDrawing drawing) {
        List<Point2D> positions = new ArrayList<>();
        for (int atom = 0; atom < drawing.atomCount(); atom++) {
            positions.add(transform.transform(drawing.position(atom), null));
        }
        return positions;
    }

    private List<Line2D> bonds() {
        Molecule substrate = shown.review().step().substrate();
        List<Line2D> bonds = new ArrayList<>();
        for (int atom = 0; atom < substrate.atomCount(); atom++) {
            for (int other : substrate.neighbours(atom)) {
                if (other > atom) {
                    bonds.add(new Line2D.Double(atoms.get(atom), atoms.get(other)));
                }
            }
        }
        return bonds;
    }

    /** Boxes of the atom symbols. */
    private List<Rectangle2D> symbols() {
        return shown.drawing().marks().stream().filter(DrawingMark::filled)
                .map(mark -> transform.createTransformedShape(mark.shape()).getBounds2D()).toList();
    }

    /**
     * The intended site first, then in the order in which protons go. Sites out of reach ask for a letter only, and so do
     * the last ones where there is not room for all values.
     */
    private List<Wish> wishes(Graphics2D g, Dimension size) {
        List<LetteredSite> ordered = shown.tags().sites().stream().sorted(Comparator.comparing((LetteredSite tag) -> !tag.intended())).toList();
        List<Wish> wishes = new ArrayList<>();
        double room = size.getWidth() * size.getHeight() / ROOM_PER_VALUE;
        for (LetteredSite tag : ordered) {
            Dimension2D full = painter.fullSize(g, tag);
            room -= full.getWidth() * full.getHeight();
            boolean value = tag.intended() || tag.counts() && room > 0;
            wishes.add(new Wish(tag, value ? full : null, painter.letterSize(g, tag)));
        }
        return wishes;
    }
}
