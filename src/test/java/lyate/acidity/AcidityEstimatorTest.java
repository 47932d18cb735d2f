package lyate.acidity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import lyate.acidity.Acidity.Basis;
import lyate.acidity.Acidity.Contribution;
import lyate.acidity.Acidity.Effect;
import lyate.molecule.Molecule;
import lyate.site.ProtonSite;
import lyate.site.Role;
import lyate.site.SiteClass;
import lyate.site.SiteClass.ClassValue;
import lyate.stock.Medium;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;

class AcidityEstimatorTest {

    private static final MeasuredAcidities MEASURED = MeasuredAcidities.load(TableFolders.packaged());
    private static final MediaTransfer TRANSFER = MediaTransfer.load(TableFolders.packaged());
    private static final AcidityEstimator ESTIMATOR = new AcidityEstimator(MEASURED, TRANSFER, List.of(new ClassValueEstimate()));
    private static final Medium NITROMETHANE = new Medium("nitromethane");

    private static SiteEstimate always(double pKa, double sigma, Medium only) {
        return (molecule, site, medium) -> medium.equals(only) ? Optional.of(new Acidity(pKa, sigma, medium, Basis.ESTIMATED,
                List.of(new Contribution("made up", Effect.ATOM, pKa, List.of())), List.of(), List.of(), "made up", List.of(), "made up")) : Optional.empty();
    }

    private static Optional<Acidity> acidity(AcidityEstimator estimator, String smiles, String label, Medium medium) {
        Molecule molecule = Sites.molecule(smiles);
        return estimator.acidity(molecule, Sites.site(molecule, label, Role.ACID), medium);
    }

    @Test
    void theValueMeasuredInTheMediumDecides() {
        Acidity acetic = acidity(ESTIMATOR, "CC(=O)O", "O4", Medium.DMSO).orElseThrow();
        assertEquals(12.3, acetic.pKa());
        assertEquals(Basis.MEASURED, acetic.basis());
        assertEquals(List.of(), acetic.contributions());
    }

    @Test
    void aValueMeasuredElsewhereIsCarriedAndSaysSo() {
        Acidity acid = acidity(ESTIMATOR, "CCCCCCC(=O)O", "O9", NITROMETHANE).orElseThrow();
        assertEquals(Basis.TRANSFERRED, acid.basis());
        assertEquals(acid.pKa(), acid.contributions().stream().mapToDouble(Contribution::value).sum(), 1e-9);
        assertEquals("measured in water", acid.contributions().get(0).text());
    }

    @Test
    void theSurerOfCarriedValueAndEstimateIsGivenAndTheOtherNamed() {
        AcidityEstimator vague = new AcidityEstimator(MEASURED, TRANSFER, List.of(always(30, 9, NITROMETHANE)));
        AcidityEstimator sure = new AcidityEstimator(MEASURED, TRANSFER, List.of(always(30, 0.01, NITROMETHANE)));
        Acidity carried = acidity(vague, "CCCCCCC(=O)O", "O9", NITROMETHANE).orElseThrow();
        Acidity estimated = acidity(sure, "CCCCCCC(=O)O", "O9", NITROMETHANE).orElseThrow();
        assertEquals(Basis.TRANSFERRED, carried.basis());
        assertTrue(carried.source().contains("preferred to the estimated value 30.0"), carried.source());
        assertEquals(Basis.ESTIMATED, estimated.basis());
        assertTrue(estimated.source().contains("preferred to the transferred value"), estimated.source());
    }

    @Test
    void anEstimateMadeInWaterIsCarriedWhereThereIsNoneInTheMedium() {
        Acidity acid = acidity(ESTIMATOR, "CCCCCCCCCCCC(=O)O", "O14", Medium.ACETONITRILE).orElseThrow();
        assertEquals(Basis.TRANSFERRED, acid.basis());
        assertEquals(Medium.ACETONITRILE, acid.medium());
        assertTrue(acid.contributions().get(0).text().startsWith("class value"), acid.contributions()::toString);
    }

    /** The second is the value of a class and counts as half as wide again: here both weigh alike. */
    @Test
    void twoEstimatesAreWeighedAndTheirDistanceCounts() {
        AcidityEstimator estimator = new AcidityEstimator(MeasuredAcidities.none(), TRANSFER,
                List.of(always(20, 0.1, Medium.WATER), always(5, 1, Medium.DMSO), always(7, 1 / 1.5, Medium.DMSO)));
        Acidity acid = acidity(estimator, "CC(=O)O", "O4", Medium.DMSO).orElseThrow();
        assertEquals(6, acid.pKa(), 1e-9);
        assertEquals(6, acid.contributions().stream().mapToDouble(Contribution::value).sum(), 1e-9);
        assertEquals(Math.hypot(Math.sqrt(0.5), 1), acid.sigma(), 1e-9);
        assertTrue(acid.alternatives().stream().anyMatch(way -> way.pKa() == 5) && acid.alternatives().stream().anyMatch(way -> way.pKa() == 7));
    }

    @Test
    void aRelationshipFarFromItsDataLeavesItToTheClassValue() {
        AcidityEstimator estimator = new AcidityEstimator(MeasuredAcidities.none(), TRANSFER,
                List.of(always(5, 2.5, Medium.DMSO), always(6, 2, Medium.DMSO)));
        assertEquals(6, acidity(estimator, "CC(=O)O", "O4", Medium.DMSO).orElseThrow().pKa());
    }

