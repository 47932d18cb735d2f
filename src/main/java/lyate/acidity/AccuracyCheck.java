package lyate.acidity;

import java.io.IOException;
import java.io.Reader;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.Function;
import java.util.stream.Collectors;
import lyate.acidity.AccuracyReport.BadRow;
import lyate.acidity.AccuracyReport.Comparison;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.site.ProtonSite;
import lyate.site.Role;
import lyate.site.SiteFinder;
import lyate.stock.Medium;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/**
 * Compares what the program says with a CSV file of measured values. Columns {@code smiles}, {@code solvent} and
 * {@code pka}; {@code site} (for example {@code O4}) and {@code role} or {@code kind} ({@code acid} or {@code base}) may be
 * left out or left empty, others are ignored. Without a site, the most acidic or most basic one of the role is compared.
 * Without a role the row says either how easily a proton leaves or how readily one arrives: it is compared with the nearer
 * of the two, and the report counts such rows.
 *
 * @param finder    finds the sites
 * @param estimator the values to be judged
 * @param media     the medium meant by the text of a {@code solvent} cell; empty for an unknown one
 */
public record AccuracyCheck(SiteFinder finder, AcidityEstimator estimator, Function<String, Optional<Medium>> media) {

    private static final CSVFormat FORMAT = CSVFormat.RFC4180.builder().setHeader().setSkipHeaderRecord(true)
            .setCommentMarker('#').setIgnoreEmptyLines(true).setTrim(true).setIgnoreHeaderCase(true)
            .setAllowMissingColumnNames(true).get();

    /** A check that finds solvents by any name the stockroom knows; each is judged in its own medium, never in a proxy. */
    public static AccuracyCheck of(SiteFinder finder, AcidityEstimator estimator, Stockroom stockroom) {
        return new AccuracyCheck(finder, estimator, name -> {
            try {
                return Optional.of(new Medium(stockroom.solvent(name).id()));
            } catch (UnknownNameException e) {
                return Optional.empty();
            }
        });
    }

    /** Thrown within a row that cannot be compared. */
    private static final class RowException extends Exception {

        private static final long serialVersionUID = 1L;

        RowException(String message) {
            super(message);
        }
    }

    /** A site, what is said of it, and whether the role was left to be found out. */
    private record Stated(ProtonSite site, Acidity acidity, boolean roleGuessed) {

        double distanceFrom(double measured) {
            return Math.abs(acidity.pKa() - measured);
        }
    }

    /**
     * Compares every row.
     *
     * @throws IOException              where the file cannot be read
     * @throws IllegalArgumentException where a needed column is missing, named in words
     */
    public AccuracyReport check(Reader csv) throws IOException {
        List<Comparison> comparisons = new ArrayList<>();
        List<BadRow> badRows = new ArrayList<>();
        try (CSVParser parser = CSVParser.builder().setReader(csv).setFormat(FORMAT).get()) {
            checkHeader(parser.getHeaderNames());
            for (CSVRecord row : parser) {
                long line = parser.getCurrentLineNumber();
                try {
                    comparisons.add(compare(row, line));
                } catch (RowException | MoleculeException e) {
                    badRows.add(new BadRow(line, String.join(",", row.toList()), e.getMessage().lines().findFirst().orElse("")));
                }
            }
        }
        return new AccuracyReport(comparisons, badRows);
    }

    private static void checkHeader(List<String> header) {
        List<String> lower = header.stream().map(name -> name.toLowerCase(Locale.ROOT)).toList();
        for (String needed : List.of("smiles", "solvent", "pka")) {
            if (!lower.contains(needed)) {
                throw new IllegalArgumentException("the file has no column " + needed + "; it has " + String.join(", ", header));
            }
        }
    }

    private Comparison compare(CSVRecord row, long line) throws RowException, MoleculeException {
        if (!row.isConsistent()) {
            throw new RowException("found " + row.size() + " cells, expected as many as the header has");
        }
        double measured = number(row.get("pka"));
        Medium medium = media.apply(row.get("solvent"))
                .orElseThrow(() -> new RowException("column solvent: found '" + row.get("solvent") + "', expected a known solvent"));
        Molecule molecule = new MoleculeReader().read(row.get("smiles"));
        String role = optional(row, "role").isEmpty() ? optional(row, "kind") : optional(row, "role");
        Stated stated = stated(molecule, optional(row, "site"), role, medium, measured);
        return new Comparison(line, row.get("smiles"), molecule.label(stated.site().atom()),
                stated.site().siteClass().name(), measured, stated.acidity(), stated.roleGuessed());
    }

    private static double number(String text) throws RowException {
        try {
            double value = Double.parseDouble(text);
            if (Double.isFinite(value)) {
                return value;
            }
        } catch (NumberFormatException e) {
            // reported below together with numbers that are not finite
        }
        throw new RowException("column pka: found '" + text + "', expected a number");
    }

    private static String optional(CSVRecord row, String column) {
        return row.isMapped(column) ? row.get(column) : "";
    }

    private Stated stated(Molecule molecule, String label, String role, Medium medium, double measured) throws RowException {
        List<ProtonSite> sites = finder.sites(molecule);
        if (!label.isEmpty()) {
            int atom = molecule.atomLabelled(label)
                    .orElseThrow(() -> new RowException("column site: found '" + label + "', expected an atom such as O4"));
            sites = sites.stream().filter(site -> site.equivalent().contains(atom)).toList();
        }
        List<Role> wanted = roles(role);
        Map<Role, Stated> extremes = extremes(molecule, sites, medium);
        extremes.keySet().retainAll(wanted);
        Stated nearest = extremes.values().stream().min(Comparator.comparingDouble(stated -> stated.distanceFrom(measured)))
                .orElseThrow(() -> new RowException("no pKa is stated for " + (label.isEmpty() ? "any site" : label) + " as "
                        + wanted.stream().map(Role::word).collect(Collectors.joining(" or ")) + " in " + medium.id()));
        return new Stated(nearest.site(), nearest.acidity(), extremes.size() > 1);
    }

    private static List<Role> roles(String text) throws RowException {
        List<Role> roles = Arrays.stream(Role.values()).filter(role -> text.isEmpty() || text.equalsIgnoreCase(role.word())).toList();
        if (roles.isEmpty()) {
            throw new RowException("column role: found '" + text + "', expected acid or base");
        }
        return roles;
    }

    /** The most acidic acid site and the most basic base site. */
    private Map<Role, Stated> extremes(Molecule molecule, List<ProtonSite> sites, Medium medium) {
        Map<Role, Stated> extremes = new TreeMap<>();
        for (Role role : Role.values()) {
            Comparator<Stated> byPKa = Comparator.comparingDouble(stated -> stated.acidity().pKa());
            sites.stream().filter(site -> site.role() == role)
                    .flatMap(site -> estimator.acidity(molecule, site, medium).map(value -> new Stated(site, value, false)).stream())
                    .min(role == Role.ACID ? byPKa : byPKa.reversed())
                    .ifPresent(stated -> extremes.put(role, stated));
        }
        return extremes;
    }
}
