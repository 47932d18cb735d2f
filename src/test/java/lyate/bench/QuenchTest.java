package lyate.bench;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalDouble;
import lyate.acidity.AcidityEstimator;
import lyate.bench.Reviews.Site;
import lyate.flask.ProtonHolder;
import lyate.review.BaseHazards;
import lyate.review.Review;
import lyate.review.Step;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.UnknownNameException;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;

/** Protons counted by hand with the law of mass action; pKa values of the CRC Handbook, 95th ed., section 5 (from memory). */
class QuenchTest {

    private static final AqueousForms FORMS = new AqueousForms(new SiteFinder(SiteClasses.load(TableFolders.packaged())),
            AcidityEstimator.load(TableFolders.packaged()));
    private static final Enthalpies ENTHALPIES = Enthalpies.load(TableFolders.packaged());
    private static final AqueousForm INERT = new AqueousForm("product",
            new ProtonHolder("product", 1, List.of(), List.of(), 0), 0, true, List.of());

    /** Half way between pK1 6.35 and pK2 10.33 carbonate has taken exactly one proton. */
    @Test
    void carbonateTakesOneProtonToHydrogencarbonate() throws UnknownNameException {
        assertEquals(10, quench("k2co3", INERT, "hcl-1m", (6.35 + 10.33) / 2).acid().milliMole(), 0.02);
    }

    /** At pH 4: H2CO3 99.56 %, 19.96 mmol of protons for 10 mmol; 20.0 mL of 1 M hydrochloric acid to three digits. */
    @Test
    void carbonateTakesTwoProtonsInAcid() throws UnknownNameException {
        Quench quench = quench("k2co3", INERT, "hcl-1m", 4);
        double share = 1 / (1 + Math.pow(10, 4 - 6.35));
        assertEquals(10 * (1 + share), quench.acid().milliMole(), 0.02);
        assertEquals(20.0, quench.acid().milliLitre().orElseThrow(), 0.1);
        assertTrue(quench.sentences().stream().anyMatch(line -> line.startsWith("Acid sets free carbon dioxide, up to 10.0 mmol")),
                quench.sentences().toString());
    }

    /** Hydroxide and the benzoate made from it: the acid that was consumed comes back, 1/(1 + 10^2.2) of it stays ionised. */
    @Test
    void theProductsOwnAcidCounts() throws UnknownNameException {
        double ionised = 10 / (1 + Math.pow(10, 4.20 - 2));
        assertEquals(10 - ionised, quench("naoh", AqueousForm.acid("benzoic acid", 4.20), "hcl-1m", 2).acid().milliMole(), 1e-3);
    }

    /** Acetic acid, pKa 4.76, has given 99.43 % of its protons at pH 7. */
    @Test
    void aWeakAcidIsNeededInALittleMore() throws UnknownNameException {
        assertEquals(10 * (1 + Math.pow(10, 4.76 - 7)), quench("naoh", INERT, "acoh", 7).acid().milliMole(), 0.01);
        String message = assertThrows(IllegalArgumentException.class, () -> quench("naoh", INERT, "acoh", 2)).getMessage();
        assertTrue(message.contains("acetic acid gives only 0.00 protons at pH 2.0"), message);
    }

    /** Lithium diisopropylamide ends as lithium ion and diisopropylammonium (pKa 11.05): two protons each at pH 7. */
    @Test
    void theAmineSetFreeByAnAmideTakesItsProtonToo() throws UnknownNameException {
        assertEquals(20, quench("lda", INERT, "hcl-1m", 7).acid().milliMole(), 0.05);
    }

    /** A phosphazene is a neutral base and takes one proton, whatever its cation looks like. */
    @Test
    void aStrongNeutralBaseTakesOneProton() throws UnknownNameException {
        assertEquals(10, quench("p2-tbu", INERT, "hcl-1m", 7).acid().milliMole(), 0.01);
    }

    /** Butane and hydrogen leave: one proton each. */
    @Test
    void whatLeavesAsAGasTakesOneProton() throws UnknownNameException {
        assertEquals(10, quench("n-buli", INERT, "hcl-1m", 7).acid().milliMole(), 1e-6);
        Quench hydride = quench("cah2", INERT, "hcl-1m", 7);
        assertEquals(20, hydride.acid().milliMole(), 1e-6);
        assertTrue(hydride.sentences().stream().anyMatch(line -> line.startsWith("Acid sets free hydrogen, up to 20.0 mmol")));
    }

    /** 10 mmol of solid sodium hydroxide, 100.1 kJ/mol by the tables: 1.00 kJ. */
    @Test
    void theHeatOfNeutralisationIsGivenWhereTabulatedAndNeverReassuring() throws UnknownNameException {
        assertEquals(1.00, quench("naoh", INERT, "hcl-1m", 7).heat().orElseThrow().kiloJoule(), 0.005);
        Quench unknown = quench("kotbu", INERT, "hcl-1m", 7);
        assertTrue(unknown.heat().isEmpty());
        assertTrue(unknown.sentences().stream().anyMatch(line -> line.contains("treat the quench as strongly exothermic")));
        assertEquals(BaseHazards.STANDING_LINE, unknown.sentences().get(unknown.sentences().size() - 1));
    }

    @Test
    void whatIsAlreadyAcidNeedsNothing() throws UnknownNameException {
        Quench quench = quench("et3n", AqueousForm.acid("strong acid", -1), "hcl-1m", 7);
        assertEquals(0, quench.acid().milliMole(), 0.01);
        assertTrue(quench.sentences().get(0).startsWith("Nothing has to be neutralised"));
    }

    /** 10 mmol of base on 10 mmol of substrate. */
    private static Quench quench(String base, AqueousForm product, String acid, double pH) throws UnknownNameException {
        Step step = Reviews.step("O=C1CCCCC1", base, 1, "thf", 25, 0.2, 0);
        Review review = Reviews.review(step, "C3", false, new Site("C3", 26.4, 9, 100));
        Amounts amounts = Amounts.of(review, Batch.ofMilliMole(step.substrate(), 10), OptionalDouble.empty());
        return Quench.of(step, amounts, product, Reviews.STOCK.acid(acid), pH, FORMS, ENTHALPIES);
    }
}
