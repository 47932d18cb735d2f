package lyate.review;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import lyate.acidity.AcidityEstimator;
import lyate.acidity.SiteCoupling;
import lyate.flask.Equilibrium;
import lyate.flask.Flask;
import lyate.flask.HolderState;
import lyate.flask.ProtonBalance;
import lyate.flask.ProtonHolder;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.review.BasicSites.BasicSite;
import lyate.review.Protonation.Uptake;
import lyate.review.VerdictRule.World;
import lyate.site.Role;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;

/**
 * Judges protonations: which basic site takes the proton of an acid, how far, and what else the acid does. Aqueous pKa
 * values decide in whatever solvent, as is common practice in salt selection; there a difference of 3 or more counts as a
 * salt and one of −1 or less as none (Cruz-Cabeza, CrystEngComm 2012, 14, 6362). Immutable; safe to share between threads.
 */
public final class ProtonationReviewer {

    /** By how much the rule of practice asks for more than the K of 100 that counts as complete in solution. */
    private static final double SALT_MARGIN = 1;

    private static final String ACID = "acid";
    private static final String SUBSTRATE = "substrate";

    private final SiteFinder finder;
    private final AcidityEstimator acidity;
    private final SiteCoupling coupling;
    private final SideReactions sideReactions;
    private final AcidHazards hazards;
    private final VerdictOdds odds = new VerdictOdds();

    private ProtonationReviewer(TableFolders folders, Stockroom stockroom) {
        this.finder = new SiteFinder(SiteClasses.load(folders));
        this.acidity = AcidityEstimator.load(folders);
        this.coupling = SiteCoupling.load(folders);
        this.sideReactions = SideReactions.load(folders, stockroom);
        this.hazards = AcidHazards.load(folders, stockroom);
    }

    /**
     * Loads the tables it needs.
     *
     * @throws lyate.table.TableException naming every bad cell
     */
    public static ProtonationReviewer load(TableFolders folders, Stockroom stockroom) {
        return new ProtonationReviewer(folders, stockroom);
    }

    /**
     * Judges one protonation. Pure.
     *
     * @throws ReviewException in words where it cannot be judged, for example where the substrate has no basic site
     */
    public Protonation review(AcidStep step) throws ReviewException {
        BasicSites sites = BasicSites.of(step.substrate(), finder, acidity, coupling);
        BasicSite intended = sites.intended(step.intendedSite());
        WorkingAcid acid = workingAcid(step);
        int protonsToGive = acid.protonsFor(intended.acidity().pKa());
        ProtonationSituation situation = new ProtonationSituation(step, sites, intended, acid, uptakes(step, sites, acid), protonsToGive);

        World world = world(situation);
        Map<Verdict, Double> probabilities = odds.of(judged(situation).stream().map(site -> new VerdictOdds.Uncertain(
                site.acidity().sigma(), acid.sigma(), site.site().siteClass().family())).toList(), world);
        Verdict verdict = VerdictOdds.verdict(probabilities);
        List<Finding> findings = Stream.of(
                ProtonationFindings.of(situation, verdict).stream(),
                internalSalt(situation).stream(),
                sideReactions.underAcid(step.substrate(), acid.pKa(), step.temperatureCelsius()).stream(),
                hazards.of(step.acid(), step.solvent()).stream())
                .flatMap(found -> found).sorted(Comparator.comparing(Finding::severity)).toList();
        double probability = probabilities.getOrDefault(verdict,
                probabilities.values().stream().mapToDouble(Double::doubleValue).max().orElse(0));
        return new Protonation(step, verdict, probability, probabilities, intended.label(), situation.firstSite(verdict),
                situation.logK(intended), Math.hypot(intended.acidity().sigma(), acid.sigma()), situation.percent(intended),
                situation.highestOther(), situation.uptakes(), protonsToGive, findings,
                ProtonationFindings.explanation(situation, verdict), ProtonationFindings.assumptions(situation));
    }

    /** The site meant and, where the step names one, its rivals: without a name any site will do. */
    private static List<BasicSite> judged(ProtonationSituation situation) {
        return situation.step().intendedSite().isPresent() ? situation.sites().all() : List.of(situation.intended());
    }

    private static World world(ProtonationSituation situation) {
        List<BasicSite> judged = judged(situation);
        double[] logK = judged.stream().mapToDouble(site -> situation.logK(site) - SALT_MARGIN).toArray();
        int[] protons = judged.stream().mapToInt(site -> site.site().equivalent().size()).toArray();
        double shift = situation.before().stream().mapToDouble(site -> situation.sites().lowering(site, situation.intended())).sum();
        return new World(logK, protons, judged.indexOf(situation.intended()), shift, situation.protonEquivalents(),
                situation.acid().levelled(), false);
    }

    /** The acid as the solvent lets it be: no stronger than the solvent's own conjugate acid. */
    private WorkingAcid workingAcid(AcidStep step) throws ReviewException {
        KnownPKa own = step.acid().pKa(Medium.WATER).orElseThrow(() ->
                new ReviewException("the tables have no pKa in water for " + step.acid().name()));
        Optional<BasicSite> solventSite = solventSite(step.solvent());
        return WorkingAcid.of(step.acid(), own, solventSite.map(BasicSite::acidity));
    }

    private Optional<BasicSite> solventSite(Solvent solvent) {
        try {
            Molecule molecule = new MoleculeReader().read(solvent.smiles());
            return BasicSites.of(molecule, finder, acidity, coupling).all().stream().findFirst();
        } catch (MoleculeException e) {
            throw new IllegalStateException("the structure of " + solvent.name() + " in solvents.csv cannot be read", e);
        }
    }

    private static List<Uptake> uptakes(AcidStep step, BasicSites sites, WorkingAcid acid) {
        ProtonHolder substrate = sites.holder(SUBSTRATE, step.concentrationMolar());
        ProtonHolder donor = ProtonHolder.stages(ACID, step.concentrationMolar() * step.equivalents(), acid.stages().length, acid.stages());
        Equilibrium settled = ProtonBalance.solve(new Flask(List.of(substrate, donor), Flask.ROOM_KELVIN, Medium.WATER.id()));
        HolderState state = settled.of(SUBSTRATE);
        List<Uptake> uptakes = new ArrayList<>();
        int place = 0;
        for (BasicSite site : sites.all()) {
            double protonated = 0;
            for (int i = 0; i < site.site().equivalent().size() && place < substrate.places().size(); i++) {
                protonated += state.protonated(place++);
            }
            uptakes.add(new Uptake(site.label(), site.site().equivalent(), site.acidity(), site.acidity().pKa() - acid.pKa(),
                    100 * Math.min(1, protonated)));
        }
        return uptakes;
    }

    /** Whether the substrate already gives the site a proton of its own. */
    private List<Finding> internalSalt(ProtonationSituation situation) {
        Molecule molecule = situation.step().substrate();
        return finder.sites(molecule, Role.ACID).stream()
                .filter(site -> acidity.acidity(molecule, site, Medium.WATER)
                        .filter(own -> own.pKa() < situation.intended().acidity().pKa()).isPresent())
                .map(site -> ProtonationFindings.internalSalt(situation, site)).limit(1).toList();
    }
}
