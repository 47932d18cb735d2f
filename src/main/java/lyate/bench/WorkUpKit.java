package lyate.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import lyate.acidity.AcidityEstimator;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.review.Step;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Acid;
import lyate.stock.Base;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;

/** Says what becomes of a step in water: quench, extraction and what the water hurts. Immutable; safe to share. */
public final class WorkUpKit {

    private static final int CARBON = 6;

    /**
     * What is to be worked up, and how.
     *
     * @param product the product; empty: the substrate, its anion simply quenched
     * @param beside  further substances the product is to be freed from
     * @param acid    of the quench
     * @param pH      where the quench is to end, 0 to 14
     */
    public record Plan(Step step, Amounts amounts, Optional<Molecule> product, List<Beside> beside, Acid acid, double pH) {

        public Plan {
            beside = List.copyOf(beside);
        }

        /** A plan without further substances. */
        public Plan(Step step, Amounts amounts, Optional<Molecule> product, Acid acid, double pH) {
            this(step, amounts, product, List.of(), acid, pH);
        }
    }

    /**
     * A substance the product is to be freed from.
     *
     * @param name what the user calls it
     */
    public record Beside(String name, Molecule molecule) {}

    /**
     * What becomes of it.
     *
     * @param others  substances the product is freed from
     * @param quench  the acid needed; empty where it cannot do it
     * @param refusal why there is no quench
     * @param hazards groups that the water hurts between the pH of the quench and 14
     */
    public record Answer(WorkUp workUp, List<AqueousForm> others, Optional<Quench> quench, String refusal,
                         List<GroupHazard> hazards) {

        public Answer {
            others = List.copyOf(others);
            hazards = List.copyOf(hazards);
        }
    }

    private final AqueousForms forms;
    private final QuenchHazards hazards;
    private final Enthalpies enthalpies;

    private WorkUpKit(AqueousForms forms, QuenchHazards hazards, Enthalpies enthalpies) {
        this.forms = forms;
        this.hazards = hazards;
        this.enthalpies = enthalpies;
    }

    /**
     * Loads the tables that only the work-up needs.
     *
     * @throws lyate.table.TableException naming every bad cell
     */
    public static WorkUpKit load(TableFolders folders, Stockroom stockroom, Enthalpies enthalpies) {
        AqueousForms forms = new AqueousForms(new SiteFinder(SiteClasses.load(folders)), AcidityEstimator.load(folders));
        return new WorkUpKit(forms, QuenchHazards.load(folders, stockroom), enthalpies);
    }

    /** Works out the work-up of a plan. */
    public Answer ask(Plan plan) {
        Molecule molecule = plan.product().orElse(plan.step().substrate());
        AqueousForm product = forms.of("product", molecule);
        List<AqueousForm> others = others(plan, molecule);
        List<GroupHazard> hurt = hazards.of(molecule, Math.min(plan.pH(), 7), 14);
        try {
            Quench quench = Quench.of(plan.step(), plan.amounts(), product, plan.acid(), plan.pH(), forms, enthalpies);
            return new Answer(WorkUp.of(product, others), others, Optional.of(quench), "", hurt);
        } catch (IllegalArgumentException e) {
            return new Answer(WorkUp.of(product, others), others, Optional.empty(), e.getMessage(), hurt);
        }
    }

    /** What the product is to be freed from: unreacted substrate, the base and what it became, and what the plan names. */
    private List<AqueousForm> others(Plan plan, Molecule product) {
        List<AqueousForm> others = new ArrayList<>();
        if (!plan.step().substrate().canonicalKey().equals(product.canonicalKey())) {
            others.add(forms.of("unreacted substrate", plan.step().substrate()));
        }
        Base base = plan.step().base();
        Optional<KnownPKa> inWater = base.pKa(Medium.WATER);
        if (base.counterIon().equals("none") && inWater.isPresent()) {
            others.add(AqueousForm.base(base.shortName(), inWater.get().pKa()));
        } else {
            conjugateAcid(base).ifPresent(others::add);
        }
        plan.beside().forEach(beside -> others.add(forms.of(beside.name(), beside.molecule())));
        return others;
    }

    /** What a salt becomes on taking its proton, where that is an organic substance that stays and that water can charge. */
    private Optional<AqueousForm> conjugateAcid(Base base) {
        if (base.conjugateAcid().isEmpty() || !base.gas().isEmpty()) {
            return Optional.empty();
        }
        try {
            Molecule acid = new MoleculeReader().read(base.conjugateAcid());
            boolean organic = IntStream.range(0, acid.atomCount()).anyMatch(atom -> acid.atomicNumber(atom) == CARBON);
            AqueousForm form = forms.of("the conjugate acid of " + base.name(), acid);
            return organic && AqueousForm.totalCharge(acid) == 0 && !form.holder().places().isEmpty() ? Optional.of(form) : Optional.empty();
        } catch (MoleculeException e) {
            // Hydrogen and bare ions have no structure the reader accepts; they leave or stay in the water anyway.
            return Optional.empty();
        }
    }
}
