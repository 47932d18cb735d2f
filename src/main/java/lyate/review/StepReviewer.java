package lyate.review;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.concurrent.ForkJoinPool;
import java.util.concurrent.ForkJoinTask;
import lyate.acidity.AcidityEstimator;
import lyate.acidity.IonisationEnthalpies;
import lyate.acidity.SiteCoupling;
import lyate.review.VerdictRule.World;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Medium;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import lyate.table.TableFolders;

/**
 * The main flow: which base is really in the flask, which proton goes first, how far, and what else happens.
 * Immutable; safe to share between threads.
 */
public final class StepReviewer implements Reviewer {

    private final WorkingBases workingBases;
    private final Donors donors;
    private final VerdictOdds odds = new VerdictOdds();
    private final Solvent water;
    private final SideReactions sideReactions;
    private final BaseSolventRules solventRules;
    private final BaseHazards hazards;
    private final KineticControl kinetics;
    private final SiteCoupling coupling;
    private final Trapping trapping;

    private StepReviewer(TableFolders folders, Stockroom stockroom, SiteFinder finder, AcidityEstimator acidity) {
        this.solventRules = BaseSolventRules.load(folders, stockroom);
        this.workingBases = new WorkingBases(new BaseStrength(finder, acidity), solventRules, stockroom);
        this.donors = new Donors(finder, acidity, IonisationEnthalpies.load(folders), IonPairs.load(folders));
        this.water = waterOf(stockroom);
        this.sideReactions = SideReactions.load(folders, stockroom);
        this.hazards = BaseHazards.load(folders, stockroom);
        this.coupling = SiteCoupling.load(folders);
        this.trapping = Trapping.load(folders);
        this.kinetics = new KineticControl(KineticPreferences.load(folders, stockroom));
    }

    /**
     * Loads the tables it needs.
     *
     * @throws lyate.table.TableException naming every bad cell
     */
    public static StepReviewer load(TableFolders folders) {
        return load(folders, Stockroom.load(folders));
    }

    /** The same with a stockroom that is loaded already. */
    public static StepReviewer load(TableFolders folders, Stockroom stockroom) {
        // Nothing else takes as long to load as these two, and neither needs the other.
        ForkJoinTask<SiteFinder> finder = ForkJoinPool.commonPool().submit(() -> new SiteFinder(SiteClasses.load(folders)));
        AcidityEstimator acidity = AcidityEstimator.load(folders);
        return new StepReviewer(folders, stockroom, finder.join(), acidity);
    }

    @Override
    public Review review(Step step) throws ReviewException {
        Contest contest = contest(step);
        ProtonShares shares = contest.flask().settle(contest.sites());
        List<Transfer> transfers = new Transfers(shares).of(contest.sites());
        List<SideReaction> reactions = sideReactions(step, contest.base(), transfers, contest.intended());

        World world = World.of(step, contest.base(), contest.protons(), contest.sites(), contest.intended());
        List<VerdictOdds.Uncertain> uncertain = contest.sites().stream().map(VerdictOdds.Uncertain::of).toList();
        Map<Verdict, Double> probabilities = withSideReactions(odds.of(uncertain, world), reactions);
        Map<Verdict, Double> onOtherScale = contest.intended().comparison().scalesDisagree()
                ? withSideReactions(odds.of(uncertain, world.onOtherScale(contest.sites())), reactions) : Map.of();
        Situation situation = new Situation(step, contest.base(), contest.sites(), contest.intended(), shares, contest.orders(),
                VerdictOdds.verdict(probabilities));
        return new ReviewWriter(situation, world, probabilities, transfers, onOtherScale).write(findings(situation, reactions));
    }

    /**
     * How far every site goes as more base goes in; the step's own equivalents do not matter.
     *
     * @throws ReviewException as {@link #review(Step)}
     */
    public DoseResponse doseResponse(Step step) throws ReviewException {
        return doseResponse(step, DoseResponse.MOST_EQUIVALENTS);
    }

