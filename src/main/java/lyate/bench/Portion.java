package lyate.bench;

import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import lyate.stock.Acid;
import lyate.stock.Base;
import lyate.stock.Base.Strength;

/**
 * An amount of a reagent in the form it comes in.
 *
 * @param milliMole  amount of the active substance
 * @param grams      mass of the material as supplied; absent where a solution's density is not known
 * @param milliLitre volume of the material as supplied; absent for a solid, and where the density is not known
 * @param form       which strength was reckoned with, for the user
 */
public record Portion(double milliMole, OptionalDouble grams, OptionalDouble milliLitre, String form) {

    /**
     * A base as supplied.
     *
     * @param titrated strength found by titration, mol/L, which replaces the label's; empty to go by the label
     */
    public static Portion of(Base base, double milliMole, OptionalDouble titrated) {
        Optional<Strength> strength = base.strength();
        if (titrated.isPresent()) {
            if (!(titrated.getAsDouble() > 0)) {
                throw new IllegalArgumentException(base.name() + ": titrated strength " + titrated.getAsDouble()
                        + " mol/L, expected a number above 0");
            }
            strength = Optional.of(new Strength(titrated.getAsDouble(), Strength.Unit.MOL_PER_LITRE));
        }
        String how = titrated.isPresent() ? "titrated" : "by the label";
        return of(milliMole, base.molarMass(), strength, base.density(), base.form().equals("liquid"), how);
    }

    /** An acid as supplied. */
    public static Portion of(Acid acid, double milliMole) {
        return of(milliMole, acid.molarMass(), acid.strength(), acid.density(), acid.form().equals("liquid"), "by the label");
    }

    private static Portion of(double milliMole, double molarMass, Optional<Strength> strength, OptionalDouble density,
                              boolean liquid, String how) {
        if (strength.isEmpty()) {
            double grams = milliMole * molarMass / 1000;
            return new Portion(milliMole, OptionalDouble.of(grams),
                    liquid ? over(grams, density) : OptionalDouble.empty(), "pure");
        }
        Strength known = strength.get();
        if (known.unit() == Strength.Unit.MOL_PER_LITRE) {
            double milliLitre = milliMole / known.value();
            OptionalDouble grams = density.isPresent() ? OptionalDouble.of(milliLitre * density.getAsDouble()) : density;
            return new Portion(milliMole, grams, OptionalDouble.of(milliLitre),
                    String.format(Locale.ROOT, "%s mol/L, %s", plain(known.value()), how));
        }
        double grams = milliMole * molarMass / 1000 / (known.value() / 100);
        return new Portion(milliMole, OptionalDouble.of(grams), over(grams, density),
                String.format(Locale.ROOT, "%s %% by mass, %s", plain(known.value()), how));
    }

    private static OptionalDouble over(double grams, OptionalDouble density) {
        return density.isPresent() ? OptionalDouble.of(grams / density.getAsDouble()) : density;
    }

    /** A strength as a label has it, without idle zeros. */
    private static String plain(double value) {
        return String.format(Locale.ROOT, "%.3f", value).replaceAll("\\.?0+$", "");
    }
}
