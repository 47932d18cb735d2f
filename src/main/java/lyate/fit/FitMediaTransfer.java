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
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import lyate.acidity.MeasuredAcidities;
import lyate.acidity.MediaRelation;
import lyate.fit.KnownAcids.Acid;
import lyate.fit.LineFit.Point;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Medium;
import lyate.stock.Solvent;
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
 * common line where that makes sense. Deterministic.
 *
 * <p>Usage: {@code java -cp target/lyate.jar lyate.fit.FitMediaTransfer FOLDER OUTPUT.csv}
 */
public final class FitMediaTransfer {

    private static final String FITTED = "fitted";
    private static final List<String> HUBS = List.of("water", "dmso");
    private static final List<String> CATIONIC = List.of("ammonium", "tertiary-ammonium", "amidinium", "anilinium",
            "pyridinium", "phosphonium", "oxonium");
    private static final List<String> NEUTRAL = List.of("carboxylic-acid", "phenol", "alcohol", "oxime", "nh-acid", "sh-acid",
            "ch-acid", "ch-acid-stabilised", "nitro-ch-acid", "hydrocarbon", "ph-acid");
    private static final int ENOUGH = 3;
    /** How far a slope may lie from 1 before looking at any acid. */
    private static final double SLOPE_SPREAD = 0.4;
    /** How far the slope of a family may lie from the common one: anions differ much in how they are solvated. */
    private static final double NEUTRAL_SPREAD = 0.45;
    private static final double CATIONIC_SPREAD = 0.15;
    /** A line with a larger error, pKa units, says nothing. */
    private static final double LARGEST_ERROR = 4;

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
    private final Set<String> protic;

    private FitMediaTransfer(List<Acid> acids, List<MediaRelation> published, Set<String> protic) {
        this.acids = acids;
        this.protic = protic;
        this.published = published;
    }

    public static void main(String[] arguments) throws IOException {
        if (arguments.length != 2) {
            System.err.println("usage: lyate.fit.FitMediaTransfer FOLDER OUTPUT.csv");
            System.exit(2);
        }
        String table = fit(TableFolders.packaged(), Path.of(arguments[0]), System.err);
        Files.writeString(Path.of(arguments[1]), table, StandardCharsets.UTF_8);
    }

    /** The text of the table, fitted on the tables and the files of a folder; rows passed over are told to {@code log}. */
    static String fit(TableFolders tables, Path folder, PrintStream log) throws IOException {
        Stockroom stockroom = Stockroom.load(tables);
        KnownAcids known = new KnownAcids(new SiteFinder(SiteClasses.load(tables)), stockroom);
        known.add(MeasuredAcidities.load(tables));
        known.addFolder(folder);
        report(known, log);
        return new FitMediaTransfer(known.all(), published(tables), protic(stockroom)).table();
    }

    private static void report(KnownAcids known, PrintStream out) {
        known.passedOver().forEach(out::println);
        out.printf(Locale.ROOT, "%d rows passed over, %d acids read%n", known.passedOver().size(), known.all().size());
    }

    private static Set<String> protic(Stockroom stockroom) {
        return stockroom.solvents().stream().filter(solvent -> solvent.kind() == Solvent.Kind.PROTIC).map(Solvent::id)
                .collect(Collectors.toSet());
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
                Stream.of(neutral(from, to), cationic(from, to), any(from, to)).flatMap(List::stream)
                        .filter(relation -> relation.standardError() <= LARGEST_ERROR)
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

    /** A common line of all neutral acids is drawn only between solvents that treat anions alike. */
    private List<MediaRelation> neutral(String from, String to) {
        List<MediaRelation> relations = new ArrayList<>(ownLines(from, to, NEUTRAL));
        if (protic.contains(from) == protic.contains(to)) {
            relations.addAll(commonLines(from, to, NEUTRAL, "neutral"));
        }
        ownLine(from, to, "mineral-acid", commonSlope(from, to, NEUTRAL)).ifPresent(relations::add);
        return relations;
    }

    private List<MediaRelation> cationic(String from, String to) {
        return Stream.concat(ownLines(from, to, CATIONIC).stream(), commonLines(from, to, CATIONIC, "cationic").stream()).toList();
    }

    private List<MediaRelation> ownLines(String from, String to, List<String> families) {
        double slope = commonSlope(from, to, families);
        return families.stream().flatMap(family -> ownLine(from, to, family, slope).stream()).toList();
    }

    private Optional<MediaRelation> ownLine(String from, String to, String family, double slope) {
        List<Point> own = points(from, to, family);
        return own.size() < ENOUGH ? Optional.empty() : Optional.of(relation(from, to, family,
                LineFit.through(own, slope, CATIONIC.contains(family) ? CATIONIC_SPREAD : NEUTRAL_SPREAD), own, FITTED + " on acids of this family measured in both media"));
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

    private List<MediaRelation> any(String from, String to) {
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
