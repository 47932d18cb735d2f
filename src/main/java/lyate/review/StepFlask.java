package lyate.review;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import lyate.flask.Coupling;
import lyate.flask.Equilibrium;
import lyate.flask.Flask;
import lyate.flask.HolderState;
import lyate.flask.ProtonBalance;
import lyate.flask.ProtonHolder;
import lyate.flask.ProtonPlace;

/**
 * Fills a flask with what a step says and lets the protons settle.
 *
 * <p>All donors are put on one axis by their log K against the working base, each taken on the scale that decides for it:
 * place pKa = reference − log K. The reference itself cancels.
 */
final class StepFlask {

    private static final String SUBSTRATE = "substrate";
    private static final String BASE = "base";
    private static final String SOLVENT = "solvent";
    private static final String WATER = "water";
    /** Where the working base stands on the common axis; any number would do. */
    private static final double REFERENCE = 0;
    /** More places than this cost time and change nothing: the others are too weak to matter. */
    private static final int MOST_PLACES = 12;
    /** Molar mass of water, g/mol. */
    private static final double WATER_MOLAR_MASS = 18.015;

    private StepFlask() {}

    /**
     * Where the protons are at equilibrium.
     *
     * @param donors   substrate sites, the first to go in front
     * @param couplings couplings between the first {@code MOST_PLACES} of them, by index
     * @param logKWater log10 K of the working base against water at 25 degrees C
     */
    static ProtonShares settle(Step step, WorkingBase base, List<Donor> donors, List<Coupling> couplings, Optional<Double> logKWater) {
        double kelvin = step.temperatureCelsius() + 273.15;
        double toTemperature = Flask.ROOM_KELVIN / kelvin;
        List<Donor> counted = donors.subList(0, Math.min(MOST_PLACES, donors.size()));
        double baseAmount = step.concentrationMolar() * step.equivalents() * step.base().protonsPerFormula();
        List<ProtonHolder> holders = new ArrayList<>();
        holders.add(substrate(step.concentrationMolar(), counted, couplings));
        holders.add(ProtonHolder.base(BASE, baseAmount, REFERENCE));
        logKWater.ifPresent(logK -> holders.add(ProtonHolder.acid(WATER, waterMolar(step), placed(logK * toTemperature))));
        if (!base.levelled()) {
            base.logKSolvent().ifPresent(logK ->
                    holders.add(ProtonHolder.acid(SOLVENT, step.solvent().molarity(), placed(logK * toTemperature))));
        }
        Equilibrium settled = ProtonBalance.solve(new Flask(holders, kelvin, step.solvent().scale().id()));
        return shares(settled, donors, counted.size(), baseAmount);
    }

    private static ProtonHolder substrate(double amount, List<Donor> donors, List<Coupling> couplings) {
        List<ProtonPlace> places = donors.stream()
                .map(donor -> new ProtonPlace(donor.label(), placed(donor.effectiveLogK()))).toList();
        return new ProtonHolder(SUBSTRATE, amount, places, couplings, places.size());
    }

    private static double placed(double logK) {
        double pKa = REFERENCE - logK;
        return Math.max(-ProtonPlace.PKA_LIMIT, Math.min(ProtonPlace.PKA_LIMIT, pKa));
    }

    /** Water in the solvent, mol/L; in water itself the solvent stands for it. */
    static double waterMolar(Step step) {
        return step.waterPpm() * 1e-6 * 1000 * step.solvent().density() / WATER_MOLAR_MASS;
    }

    private static ProtonShares shares(Equilibrium settled, List<Donor> donors, int counted, double baseAmount) {
        Map<String, Double> taken = new LinkedHashMap<>();
        HolderState substrate = settled.of(SUBSTRATE);
        for (int i = 0; i < donors.size(); i++) {
            taken.put(donors.get(i).label(), i < counted ? 100 * substrate.deprotonated(i) : 0.0);
        }
        return new ProtonShares(taken, spentOn(WATER, settled, baseAmount), spentOn(SOLVENT, settled, baseAmount));
    }

    private static double spentOn(String name, Equilibrium settled, double baseAmount) {
        return settled.flask().holders().stream().filter(holder -> holder.name().equals(name))
                .mapToDouble(holder -> holder.amount() * settled.of(name).deprotonated(0))
                .map(taken -> baseAmount > 0 ? 100 * Math.min(1, taken / baseAmount) : 0).findFirst().orElse(0);
    }
}