    /** The same up to a dose of one's own. */
    public DoseResponse doseResponse(Step step, double mostEquivalents) throws ReviewException {
        Contest contest = contest(step);
        return DoseResponse.of(contest.flask(), contest.sites(), contest.intended(), mostEquivalents);
    }

    /** Who competes for the base in a step: the sites, the one meant first to ask about, and the flask they are in. */
    private record Contest(WorkingBase base, List<Donor> sites, List<KineticControl.Order> orders, Donor intended,
                           SubstrateProtons protons, StepFlask flask) {}

    private Contest contest(Step step) throws ReviewException {
        WorkingBase base = workingBases.of(step);
        List<Donor> atEquilibrium = donors.of(step, base);
        List<KineticControl.Order> orders = kinetics.orders(step, base, atEquilibrium);
        List<Donor> sites = KineticControl.ahead(atEquilibrium, orders);
        SubstrateProtons protons = new SubstrateProtons(step.substrate(), coupling, sites);
        Optional<SubstrateProtons> partner = step.partner().map(molecule -> new SubstrateProtons(molecule, coupling, donors.of(molecule, step, base)));
        StepFlask flask = new StepFlask(step, base, protons, partner.filter(there -> !there.isEmpty()),
                workingBases.logK(base, water, step.solvent()));
        return new Contest(base, sites, orders, Donors.intended(step, sites), protons, flask);
    }

    private List<SideReaction> sideReactions(Step step, WorkingBase base, List<Transfer> transfers, Donor intended) {
        return base.destroyed() ? List.of() : base.shelfBase().map(working -> sideReactions.of(step,
                new SideReactionContext(working, transfers, OptionalInt.of(intended.site().atom())))).orElse(List.of());
    }

    /** A tabulated side reaction that wins turns every verdict but levelling into incompatible. */
    private static Map<Verdict, Double> withSideReactions(Map<Verdict, Double> probabilities, List<SideReaction> reactions) {
        double levelled = probabilities.getOrDefault(Verdict.LEVELLED, 0.0);
        if (levelled == 1 || reactions.stream().noneMatch(SideReaction::wins)) {
            return probabilities;
        }
        return levelled > 0 ? Map.of(Verdict.LEVELLED, levelled, Verdict.INCOMPATIBLE, 1 - levelled)
                : Map.of(Verdict.INCOMPATIBLE, 1.0);
    }

    private List<Finding> findings(Situation situation, List<SideReaction> reactions) {
        Step step = situation.step();
        List<Finding> findings = new ArrayList<>();
        EquilibriumFindings.rules().forEach(rule -> findings.addAll(rule.find(situation)));
        SiteOriginFindings.rules().forEach(rule -> findings.addAll(rule.find(situation)));
        SiteFindings.rules().forEach(rule -> findings.addAll(rule.find(situation)));
        ScaleFindings.rules().forEach(rule -> findings.addAll(rule.find(situation)));
        SolventFindings.rules().forEach(rule -> findings.addAll(rule.find(situation)));
        findings.addAll(trapping.of(situation));
        reactions.forEach(reaction -> findings.add(reaction.finding()));
        findings.addAll(inAcidSolvent(step));
        solventRules.of(step.base(), step.solvent(), step.temperatureCelsius()).stream()
                .filter(effect -> !effect.destroysBase() || situation.workingBase().levelled())
                .forEach(effect -> findings.add(effect.finding()));
        findings.addAll(hazards.of(step.base(), step.solvent(), step.temperatureCelsius(), situation.baseTakesProtons()));
        findings.sort(Comparator.comparing(Finding::severity));
        return findings;
    }

    /** What the solvent itself does to the substrate where it is an acid. */
    private List<Finding> inAcidSolvent(Step step) {
        return step.solvent().donorPKa(Medium.WATER)
                .map(acid -> sideReactions.underAcid(step.substrate(), acid.pKa(), step.temperatureCelsius())).orElse(List.of());
    }

    private static Solvent waterOf(Stockroom stockroom) {
        try {
            return stockroom.solvent(Medium.WATER.id());
        } catch (UnknownNameException e) {
            throw new IllegalStateException("moisture needs a row for water in solvents.csv", e);
        }
    }
}
