package lyate.report;

import java.awt.geom.AffineTransform;
import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import lyate.molecule.DrawingMark;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeDrawing;
import lyate.molecule.MoleculeSvg;

/**
 * The substrate with every proton site: a ring whose thick arc is the share of protons taken, double for the intended
 * site, and a tag with the site's letter, pKa and uncertainty.
 */
final class DrawingFigure {

    private static final double WIDTH = 500;
    private static final double MARGIN_X = 92;
    private static final double MARGIN_Y = 46;
    private static final double LARGEST_BOND = 34;
    private static final double LARGEST_HEIGHT = 320;
    private static final double FONT = 11.5;
    private static final double LINE = 15;
    private static final double EDGE = 6;
    /** White round the atom symbols, bond lengths. */
    private static final double SEAM = 0.12;
    /** Ring of a site out of reach, relative to the others. */
    private static final double FAINT = 0.5;

    private final Molecule molecule;
    private final List<LetteredSite> sites;
    private final MoleculeDrawing drawing;
    private final AffineTransform toPicture;
    private final double height;
    private final double ring;

    DrawingFigure(Molecule molecule, List<LetteredSite> sites) {
        this.molecule = molecule;
        this.sites = sites;
        this.drawing = MoleculeDrawing.of(molecule);
        Rectangle2D box = drawing.bounds();
        double bond = Math.min(LARGEST_BOND, Math.min((WIDTH - 2 * MARGIN_X) / Math.max(1, box.getWidth()),
                (LARGEST_HEIGHT - 2 * MARGIN_Y) / Math.max(1, box.getHeight())));
        this.height = Math.ceil(box.getHeight() * bond + 2 * MARGIN_Y);
        this.ring = Math.max(5, 0.36 * bond);
        this.toPicture = drawing.fit(new Rectangle2D.Double(MARGIN_X, MARGIN_Y, WIDTH - 2 * MARGIN_X, height - 2 * MARGIN_Y), bond);
    }

    String write(String id) {
        List<Rectangle2D> boxes = boxes();
        Rectangle2D used = toPicture.createTransformedShape(drawing.bounds()).getBounds2D();
        boxes.forEach(used::add);
        double top = used.getMinY() - EDGE;
        Svg svg = new Svg(WIDTH, top, used.getMaxY() + EDGE - top);
        sites.forEach(site -> rings(svg, site));
        svg.markup(String.format(Locale.ROOT, "<g transform=\"matrix(%.4f 0 0 %.4f %.3f %.3f)\">\n", toPicture.getScaleX(), toPicture.getScaleY(),
                toPicture.getTranslateX(), toPicture.getTranslateY())).markup(MoleculeSvg.seam(drawing, Ink.PAPER, SEAM))
                .markup(MoleculeSvg.paths(drawing, Ink.atoms())).markup("</g>\n");
        for (int i = 0; i < sites.size(); i++) {
            leader(svg, sites.get(i), boxes.get(i), position(sites.get(i).transfer().atoms().get(0)));
            tag(svg, sites.get(i), boxes.get(i));
        }
        String names = sites.stream().map(LetteredSite::sentence).collect(Collectors.joining("; "));
        return svg.write(id, "Structure of the substrate with its proton sites", molecule.smiles() + ". Sites, first to go first. " + names + ".");
    }

    private void rings(Svg svg, LetteredSite site) {
        for (int atom : site.transfer().atoms()) {
            Point2D centre = position(atom);
            if (!site.counts()) {
                svg.ring(centre, FAINT * ring, Ink.LINE, 0.8);
                continue;
            }
            svg.ring(centre, ring, site.ink(), 1);
            if (site.intended()) {
                svg.ring(centre, ring + 4.5, site.ink(), 1);
            }
            if (site.fraction() > 0.005) {
                svg.arc(centre, ring, site.fraction(), site.ink(), 3.6);
            }
        }
    }

    /** Where the tags go, in the order of the sites. */
    private List<Rectangle2D> boxes() {
        TagSpots spots = new TagSpots(new Rectangle2D.Double(2, 2, WIDTH - 4, height - 4), positions(), bonds(), symbols(), ring + 3);
        List<Rectangle2D> boxes = new ArrayList<>();
        for (LetteredSite site : sites) {
            double words = lines(site).stream().mapToDouble(line -> Svg.width(line, FONT) + 4).max().orElse(0);
            boxes.add(spots.find(site.transfer().atoms().get(0), chip(site) + words, Math.max(1, lines(site).size()) * LINE + 3, boxes));
        }
        return boxes;
    }

    private static double chip(LetteredSite site) {
        return Svg.width(site.letter(), FONT) + 9;
    }

    private static List<String> lines(LetteredSite site) {
        if (!site.counts()) {
            return List.of();
        }
        String pKa = Words.withSigma(site.transfer().acidity());
        return site.transfer().percentTaken() < 0.05 ? List.of(pKa) : List.of(pKa, Words.percent(site.transfer().percentTaken()) + " taken");
    }

    /** A site out of reach has its letter and no more. */
    private static void tag(Svg svg, LetteredSite site, Rectangle2D box) {
        if (!site.counts()) {
            svg.text(box.getCenterX(), box.getY() + LINE - 3, site.letter(), FONT, site.ink(), "middle", false);
            return;
        }
        svg.box(box.getX(), box.getY(), box.getWidth(), box.getHeight(), 3, site.intended() ? Ink.INTENDED_GROUND : Ink.PAPER, site.ink(),
                site.intended() ? 1.6 : 0.8);
        svg.text(box.getX() + chip(site) / 2, box.getY() + LINE - 3, site.letter(), FONT, site.ink(), "middle", true);
        for (int i = 0; i < lines(site).size(); i++) {
            svg.text(box.getX() + chip(site), box.getY() + (i + 1) * LINE - 3, lines(site).get(i), FONT, Ink.TEXT, "start", false);
        }
    }

    private void leader(Svg svg, LetteredSite site, Rectangle2D box, Point2D atom) {
        double x = Math.max(box.getMinX(), Math.min(atom.getX(), box.getMaxX()));
        double y = Math.max(box.getMinY(), Math.min(atom.getY(), box.getMaxY()));
        double distance = atom.distance(x, y);
        double edge = (site.counts() ? ring : FAINT * ring) + (site.intended() ? 4.5 : 0);
        if (distance > edge + 3) {
            svg.line(atom.getX() + (x - atom.getX()) * edge / distance, atom.getY() + (y - atom.getY()) * edge / distance, x, y, site.counts() ? site.ink() : Ink.LINE, 0.8);
        }
    }

    private Point2D position(int atom) {
        return toPicture.transform(drawing.position(atom), null);
    }

    private List<Point2D> positions() {
        return IntStream.range(0, drawing.atomCount()).mapToObj(this::position).toList();
    }

    private List<Line2D> bonds() {
        List<Line2D> bonds = new ArrayList<>();
        for (int atom = 0; atom < molecule.atomCount(); atom++) {
            for (int other : molecule.neighbours(atom)) {
                if (other > atom) {
                    bonds.add(new Line2D.Double(position(atom), position(other)));
                }
            }
        }
        return bonds;
    }

    private List<Rectangle2D> symbols() {
        return drawing.marks().stream().filter(DrawingMark::filled).map(mark -> toPicture.createTransformedShape(mark.shape()).getBounds2D()).toList();
    }
}
