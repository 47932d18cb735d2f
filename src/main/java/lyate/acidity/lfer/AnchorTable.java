package lyate.acidity.lfer;

import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.site.Role;
import lyate.stock.Medium;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/** Reads {@code estimate-anchors.csv}. */
public final class AnchorTable {

    /** What {@code estimate-anchors.csv} looks like. */
    public static final Schema SCHEMA = Schema.of("estimate-anchors.csv", text("id"), word("medium", "water", "dmso"),
            text("smiles"), text("site"), word("role", "acid", "base"), number("weight"), text("measured").optional(), text("source"));

    private AnchorTable() {}

    private record Reading(Row row, Optional<Anchor> anchor, Optional<TableProblem> problem) {}

    /**
     * The anchors by pool.
     *
     * @throws TableException for a bad cell, a structure that cannot be read, or a site it does not have
     */
    static Map<Pool, List<Anchor>> load(TableFolders folders, SiteDescriber describer, Pools pools) {
        List<Reading> readings = Table.read(SCHEMA, folders).rows().parallelStream().map(row -> read(row, describer)).toList();
        List<TableProblem> problems = readings.stream().flatMap(reading -> reading.problem().stream()).toList();
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        Map<Pool, List<Anchor>> anchors = new HashMap<>();
        for (Reading reading : readings) {
            Anchor anchor = reading.anchor().orElseThrow();
            pools.of(new Medium(reading.row().text("medium")), anchor.site().series().group())
                    .ifPresent(pool -> anchors.computeIfAbsent(pool, key -> new ArrayList<>()).add(anchor));
        }
        return anchors;
    }

    private static Reading read(Row row, SiteDescriber describer) {
        try {
            Molecule molecule = new MoleculeReader().read(row.text("smiles"));
            OptionalInt atom = molecule.atomLabelled(row.text("site"));
            Role role = row.text("role").equals(Role.ACID.word()) ? Role.ACID : Role.BASE;
            Optional<SiteDescription> site = atom.isEmpty() ? Optional.empty() : describer.describe(molecule, role, atom.getAsInt());
            if (site.isEmpty()) {
                return new Reading(row, Optional.empty(), Optional.of(row.problem("site", "an atom of a series of estimate-series.csv")));
            }
            return new Reading(row, Optional.of(new Anchor(row.text("smiles"), row.text("site"), site.get(),
                    row.number("weight").getAsDouble(), row.text("measured"))), Optional.empty());
        } catch (MoleculeException e) {
            return new Reading(row, Optional.empty(), Optional.of(row.problem("smiles", "a structure (" + e.getMessage() + ")")));
        }
    }
}
