package lyate.review;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import lyate.flask.Completion;
import lyate.flask.Equilibrium;
import lyate.flask.Flask;
import lyate.flask.HolderState;
import lyate.flask.IrreversibleBase;
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
    private static final String PARTNER = "partner";
    /** Where the working base stands on the common axis; any number would do. */
    private static final double REFERENCE = 0;
    /** Molar mass of water, g/mol. */
    private static final double WATER_MOLAR_MASS = 18.015;

    private final Step step;
    private final WorkingBase base;
    private final SubstrateProtons substrate;
    private final ProtonHolder substrateHolder;
    private final Optional<ProtonHolder> partnerHolder;
    private final Optional<Double> logKWater;
    private final double toTemperature;

    /**
     * A flask ready to be filled.
     *
     * @param substrate its protons
     * @param partner   those of the partner, where the step names one; there is as much of it as of the substrate
     * @param logKWater log10 K of the working base against water at 25 degrees C
     */
    StepFlask(Step step, WorkingBase base, SubstrateProtons substrate, Optional<SubstrateProtons> partner, Optional<Double> logKWater) {
        this.step = step;
        this.base = base;
        this.substrate = substrate;
        this.substrateHolder = substrate.holder(SUBSTRATE, step.concentrationMolar(), REFERENCE);
        this.partnerHolder = partner.map(there -> there.holder(PARTNER, step.concentrationMolar(), REFERENCE));
        this.logKWater = logKWater;
        this.toTemperature = Flask.ROOM_KELVIN / (step.temperatureCelsius() + 273.15);
    }

    /** Where the protons are at the amounts of the step. */
    ProtonShares settle(List<Donor> donors) {
        Equilibrium settled = ProtonBalance.solve(at(step.equivalents()));
        Map<String, Double> taken = new LinkedHashMap<>();
        donors.forEach(donor -> taken.put(donor.label(), 100 * taken(settled, donor)));
        double partnerTaken = partnerHolder.map(there -> 100 * settled.of(PARTNER).deprotonated(0)).orElse(0.0);
        return new ProtonShares(taken, partnerTaken, spentOnWater(settled));
    }

    /** Share of the substrate molecules whose site has lost a proton, 0 to 1. */
    double taken(Equilibrium settled, Donor donor) {
        HolderState state = settled.of(SUBSTRATE);
        return Math.min(1, substrate.placesOf(donor).stream().mapToDouble(state::deprotonated).sum());
    }

    /**
     * The flask with that many moles of base per mole of substrate; the holders keep their order. A base whose protonation
     * cannot be undone has taken its protons already.
     */
    Flask at(double equivalents) {
        List<ProtonHolder> holders = new ArrayList<>();
        holders.add(substrateHolder);
        boolean completes = step.base().family().irreversible() && !base.levelled();
        if (!completes) {
            holders.add(baseHolder(baseMolar(equivalents)));
        }
        logKWater.ifPresent(logK -> holders.add(ProtonHolder.acid(WATER, waterMolar(), placed(logK * toTemperature))));
        if (!base.levelled()) {
            base.logKSolvent().ifPresent(logK ->
                    holders.add(ProtonHolder.acid(SOLVENT, step.solvent().molarity(), placed(logK * toTemperature))));
        }
        partnerHolder.ifPresent(holders::add);
        Flask flask = new Flask(holders, step.temperatureCelsius() + 273.15, step.solvent().scale().id());
        return completes ? Completion.of(flask, new IrreversibleBase(BASE, baseMolar(equivalents), REFERENCE)).after() : flask;
    }

    /** Protons that the base takes in its first stage, mol/L. */
    private double baseMolar(double equivalents) {
        return step.concentrationMolar() * equivalents * step.base().protonsPerFormula();
    }

    /** The base with its further stages, where the table has them: carbonate goes on to take a second proton. */
    private ProtonHolder baseHolder(double molar) {
        Optional<KnownPKa> first = step.base().pKa(Medium.WATER);
        List<KnownPKa> further = step.base().furtherStages();
        if (base.levelled() || first.isEmpty() || further.isEmpty()) {
            return ProtonHolder.base(BASE, molar, REFERENCE);
        }
        double[] stages = new double[further.size() + 1];
        for (int i = 0; i < further.size(); i++) {
            stages[further.size() - 1 - i] = REFERENCE + (further.get(i).pKa() - first.get().pKa()) * toTemperature;
        }
        stages[further.size()] = REFERENCE;
        return ProtonHolder.stages(BASE, molar, 0, stages);
    }

    private static double placed(double logK) {
        double pKa = REFERENCE - logK;
        return Math.max(-ProtonPlace.PKA_LIMIT, Math.min(ProtonPlace.PKA_LIMIT, pKa));
    }

    /** Water in the solvent, mol/L; in water itself the solvent stands for it. */
    private double waterMolar() {
        return step.waterPpm() * 1e-6 * 1000 * step.solvent().density() / WATER_MOLAR_MASS;
    }

    /** Percent of the base that moisture uses up. */
    private double spentOnWater(Equilibrium settled) {
        double baseMolar = baseMolar(step.equivalents());
        return settled.flask().holders().stream().filter(holder -> holder.name().equals(WATER))
                .mapToDouble(holder -> holder.amount() * settled.of(WATER).deprotonated(0))
                .map(taken -> baseMolar > 0 ? 100 * Math.min(1, taken / baseMolar) : 0).findFirst().orElse(0);
    }
}
