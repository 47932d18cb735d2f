package lyate.stock;

import java.util.List;
import java.util.Optional;
import lyate.table.TableException;
import lyate.table.TableFolders;

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

    private Stockroom(TableFolders folders) {
        BaseTable baseTable = new BaseTable(folders);
        this.bases = new Shelf<>("base", "bases.csv", baseTable.read());
        this.solvents = new Shelf<>("solvent", "solvents.csv", SolventTable.read(folders));
        this.acids = new Shelf<>("acid", "acids.csv", AcidTable.read(folders));
        this.partners = new Shelf<>("partner", "partners.csv", PartnerTable.read(folders, baseTable.familyIds()));
    }

    /**
     * Loads the shelf tables.
     *
     * @throws TableException naming file, line and column of every bad cell, and both rows where two share a name
     */
    public static Stockroom load(TableFolders folders) {
        return new Stockroom(folders);
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
