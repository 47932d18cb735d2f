package lyate.command;

import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import lyate.bench.Amounts;
import lyate.bench.Batch;
import lyate.bench.Enthalpies;
import lyate.bench.GasAndHeat;
import lyate.bench.WorkUpKit;
import lyate.bench.WorkUpKit.Beside;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.report.AmountsJson;
import lyate.report.BenchJson;
import lyate.report.BenchText;
import lyate.review.Review;
import lyate.stock.Acid;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import lyate.table.TableFolders;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;
import picocli.CommandLine.Spec.Target;

/** What the bench is asked beside the judgement: amounts, gas and heat, work-up. */
final class BenchOptions {

    private static final Pattern AMOUNT = Pattern.compile("(\\d+(?:[.,]\\d+)?|[.,]\\d+)\\s*(kg|g|mg|mol|mmol)");
    private static final Map<String, Double> TO_MILLI = Map.of("kg", 1e6, "g", 1e3, "mg", 1.0, "mol", 1e3, "mmol", 1.0);
    /** A batch that stands for others where a work-up is asked for without one. */
    private static final double USUAL_MILLI_MOLE = 10;

    @Spec(Target.MIXEE)
    private CommandSpec spec;

    @Option(names = "--amount", paramLabel = "5g", defaultValue = "", description = "Substrate in g, mg, kg, mmol or mol: adds what to"
            + " weigh and measure out, and the gas and heat.")
    private String amount;
    @Option(names = "--titre", paramLabel = "M", description = "Strength of the base found by titration, mol/L; replaces the label's.")
    private Double titre;
    @Option(names = "--work-up", description = "Adds the quench, the pH to extract at, and what the water would hurt.")
    private boolean workUp;
    @Option(names = "--product", paramLabel = "P", defaultValue = "", description = "What is worked up (default: the substrate, its anion quenched).")
    private String product;
    @Option(names = "--separate-from", paramLabel = "X", description = "A further substance the product is to be freed from, for example"
            + " an unreacted acid: structure or name. May be repeated.")
    private List<String> separateFrom = List.of();
    @Option(names = "--quench", paramLabel = "ACID", defaultValue = "1 M hydrochloric acid", description = "Acid of the quench, from the shelf"
            + " (default: 1 M hydrochloric acid).")
    private String quench;
    @Option(names = "--quench-ph", paramLabel = "PH", defaultValue = "7", description = "Where the quench is to end (default: 7).")
    private double quenchPH;

    /** What the bench answered; empty where it was not asked. */
    record Answers(Optional<Amounts> amounts, Optional<GasAndHeat> gasAndHeat, Optional<WorkUpKit.Answer> workUp, Molecule product) {

        void write(Review review, Appendable out) throws IOException {
            if (amounts.isPresent() && gasAndHeat.isPresent()) {
                new BenchText(out).write(review.step(), amounts.get(), gasAndHeat.get());
            }
            if (workUp.isPresent()) {
                new BenchText(out).write(workUp.get());
            }
        }

        /** As further members of the object of a review. */
        Map<String, Object> describe() {
            Map<String, Object> object = new LinkedHashMap<>();
            amounts.ifPresent(found -> object.put("amounts", AmountsJson.describe(found)));
            gasAndHeat.ifPresent(found -> object.put("gas_and_heat", BenchJson.describe(found)));
            workUp.ifPresent(found -> object.put("work_up", BenchJson.describe(product, found)));
            return object;
        }
    }

    /**
     * Asks the bench about a reviewed step.
     *
     * @throws ParameterException naming the option that cannot be read
     */
    Answers ask(Review review, TableFolders folders, Stockroom stockroom, MoleculeReader molecules) {
        boolean withWorkUp = workUp || !product.isEmpty() || !separateFrom.isEmpty();
        Molecule worked = product.isEmpty() ? review.step().substrate() : molecule("--product", product, stockroom, molecules);
        if (amount.isEmpty() && !withWorkUp) {
            return new Answers(Optional.empty(), Optional.empty(), Optional.empty(), worked);
        }
        Enthalpies enthalpies = Enthalpies.load(folders);
        Amounts amounts = Amounts.of(review, batch(review.step().substrate()), titre());
        Optional<WorkUpKit.Answer> answer = withWorkUp ? Optional.of(WorkUpKit.load(folders, stockroom, enthalpies).ask(
                new WorkUpKit.Plan(review.step(), amounts, Optional.of(worked), beside(stockroom, molecules), acid(stockroom), pH())))
                : Optional.empty();
        boolean withAmounts = !amount.isEmpty();
        return new Answers(withAmounts ? Optional.of(amounts) : Optional.empty(),
                withAmounts ? Optional.of(GasAndHeat.of(review, amounts, enthalpies)) : Optional.empty(), answer, worked);
    }

    private Batch batch(Molecule substrate) {
        if (amount.isEmpty()) {
            return Batch.ofMilliMole(substrate, USUAL_MILLI_MOLE);
        }
        Matcher parts = AMOUNT.matcher(amount.strip().toLowerCase(Locale.ROOT));
        double number = parts.matches() ? Double.parseDouble(parts.group(1).replace(',', '.')) : 0;
        if (!(number > 0)) {
            throw refused("--amount: found '" + amount + "', expected a number above 0 with its unit, for example 5g or 20mmol");
        }
        double milli = number * TO_MILLI.get(parts.group(2));
        return parts.group(2).endsWith("g") ? Batch.ofGrams(substrate, milli / 1000) : Batch.ofMilliMole(substrate, milli);
    }

    private OptionalDouble titre() {
        if (titre != null && !(titre > 0 && titre < 30)) {
            throw refused("--titre: found " + titre + ", expected a number above 0 and below 30 (mol/L)");
        }
        return titre == null ? OptionalDouble.empty() : OptionalDouble.of(titre);
    }

    private double pH() {
        if (!(quenchPH >= 0 && quenchPH <= 14)) {
            throw refused("--quench-ph: found " + quenchPH + ", expected a number from 0 to 14");
        }
        return quenchPH;
    }

    private Acid acid(Stockroom stockroom) {
        try {
            return stockroom.acid(quench);
        } catch (UnknownNameException e) {
            throw refused("--quench: " + e.getMessage());
        }
    }

    private List<Beside> beside(Stockroom stockroom, MoleculeReader molecules) {
        List<Beside> beside = new ArrayList<>();
        for (String text : separateFrom) {
            beside.add(new Beside(text, molecule("--separate-from", text, stockroom, molecules)));
        }
        return beside;
    }

    /** A substance by its name on the shelf of acids or partners, or by its structure. */
    private Molecule molecule(String option, String text, Stockroom stockroom, MoleculeReader molecules) {
        try {
            return molecules.read(stockroom.structureOf(text).orElse(text));
        } catch (MoleculeException e) {
            throw refused(option + ": " + e.getMessage());
        }
    }

    private ParameterException refused(String message) {
        return new ParameterException(spec.commandLine(), message);
    }
}
