package lyate.fit;

import java.io.IOException;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import lyate.acidity.MeasuredAcidities;
import lyate.acidity.lfer.SiteDescriber;
import lyate.acidity.lfer.SiteDescription;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.site.Role;
import lyate.site.SiteClass;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Medium;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/**
 * The measured values of a folder of CSV files; rows that cannot be used are kept with the reason.
 *
 * <p>Read are files whose name begins with {@code aqueous} (water) or {@code dmso}, in two layouts told apart by the header:
 * <ul>
 * <li>{@code smiles,site,pka}, with {@code kind} ({@code acid} or {@code base}; acid where there is no such column) and, for the
 * report, {@code site_class} or {@code acid_type}: the site is named;
 * <li>{@code smiles,kind,step,pka,quality}: the site is not named. Only rows with step 1 of one component are used;
 * quality 2 counts as twice as uncertain as 0 and 1.
 * </ul>
 * Other columns are ignored. The packaged table of measured values can be added.
 */
final class TrainingFiles {

    private static final CSVFormat FORMAT = CSVFormat.RFC4180.builder().setHeader().setSkipHeaderRecord(true)
            .setCommentMarker('#').setIgnoreEmptyLines(true).setTrim(true).get();
    private static final double UNCERTAIN = 2;
    /** Tabled values with a larger standard uncertainty count as uncertain, or are not used. */
    private static final double VAGUE = 0.3;
    private static final double TOO_VAGUE = 1;
    /** Standard uncertainty of a reliable value in DMSO, against which the spread of a class is measured. */
    private static final double RELIABLE = 0.4;

    private final SiteDescriber describer;
    private final MoleculeReader reader = new MoleculeReader();
    final List<TrainingRow> placed = new ArrayList<>();
    final List<TrainingRow> tabled = new ArrayList<>();
    final List<TrainingRow> ofClasses = new ArrayList<>();
    final List<UnplacedRow> unplaced = new ArrayList<>();
    final List<String> passedOver = new ArrayList<>();

    private TrainingFiles(SiteDescriber describer) {
        this.describer = describer;
    }

    static TrainingFiles read(Path folder, SiteDescriber describer) throws IOException {
        TrainingFiles files = new TrainingFiles(describer);
        List<Path> paths;
        try (Stream<Path> listed = Files.list(folder)) {
            paths = listed.filter(path -> path.getFileName().toString().matches("(aqueous|dmso).*\\.csv")).sorted().toList();
        }
        for (Path path : paths) {
            files.read(path);
        }
        files.dropRepeats();
        return files;
    }

    /** A compound whose site is named for the same step elsewhere needs no second, vaguer row. */
    private void dropRepeats() {
        Set<String> named = placed.stream().filter(row -> row.medium().equals(Medium.WATER))
                .map(row -> row.site().series().role() + row.compound()).collect(Collectors.toSet());
        unplaced.removeIf(row -> named.contains(row.role() + row.molecule().canonicalKey()));
    }

    /** Adds the packaged table's values in water and DMSO, but for compounds whose value the files state. */
    void add(MeasuredAcidities table) {
        Set<String> named = placed.stream().map(row -> row.medium().id() + row.site().series().role() + row.compound())
                .collect(Collectors.toSet());
        for (MeasuredAcidities.Value value : table.values()) {
            Medium medium = value.acidity().medium();
            boolean wanted = medium.equals(Medium.WATER) || medium.equals(Medium.DMSO);
            if (wanted && value.acidity().sigma() <= TOO_VAGUE && named.add(medium.id() + value.role() + value.molecule().canonicalKey())) {
                describer.describe(value.molecule(), value.role(), value.atom()).ifPresent(site -> tabled.add(new TrainingRow(
                        MeasuredAcidities.SCHEMA.fileName() + " " + value.row().id(), value.row().text("smiles"), value.row().text("site"),
                        value.molecule().canonicalKey(), "", false, medium, site, value.acidity().pKa(),
                        value.acidity().sigma() > VAGUE ? UNCERTAIN : 1)));
            }
        }
        unplaced.removeIf(row -> named.contains(Medium.WATER.id() + row.role() + row.molecule().canonicalKey()));
    }

