package lyate.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import lyate.review.Review;
import lyate.review.Step;
import lyate.review.Transfer;
import lyate.stock.Base;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;

/**
 * What to weigh and measure out for a step, and where its base goes.
 *
 * @param batch             substrate
 * @param solventMilliLitre solvent that gives the stated concentration of substrate
 * @param waterMilliMole    water that solvent brings
 * @param base              base for the stated equivalents
 * @param spending          what takes the base before and at the intended site, in order; protons, mmol
 * @param protonsTakenUp    protons that much base can take, mmol
 * @param baseNeeded        base that just covers the spending
 * @param warnings          what the user should know, in words
 */
public record Amounts(Batch batch, double solventMilliLitre, double waterMilliMole, Portion base, List<Spent> spending,
                      double protonsTakenUp, Portion baseNeeded, List<String> warnings) {

    private static final double WATER_MOLAR_MASS = 18.015;
    /** pKa of water on the molar scale, 14.00 + log10 55.3. */
    private static final double WATER_PKA = 15.74;
    /** A titrated strength this far off the label is worth a word. */
    private static final double NOTABLE_DEVIATION = 0.05;
    /** Water below this share of the substrate is not worth a word. */
    private static final double NOTABLE_WATER = 0.01;

    /**
     * Protons the base meets.
     *
     * @param what      site label, or {@code water}
     * @param milliMole how many
     */
    public record Spent(String what, double milliMole) {}

    public Amounts {
        spending = List.copyOf(spending);
        warnings = List.copyOf(warnings);
    }

    /**
     * Works out the amounts of a reviewed step.
     *
     * @param titrated strength of the base found by titration, mol/L; empty to go by the label
     */
    public static Amounts of(Review review, Batch batch, OptionalDouble titrated) {
        Step step = review.step();
        double solvent = batch.milliMole() / step.concentrationMolar();
        double water = solvent * step.solvent().density() * step.waterPpm() * 1e-6 / WATER_MOLAR_MASS * 1000;
        List<Spent> spending = spending(review, batch.milliMole(), water);
        double spent = spending.stream().mapToDouble(Spent::milliMole).sum();
        int protonsPerFormula = step.base().protonsPerFormula();
        double planned = batch.milliMole() * step.equivalents();
        Amounts amounts = new Amounts(batch, solvent, water, Portion.of(step.base(), planned, titrated), spending,
                planned * protonsPerFormula, Portion.of(step.base(), spent / protonsPerFormula, titrated), List.of());
        return amounts.with(amounts.warnings(step, titrated));
    }

    /** Protons the base can still take once everything it meets is spent; negative where it falls short, mmol. */
    public double excess() {
        return protonsTakenUp - spending.stream().mapToDouble(Spent::milliMole).sum();
    }

    private static List<Spent> spending(Review review, double milliMole, double water) {
        List<Spent> spending = new ArrayList<>();
        if (water > 0 && takesWater(review.step().base())) {
            spending.add(new Spent("water", water));
        }
        review.transfers().stream()
                .filter(transfer -> !transfer.atoms().isEmpty())
                .filter(transfer -> transfer.logK() > review.logK() && !transfer.donor().equals(review.intendedSite()))
                .forEach(transfer -> spending.add(new Spent(transfer.donor(), milliMole * protons(review.step(), transfer))));
        spending.add(new Spent(review.intendedSite(), milliMole));
        return spending;
    }

    /** Equivalent heteroatoms give one proton each; of equivalent carbons only the first goes before the charge is felt. */
    static int protons(Step step, Transfer transfer) {
        boolean carbon = step.substrate().atomicNumber(transfer.atoms().get(0)) == 6;
        return carbon ? 1 : transfer.atoms().size();
    }

    /** Whether water gives its proton to the base for the greater part. */
    private static boolean takesWater(Base base) {
        Optional<KnownPKa> inWater = base.pKa(Medium.WATER);
        return inWater.map(known -> known.pKa() > WATER_PKA).orElse(base.family().strong());
    }

    private List<String> warnings(Step step, OptionalDouble titrated) {
        List<String> found = new ArrayList<>();
        double onWater = spending.stream().filter(spent -> spent.what().equals("water")).mapToDouble(Spent::milliMole).sum();
        double spareWhenDry = excess() + onWater;
        if (onWater > NOTABLE_WATER * batch.milliMole() && onWater > Math.abs(spareWhenDry)) {
            found.add(say("The water in the solvent takes %s mmol of base, more than the %s mmol by which the base"
                    + " differs from what the protons need: drying matters more than the stoichiometry.", Figures.of(onWater),
                    Figures.notable(Math.abs(spareWhenDry), protonsTakenUp) ? Figures.of(Math.abs(spareWhenDry)) : "0"));
        }
        if (Figures.notable(-excess(), protonsTakenUp)) {
            found.add(say("The base is %s mmol short of what it meets up to and including the intended site.", Figures.of(-excess())));
        }
        if (base.milliLitre().isEmpty() && !step.base().form().equals("solid") && !step.base().form().equals("dispersion")) {
            found.add("No density in the table for " + step.base().name() + " as supplied: measure it by mass.");
        }
        if (base.grams().isEmpty()) {
            found.add("No density in the table for " + step.base().name() + " as supplied: its mass cannot be given.");
        }
        labelled(step.base()).ifPresent(label -> titrated.ifPresent(value -> {
            if (Math.abs(value / label - 1) > NOTABLE_DEVIATION) {
                found.add(say("The titrated strength is %.0f %% of the label's.", 100 * value / label));
            }
        }));
        return found;
    }

    private static Optional<Double> labelled(Base base) {
        return base.strength().filter(strength -> strength.unit() == Base.Strength.Unit.MOL_PER_LITRE)
                .map(Base.Strength::value);
    }

    private Amounts with(List<String> others) {
        return new Amounts(batch, solventMilliLitre, waterMilliMole, base, spending, protonsTakenUp, baseNeeded, others);
    }

    private static String say(String format, Object... values) {
        return String.format(Locale.ROOT, format, values);
    }
}
