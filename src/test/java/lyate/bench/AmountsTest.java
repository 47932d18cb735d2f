package lyate.bench;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalDouble;
import lyate.bench.Reviews.Site;
import lyate.review.Review;
import lyate.review.Step;
import org.junit.jupiter.api.Test;

/** Worked with a pocket calculator; molar masses from IUPAC atomic weights (NaH 24.00, cyclohexanone 98.14, water 18.015 g/mol). */
class AmountsTest {

    private static final OptionalDouble BY_LABEL = OptionalDouble.empty();

    /** 10 mmol, 1.2 equivalents of sodium hydride: 12 mmol, 0.288 g pure, 0.480 g of the 60 % dispersion. */
    @Test
    void aDispersionIsWeighedWithItsOil() {
        Review review = enolate("nah", 1.2, 50);
        Amounts amounts = Amounts.of(review, Batch.ofMilliMole(review.step().substrate(), 10), BY_LABEL);
        assertEquals(0.480, amounts.base().grams().orElseThrow(), 0.0005);
        assertEquals(50, amounts.solventMilliLitre(), 1e-9);
        assertEquals(0.9814, amounts.batch().grams(), 0.0002);
    }

    /** 1.05 equivalents of 2.5 M butyllithium: 4.20 mL; titrated at 2.1 M: 5.00 mL. */
    @Test
    void aTitratedStrengthReplacesTheLabel() {
        Review review = enolate("n-buli", 1.05, 0);
        Batch batch = Batch.ofMilliMole(review.step().substrate(), 10);
        assertEquals(4.20, Amounts.of(review, batch, BY_LABEL).base().milliLitre().orElseThrow(), 1e-9);
        Amounts titrated = Amounts.of(review, batch, OptionalDouble.of(2.1));
        assertEquals(5.00, titrated.base().milliLitre().orElseThrow(), 1e-9);
        assertTrue(titrated.warnings().contains("The titrated strength is 84 % of the label's."), titrated.warnings().toString());
        assertThrows(IllegalArgumentException.class, () -> Amounts.of(review, batch, OptionalDouble.of(0)));
    }

    /** 9.814 g of cyclohexanone are 100 mmol. */
    @Test
    void aBatchMayBeGivenInGrams() {
        Step step = enolate("n-buli", 1, 0).step();
        assertEquals(100, Batch.ofGrams(step.substrate(), 9.814).milliMole(), 0.05);
        assertThrows(IllegalArgumentException.class, () -> Batch.ofGrams(step.substrate(), 0));
    }

    /** 50 mL of THF (0.889 g/mL) with 200 ppm of water: 8.89 mg, 0.49 mmol, more than an excess of 0.5 mmol less itself. */
    @Test
    void moistureIsCountedAndOutweighsASmallExcess() {
        Review review = enolate("n-buli", 1.03, 200);
        Amounts amounts = Amounts.of(review, Batch.ofMilliMole(review.step().substrate(), 10), BY_LABEL);
        assertEquals(0.493, amounts.waterMilliMole(), 0.003);
        assertEquals(List.of("water", "C3"), amounts.spending().stream().map(Amounts.Spent::what).toList());
        assertEquals(10.3 - 10 - 0.493, amounts.excess(), 0.003);
        assertEquals(10.493, amounts.baseNeeded().milliMole(), 0.003);
        assertTrue(amounts.warnings().stream().anyMatch(line -> line.contains("drying matters more than the stoichiometry")));
        assertTrue(amounts.warnings().stream().anyMatch(line -> line.contains("0.193 mmol short")), amounts.warnings().toString());
    }

    @Test
    void aDrySolventAndEnoughBaseNeedNoWarning() {
        Review review = enolate("n-buli", 1.05, 5);
        assertEquals(List.of(), Amounts.of(review, Batch.ofMilliMole(review.step().substrate(), 10), BY_LABEL).warnings());
    }

    /** Water does not use up an amine: it is the weaker acid by far. */
    @Test
    void moistureDoesNotUseUpAWeakBase() {
        Review review = enolate("et3n", 1.05, 200);
        Amounts amounts = Amounts.of(review, Batch.ofMilliMole(review.step().substrate(), 10), BY_LABEL);
        assertEquals(List.of("C3"), amounts.spending().stream().map(Amounts.Spent::what).toList());
        assertEquals(10.5 * 101.19 / 1000 / 0.7255, amounts.base().milliLitre().orElseThrow(), 0.01);
    }

    /** 4-Hydroxycyclohexanone: the hydroxyl goes before the α-carbon and costs an equivalent of its own. */
    @Test
    void aMoreAcidicProtonIsPaidForFirst() {
        Step step = Reviews.step("O=C1CCC(O)CC1", "n-buli", 2.1, "thf", -78, 0.2, 0);
        Review review = Reviews.review(step, "C3", false, new Site("O6", 24, 31, 100), new Site("C3", 26.4, 28.6, 100));
        Amounts amounts = Amounts.of(review, Batch.ofMilliMole(step.substrate(), 5), BY_LABEL);
        assertEquals(List.of(new Amounts.Spent("O6", 5), new Amounts.Spent("C3", 5)), amounts.spending());
        assertEquals(0.5, amounts.excess(), 1e-9);
    }

    /** One mole of calcium hydride takes two of protons. */
    @Test
    void aBaseWithTwoHydridesIsNeededByHalf() {
        Review review = enolate("cah2", 1, 0);
        Amounts amounts = Amounts.of(review, Batch.ofMilliMole(review.step().substrate(), 10), BY_LABEL);
        assertEquals(20, amounts.protonsTakenUp(), 1e-9);
        assertEquals(5, amounts.baseNeeded().milliMole(), 1e-9);
    }

    /** Cyclohexanone, its α-carbon meant, 0.2 M in THF. */
    private static Review enolate(String base, double equivalents, double ppm) {
        Step step = Reviews.step("O=C1CCCCC1", base, equivalents, "thf", 25, 0.2, ppm);
        return Reviews.review(step, "C3", false, new Site("C3", 26.4, 9, 100));
    }
}
