package lyate.sheet;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.review.AcidStep;
import lyate.review.SiteOrigin;
import lyate.review.Step;
import lyate.sheet.RowException.Problem;
import lyate.sheet.reaction.Reaction;
import lyate.sheet.reaction.ReactionReader;
import lyate.stock.Acid;
import lyate.stock.Base;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import lyate.table.Lazy;

/**
 * Turns a row into the step it means. Where the row says nothing: 1.0 equivalent of base, 25 degrees Celsius, 0.2 mol/L,
 * as much water as a well-kept bottle of the solvent holds. Immutable; safe to share between threads.
 */
public final class StepReader {

    /** Moles of base per mole of substrate where the row does not say. */
    public static final double USUAL_EQUIVALENTS = 1.0;
    /** Degrees Celsius where the row does not say. */
    public static final double USUAL_TEMPERATURE = 25;
    /** mol/L of substrate where the row does not say. */
    public static final double USUAL_CONCENTRATION = 0.2;

    private final MoleculeReader molecules;
    private final Stockroom stockroom;
    private final Lazy<ReactionReader> reactions;

    public StepReader(MoleculeReader molecules, Stockroom stockroom) {
        this.molecules = molecules;
        this.stockroom = stockroom;
        this.reactions = Lazy.of(() -> new ReactionReader(molecules, stockroom));
    }

    /**
     * Reads a row.
     *
     * @throws RowException naming every column at fault
     */
    public Step read(SheetRow row) throws RowException {
        return read(row, false);
    }

    /**
     * Reads a row whose base an acid takes the place of; its reaction, if there is one, may be a protonation.
     *
     * @param acid empty: the one that is drawn
     * @throws RowException naming every column at fault
     */
    public AcidStep read(SheetRow row, Optional<Acid> acid) throws RowException {
        Optional<Acid> meant = acid.or(() -> drawn(row).flatMap(Reaction::acid));
        if (meant.isEmpty()) {
            throw new RowException(List.of(new Problem(SheetColumn.REACTION, "a proton arrives, but no acid of the tables is drawn: name it")));
        }
        return AcidStep.of(read(row, true), meant.get());
    }

    /** What the row's reaction says of the site; empty where there is no reaction that can be read. */
    public Optional<SiteOrigin> drawnSite(SheetRow row) {
        return drawn(row).map(Reaction::origin);
    }

    private Optional<Reaction> drawn(SheetRow row) {
        return reaction(row, new ArrayList<>());
    }

    private Step read(SheetRow row, boolean protonation) throws RowException {
        if (!row.problem().isEmpty()) {
            throw new RowException(List.of(new Problem("", row.problem())));
        }
        List<Problem> problems = new ArrayList<>();
        Optional<Reaction> reaction = reaction(row, problems);
        Molecule substrate = substrate(row, reaction, problems);
        Base base = protonation ? stockroom.bases().get(0) : base(row, reaction, problems);
        Solvent solvent = solvent(row, reaction, problems);
        Optional<SiteOrigin> origin = DrawnSite.of(reaction, substrate, protonation, problems);
        Optional<String> site = site(row, substrate, problems).or(() -> origin.flatMap(SiteOrigin::site));
        double equivalents = number(row, SheetColumn.BASE_EQUIV, Quantity.EQUIVALENTS, USUAL_EQUIVALENTS, problems);
        double temperature = number(row, SheetColumn.TEMPERATURE, Quantity.TEMPERATURE, USUAL_TEMPERATURE, problems);
        double concentration = number(row, SheetColumn.CONCENTRATION, Quantity.CONCENTRATION, USUAL_CONCENTRATION, problems);
        double water = number(row, SheetColumn.WATER, Quantity.WATER_PPM, UsualWater.ppm(solvent), problems);
        Optional<Molecule> partner = partner(row, problems).or(() -> reaction.flatMap(Reaction::partner));
        StepScale.check(row, problems);
        if (!problems.isEmpty()) {
            throw new RowException(problems);
        }
        return new Step(row.name(), substrate, site, base, equivalents, solvent, temperature, concentration, water, partner,
                reaction.map(drawn -> DrawnSite.compared(origin.orElseThrow(), drawn, base, partner)));
    }

    private Optional<Reaction> reaction(SheetRow row, List<Problem> problems) {
        String text = row.text(SheetColumn.REACTION);
        if (text.isEmpty()) {
            return Optional.empty();
        }
        try {
            return Optional.of(reactions.get().read(text));
        } catch (MoleculeException e) {
            problems.add(new Problem(SheetColumn.REACTION, e.getMessage()));
            return Optional.empty();
        }
    }

