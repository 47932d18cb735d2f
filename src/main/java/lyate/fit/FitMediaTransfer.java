package lyate.fit;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import lyate.acidity.MeasuredAcidities;
import lyate.acidity.MediaRelation;
import lyate.fit.KnownAcids.Acid;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.table.Row;
import lyate.table.Table;
import lyate.table.TableFolders;

/**
 * Fits {@code media-transfer.csv}: one straight line for every family of acids and pair of media measured in both.
 *
 * <p>Reads the packaged tables and a folder of CSV files with the columns {@code smiles,site,role,solvent,pka}; writes
 * the table, and to standard error how well each line predicts acids left out in turn. Published relations (rows whose source does not begin with "fitted") are kept as they are. Each line is
 * fitted in one direction, from water or DMSO, and read backwards for the other. The slope of a family with few members
 * is held near the slope common to the acids of the same charge; a family with fewer than three members takes their
 * common line where that makes sense. Deterministic.
 *
 * <p>Usage: {@code java -cp target/lyate.jar lyate.fit.FitMediaTransfer FOLDER OUTPUT.csv}
 */
public final class FitMediaTransfer {

    private static final List<String> HUBS = List.of("water", "dmso");
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
    private final FamilyLines lines;
    private final List<MediaRelation> published;

    private FitMediaTransfer(List<Acid> acids, List<MediaRelation> published, Set<String> protic) {
        this.acids = acids;
        this.lines = new FamilyLines(acids, protic);
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
        FitMediaTransfer fit = new FitMediaTransfer(known.all(), published(tables), protic(stockroom));
        fit.crossValidate(log);
        return fit.table();
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
            if (!row.text("source").startsWith(FamilyLines.FITTED)) {
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
                Stream.of(lines.neutral(from, to), lines.cationic(from, to), lines.any(from, to)).flatMap(List::stream)
                        .filter(relation -> relation.standardError() <= LARGEST_ERROR)
                        .filter(relation -> published.stream().noneMatch(other -> sameLine(relation, other)))
                        .forEach(relation -> text.append(line(relation)));
            }
        }
        return text.toString();
    }

    /** How well each family's line predicts acids it was not fitted on. */
    private void crossValidate(PrintStream out) {
        for (String from : HUBS) {
            for (String to : mediaBeyond(from)) {
                Map<String, LeaveOneOut> families = lines.crossValidation(from, to);
                families.forEach((family, errors) -> out.printf(Locale.ROOT, "  %-20s %s%n", family, errors));
                families.values().stream().reduce(LeaveOneOut::and)
                        .ifPresent(all -> out.printf(Locale.ROOT, "%-22s %s%n", from + " to " + to, all));
            }
        }
    }

    private Set<String> mediaBeyond(String from) {
        Set<String> media = new TreeSet<>();
        acids.stream().filter(acid -> acid.in(from).isPresent()).forEach(acid -> media.addAll(acid.values().keySet()));
        media.removeAll(HUBS.subList(0, HUBS.indexOf(from) + 1));
        return media;
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
