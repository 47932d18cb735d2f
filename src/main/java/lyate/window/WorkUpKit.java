package lyate.window;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import lyate.acidity.AcidityEstimator;
import lyate.bench.Amounts;
import lyate.bench.AqueousForm;
import lyate.bench.AqueousForms;
import lyate.bench.GroupHazard;
import lyate.bench.Quench;
import lyate.bench.QuenchHazards;
import lyate.bench.WorkUp;
import lyate.molecule.Molecule;
import lyate.review.Step;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Acid;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;

/** Asks the bench what becomes of a step in water. */
final class WorkUpKit {

    /**
     * What is to be worked up, and how.
     *
     * @param product the product; empty: the substrate, its anion simply quenched
     */
    record Plan(Step step, Amounts amounts, Optional<Molecule> product, Acid acid, double pH) {}

    /**
     * What the panel shows.
     *
     * @param quench  the acid needed; empty where it cannot do it
     * @param refusal why there is no quench
     */
    record Answer(WorkUp workUp, List<AqueousForm> others, Optional<Quench> quench, String refusal, List<GroupHazard> hazards) {}

    private final Engine engine;
    private final AqueousForms forms;
    private final QuenchHazards hazards;

    private WorkUpKit(Engine engine, AqueousForms forms, QuenchHazards hazards) {
        this.engine = engine;
        this.forms = forms;
        this.hazards = hazards;
    }

    /** Loads the tables that only the work-up needs. */
    static WorkUpKit load(Engine engine) {
        AqueousForms forms = new AqueousForms(new SiteFinder(SiteClasses.load(engine.folders())), AcidityEstimator.load(engine.folders()));
        return new WorkUpKit(engine, forms, QuenchHazards.load(engine.folders()));
    }

    Answer ask(Plan plan) {
        Molecule molecule = plan.product().orElse(plan.step().substrate());
        AqueousForm product = forms.of("product", molecule);
        List<AqueousForm> others = others(plan, molecule);
        List<GroupHazard> hurt = hazards.of(molecule, Math.min(plan.pH(), 7), 14);
        try {
            Quench quench = Quench.of(plan.step(), plan.amounts(), product, plan.acid(), plan.pH(), forms, engine.enthalpies());
            return new Answer(WorkUp.of(product, others), others, Optional.of(quench), "", hurt);
        } catch (IllegalArgumentException e) {
            return new Answer(WorkUp.of(product, others), others, Optional.empty(), e.getMessage(), hurt);
        }
    }

    /** What the product is to be freed from: unreacted substrate, and an organic base. */
    private List<AqueousForm> others(Plan plan, Molecule product) {
        List<AqueousForm> others = new ArrayList<>();
        if (!plan.step().substrate().canonicalKey().equals(product.canonicalKey())) {
            others.add(forms.of("unreacted substrate", plan.step().substrate()));
        }
        Optional<KnownPKa> inWater = plan.step().base().pKa(Medium.WATER);
        if (plan.step().base().counterIon().equals("none") && inWater.isPresent()) {
            others.add(AqueousForm.base(plan.step().base().shortName(), inWater.get().pKa()));
        }
        return others;
    }
}
