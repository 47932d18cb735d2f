package lyate.review;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import lyate.flask.Equilibrium;
import lyate.flask.Flask;
import lyate.flask.HolderState;
import lyate.flask.ProtonBalance;
import lyate.flask.ProtonHolder;
import lyate.flask.ProtonPlace;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;

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
    /** Molar mass of water, g/mol. */
    private static final double WATER_MOLAR_MASS = 18.015;

    private StepFlask() {}

    /**
     * Where the protons are at equilibrium.
     *
     * @param protons   the substrate's
     * @param donors    the same by site
     * @param logKWater log10 K of the working base against water at 25 degrees C
     */
    static ProtonShares settle(Step step, WorkingBase base, SubstrateProtons protons, List<Donor> donors, Optional<Double> logKWater) {
        double kelvin = step.temperatureCelsius() + 273.15;
        double toTemperature = Flask.ROOM_KELVIN / kelvin;
        List<ProtonHolder> holders = new ArrayList<>();
        holders.add(protons.holder(SUBSTRATE, step.concentrationMolar(), REFERENCE));
        holders.add(baseHolder(step, base, toTemperature));
        logKWater.ifPresent(logK -> holders.add(ProtonHolder.acid(WATER, waterMolar(step), placed(logK * toTemperature))));
        if (!base.levelled()) {
            base.logKSolvent().ifPresent(logK ->
                    holders.add(ProtonHolder.acid(SOLVENT, step.solvent().molarity(), placed(logK * toTemperature))));
        }
        return shares(ProtonBalance.solve(new Flask(holders, kelvin, step.solvent().scale().id())), protons, donors, baseMolar(step));
    }

    /** Protons that the base takes in its first stage, mol/L. */
    private static double baseMolar(Step step) {
        return step.concentrationMolar() * step.equivalents() * step.base().protonsPerFormula();
    }

    /** The base with its further stages, where the table has them: carbonate goes on to take a second proton. */
    private static ProtonHolder baseHolder(Step step, WorkingBase base, double toTemperature) {
        Optional<KnownPKa> first = step.base().pKa(Medium.WATER);
        List<KnownPKa> further = step.base().furtherStages();
        if (base.levelled() || first.isEmpty() || further.isEmpty()) {
            return ProtonHolder.base(BASE, baseMolar(step), REFERENCE);
        }
        double[] stages = new double[further.size() + 1];
        for (int i = 0; i < further.size(); i++) {
            stages[further.size() - 1 - i] = REFERENCE + (further.get(i).pKa() - first.get().pKa()) * toTemperature;
        }
        stages[further.size()] = REFERENCE;
        return ProtonHolder.stages(BASE, baseMolar(step), 0, stages);
    }

    private static double placed(double logK) {
        double pKa = REFERENCE - logK;
        return Math.max(-ProtonPlace.PKA_LIMIT, Math.min(ProtonPlace.PKA_LIMIT, pKa));
    }

    /** Water in the solvent, mol/L; in water itself the solvent stands for it. */
    static double waterMolar(Step step) {
        return step.waterPpm() * 1e-6 * 1000 * step.solvent().density() / WATER_MOLAR_MASS;
    }

    private static ProtonShares shares(Equilibrium settled, SubstrateProtons protons, List<Donor> donors, double baseMolar) {
        Map<String, Double> taken = new LinkedHashMap<>();
        HolderState substrate = settled.of(SUBSTRATE);
        for (Donor donor : donors) {
            double lost = protons.placesOf(donor).stream().mapToDouble(substrate::deprotonated).sum();
            taken.put(donor.label(), 100 * Math.min(1, lost));
        }
        return new ProtonShares(taken, spentOn(WATER, settled, baseMolar), spentOn(SOLVENT, settled, baseMolar));
    }

    private static double spentOn(String name, Equilibrium settled, double baseAmount) {
        return settled.flask().holders().stream().filter(holder -> holder.name().equals(name))
                .mapToDouble(holder -> holder.amount() * settled.of(name).deprotonated(0))
                .map(taken -> baseAmount > 0 ? 100 * Math.min(1, taken / baseAmount) : 0).findFirst().orElse(0);
    }
}
