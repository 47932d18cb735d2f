package lyate.bench;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;
import lyate.bench.Reviews.Site;
import lyate.review.BaseHazards;
import lyate.review.Review;
import lyate.review.Step;
import lyate.stock.Medium;
import lyate.stock.Solvent;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;

class GasAndHeatTest {

    private final Enthalpies enthalpies = Enthalpies.load(TableFolders.packaged());

    /** Molar volume of an ideal gas: 22.414 L at 0 degrees C and 101.325 kPa (CODATA 2018). */
    @Test
    void aMoleOfGasFillsItsMolarVolume() {
        assertEquals(22.414, new GivenOffGas("hydrogen", 1000, 0, 0, 101.325).litresInStep(), 0.001);
    }

    /** 100 mmol of malonate with 1.2 equivalents of hydride: 2.45 L of hydrogen at 25 degrees C now, 0.49 L when the rest dies. */
    @Test
    void hydrideGivesItsHydrogenNowAndAtTheQuench() {
        GasAndHeat found = of(malonate("nah", "thf", 1.2, 0, 5.5, 100));
        GivenOffGas gas = found.gas().orElseThrow();
        assertEquals("hydrogen", gas.name());
        assertEquals(2.447, gas.litresInStep(), 0.002);
        assertEquals(0.489, gas.litresAtQuench(), 0.001);
        assertTrue(found.cautions().get(0).startsWith("Gives off 2.45 L of hydrogen (25 degrees C, 101.3 kPa)"), found.cautions().get(0));
    }

    /**
     * The malonate proton is more acidic than water: at least the 83.7 kJ/mol of hydride and water. 0.1 mol in 500 mL of THF
     * (0.889 g/mL, 1.72 J/(g K)): 8.37 kJ over 765 J/K are 11 K.
     */
    @Test
    void theHeatWarmsTheSolventAsItsHeatCapacitySays() {
        GasAndHeat found = of(malonate("nah", "thf", 1.0, 0, 5.5, 100));
        assertEquals(8.37, found.kiloJoule().orElseThrow(), 0.01);
        assertEquals(10.9, found.temperatureRise().orElseThrow(), 0.2);
        assertEquals(found.temperatureRise().getAsDouble(), found.highestTemperature().orElseThrow(), 1e-9);
        assertFalse(found.heat().get(0).tabulated());
    }

    /** Where the pKa difference says more heat than water gives, it counts: 12 × 5.708 kJ/mol is less, 20 × 5.708 more than its 83.67. */
    @Test
    void theLargerOfTwoEstimatesCounts() {
        assertEquals(83.67, of(malonate("nah", "thf", 1.0, 0, 12, 100)).heat().get(0).kiloJoulePerMole(), 0.01);
        assertEquals(114.16, of(malonate("nah", "thf", 1.0, 0, 20, 100)).heat().get(0).kiloJoulePerMole(), 0.01);
    }

    /** Butyllithium in methanol: all of it reacts with the solvent, 187.3 kJ/mol by the tables. */
    @Test
    void aLevelledBaseGivesAllItsHeatAndGasToTheSolvent() {
        Step step = Reviews.step("CCOC(=O)CC(=O)OCC", "n-buli", 1.5, "meoh", 25, 1.0, 0);
        Review review = Reviews.review(step, "C6", true, new Site("C6", 16.4, 1, 90));
        GasAndHeat found = GasAndHeat.of(review, amounts(review, 100), enthalpies);
        assertEquals(1, found.heat().size());
        assertTrue(found.heat().get(0).tabulated());
        assertEquals(0.150 * 187.3, found.kiloJoule().orElseThrow(), 0.1);
        assertEquals("butane", found.gas().orElseThrow().name());
        assertEquals(0, found.gas().orElseThrow().milliMoleAtQuench(), 1e-9);
        assertTrue(found.highestTemperature().orElseThrow() > step.solvent().boilingPoint());
        assertTrue(found.cautions().stream().anyMatch(line -> line.startsWith("That reaches the boiling point of methanol")));
    }

    /** Without a heat capacity nothing is said about the temperature except that it is not known. */
    @Test
    void aMissingHeatCapacityIsNeverReassuring() {
        Review review = in(bare(), malonate("nah", "thf", 1.0, 25, 12, 100), false);
        GasAndHeat found = of(review);
        assertTrue(found.temperatureRise().isEmpty() && found.highestTemperature().isEmpty());
        assertTrue(found.kiloJoule().isPresent());
        assertTrue(found.cautions().stream().anyMatch(line -> line.contains("treat the addition as strongly exothermic")));
    }

