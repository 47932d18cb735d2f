package lyate.acidity.lfer;

import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.stream.Collectors;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.site.Role;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/** The rows of {@code estimate-anchors.csv}, whose structures are read pool by pool when they are needed. */
public final class AnchorTable {

    /** What {@code estimate-anchors.csv} looks like. */
    public static final Schema SCHEMA = Schema.of("estimate-anchors.csv", text("id"), word("medium", "water", "dmso"), text("pool"),
            text("smiles"), text("site"), word("role", "acid", "base"), number("weight"), number("misfit"),
            text("measured").optional(), text("source"));

    private final Map<String, List<Row>> byPool;
    private final SiteDescriber describer;

    private record Reading(Optional<Anchor> anchor, Optional<TableProblem> problem) {}

    private AnchorTable(Map<String, List<Row>> byPool, SiteDescriber describer) {
        this.byPool = byPool;
        this.describer = describer;
    }

    /**
     * Loads the table.
     *
     * @throws TableException for a bad cell
     */
    static AnchorTable load(TableFolders folders, SiteDescriber describer) {
        return new AnchorTable(Table.read(SCHEMA, folders).rows().stream()
                .collect(Collectors.groupingBy(row -> row.text("medium") + " " + row.text("pool"))), describer);
    }

    /**
     * The anchors of a pool.
     *
     * @throws TableException for a structure that cannot be read, or a site it does not have
     */
    List<Anchor> of(Pool pool) {
        List<Reading> readings = byPool.getOrDefault(pool.medium().id() + " " + pool.name(), List.of()).parallelStream()
                .map(row -> read(row, describer)).toList();
        List<TableProblem> problems = readings.stream().flatMap(reading -> reading.problem().stream()).toList();
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return readings.stream().flatMap(reading -> reading.anchor().stream()).toList();
    }

    private static Reading read(Row row, SiteDescriber describer) {
        try {
            Molecule molecule = new MoleculeReader().read(row.text("smiles"));
            OptionalInt atom = molecule.atomLabelled(row.text("site"));
            Role role = row.text("role").equals(Role.ACID.word()) ? Role.ACID : Role.BASE;
            Optional<SiteDescription> site = atom.isEmpty() ? Optional.empty() : describer.describe(molecule, role, atom.getAsInt());
            if (site.isEmpty()) {
                return new Reading(Optional.empty(), Optional.of(row.problem("site", "an atom of a series of estimate-series.csv")));
            }
            return new Reading(Optional.of(new Anchor(row.text("smiles"), row.text("site"), site.get(),
                    row.number("weight").getAsDouble(), row.number("misfit").getAsDouble(), row.text("measured"))), Optional.empty());
        } catch (MoleculeException e) {
            return new Reading(Optional.empty(), Optional.of(row.problem("smiles", "a structure (" + e.getMessage() + ")")));
        }
    }
}
