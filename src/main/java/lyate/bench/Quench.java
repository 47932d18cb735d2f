package lyate.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import lyate.bench.Enthalpies.Donor;
import lyate.flask.HolderState;
import lyate.flask.ProtonHolder;
import lyate.review.BaseHazards;
import lyate.review.Step;
import lyate.stock.Acid;
import lyate.stock.Base;

/**
 * How much acid brings a finished step to a pH. Protons are counted, not reactions: whatever the base did in the step, it
 * and the substrate together want this many protons back. What the water itself takes is left out: 0.01 mmol per mL at pH 2
 * and a tenth of that for every unit towards neutral.
 *
 * @param pH        where it is to end
 * @param acidName  which acid
 * @param acid      how much of it, as supplied
 * @param heat      heat of neutralising all the base from the start, where tabulated: what a neglected quench could give
 * @param sentences what the user should know, the standing line last
 */
public record Quench(double pH, String acidName, Portion acid, Optional<HeatShare> heat, List<String> sentences) {

    /** Below this share of its protons an acid gives off at the pH, it is the wrong acid for it. */
    private static final double LEAST_GIVEN = 0.5;

    public Quench {
        sentences = List.copyOf(sentences);
    }

    /**
     * Works out the acid for a reviewed step.
     *
     * @param amounts what went in
     * @param product what is in the flask beside the base, as drawn; the substrate if the anion is simply quenched
     * @param acid    from the shelf; needs a pKa in water
     * @param pH      where it is to end, 0 to 14
     * @throws IllegalArgumentException where the acid has no pKa in water or cannot reach the pH
     */
    public static Quench of(Step step, Amounts amounts, AqueousForm product, Acid acid, double pH, AqueousForms forms,
                            Enthalpies enthalpies) {
        if (!(pH >= 0 && pH <= 14)) {
            throw new IllegalArgumentException("pH " + pH + ", expected 0 to 14");
        }
        List<ProtonHolder> contents = new ArrayList<>(AqueousBase.holders(step.base(), amounts.base().milliMole(), forms));
        contents.add(product.holder().withAmount(amounts.batch().milliMole()));
        double wanted = contents.stream().mapToDouble(holder -> protonsWanted(holder, pH)).sum();
        Portion portion = Portion.of(acid, Math.max(0, wanted) / given(acid, pH));
        Optional<HeatShare> heat = heat(step.base(), amounts, enthalpies);
        return new Quench(pH, acid.name(), portion, heat, sentences(step.base(), amounts, pH, wanted, heat, enthalpies));
    }

    /** Protons a holder takes up on its way to the pH; negative where it gives some. */
    private static double protonsWanted(ProtonHolder holder, double pH) {
        return holder.amount() * (HolderState.at(holder, pH).meanProtons() - holder.protonsHeld());
    }

    /** Protons one mole of the acid has given at the pH. */
    private static double given(Acid acid, double pH) {
        double given = -protonsWanted(AqueousBase.holder(acid), pH);
        if (given < LEAST_GIVEN) {
            throw new IllegalArgumentException(String.format(Locale.ROOT,
                    "%s gives only %.2f protons at pH %.1f, expected a stronger acid or a higher pH", acid.name(), given, pH));
        }
        return given;
    }

    private static Optional<HeatShare> heat(Base base, Amounts amounts, Enthalpies enthalpies) {
        return enthalpies.of(base, Donor.ACID).map(known -> new HeatShare("acid",
                amounts.base().milliMole() * known.protonsPerFormula(), -known.kiloJoulePerProton(), true, known.equation(),
                known.source()));
    }

    private static List<String> sentences(Base base, Amounts amounts, double pH, double wanted, Optional<HeatShare> heat,
                                          Enthalpies enthalpies) {
        List<String> said = new ArrayList<>();
        if (wanted <= 0) {
            said.add(say("Nothing has to be neutralised: the mixture is at or below pH %.1f.", pH));
        }
        heat.ifPresentOrElse(share -> said.add(share.kiloJoule() > 0
                        ? say("If none of the base had reacted before, its neutralisation would give off %s kJ: add the acid"
                                + " slowly to the cold mixture.", Figures.of(share.kiloJoule()))
                        : "The neutralisation itself takes up heat; mixing and dissolving the acid may give some off."),
                () -> said.add(say("No heat of neutralisation in the tables for %s: treat the quench as strongly exothermic.",
                        base.name())));
        gases(base, amounts, enthalpies).forEach((gas, milliMole) -> said.add(say("Acid sets free %s, up to %s mmol"
                + " (%s L at 25 degrees C): add it slowly and keep the vessel vented.", gas, Figures.of(milliMole),
                Figures.of(new GivenOffGas(gas, milliMole, 0, 25, 101.325).litresInStep()))));
        said.add(BaseHazards.STANDING_LINE);
        return said;
    }

    /** Gas the acid can set free, mmol by name: what the equation says, else what the shelf says of the base. */
    private static Map<String, Double> gases(Base base, Amounts amounts, Enthalpies enthalpies) {
        Map<String, Double> gases = new TreeMap<>();
        enthalpies.of(base, Donor.ACID).ifPresent(known -> known.gases().forEach((gas, count) ->
                gases.put(gas, count * amounts.base().milliMole())));
        if (gases.isEmpty() && !base.gas().isEmpty()) {
            gases.put(base.gas(), GasAndHeat.all(base, amounts));
        }
        return gases;
    }

    private static String say(String format, Object... values) {
        return String.format(Locale.ROOT, format, values);
    }
}
