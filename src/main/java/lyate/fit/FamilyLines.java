package lyate.fit;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Stream;
import lyate.acidity.MediaRelation;
import lyate.fit.KnownAcids.Acid;
import lyate.fit.LineFit.Point;
import lyate.stock.Medium;

/** Draws the lines between two media, family by family. */
final class FamilyLines {

    /** How the source of a fitted row begins. */
    static final String FITTED = "fitted";

    private static final List<String> CATIONIC = List.of("ammonium", "tertiary-ammonium", "amidinium", "anilinium",
            "pyridinium", "phosphonium", "oxonium");
    private static final List<String> NEUTRAL = List.of("carboxylic-acid", "phenol", "alcohol", "oxime", "nh-acid", "sh-acid",
            "ch-acid", "ch-acid-stabilised", "nitro-ch-acid", "hydrocarbon", "ph-acid");
    private static final String MINERAL = "mineral-acid";
    private static final int ENOUGH = 3;
    /** How far a slope may lie from 1 before looking at any acid. */
    private static final double SLOPE_SPREAD = 0.4;
    /** How far the slope of a family may lie from the common one: anions differ much in how they are solvated. */
    private static final double NEUTRAL_SPREAD = 0.45;
    private static final double CATIONIC_SPREAD = 0.15;

    private final List<Acid> acids;
    private final Set<String> protic;

    FamilyLines(List<Acid> acids, Set<String> protic) {
        this.acids = acids;
        this.protic = protic;
    }

    /** Errors of the families' own lines, by family, where at least four acids allow it. */
    Map<String, LeaveOneOut> crossValidation(String from, String to) {
        Map<String, LeaveOneOut> errors = new TreeMap<>();
        for (List<String> group : List.of(NEUTRAL, CATIONIC)) {
            double slope = commonSlope(from, to, group);
            for (String family : group) {
                List<Point> own = points(from, to, family);
                if (own.size() > ENOUGH) {
                    errors.put(family, LeaveOneOut.of(own, slope, spread(family)));
                }
            }
        }
        return errors;
    }

    /** A common line of all neutral acids is drawn only between solvents that treat anions alike. */
    List<MediaRelation> neutral(String from, String to) {
        List<MediaRelation> relations = new ArrayList<>(ownLines(from, to, NEUTRAL));
        if (protic.contains(from) == protic.contains(to)) {
            relations.addAll(commonLines(from, to, NEUTRAL, "neutral"));
        }
        ownLine(from, to, MINERAL, commonSlope(from, to, NEUTRAL)).ifPresent(relations::add);
        return relations;
    }

    List<MediaRelation> cationic(String from, String to) {
        return Stream.concat(ownLines(from, to, CATIONIC).stream(), commonLines(from, to, CATIONIC, "cationic").stream()).toList();
    }

    private List<MediaRelation> ownLines(String from, String to, List<String> families) {
        double slope = commonSlope(from, to, families);
        return families.stream().flatMap(family -> ownLine(from, to, family, slope).stream()).toList();
    }

    private Optional<MediaRelation> ownLine(String from, String to, String family, double slope) {
        List<Point> own = points(from, to, family);
        return own.size() < ENOUGH ? Optional.empty() : Optional.of(relation(from, to, family,
                LineFit.through(own, slope, spread(family)), own, FITTED + " on acids of this family measured in both media"));
    }

    /** The line through all acids of the group, for its families that have too few members. */
    private List<MediaRelation> commonLines(String from, String to, List<String> families, String charge) {
        List<Point> all = families.stream().flatMap(family -> points(from, to, family).stream()).toList();
        if (all.size() < ENOUGH) {
            return List.of();
        }
        LineFit common = LineFit.through(all, 1, SLOPE_SPREAD);
        return families.stream().filter(family -> points(from, to, family).size() < ENOUGH)
                .map(family -> relation(from, to, family, common, all, FITTED + " on all " + charge
                        + " acids measured in both media because there are too few of this family")).toList();
    }

    /** The slope within families, each about its own mean; 1 where there is none to judge by. */
    private double commonSlope(String from, String to, List<String> families) {
        List<Point> centred = new ArrayList<>();
        for (String family : families) {
            List<Point> own = points(from, to, family);
            if (own.size() >= ENOUGH) {
                double x = own.stream().mapToDouble(Point::x).average().orElseThrow();
                double y = own.stream().mapToDouble(Point::y).average().orElseThrow();
                own.forEach(point -> centred.add(new Point(point.x() - x, point.y() - y)));
            }
        }
        return centred.isEmpty() ? 1 : LineFit.through(centred, 1, SLOPE_SPREAD).slope();
    }

    List<MediaRelation> any(String from, String to) {
        List<Point> all = acids.stream().flatMap(acid -> point(acid, from, to).stream()).toList();
        return all.size() < ENOUGH ? List.of() : List.of(relation(from, to, MediaRelation.ANY,
                LineFit.through(all, 1, SLOPE_SPREAD), all, FITTED + " on all acids measured in both media"));
    }

    private List<Point> points(String from, String to, String family) {
        return acids.stream().filter(acid -> acid.family().equals(family)).flatMap(acid -> point(acid, from, to).stream()).toList();
    }

    private static Optional<Point> point(Acid acid, String from, String to) {
        return acid.in(from).flatMap(x -> acid.in(to).map(y -> new Point(x, y)));
    }

    private static MediaRelation relation(String from, String to, String family, LineFit fit, List<Point> points, String source) {
        double low = points.stream().mapToDouble(Point::x).min().orElseThrow();
        double high = points.stream().mapToDouble(Point::x).max().orElseThrow();
        return new MediaRelation(new Medium(from), new Medium(to), family, fit.slope(), fit.intercept(),
                fit.standardError(), fit.points(), low, high, source);
    }

    private static double spread(String family) {
        return CATIONIC.contains(family) ? CATIONIC_SPREAD : NEUTRAL_SPREAD;
    }
}
