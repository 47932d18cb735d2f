package lyate.review;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.stream.Stream;
import lyate.acidity.Acidity;
import lyate.acidity.AcidityEstimator;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
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
import lyate.stock.UnknownNameException;
import lyate.table.TableFolders;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every rule is reached by its own example, is not set off by its counter-example, and is shadowed by no later row. */
class RuleTablesTest {

    private static final Stockroom STOCKROOM = Stockroom.load(TableFolders.packaged());
    private static final SideReactions SIDE_REACTIONS = SideReactions.load(TableFolders.packaged(), STOCKROOM);
    private static final BaseSolventRules SOLVENT_RULES = BaseSolventRules.load(TableFolders.packaged(), STOCKROOM);
    private static final BaseHazards HAZARDS = BaseHazards.load(TableFolders.packaged(), STOCKROOM);
    private static final AcidityEstimator ACIDITY = AcidityEstimator.load(TableFolders.packaged());
    private static final SiteFinder SITES = new SiteFinder(SiteClasses.load(TableFolders.packaged()));

    static Stream<SideReactionRule> sideReactions() {
        return SIDE_REACTIONS.rules().stream();
    }

    static Stream<BaseSolventRules.Rule> solventRules() {
        return SOLVENT_RULES.rules().stream();
    }

    static Stream<BaseHazards.Rule> hazards() {
        return HAZARDS.rules().stream();
    }

    @ParameterizedTest
    @MethodSource("sideReactions")
    void aSideReactionIsRaisedByItsHit(SideReactionRule rule) throws Exception {
        assertTrue(decides(rule, rule.hit()), rule.id() + " is not what decides for " + rule.hit());
    }

    @ParameterizedTest
    @MethodSource("sideReactions")
    void aSideReactionIsNotRaisedByItsMiss(SideReactionRule rule) throws Exception {
        assertFalse(decides(rule, rule.miss()), rule.id() + " is raised by " + rule.miss());
    }

    @ParameterizedTest
    @MethodSource("solventRules")
    void aSolventRuleIsRaisedByItsHitAlone(BaseSolventRules.Rule rule) throws UnknownNameException {
        assertTrue(SOLVENT_RULES.deciding(base(rule.hit(), 0), solvent(rule.hit(), 1), number(rule.hit(), 2)).containsValue(rule),
                rule.id() + " is not what decides for " + rule.hit());
        assertFalse(SOLVENT_RULES.deciding(base(rule.miss(), 0), solvent(rule.miss(), 1), number(rule.miss(), 2)).containsValue(rule),
                rule.id() + " is raised by " + rule.miss());
    }

    @ParameterizedTest
    @MethodSource("hazards")
    void aHazardIsRaisedByItsHitAlone(BaseHazards.Rule rule) throws UnknownNameException {
        assertTrue(HAZARDS.deciding(base(rule.hit(), 0), solvent(rule.hit(), 1), number(rule.hit(), 2), rule.needsProton())
                .contains(rule), rule.id() + " is not what decides for " + rule.hit());
        assertFalse(HAZARDS.deciding(base(rule.miss(), 0), solvent(rule.miss(), 1), number(rule.miss(), 2), true)
                .contains(rule), rule.id() + " is raised by " + rule.miss());
    }

    /**
     * Whether a rule decides at some atom of an example: {@code substrate|base|solvent|temperature|equivalents|site} for bases
     * (the last two may be left out: 1.1 equivalents, no site), {@code substrate|acid pKa|temperature} for acids.
     */
    private static boolean decides(SideReactionRule rule, String example) throws UnknownNameException, MoleculeException {
        Molecule molecule = new MoleculeReader().read(cell(example, 0));
        if (rule.agent() == Agent.ACID) {
            return SIDE_REACTIONS.underAcid(molecule, number(example, 1), number(example, 2)).stream()
                    .anyMatch(finding -> finding.sentence().equals(rule.sentence()));
        }
        Base base = base(example, 1);
        Optional<String> site = Optional.ofNullable(cell(example, 5));
        double equivalents = cell(example, 4) == null ? 1.1 : number(example, 4);
        Step step = new Step("example", molecule, site, base, equivalents, solvent(example, 2), number(example, 3), 0.2, 0,
                rule.target() == Target.PARTNER ? Optional.of(molecule) : Optional.empty());
        SideReactionContext context = new SideReactionContext(base,
                rule.target() == Target.PARTNER ? List.of() : transfers(molecule, base, step.solvent()),
                site.map(molecule::atomLabelled).orElse(OptionalInt.empty()));
        return SIDE_REACTIONS.byRule(molecule, rule.target(),
                (tried, atom) -> SideReactions.fits(tried, molecule, atom, step, context)).containsKey(rule);
    }

    /** Every acid site against the base, in DMSO for strong bases out of reach of protic solvents, else in water. */
    private static List<Transfer> transfers(Molecule molecule, Base base, Solvent solvent) {
        Medium scale = base.family().strong() && solvent.kind() != Solvent.Kind.PROTIC ? Medium.DMSO : Medium.WATER;
        double pKaOfBase = base.pKa(scale).orElseThrow().pKa();
        List<Transfer> transfers = new ArrayList<>();
        for (ProtonSite site : SITES.sites(molecule, Role.ACID)) {
            ACIDITY.acidity(molecule, site, scale).ifPresent((Acidity acidity) -> transfers.add(
                    new Transfer(molecule.label(site.atom()), site.equivalent(), acidity, pKaOfBase - acidity.pKa(),
                            acidity.sigma(), 0, 0, "example")));
        }
        return transfers;
    }

    private static String cell(String example, int index) {
        String[] cells = example.split("\\|");
        return index < cells.length ? cells[index].strip() : null;
    }

    private static double number(String example, int index) {
        return Double.parseDouble(cell(example, index));
    }

    private static Base base(String example, int index) throws UnknownNameException {
        return STOCKROOM.base(cell(example, index));
    }

    private static Solvent solvent(String example, int index) throws UnknownNameException {
        return STOCKROOM.solvent(cell(example, index));
    }
}
