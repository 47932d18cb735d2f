package lyate.review;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.concurrent.Callable;
import lyate.acidity.AcidityEstimator;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeReader;
import lyate.review.SideReactionRule.Agent;
import lyate.review.SideReactionRule.Target;
import lyate.site.ProtonSite;
import lyate.site.Role;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Base;
import lyate.stock.Medium;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;

/** Tries the examples that stand beside every rule: the hit must end in the row, the miss must not. */
public final class RuleExamples {

    private static final double USUAL_EQUIVALENTS = 1.1;

    private final Stockroom stockroom;
    private final SideReactions sideReactions;
    private final BaseSolventRules solventRules;
    private final BaseHazards hazards;
    private final AcidHazards acidHazards;
    private final SiteFinder sites;
    private final AcidityEstimator acidity;

    private RuleExamples(TableFolders folders) {
        this.stockroom = Stockroom.load(folders);
        this.sideReactions = SideReactions.load(folders, stockroom);
        this.solventRules = BaseSolventRules.load(folders, stockroom);
        this.hazards = BaseHazards.load(folders, stockroom);
        this.acidHazards = AcidHazards.load(folders, stockroom);
        this.sites = new SiteFinder(SiteClasses.load(folders));
        this.acidity = AcidityEstimator.load(folders);
    }

    /**
     * Loads the tables of rules.
     *
     * @throws lyate.table.TableException naming every bad cell
     */
    public static RuleExamples load(TableFolders folders) {
        return new RuleExamples(folders);
    }

    /** What is wrong with the examples of rows that somebody added, one sentence each; packaged rows are held by tests. */
    public List<String> problemsOfOwnRows() {
        List<String> problems = new ArrayList<>();
        sideReactions.rules().stream().filter(rule -> rule.place().own()).forEach(rule ->
                check(rule.place(), rule.hit(), rule.miss(), example -> () -> decides(rule, example), problems));
        solventRules.rules().stream().filter(rule -> rule.place().own()).forEach(rule ->
                check(rule.place(), rule.hit(), rule.miss(), example -> () -> decides(rule, example), problems));
        hazards.rules().stream().filter(rule -> rule.place().own()).forEach(rule ->
                check(rule.place(), rule.hit(), rule.miss(), example -> () -> decides(rule, example), problems));
        acidHazards.rules().stream().filter(rule -> rule.place().own()).forEach(rule ->
                check(rule.place(), rule.hit(), rule.miss(), example -> () -> decides(rule, example), problems));
        return problems;
    }

    /** One example of one rule, yet to be tried. */
    private interface Trial {
        Callable<Boolean> of(String example);
    }

    private static void check(RulePlace place, String hit, String miss, Trial trial, List<String> problems) {
        try {
            if (!trial.of(hit).call()) {
                problems.add(place + ": the hit '" + hit + "' does not end in this row");
            }
            if (trial.of(miss).call()) {
                problems.add(place + ": the miss '" + miss + "' ends in this row");
            }
        } catch (Exception e) {
            problems.add(place + ": an example cannot be read: " + e.getMessage());
        }
    }

    SideReactions sideReactions() {
        return sideReactions;
    }

    BaseSolventRules solventRules() {
        return solventRules;
    }

    BaseHazards hazards() {
        return hazards;
    }

    AcidHazards acidHazards() {
        return acidHazards;
    }

    /**
     * Whether a rule decides at some atom of {@code substrate|base|solvent|temperature[|equivalents[|site]]}, for a rule about
     * acids of {@code substrate|acid pKa|temperature}.
     */
    boolean decides(SideReactionRule rule, String text) throws Exception {
        RuleExample example = RuleExample.of(text);
        Molecule molecule = new MoleculeReader().read(example.text(0));
        if (rule.agent() == Agent.ACID) {
            return sideReactions.underAcid(molecule, example.number(1), example.number(2)).stream()
                    .anyMatch(finding -> finding.sentence().equals(rule.sentence()));
        }
        Base base = example.base(1, stockroom);
        Optional<String> site = example.has(5) ? Optional.of(example.text(5)) : Optional.empty();
        boolean partner = rule.target() == Target.PARTNER;
        Step step = new Step("example", molecule, site, base, example.number(4, USUAL_EQUIVALENTS), example.solvent(2, stockroom),
                example.number(3), 0.2, 0, partner ? Optional.of(molecule) : Optional.empty());
        SideReactionContext context = new SideReactionContext(base, partner ? List.of() : transfers(molecule, base, step.solvent()),
                site.map(molecule::atomLabelled).orElse(OptionalInt.empty()));
        return sideReactions.byRule(molecule, rule.target(),
                new SideReactions.UnderBase(molecule, step, context)).containsKey(rule);
    }

    /** Whether a rule decides for {@code base|solvent|temperature}. */
    boolean decides(BaseSolventRules.Rule rule, String text) throws Exception {
        RuleExample example = RuleExample.of(text);
        return solventRules.deciding(example.base(0, stockroom), example.solvent(1, stockroom), example.number(2)).containsValue(rule);
    }

    /** Whether a rule decides for {@code base|solvent|temperature}, the base being protonated. */
    boolean decides(BaseHazards.Rule rule, String text) throws Exception {
        RuleExample example = RuleExample.of(text);
        return hazards.deciding(example.base(0, stockroom), example.solvent(1, stockroom), example.number(2), true).contains(rule);
    }

    /** Whether a rule decides for {@code acid|solvent}. */
    boolean decides(AcidHazards.Rule rule, String text) throws Exception {
        RuleExample example = RuleExample.of(text);
        return acidHazards.deciding(stockroom.acid(example.text(0)), example.solvent(1, stockroom)).containsValue(rule);
    }

    /** Every acid site against the base, in DMSO for strong bases out of reach of protic solvents, else in water. */
    private List<Transfer> transfers(Molecule molecule, Base base, Solvent solvent) {
        Medium scale = base.family().strong() && solvent.kind() != Solvent.Kind.PROTIC ? Medium.DMSO : Medium.WATER;
        List<Transfer> transfers = new ArrayList<>();
        base.pKa(scale).ifPresent(pKaOfBase -> {
            for (ProtonSite site : sites.sites(molecule, Role.ACID)) {
                acidity.acidity(molecule, site, scale).ifPresent(donor -> transfers.add(new Transfer(molecule.label(site.atom()),
                        site.equivalent(), donor, pKaOfBase.pKa() - donor.pKa(), donor.sigma(), 0, 0, "example")));
            }
        });
        return transfers;
    }
}