    /** There the spread of a class counts four times: here both weigh alike, however unsure the relationship is. */
    @Test
    void forHeteroatomsInWaterTheClassValueCountsLess() {
        AcidityEstimator estimator = new AcidityEstimator(MeasuredAcidities.none(), TRANSFER,
                List.of(always(5, 2.4, Medium.WATER), always(7, 0.6, Medium.WATER)));
        Acidity acid = acidity(estimator, "CC(=O)O", "O4", Medium.WATER).orElseThrow();
        assertEquals(6, acid.pKa(), 1e-9);
        assertEquals(Math.hypot(2.4 * Math.sqrt(0.5), 1), acid.sigma(), 1e-9);
    }

    @Test
    void withoutMeasuredTheTableIsIgnored() {
        Acidity acetic = acidity(ESTIMATOR.withoutMeasured(), "CC(=O)O", "O4", Medium.WATER).orElseThrow();
        assertEquals(8, acetic.pKa(), "the class value");
        assertEquals(Basis.ESTIMATED, acetic.basis());
    }

    /** 4-Ethoxyphenol, 10.13 in water (Serjeant & Dempsey 1979, from memory), by the class of phenols: 10.0 and 18.0. */
    @Test
    void betweenWaterAndDmsoTheShiftOfTheClassIsSurerThanTheLineOfTheFamily() {
        MediaTransfer vague = new MediaTransfer(List.of(new MediaRelation(Medium.WATER, Medium.DMSO, "phenol", 2, -2, 2, 9, 0, 20, "made up")));
        ClassValue inWater = new ClassValue(10, 0.8, "made up");
        ClassValue inDmso = new ClassValue(18, 1.2, "made up");
        SiteClass phenols = Sites.siteClass(Role.ACID, "phenol", Optional.of(inWater), Optional.of(inDmso));
        Acidity shifted = new ClassShift(vague).carry(Acidity.measured(10.13, 0.05, Medium.WATER, "made up"), phenols, Medium.DMSO).orElseThrow();
        assertEquals(18 + 2 * 0.13, shifted.pKa(), 1e-9);
        assertTrue(shifted.sigma() >= 0.5 && shifted.sigma() < 0.6, () -> "uncertainty " + shifted.sigma());
        assertEquals(1, shifted.contributions().stream().filter(term -> term.effect() == Effect.MEDIUM).count());
        Acidity far = new ClassShift(vague).carry(Acidity.measured(4, 0.05, Medium.WATER, "made up"), phenols, Medium.DMSO).orElseThrow();
        assertTrue(far.sigma() > 1.8, "a phenol that is hardly one of its class");
    }

    @Test
    void withoutClassValuesInBothMediaThereIsNoShift() {
        SiteClass onlyWater = Sites.siteClass(Role.ACID, "phenol", Optional.of(new ClassValue(10, 1, "made up")), Optional.empty());
        Acidity value = Acidity.measured(10, 0.1, Medium.WATER, "made up");
        assertEquals(Optional.empty(), new ClassShift(TRANSFER).carry(value, onlyWater, Medium.DMSO));
    }

    @Test
    void shiftAndLineTogetherAreOneContribution() {
        Molecule acid = Sites.molecule("CCCCCCC(=O)O");
        SiteClass acids = Sites.siteClass(Role.ACID, "carboxylic-acid", Optional.of(new ClassValue(4.8, 0.3, "made up")),
                Optional.of(new ClassValue(12.3, 0.4, "made up")));
        ProtonSite site = new ProtonSite(Role.ACID, acid.atomLabelled("O9").orElseThrow(), List.of(8), 1, acids);
        Acidity carried = ESTIMATOR.acidity(acid, site, Medium.ACETONITRILE).orElseThrow();
        assertEquals(1, carried.contributions().stream().filter(term -> term.effect() == Effect.MEDIUM).count());
        assertEquals(carried.pKa(), carried.contributions().stream().mapToDouble(Contribution::value).sum(), 1e-9);
        assertEquals(23.5, carried.pKa(), 1, "acetic acid 23.51, Kuett et al. 2006 (from memory)");
    }

    @Test
    void missingIsMissing() {
        AcidityEstimator estimator = new AcidityEstimator(MeasuredAcidities.none(), TRANSFER, List.of());
        assertEquals(Optional.empty(), acidity(estimator, "CC(=O)O", "O4", Medium.WATER));
    }

    @Test
    void acidAndConjugateBaseGiveTheSameValue() {
        Molecule base = Sites.molecule("C1CCNCC1");
        Molecule acid = Sites.molecule("C1CC[NH2+]CC1");
        ProtonSite baseSite = Sites.site(base, "N4", Role.BASE, "ammonium");
        ProtonSite acidSite = Sites.site(acid, "N4", Role.ACID, "ammonium");
        for (Medium medium : List.of(Medium.WATER, Medium.DMSO, Medium.ACETONITRILE, NITROMETHANE, new Medium("meoh"))) {
            assertEquals(ESTIMATOR.acidity(base, baseSite, medium), ESTIMATOR.acidity(acid, acidSite, medium), medium::id);
        }
    }
}
