package lyate.acidity;

import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.OptionalLong;
import java.util.TreeMap;
import lyate.molecule.HeavyAtoms;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.site.ProtonSite;
import lyate.site.Role;
import lyate.stock.Medium;
import lyate.table.Lazy;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/**
 * The pKa values of {@code measured-acidities.csv}, found by structure and only at the site they were measured at.
 * How the structure is drawn does not matter ({@link ProtonSkeleton}). Immutable; safe to share between threads.
 */
public final class MeasuredAcidities {

    /** What {@code measured-acidities.csv} looks like. */
    public static final Schema SCHEMA = Schema.of("measured-acidities.csv",
            text("id"), text("name"), text("smiles"), text("site"), word("role", "acid", "base"), text("medium"),
            number("pka"), number("sigma"), number("temperature_C").optional(), text("source"));

    /**
     * One row, matched and read.
     *
     * @param row      its table row
     * @param molecule its structure
     * @param role     whether the structure is the acid or its conjugate base
     * @param atom     index of the site
     * @param place    what it is found by
     * @param acidity  its value
     */
    public record Value(Row row, Molecule molecule, Role role, int atom, ProtonSkeleton place, Acidity acidity) {}

    private final List<Lazy<Value>> values;
    /** By {@link HeavyAtoms}, later rows first. */
    private final Map<Long, List<Lazy<Value>>> byHeavyAtoms = new HashMap<>();

    /** Later values of the same proton in the same medium replace earlier ones. */
    private MeasuredAcidities(List<Entry> entries) {
        this.values = entries.stream().map(Entry::value).toList();
        for (Entry entry : entries) {
            byHeavyAtoms.computeIfAbsent(entry.heavyAtoms(), key -> new ArrayList<>()).add(0, entry.value());
        }
    }

    /** A value and the heavy atoms of its structure, by which it is found; the structure is read when they are asked for. */
    private record Entry(long heavyAtoms, Lazy<Value> value) {}

    /**
     * Loads the table and reads the structures of the rows somebody added; the packaged ones are held by tests.
     *
     * @throws TableException for a bad cell, a structure that cannot be read, or a site it does not have
     */
    public static MeasuredAcidities load(TableFolders folders) {
        return of(Table.read(SCHEMA, folders));
    }

    /** The same of a table that is read already. */
    static MeasuredAcidities of(Table table) {
        MoleculeReader reader = new MoleculeReader();
        List<TableProblem> problems = new ArrayList<>();
        List<Entry> entries = new ArrayList<>();
        for (Row row : table.rows()) {
            OptionalLong heavyAtoms = row.file().equals(SCHEMA.fileName()) ? HeavyAtoms.ofSmiles(row.text("smiles")) : OptionalLong.empty();
            if (heavyAtoms.isPresent()) {
                entries.add(new Entry(heavyAtoms.getAsLong(), Lazy.of(() -> readSound(row, reader))));
            } else {
                Reading reading = read(row, reader);
                reading.problem().ifPresent(problems::add);
                reading.value().ifPresent(value -> entries.add(new Entry(HeavyAtoms.of(value.molecule()), Lazy.known(value))));
            }
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return new MeasuredAcidities(entries);
    }

    /** A table without a row. */
    public static MeasuredAcidities none() {
        return new MeasuredAcidities(List.of());
    }

    /** Every row. */
    public List<Value> values() {
        return values.parallelStream().map(Lazy::get).toList();
    }

    /** The value measured for this proton in this medium. */
    public Optional<Acidity> measured(Molecule molecule, ProtonSite site, Medium medium) {
        return inAnyMedium(molecule, site).stream().filter(acidity -> acidity.medium().equals(medium)).findFirst();
    }

    /** The values measured for this proton, one per medium, ordered by the medium's id. */
    public List<Acidity> inAnyMedium(Molecule molecule, ProtonSite site) {
        List<Lazy<Value>> alike = byHeavyAtoms.get(HeavyAtoms.of(molecule));
        if (alike == null) {
            return List.of();
        }
        long formula = ProtonSkeleton.formula(molecule, site.role());
        List<Value> isomers = alike.stream().map(Lazy::get).filter(value -> value.place().formula() == formula).toList();
        return isomers.isEmpty() ? List.of() : at(ProtonSkeleton.of(molecule, site.role(), site.atom()), molecule.doubleBondConfigurations(), isomers);
    }

    /** A row whose double bonds are drawn as asked goes before one that leaves them open; one drawn the other way is another acid. */
    private static List<Acidity> at(ProtonSkeleton place, List<String> configurations, List<Value> isomers) {
        Map<String, Acidity> found = new TreeMap<>();
        Map<String, Acidity> lessSure = new TreeMap<>();
        for (Value value : isomers) {
            if (value.place().sameAs(place)) {
                List<String> drawn = value.molecule().doubleBondConfigurations();
                if (drawn.equals(configurations)) {
                    found.putIfAbsent(value.acidity().medium().id(), value.acidity());
                } else if (drawn.isEmpty() || configurations.isEmpty()) {
                    lessSure.putIfAbsent(value.acidity().medium().id(), value.acidity());
                }
            }
        }
        lessSure.forEach(found::putIfAbsent);
        return List.copyOf(found.values());
    }

    /** A row's value, or what is wrong with it. */
    private record Reading(Optional<Value> value, Optional<TableProblem> problem) {

        static Reading problem(Row row, String column, String expected) {
            return new Reading(Optional.empty(), Optional.of(row.problem(column, expected)));
        }
    }

    private static Value readSound(Row row, MoleculeReader reader) {
        Reading reading = read(row, reader);
        return reading.value().orElseThrow(() -> new TableException(List.of(reading.problem().orElseThrow())));
    }

    private static Reading read(Row row, MoleculeReader reader) {
        Molecule molecule;
        try {
            molecule = reader.read(row.text("smiles"));
        } catch (MoleculeException e) {
            return Reading.problem(row, "smiles", "a structure (" + e.getMessage() + ")");
        }
        Role role = row.text("role").equals(Role.ACID.word()) ? Role.ACID : Role.BASE;
        OptionalInt atom = molecule.atomLabelled(row.text("site"));
        if (atom.isEmpty() || role == Role.ACID && molecule.hydrogens(atom.getAsInt()) == 0) {
            return Reading.problem(row, "site", "an atom of " + row.text("smiles")
                    + (role == Role.ACID ? " that carries hydrogen" : "") + ", for example O4");
        }
        if (row.number("sigma").getAsDouble() <= 0) {
            return Reading.problem(row, "sigma", "a number above zero");
        }
        Acidity acidity = Acidity.measured(row.number("pka").getAsDouble(), row.number("sigma").getAsDouble(),
                new Medium(row.text("medium")), row.text("source"));
        ProtonSkeleton place = ProtonSkeleton.of(molecule, role, atom.getAsInt());
        return new Reading(Optional.of(new Value(row, molecule, role, atom.getAsInt(), place, acidity)), Optional.empty());
    }
}
