package lyate.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import lyate.review.BaseHazards;
import lyate.review.Review;
import lyate.review.Step;
import lyate.stock.Base;
import lyate.stock.Medium;
import lyate.stock.Solvent;

/**
 * Gas and heat of a step if all its base went in at once. A figure that is missing stays missing: nothing here says that
 * a step is safe.
 *
 * @param gas                what is given off; empty where the table names no gas for the base
 * @param heat               heat by donor
 * @param withoutHeat        donors whose heat is not known
 * @param temperatureRise    kelvin the solvent alone would warm by; empty where its heat capacity or a heat is missing
 * @param highestTemperature degrees C that would be reached from the temperature of the step
 * @param cautions           sentences for the user, the standing line last
 */
public record GasAndHeat(Optional<GivenOffGas> gas, List<HeatShare> heat, List<String> withoutHeat,
                         OptionalDouble temperatureRise, OptionalDouble highestTemperature, List<String> cautions) {

    private static final double ROOM_CELSIUS = 25;
    private static final double ATMOSPHERE = 101.325;
    /** This close to the boiling point counts as boiling: hot spots, vapour carried off by the gas. */
    private static final double BOILING_MARGIN = 10;
    private static final double NOTABLE_RISE = 5;

    public GasAndHeat {
        heat = List.copyOf(heat);
        withoutHeat = List.copyOf(withoutHeat);
        cautions = List.copyOf(cautions);
    }

    /** Gas counted at 25 degrees C and 101.325 kPa. */
    public static GasAndHeat of(Review review, Amounts amounts, Enthalpies enthalpies) {
        return of(review, amounts, enthalpies, ROOM_CELSIUS, ATMOSPHERE);
    }

    /** Gas counted at the temperature and pressure of the vent. */
    public static GasAndHeat of(Review review, Amounts amounts, Enthalpies enthalpies, double ventCelsius, double kiloPascal) {
        Step step = review.step();
        HeatOfStep donors = HeatOfStep.of(review, amounts, enthalpies);
        Optional<GivenOffGas> gas = gas(review, amounts, donors).map(milliMole -> new GivenOffGas(step.base().gas(), milliMole,
                Math.max(0, all(step.base(), amounts) - milliMole), ventCelsius, kiloPascal));
        OptionalDouble rise = rise(step.solvent(), amounts, donors);
        OptionalDouble highest = rise.isPresent() ? OptionalDouble.of(step.temperatureCelsius() + rise.getAsDouble()) : rise;
        return new GasAndHeat(gas, donors.known(), donors.unknown(), rise, highest,
                cautions(step, gas, donors, rise, highest));
    }

    /**
     * Gas given off in the step, mmol. Where only the last of several stages gives it, as with carbonate, protons acidic enough
     * for that stage are taken to use whole molecules of the solid one after the other: rather too much than too little.
     */
    private static Optional<Double> gas(Review review, Amounts amounts, HeatOfStep donors) {
        Base base = review.step().base();
        if (base.gas().isEmpty() || base.furtherStages().isEmpty()) {
            return base.gas().isEmpty() ? Optional.empty() : Optional.of(donors.milliMoleTaken());
        }
        int stages = base.furtherStages().size();
        double reach = base.pKa(Medium.WATER).map(first -> first.pKa() - base.furtherStages().get(stages - 1).pKa()).orElse(0.0);
        double protons = review.transfers().stream().filter(transfer -> !transfer.atoms().isEmpty() && transfer.logK() >= reach)
                .mapToDouble(transfer -> amounts.batch().milliMole() * Amounts.protons(review.step(), transfer)).sum();
        return Optional.of(Math.min(amounts.base().milliMole(), protons / (stages + 1)));
    }

    /** Gas that all of the base can give off, mmol. */
    static double all(Base base, Amounts amounts) {
        return base.furtherStages().isEmpty() ? amounts.protonsTakenUp() : amounts.base().milliMole();
    }

    /** That heat in words; empty where it is not known, and never none where it is only estimated to be small. */
    public Optional<String> heatSentence() {
        OptionalDouble all = kiloJoule();
        if (all.isEmpty()) {
            return Optional.empty();
        }
        boolean estimated = heat.isEmpty() || heat.stream().anyMatch(share -> !share.tabulated());
        return Optional.of(all.getAsDouble() > 0 ? say("Heat if all the base went in at once: %s%s kJ.", estimated ? "about " : "",
                Figures.of(all.getAsDouble()))
                : "No heat could be estimated for the proton transfer; that does not mean that there is none.");
    }

    /** Heat of all donors together, kJ; empty where one is not known. */
    public OptionalDouble kiloJoule() {
        return withoutHeat.isEmpty() ? OptionalDouble.of(heat.stream().mapToDouble(HeatShare::kiloJoule).sum())
                : OptionalDouble.empty();
    }

    private static OptionalDouble rise(Solvent solvent, Amounts amounts, HeatOfStep donors) {
        if (!donors.unknown().isEmpty() || solvent.heatCapacity().isEmpty()) {
            return OptionalDouble.empty();
        }
        double joule = 1000 * donors.known().stream().mapToDouble(HeatShare::kiloJoule).sum();
        double perKelvin = amounts.solventMilliLitre() * solvent.density() * solvent.heatCapacity().getAsDouble();
        return OptionalDouble.of(joule / perKelvin);
    }

    private static List<String> cautions(Step step, Optional<GivenOffGas> gas, HeatOfStep donors, OptionalDouble rise,
                                         OptionalDouble highest) {
        List<String> said = new ArrayList<>();
        gas.ifPresent(given -> said.add(gasLine(given, step.base().furtherStages().isEmpty() ? "" : "up to ")));
        if (!donors.unknown().isEmpty()) {
            said.add(say("No heat is known for %s with %s: treat the addition as strongly exothermic.", step.base().name(),
                    String.join(", ", donors.unknown())));
        } else if (rise.isEmpty()) {
            said.add(say("No heat capacity in the table for %s: the temperature rise cannot be given; treat the addition as"
                    + " strongly exothermic.", step.solvent().name()));
        }
        if (rise.isPresent() && rise.getAsDouble() >= NOTABLE_RISE) {
            said.add(say("Added at once, the base would warm the solvent by about %.0f K, to about %.0f degrees C.",
                    rise.getAsDouble(), highest.getAsDouble()));
        }
        if (highest.isPresent() && highest.getAsDouble() >= step.solvent().boilingPoint() - BOILING_MARGIN) {
            said.add(say("That reaches the boiling point of %s (%.0f degrees C): add slowly, with cooling and room to vent.",
                    step.solvent().name(), step.solvent().boilingPoint()));
        }
        double all = donors.milliMoleTaken();
        String estimated = donors.known().stream().filter(share -> !share.tabulated() && Figures.notable(share.milliMole(), all))
                .map(HeatShare::donor).collect(Collectors.joining(", "));
        if (!estimated.isEmpty()) {
            said.add("The heat of " + estimated + " is an estimate, not calorimetry.");
        }
        said.add("Heat of solution, of mixing and of side reactions is not counted.");
        said.add(BaseHazards.STANDING_LINE);
        return said;
    }

    private static String gasLine(GivenOffGas gas, String atMost) {
        double all = gas.litresInStep() + gas.litresAtQuench();
        String counted = say("(%.0f degrees C, %.1f kPa)", gas.celsius(), gas.kiloPascal());
        String inStep = Figures.notable(gas.litresInStep(), all)
                ? say("Gives off %s%s L of %s %s as the base reacts", atMost, Figures.of(gas.litresInStep()), gas.name(), counted)
                : say("Gives off no %s to speak of as the base reacts", gas.name());
        String atQuench = Figures.notable(gas.litresAtQuench(), all)
                ? say(" and up to %s L%s when the rest is destroyed", Figures.of(gas.litresAtQuench()),
                        Figures.notable(gas.litresInStep(), all) ? " more" : " " + counted) : "";
        return inStep + atQuench + ": keep the vessel vented, let the rate of addition set the rate of the gas, and lead it away.";
    }

    private static String say(String format, Object... values) {
        return String.format(Locale.ROOT, format, values);
    }
}
