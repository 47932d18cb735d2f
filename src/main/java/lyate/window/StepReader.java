package lyate.window;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.review.Step;
import lyate.sheet.Quantity;
import lyate.sheet.Reaction;
import lyate.sheet.ReactionReader;
import lyate.sheet.UsualWater;
import lyate.stock.Base;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;

/**
 * Turns typed text into a step, or says by field what stands in the way. Where a field is empty it means what an empty cell
 * of a sheet means. Pure; safe to share between threads.
 */
final class StepReader {

    private final MoleculeReader molecules;
    private final Supplier<Stockroom> stockroom;

    /** @param stockroom asked when the first step is read */
    StepReader(MoleculeReader molecules, Supplier<Stockroom> stockroom) {
        this.molecules = molecules;
        this.stockroom = stockroom;
    }

    StepReading read(StepText text) {
        Map<StepField, String> problems = new EnumMap<>(StepField.class);
        Optional<Reaction> reaction = reaction(text.get(StepField.SUBSTRATE), problems);
        Molecule substrate = reaction.map(Reaction::substrate).orElseGet(() -> molecule(text, StepField.SUBSTRATE, problems));
        Base base = base(text.get(StepField.BASE), reaction, problems);
        Solvent solvent = solvent(text.get(StepField.SOLVENT), reaction, problems);
        double equivalents = number(text, StepField.EQUIVALENTS, Quantity.EQUIVALENTS, lyate.sheet.StepReader.USUAL_EQUIVALENTS, problems);
        double temperature = number(text, StepField.TEMPERATURE, Quantity.TEMPERATURE, lyate.sheet.StepReader.USUAL_TEMPERATURE, problems);
        double concentration = number(text, StepField.CONCENTRATION, Quantity.CONCENTRATION, lyate.sheet.StepReader.USUAL_CONCENTRATION, problems);
        double water = number(text, StepField.WATER, Quantity.WATER_PPM, UsualWater.ppm(solvent), problems);
        Optional<Molecule> partner = text.get(StepField.PARTNER).isEmpty() ? Optional.empty()
                : Optional.ofNullable(molecule(text, StepField.PARTNER, problems));
        if (!problems.isEmpty()) {
            return new StepReading(Optional.empty(), problems);
        }
        Optional<String> site = Optional.of(text.site()).filter(label -> substrate.atomLabelled(label).isPresent());
        return new StepReading(Optional.of(new Step("", substrate, site, base, equivalents, solvent, temperature,
                concentration, water, partner)), problems);
    }

    private Optional<Reaction> reaction(String text, Map<StepField, String> problems) {
        if (!StepCells.isReaction(text)) {
            return Optional.empty();
        }
        try {
            return Optional.of(new ReactionReader(molecules, stockroom.get()).read(text));
        } catch (MoleculeException e) {
            problems.put(StepField.SUBSTRATE, e.getMessage());
            return Optional.empty();
        }
    }

    private Molecule molecule(StepText text, StepField field, Map<StepField, String> problems) {
        if (problems.containsKey(field)) {
            return null;
        }
        if (text.get(field).isEmpty()) {
            problems.put(field, "type or paste a structure");
            return null;
        }
        try {
            return molecules.read(text.get(field));
        } catch (MoleculeException e) {
            problems.put(field, e.getMessage());
            return null;
        }
    }

    private Base base(String name, Optional<Reaction> reaction, Map<StepField, String> problems) {
        Optional<Base> drawn = reaction.flatMap(Reaction::base);
        if (name.isEmpty() && drawn.isPresent()) {
            return drawn.get();
        }
        try {
            if (!name.isEmpty()) {
                return stockroom.get().base(name);
            }
            problems.put(StepField.BASE, "choose a base");
        } catch (UnknownNameException e) {
            problems.put(StepField.BASE, e.getMessage());
        }
        return null;
    }

    private Solvent solvent(String name, Optional<Reaction> reaction, Map<StepField, String> problems) {
        Optional<Solvent> drawn = reaction.flatMap(Reaction::solvent);
        if (name.isEmpty() && drawn.isPresent()) {
            return drawn.get();
        }
        try {
            if (!name.isEmpty()) {
                return stockroom.get().solvent(name);
            }
            problems.put(StepField.SOLVENT, "choose a solvent");
        } catch (UnknownNameException e) {
            problems.put(StepField.SOLVENT, e.getMessage());
        }
        return null;
    }

    private static double number(StepText text, StepField field, Quantity quantity, double usual, Map<StepField, String> problems) {
        if (text.get(field).isEmpty()) {
            return usual;
        }
        return quantity.parse(text.get(field)).orElseGet(() -> {
            problems.put(field, quantity.expected());
            return Double.NaN;
        });
    }
}
