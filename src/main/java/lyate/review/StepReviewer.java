package lyate.review;

import java.util.Comparator;
import java.util.List;
import java.util.Map;
import lyate.acidity.AcidityEstimator;
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

    private final BaseStrength strength;
    private final Donors donors;
    private final Solvent water;
    private final VerdictOdds odds = new VerdictOdds();

    public StepReviewer(SiteFinder finder, AcidityEstimator acidity, Solvent water) {
        this.strength = new BaseStrength(finder, acidity);
        this.donors = new Donors(finder, acidity);
        this.water = water;
    }

    /** Loads the tables it needs. */
    public static StepReviewer load(TableFolders folders) {
        return new StepReviewer(new SiteFinder(SiteClasses.load(folders)), AcidityEstimator.load(folders),
                waterOf(Stockroom.load(folders)));
    }

    private static Solvent waterOf(Stockroom stockroom) {
        try {
            return stockroom.solvent(Medium.WATER.id());
        } catch (UnknownNameException e) {
            throw new IllegalStateException("moisture needs a row for water in solvents.csv", e);
        }
    }

    @Override
    public Review review(Step step) throws ReviewException {
        WorkingBase base = WorkingBase.of(step.base(), step.solvent(), strength);
        List<Donor> sites = donors.of(step, base);
        Donor intended = Donors.intended(step, sites);
        World world = world(step, base, sites, intended);
        Map<Verdict, Double> probabilities = odds.of(sites, world);
        Verdict verdict = likeliest(probabilities);
        ProtonShares shares = StepFlask.settle(step, base, sites, List.of(), base.logKAgainst(water, step.solvent()));
        Situation situation = new Situation(step, base, sites, intended, shares, verdict);
        return new ReviewWriter(situation, world, probabilities).write(findings(situation));
    }

    private static World world(Step step, WorkingBase base, List<Donor> sites, Donor intended) {
        double[] logK = sites.stream().mapToDouble(Donor::effectiveLogK).toArray();
        return new World(logK, sites.indexOf(intended), 0, step.equivalents() * step.base().protonsPerFormula(), base.levelled());
    }

    private static Verdict likeliest(Map<Verdict, Double> probabilities) {
        return probabilities.entrySet().stream().max(Map.Entry.comparingByValue())
                .filter(entry -> entry.getValue() >= VerdictOdds.DECIDED).map(Map.Entry::getKey).orElse(Verdict.UNDECIDED);
    }

    private static List<Finding> findings(Situation situation) {
        return EquilibriumFindings.rules().stream().flatMap(rule -> rule.find(situation).stream())
                .sorted(Comparator.comparing(Finding::severity)).toList();
    }
}
