package lyate.fit;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import lyate.acidity.MeasuredAcidities;
import lyate.acidity.MediaRelation;
import lyate.fit.KnownAcids.Acid;
import lyate.fit.LineFit.Point;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Medium;
import lyate.stock.Stockroom;
import lyate.table.Row;
import lyate.table.Table;
import lyate.table.TableFolders;

/**
 * Fits {@code media-transfer.csv}: one straight line for every family of acids and pair of media measured in both.
 *
 * <p>Reads the packaged tables and a folder of CSV files with the columns {@code smiles,site,role,solvent,pka}; writes
 * the table. Published relations (rows whose source does not begin with "fitted") are kept as they are. Each line is
 * fitted in one direction, from water or DMSO, and read backwards for the other. The slope of a family with few members
 * is held near the slope common to the acids of the same charge; a family with fewer than three members takes their
 * common line. Deterministic.
 *
 * <p>Usage: {@code java -cp target/lyate.jar lyate.fit.FitMediaTransfer FOLDER OUTPUT.csv}
 */
public final class FitMediaTransfer {

    private static final String FITTED = "fitted";
    private static final List<String> HUBS = List.of("water", "dmso");
    private static final List<String> CATIONIC = List.of("ammonium", "anilinium", "pyridinium", "oxonium");
    private static final List<String> NEUTRAL = List.of("carboxylic-acid", "phenol", "alcohol", "nh-acid", "sh-acid",
            "ch-acid", "ch-acid-stabilised", "hydrocarbon", "ph-acid", "mineral-acid");
    private static final int ENOUGH = 3;
    private static final double FAMILY_SPREAD = 0.15;
    private static final double FREE_SPREAD = 0.5;

    private static final String HEADER = """
            # Straight lines between the pKa scales of two media, by family of acids: pKa(to) = slope x pKa(from) + intercept.
            # standard_error: spread of a further acid of the family about the line, in the `to` medium, pKa units; n: acids
            # measured in both; valid_from, valid_to: range of the fit in the `from` medium. A line serves both directions; where
            # no line joins two media, two lines that meet in DMSO or water do. family `any`: for acids of no listed family.
            # Rows whose source begins with "fitted" are made by lyate.fit.FitMediaTransfer; others are published relations,
            # which the program keeps.
            # version: 1
            id,from,to,family,slope,intercept,standard_error,n,valid_from,valid_to,source
            """;

    private final List<Acid> acids;
    private final List<MediaRelation> published;

    private FitMediaTransfer(List<Acid> acids, List<MediaRelation> published) {
        this.acids = acids;
        this.published = published;
    }

    public static void main(String[] arguments) throws IOException {
        if (arguments.length != 2) {
            System.err.println("usage: lyate.fit.FitMediaTransfer FOLDER OUTPUT.csv");
            System.exit(2);
        }
        TableFolders tables = TableFolders.packaged();
        KnownAcids known = new KnownAcids(new SiteFinder(SiteClasses.load(tables)), Stockroom.load(tables));
        known.add(MeasuredAcidities.load(tables));
        known.addFolder(Path.of(arguments[0]));
        report(known, System.err);
        String fitted = new FitMediaTransfer(known.all(), published(tables)).table();
        Files.writeString(Path.of(arguments[1]), fitted, StandardCharsets.UTF_8);
    }

    private static void report(KnownAcids known, PrintStream out) {
        known.passedOver().forEach(out::println);
        out.printf(Locale.ROOT, "%d rows passed over, %d acids read%n", known.passedOver().size(), known.all().size());
    }

    private static List<MediaRelation> published(TableFolders tables) {
        List<MediaRelation> relations = new ArrayList<>();
        for (Row row : Table.read(MediaRelation.SCHEMA, tables).rows()) {
            if (!row.text("source").startsWith(FITTED)) {
                relations.add(MediaRelation.of(row));
            }
        }
        return relations;
    }

    private String table() {
        StringBuilder text = new StringBuilder(HEADER);
        published.forEach(relation -> text.append(line(relation)));
        for (String from : HUBS) {
            for (String to : mediaBeyond(from)) {
                Stream.of(group(from, to, NEUTRAL), group(from, to, CATIONIC), any(from, to)).flatMap(List::stream)
                        .filter(relation -> published.stream().noneMatch(other -> sameLine(relation, other)))
                        .forEach(relation -> text.append(line(relation)));
            }
        }
        return text.toString();
    }

    private Set<String> mediaBeyond(String from) {
        Set<String> media = new TreeSet<>();
        acids.stream().filter(acid -> acid.in(from).isPresent()).forEach(acid -> media.addAll(acid.values().keySet()));
        media.removeAll(HUBS.subList(0, HUBS.indexOf(from) + 1));
        return media;
    }

    /** Lines of the families of one charge: their own where they have enough members, else the common one. */
    private List<MediaRelation> group(String from, String to, List<String> families) {
        List<Point> all = families.stream().flatMap(family -> points(from, to, family).stream()).toList();
        List<MediaRelation> relations = new ArrayList<>();
        if (all.size() < ENOUGH) {
            return relations;
        }
        LineFit common = LineFit.through(all, 1, FREE_SPREAD);
        double slope = commonSlope(from, to, families).orElse(common.slope());
        for (String family : families) {
            List<Point> own = points(from, to, family);
            relations.add(own.size() >= ENOUGH
                    ? relation(from, to, family, LineFit.through(own, slope, FAMILY_SPREAD), own,
                            FITTED + " on acids of this family measured in both media")
                    : relation(from, to, family, common, all, FITTED + " on all "
                            + (families.equals(CATIONIC) ? "cationic" : "neutral") + " acids measured in both media, too few of this family"));
        }
        return relations;
    }

    /** The slope within families, each about its own mean. */
    private OptionalDouble commonSlope(String from, String to, List<String> families) {
        List<Point> centred = new ArrayList<>();
        for (String family : families) {
            List<Point> own = points(from, to, family);
            if (own.size() >= ENOUGH) {
                double x = own.stream().mapToDouble(Point::x).average().orElseThrow();
                double y = own.stream().mapToDouble(Point::y).average().orElseThrow();
                own.forEach(point -> centred.add(new Point(point.x() - x, point.y() - y)));
            }
        }
        return centred.isEmpty() ? OptionalDouble.empty()
                : OptionalDouble.of(LineFit.through(centred, 1, FREE_SPREAD).slope());
    }

    private List<MediaRelation> any(String from, String to) {
        List<Point> all = acids.stream().flatMap(acid -> point(acid, from, to).stream()).toList();
        return all.size() < ENOUGH ? List.of() : List.of(relation(from, to, MediaRelation.ANY,
                LineFit.through(all, 1, FREE_SPREAD), all, FITTED + " on all acids measured in both media"));
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

    private static boolean sameLine(MediaRelation one, MediaRelation other) {
        return one.from().equals(other.from()) && one.to().equals(other.to()) && one.family().equals(other.family());
    }

    private static String line(MediaRelation relation) {
        return String.format(Locale.ROOT, "%s-%s-%s,%s,%s,%s,%.3f,%.2f,%.2f,%d,%.1f,%.1f,\"%s\"%n", relation.from().id(),
                relation.to().id(), relation.family(), relation.from().id(), relation.to().id(), relation.family(),
                relation.slope(), relation.intercept(), relation.standardError(), relation.pairs(), relation.validFrom(),
                relation.validTo(), relation.source()).replace(System.lineSeparator(), "\n");
    }
}
