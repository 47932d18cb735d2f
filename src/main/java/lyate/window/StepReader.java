package lyate.window;

import java.math.BigDecimal;
import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.review.Step;
import lyate.stock.Base;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;

/** Turns typed text into a step, or says by field what stands in the way. Pure; safe to share between threads. */
final class StepReader {

    private static final Range EQUIVALENTS = new Range(0, 100);
    private static final Range TEMPERATURE = new Range(-120, 250);
    private static final Range CONCENTRATION = new Range(1e-6, 30);
    private static final Range WATER = new Range(0, 1e6);

    private final MoleculeReader molecules;
    private final Stockroom stockroom;

    StepReader(MoleculeReader molecules, Stockroom stockroom) {
        this.molecules = molecules;
        this.stockroom = stockroom;
    }

    StepReading read(StepText text) {
        Map<StepField, String> problems = new EnumMap<>(StepField.class);
        Molecule substrate = molecule(text, StepField.SUBSTRATE, problems);
        Base base = base(text.get(StepField.BASE), problems);
        Solvent solvent = solvent(text.get(StepField.SOLVENT), problems);
        double equivalents = number(text, StepField.EQUIVALENTS, EQUIVALENTS, problems);
        double temperature = number(text, StepField.TEMPERATURE, TEMPERATURE, problems);
        double concentration = number(text, StepField.CONCENTRATION, CONCENTRATION, problems);
        double water = number(text, StepField.WATER, WATER, problems);
        Optional<Molecule> partner = text.get(StepField.PARTNER).isEmpty() ? Optional.empty()
                : Optional.ofNullable(molecule(text, StepField.PARTNER, problems));
        if (!problems.isEmpty()) {
            return new StepReading(Optional.empty(), problems);
        }
        Optional<String> site = Optional.of(text.site()).filter(label -> substrate.atomLabelled(label).isPresent());
        return new StepReading(Optional.of(new Step("1", substrate, site, base, equivalents, solvent, temperature,
                concentration, water, partner)), problems);
    }

    private Molecule molecule(StepText text, StepField field, Map<StepField, String> problems) {
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

    private Base base(String name, Map<StepField, String> problems) {
        try {
            if (!name.isEmpty()) {
                return stockroom.base(name);
            }
            problems.put(StepField.BASE, "choose a base");
        } catch (UnknownNameException e) {
            problems.put(StepField.BASE, e.getMessage());
        }
        return null;
    }

    private Solvent solvent(String name, Map<StepField, String> problems) {
        try {
            if (!name.isEmpty()) {
                return stockroom.solvent(name);
            }
            problems.put(StepField.SOLVENT, "choose a solvent");
        } catch (UnknownNameException e) {
            problems.put(StepField.SOLVENT, e.getMessage());
        }
        return null;
    }

    private static double number(StepText text, StepField field, Range range, Map<StepField, String> problems) {
        String typed = text.get(field).replace(',', '.').replace('\u2212', '-');
        try {
            double value = Double.parseDouble(typed);
            if (value >= range.low() && value <= range.high()) {
                return value;
            }
        } catch (NumberFormatException e) {
            // falls through to the same sentence as a number out of range
        }
        problems.put(field, "a number, " + range.words() + " " + field.unit());
        return Double.NaN;
    }

    /** Sane limits of a number, both included. */
    private record Range(double low, double high) {
        String words() {
return BigDecimal.valueOf(low).stripTrailingZeros().toPlainString() + " to " + BigDecimal.valueOf(high).stripTrailingZeros().toPlainString();
        }
    }
}
