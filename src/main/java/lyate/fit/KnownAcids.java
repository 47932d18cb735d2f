package lyate.fit;

import java.io.IOException;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Stream;
import lyate.acidity.MeasuredAcidities;
import lyate.acidity.ProtonSkeleton;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.site.ProtonSite;
import lyate.site.Role;
import lyate.site.SiteFinder;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/**
 * Acids gathered by proton, each with its values by medium, from the table of measured values and from files with the
 * columns {@code smiles,site,role,solvent,pka} (others are ignored).
 */
final class KnownAcids {

    private static final CSVFormat FORMAT = CSVFormat.RFC4180.builder().setHeader().setSkipHeaderRecord(true)
            .setCommentMarker('#').setIgnoreEmptyLines(true).setTrim(true).get();

    private static final double LARGEST_SIGMA = 0.8;

    /** One proton: the family of its site and every value by medium id. */
    record Acid(ProtonSkeleton place, String family, Map<String, List<Double>> values) {

        /** Mean of the values in a medium. */
        Optional<Double> in(String medium) {
            return values.containsKey(medium)
                    ? Optional.of(values.get(medium).stream().mapToDouble(Double::doubleValue).average().orElseThrow())
                    : Optional.empty();
        }
    }

    private final SiteFinder finder;
    private final Stockroom stockroom;
    private final Map<Long, List<Acid>> acids = new LinkedHashMap<>();
    private final List<String> passedOver = new ArrayList<>();

    KnownAcids(SiteFinder finder, Stockroom stockroom) {
        this.finder = finder;
        this.stockroom = stockroom;
    }

    List<Acid> all() {
        return acids.values().stream().flatMap(List::stream).toList();
    }

    /** Rows that could not be used, with the reason. */
    List<String> passedOver() {
        return List.copyOf(passedOver);
    }

    /** Adds the rows whose uncertainty is small enough to say something about a line; extrapolated values are not. */
    void add(MeasuredAcidities table) {
        for (MeasuredAcidities.Value value : table.values()) {
            if (value.acidity().sigma() > LARGEST_SIGMA) {
                continue;
            }
            add(value.row().id(), value.molecule(), value.role(), value.atom(), value.acidity().medium().id(),
                    value.acidity().pKa());
        }
    }

    /** Reads every {@code .csv} file of a folder, in the order of their names. */
    void addFolder(Path folder) throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            for (Path file : files.filter(path -> path.toString().endsWith(".csv")).sorted().toList()) {
                addFile(file);
            }
        }
    }

    private void addFile(Path file) throws IOException {
        try (Reader reader = Files.newBufferedReader(file, StandardCharsets.UTF_8);
                CSVParser parser = CSVParser.builder().setReader(reader).setFormat(FORMAT).get()) {
            for (CSVRecord row : parser) {
                String place = file.getFileName() + ":" + parser.getCurrentLineNumber();
                try {
                    Molecule molecule = new MoleculeReader().read(row.get("smiles"));
                    int atom = molecule.atomLabelled(row.get("site")).orElseThrow(() ->
                            new MoleculeException("no atom " + row.get("site")));
                    Role role = row.get("role").equals(Role.BASE.word()) ? Role.BASE : Role.ACID;
                    add(place, molecule, role, atom, stockroom.solvent(row.get("solvent")).id(),
                            Double.parseDouble(row.get("pka")));
                } catch (MoleculeException | UnknownNameException | NumberFormatException e) {
                    passedOver.add(place + ": " + e.getMessage());
                }
            }
        }
    }

    private void add(String where, Molecule molecule, Role role, int atom, String medium, double pKa) {
        Optional<ProtonSite> site = finder.sites(molecule, role).stream()
                .filter(candidate -> candidate.equivalent().contains(atom)).findFirst();
        if (site.isEmpty()) {
            passedOver.add(where + ": " + molecule.label(atom) + " has no site class as " + role.word());
            return;
        }
        ProtonSkeleton place = ProtonSkeleton.of(molecule, role, atom);
        List<Acid> alike = acids.computeIfAbsent(place.hash(), key -> new ArrayList<>());
        Acid acid = alike.stream().filter(known -> known.place().sameAs(place)).findFirst().orElseGet(() -> {
            Acid fresh = new Acid(place, site.get().siteClass().family(), new TreeMap<>());
            alike.add(fresh);
            return fresh;
        });
        acid.values().computeIfAbsent(medium, key -> new ArrayList<>()).add(pKa);
    }
}
