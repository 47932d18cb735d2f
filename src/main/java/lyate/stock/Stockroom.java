package lyate.stock;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/**
 * Everything on the shelf, loaded once and passed in. Immutable; safe to share between threads.
 *
 * <p>Things are found by id, name, alias or abbreviation; case, accents, spaces and punctuation do not count.
 */
public final class Stockroom {

    private final Shelf<Base> bases;
    private final Shelf<Solvent> solvents;
    private final Shelf<Acid> acids;
    private final Shelf<Partner> partners;

    private Stockroom(Shelf<Base> bases, Shelf<Solvent> solvents, Shelf<Acid> acids, Shelf<Partner> partners) {
        this.bases = bases;
        this.solvents = solvents;
        this.acids = acids;
        this.partners = partners;
    }

    /**
     * Loads the shelf tables.
     *
     * @throws TableException naming file, line and column of every bad cell, and both rows where two share a name
     */
    public static Stockroom load(TableFolders folders) {
        List<TableProblem> problems = new ArrayList<>();
        Optional<BaseTable> families = sound(() -> new BaseTable(folders), problems);
        Optional<Shelf<Base>> bases = families.flatMap(table -> sound(() -> new Shelf<>("base", "bases.csv", table.read()), problems));
        Optional<Shelf<Solvent>> solvents = sound(() -> new Shelf<>("solvent", "solvents.csv", SolventTable.read(folders)), problems);
        Optional<Shelf<Acid>> acids = sound(() -> new Shelf<>("acid", "acids.csv", AcidTable.read(folders)), problems);
        Optional<Shelf<Partner>> partners = families.flatMap(table -> sound(() -> new Shelf<>("partner", "partners.csv",
                PartnerTable.read(folders, table.familyIds())), problems));
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return new Stockroom(bases.orElseThrow(), solvents.orElseThrow(), acids.orElseThrow(), partners.orElseThrow());
    }

    /** What a table gives, or empty with its problems noted: the other tables are read all the same. */
    private static <T> Optional<T> sound(Supplier<T> table, List<TableProblem> problems) {
        try {
            return Optional.of(table.get());
        } catch (TableException e) {
            problems.addAll(e.problems());
            return Optional.empty();
        }
    }

    /** Every base, in the order of the table. */
    public List<Base> bases() {
        return bases.all();
    }

    /** Every solvent, in the order of the table. */
    public List<Solvent> solvents() {
        return solvents.all();
    }

    /** Every acid, in the order of the table. */
    public List<Acid> acids() {
        return acids.all();
    }

    /** Every electrophile and other partner, in the order of the table. */
    public List<Partner> partners() {
        return partners.all();
    }

    /**
     * The base of that name.
     *
     * @throws UnknownNameException with the nearest known names
     */
    public Base base(String name) throws UnknownNameException {
        return bases.find(name);
    }

    /**
     * The solvent of that name.
     *
     * @throws UnknownNameException with the nearest known names
     */
    public Solvent solvent(String name) throws UnknownNameException {
        return solvents.find(name);
    }

    /**
     * The acid of that name.
     *
     * @throws UnknownNameException with the nearest known names
     */
    public Acid acid(String name) throws UnknownNameException {
        return acids.find(name);
    }

    /** The acid of that name where it is no base's name: somebody put an acid where a base belongs, to protonate something. */
    public Optional<Acid> acidNamedAsBase(String name) {
        return bases.lookUp(name).isPresent() ? Optional.empty() : acids.lookUp(name);
    }

    /**
     * The partner of that name.
     *
     * @throws UnknownNameException with the nearest known names
     */
    public Partner partner(String name) throws UnknownNameException {
        return partners.find(name);
    }

    /** SMILES of the acid, partner or base that goes by a name. */
    public Optional<String> structureOf(String name) {
        return acids.lookUp(name).map(Acid::smiles).or(() -> partners.lookUp(name).map(Partner::smiles))
                .or(() -> bases.lookUp(name).map(Base::smiles));
    }

    /** At most {@code limit} bases that a text typed so far may mean, likeliest first. */
    public List<Base> searchBases(String text, int limit) {
        return bases.search(text, limit);
    }

    /** At most {@code limit} solvents that a text typed so far may mean, likeliest first. */
    public List<Solvent> searchSolvents(String text, int limit) {
        return solvents.search(text, limit);
    }
}