    /** A solvent that destroys the base in a way no table tells the heat of. */
    @Test
    void aMissingHeatIsNeverReassuring() {
        GasAndHeat found = of(in(bare(), malonate("nah", "thf", 1.0, 25, 12, 100), true));
        assertEquals(List.of("liquid"), found.withoutHeat());
        assertTrue(found.kiloJoule().isEmpty() && found.temperatureRise().isEmpty());
        assertTrue(found.cautions().contains(
                "No heat is known for sodium hydride with liquid: treat the addition as strongly exothermic."), found.cautions().toString());
    }

    /** No table tells what potassium hexamethyldisilazide gives off in water; the pKa difference would say next to nothing. */
    @Test
    void aBaseItsSolventDestroysIsNotJudgedByPKa() {
        Step step = Reviews.step("CCOC(=O)CC(=O)OCC", "khmds", 1.1, "water", 25, 0.3, 0);
        Review review = Reviews.review(step, "C6", true, new Site("C6", 16.4, 1, 90));
        GasAndHeat found = of(review);
        assertTrue(found.temperatureRise().isEmpty());
        assertEquals(List.of("water"), found.withoutHeat());
    }

    /** A transfer that hardly runs is no cold pack. */
    @Test
    void anEstimateIsNeverBelowZero() {
        assertEquals(0, of(malonate("et3n", "thf", 1, 0, -6, 1)).kiloJoule().orElseThrow());
    }

    @Test
    void moistureAddsItsOwnHeat() {
        GasAndHeat found = of(malonate("n-buli", "thf", 1.2, -78, 30, 100, 500));
        assertEquals(List.of("water", "C6"), found.heat().stream().map(HeatShare::donor).toList());
        assertEquals(195.17, found.heat().get(0).kiloJoulePerMole(), 0.1);
        assertTrue(found.heat().get(0).tabulated());
        assertEquals(195.17, found.heat().get(1).kiloJoulePerMole(), 0.1);
    }

    @Test
    void theStandingLineIsAlwaysLast() {
        for (GasAndHeat found : List.of(of(malonate("nah", "thf", 1, 0, 12, 1)), of(malonate("et3n", "thf", 1, 0, -6, 1)))) {
            assertEquals(BaseHazards.STANDING_LINE, found.cautions().get(found.cautions().size() - 1));
            assertTrue(found.cautions().stream().noneMatch(line ->
                    line.toLowerCase(Locale.ROOT).matches(".*\\b(safe|harmless|no risk)\\b.*")));
        }
        assertTrue(of(malonate("et3n", "thf", 1, 0, -6, 1)).gas().isEmpty());
    }

    /** A solvent of which only what every row must have is known. */
    private static Solvent bare() {
        return new Solvent("liquid", "liquid", List.of(), "CCOCC", Solvent.Kind.LOW_POLARITY, Medium.DMSO, Map.of(), 100,
                OptionalDouble.empty(), 1, OptionalDouble.empty(), OptionalDouble.empty(), 100, OptionalDouble.empty(),
                OptionalDouble.empty(), "", "written for the test");
    }

    private static Review in(Solvent solvent, Review other, boolean levelled) {
        Step step = other.step();
        return Reviews.review(new Step(step.id(), step.substrate(), step.intendedSite(), step.base(), step.equivalents(), solvent,
                step.temperatureCelsius(), step.concentrationMolar(), step.waterPpm(), step.partner()), "C6", levelled,
                new Site("C6", 16.4, 12, 100));
    }

    private GasAndHeat of(Review review) {
        return GasAndHeat.of(review, amounts(review, 100), enthalpies);
    }

    private static Amounts amounts(Review review, double milliMole) {
        return Amounts.of(review, Batch.ofMilliMole(review.step().substrate(), milliMole), OptionalDouble.empty());
    }

    private static Review malonate(String base, String solvent, double equivalents, double celsius, double logK, double percent) {
        return malonate(base, solvent, equivalents, celsius, logK, percent, 0);
    }

    /** Diethyl malonate, 0.2 M. */
    private static Review malonate(String base, String solvent, double equivalents, double celsius, double logK, double percent,
                                   double ppm) {
        Step step = Reviews.step("CCOC(=O)CC(=O)OCC", base, equivalents, solvent, celsius, 0.2, ppm);
        return Reviews.review(step, "C6", false, new Site("C6", 16.4, logK, percent));
    }
}