    /**
     * Adds the values that site classes have in DMSO, each at the example of its class and as uncertain as the class is wide, but
     * for compounds whose value is known. They say something of kinds of acids that nobody has measured a series of.
     */
    void add(SiteClasses classes) {
        Set<String> known = Stream.concat(placed.stream(), tabled.stream()).map(TrainingFiles::identity).collect(Collectors.toSet());
        SiteFinder finder = new SiteFinder(classes);
        for (SiteClass siteClass : classes.rows()) {
            siteClass.dmso().flatMap(value -> classRow(siteClass, value, finder)).filter(row -> known.add(identity(row)))
                    .ifPresent(ofClasses::add);
        }
    }

    private static String identity(TrainingRow row) {
        return row.medium().id() + row.site().series().role() + row.compound() + row.label();
    }

    private Optional<TrainingRow> classRow(SiteClass siteClass, SiteClass.ClassValue value, SiteFinder finder) {
        try {
            Molecule molecule = reader.read(siteClass.hit());
            return finder.sites(molecule, siteClass.role()).stream().filter(site -> site.siteClass().equals(siteClass)).findFirst()
                    .flatMap(site -> describer.describe(molecule, siteClass.role(), site.atom())
                            .map(described -> new TrainingRow("class " + siteClass.id(), siteClass.hit(), molecule.label(site.atom()),
                                    molecule.canonicalKey(), "", true, Medium.DMSO, described, value.pKa(),
                                    Math.max(1, value.sigma() / RELIABLE))));
        } catch (MoleculeException e) {
            throw new IllegalStateException("the example of " + siteClass.id() + " cannot be read", e);
        }
    }

    private void read(Path path) throws IOException {
        String file = path.getFileName().toString();
        Medium medium = file.startsWith("dmso") ? Medium.DMSO : Medium.WATER;
        try (Reader text = Files.newBufferedReader(path, StandardCharsets.UTF_8);
                CSVParser csv = CSVParser.builder().setReader(text).setFormat(FORMAT).get()) {
            boolean named = csv.getHeaderNames().contains("site");
            for (CSVRecord row : csv) {
                String place = file + ":" + csv.getCurrentLineNumber();
                Optional<String> problem = named ? readNamed(row, place, medium) : readUnplaced(row, place);
                problem.ifPresent(words -> passedOver.add(place + ": " + row.get("smiles") + ": " + words));
            }
        }
    }

    private Optional<String> readNamed(CSVRecord row, String place, Medium medium) {
        try {
            Molecule molecule = reader.read(row.get("smiles"));
            Role role = row.isMapped("kind") && row.get("kind").equals("base") ? Role.BASE : Role.ACID;
            OptionalInt atom = molecule.atomLabelled(row.get("site"));
            if (atom.isEmpty()) {
                return Optional.of("no atom " + row.get("site"));
            }
            Optional<SiteDescription> site = describer.describe(molecule, role, atom.getAsInt());
            if (site.isEmpty()) {
                return Optional.of("the site belongs to no series");
            }
            placed.add(new TrainingRow(place, row.get("smiles"), row.get("site"), molecule.canonicalKey(), kind(row), true, medium,
                    site.get(), Double.parseDouble(row.get("pka")), 1));
            return Optional.empty();
        } catch (MoleculeException | NumberFormatException e) {
            return Optional.of(String.valueOf(e.getMessage()).lines().findFirst().orElse(""));
        }
    }

    private static String kind(CSVRecord row) {
        String kind = row.isMapped("site_class") ? row.get("site_class") : row.isMapped("acid_type") ? row.get("acid_type") : "";
        return switch (kind) {
            case "primary amine", "secondary amine", "tertiary amine" -> "aliphatic amine";
            case "azole N", "azole NH" -> "azole";
            default -> kind;
        };
    }

    private Optional<String> readUnplaced(CSVRecord row, String place) {
        if (!row.get("step").equals("1")) {
            return Optional.of("a further step, of a charged molecule");
        }
        if (row.get("smiles").contains(".")) {
            return Optional.of("more than one component");
        }
        try {
            Molecule molecule = reader.read(row.get("smiles"));
            unplaced.add(new UnplacedRow(place, molecule, row.get("kind").equals("base") ? Role.BASE : Role.ACID,
                    Double.parseDouble(row.get("pka")), row.get("quality").equals("2") ? UNCERTAIN : 1));
            return Optional.empty();
        } catch (MoleculeException | NumberFormatException e) {
            return Optional.of(String.valueOf(e.getMessage()).lines().findFirst().orElse(""));
        }
    }
}
