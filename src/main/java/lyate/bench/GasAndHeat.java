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

    /** Litres. */
    private static final double WORTH_SAYING = 0.005;
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
        Optional<GivenOffGas> gas = step.base().gas().isEmpty() ? Optional.empty()
                : Optional.of(new GivenOffGas(step.base().gas(), donors.milliMoleTaken(),
                        Math.max(0, amounts.protonsTakenUp() - donors.milliMoleTaken()), ventCelsius, kiloPascal));
        OptionalDouble rise = rise(step.solvent(), amounts, donors);
        OptionalDouble highest = rise.isPresent() ? OptionalDouble.of(step.temperatureCelsius() + rise.getAsDouble()) : rise;
        return new GasAndHeat(gas, donors.known(), donors.unknown(), rise, highest,
                cautions(step, gas, donors, rise, highest));
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
        gas.ifPresent(given -> said.add(gasLine(given)));
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
        String estimated = donors.known().stream().filter(share -> !share.tabulated()).map(HeatShare::donor)
                .collect(Collectors.joining(", "));
        if (!estimated.isEmpty()) {
            said.add("The heat of " + estimated + " is an estimate, not calorimetry.");
        }
        said.add("Heat of solution, of mixing and of side reactions is not counted.");
        said.add(BaseHazards.STANDING_LINE);
        return said;
    }

    private static String gasLine(GivenOffGas gas) {
        String later = gas.litresAtQuench() < WORTH_SAYING ? "" : say(" and up to %.3g L more when the rest is destroyed", gas.litresAtQuench());
        return say("Gives off %.3g L of %s (%.0f degrees C, %.1f kPa) as the base reacts%s: keep the vessel vented, let the rate of"
                + " addition set the rate of the gas, and lead it away.", gas.litresInStep(), gas.name(), gas.celsius(), gas.kiloPascal(), later);
    }

    private static String say(String format, Object... values) {
        return String.format(Locale.ROOT, format, values);
    }
}