    private Molecule substrate(SheetRow row, Optional<Reaction> reaction, List<Problem> problems) {
        if (!row.text(SheetColumn.REACTION).isEmpty() && row.text(SheetColumn.SUBSTRATE).isEmpty()) {
            return reaction.map(Reaction::substrate).orElse(null);
        }
        try {
            return molecules.read(row.text(SheetColumn.SUBSTRATE));
        } catch (MoleculeException e) {
            problems.add(new Problem(SheetColumn.SUBSTRATE, e.getMessage()));
            return null;
        }
    }

    private Base base(SheetRow row, Optional<Reaction> reaction, List<Problem> problems) {
        String name = row.text(SheetColumn.BASE);
        Optional<Base> drawn = reaction.flatMap(Reaction::base);
        if (name.isEmpty() && drawn.isPresent()) {
            return drawn.get();
        }
        try {
            if (!name.isEmpty()) {
                return stockroom.base(name);
            }
            if (mayLack(row, reaction)) {
                problems.add(new Problem(SheetColumn.BASE, "there is no base" + reaction.flatMap(Reaction::acid)
                        .map(acid -> "; " + acid.name() + ", which is drawn, is an acid").orElse("")));
            }
        } catch (UnknownNameException e) {
            problems.add(new Problem(SheetColumn.BASE, e.getMessage()));
        }
        return null;
    }

    /** Nothing is missed of a reaction that could not be read, or that no base takes part in. */
    private static boolean mayLack(SheetRow row, Optional<Reaction> reaction) {
        return row.text(SheetColumn.REACTION).isEmpty() || reaction.filter(drawn -> !drawn.origin().arrives()).isPresent();
    }

    private Solvent solvent(SheetRow row, Optional<Reaction> reaction, List<Problem> problems) {
        String name = row.text(SheetColumn.SOLVENT);
        Optional<Solvent> drawn = reaction.flatMap(Reaction::solvent);
        if (name.isEmpty() && drawn.isPresent()) {
            return drawn.get();
        }
        try {
            if (!name.isEmpty()) {
                return stockroom.solvent(name);
            }
            if (mayLack(row, reaction)) {
                problems.add(new Problem(SheetColumn.SOLVENT, "there is no solvent"));
            }
        } catch (UnknownNameException e) {
            problems.add(new Problem(SheetColumn.SOLVENT, e.getMessage()));
        }
        return null;
    }

    private static Optional<String> site(SheetRow row, Molecule substrate, List<Problem> problems) {
        String label = row.text(SheetColumn.SITE);
        if (label.isEmpty() || substrate == null) {
            return Optional.empty();
        }
        if (substrate.atomLabelled(label).isEmpty()) {
            problems.add(new Problem(SheetColumn.SITE, "there is no atom '" + label + "' in the substrate; its protons are on "
                    + protons(substrate)));
        }
        return Optional.of(label);
    }

    /** The first of each kind of atom that carries hydrogen. */
    private static String protons(Molecule substrate) {
        Set<Long> seen = new HashSet<>();
        String atoms = IntStream.range(0, substrate.atomCount())
                .filter(atom -> substrate.hydrogens(atom) > 0 && seen.add(substrate.symmetryClass(atom)))
                .mapToObj(substrate::label).collect(Collectors.joining(", "));
        return atoms.isEmpty() ? "no atom" : atoms;
    }

    private Optional<Molecule> partner(SheetRow row, List<Problem> problems) {
        String text = row.text(SheetColumn.ELECTROPHILE);
        if (text.isEmpty()) {
            return Optional.empty();
        }
        try {
            return Optional.of(molecules.read(structureOf(text)));
        } catch (MoleculeException e) {
            problems.add(new Problem(SheetColumn.ELECTROPHILE, e.getMessage()));
            return Optional.empty();
        }
    }

    /** A partner's structure by its name or abbreviation; any other text is a structure itself. */
    private String structureOf(String text) {
        try {
            return stockroom.partner(text).smiles();
        } catch (UnknownNameException e) {
            return text;
        }
    }

    private static double number(SheetRow row, SheetColumn column, Quantity quantity, double usual, List<Problem> problems) {
        String text = row.text(column);
        if (text.isEmpty()) {
            return usual;
        }
        return quantity.parse(text).orElseGet(() -> {
            problems.add(new Problem(column, "found '" + text + "', expected " + quantity.expected()));
            return Double.NaN;
        });
    }
}
