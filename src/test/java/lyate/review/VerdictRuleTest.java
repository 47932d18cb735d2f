package lyate.review;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.stream.IntStream;
import lyate.review.VerdictRule.World;
import org.junit.jupiter.api.Test;

class VerdictRuleTest {

    private static final double COUPLED = 8;

    @Test
    void aBaseTwoUnitsStrongerThanTheOnlyAcidTakesItSelectively() {
        assertEquals(Verdict.SELECTIVE, judge(1, 2.0));
    }

    @Test
    void comparableAcidsShareTheProton() {
        assertEquals(Verdict.PARTIAL, judge(1, 0));
        assertEquals(Verdict.PARTIAL, judge(1, 1.9));
        assertEquals(Verdict.PARTIAL, judge(1, -1.9));
    }

    @Test
    void aBaseTwoUnitsWeakerDoesNothing() {
        assertEquals(Verdict.TOO_WEAK, judge(1, -2.0));
    }

    @Test
    void aMoreAcidicProtonTakesTheOnlyEquivalent() {
        assertEquals(Verdict.WRONG_SITE, judge(1, 9, 20));
    }

    @Test
    void aSecondEquivalentReachesTheLessAcidicProtonOfADianion() {
        assertEquals(Verdict.SELECTIVE, judge(2, 12, 20));
        assertEquals(Verdict.SELECTIVE, judge(2.2, 12, 20));
    }

    @Test
    void aSecondProtonOutOfReachAfterTheFirstIsStillTheWrongSite() {
        assertEquals(Verdict.WRONG_SITE, judge(2, 5, 20));
    }

    @Test
    void aBaseThatReachesNoProtonIsTooWeakWhateverTheirOrder() {
        assertEquals(Verdict.TOO_WEAK, judge(1, -9, -4));
    }

    @Test
    void aLessAcidicRivalWithinTheNinetyFivePercentGapSpoilsSelectivity() {
        assertEquals(Verdict.PARTIAL, judge(1, 9, 8.2));
        assertEquals(Verdict.SELECTIVE, judge(1, 9, 7.5));
    }

    @Test
    void aLyateIonThatStillSufficesIsSelective() {
        assertEquals(Verdict.SELECTIVE, VerdictRule.judge(new World(new double[] {5}, new int[] {1}, 0, COUPLED, 1, true, false)));
    }

    @Test
    void aLyateIonThatDoesNotSufficeMeansTheBaseWasLevelled() {
        assertEquals(Verdict.LEVELLED, VerdictRule.judge(new World(new double[] {1}, new int[] {1}, 0, COUPLED, 1, true, false)));
    }

    @Test
    void aBaseThatTheSolventDestroysTakesNothing() {
        assertEquals(Verdict.LEVELLED, VerdictRule.judge(new World(new double[] {20}, new int[] {1}, 0, COUPLED, 1, true, true)));
    }

    private static Verdict judge(double equivalents, double... logKIntendedFirst) {
        return VerdictRule.judge(new World(logKIntendedFirst, IntStream.range(0, logKIntendedFirst.length).map(site -> 1).toArray(), 0, COUPLED, equivalents, false, false));
    }
}
