package lyate.flask;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;

class CompletionTest {

    private static final IrreversibleBase BUTYLLITHIUM = new IrreversibleBase("butyllithium", 1, 50);

    /** Hydroxybenzoic acid and water with one base: the carboxylic acid goes first, and all of it. */
    @Test
    void theMostAcidicProtonGoesFirst() {
        ProtonHolder acid = new ProtonHolder("4-hydroxybenzoic acid", 0.6,
                List.of(new ProtonPlace("O1", 18.0), new ProtonPlace("O9", 11.1)), List.of(), 2);
        Completion completion = Completion.of(Flask.of("dmso", acid, ProtonHolder.acid("water", 0.1, 31.4)), BUTYLLITHIUM);
        assertEquals(List.of(new Completion.Consumed("4-hydroxybenzoic acid", 1, 11.1, 0.6),
                new Completion.Consumed("4-hydroxybenzoic acid", 0, 18.0, 0.4)), completion.consumed());
        assertEquals(0, completion.leftOver());
        assertEquals(0.2 / 0.6, completion.after().holders().get(0).protonsHeld(), 1e-15);
        assertEquals(1, completion.after().holders().get(1).protonsHeld());
    }

    @Test
    void aWeakerDonorIsLeftAloneAndTheRestOfTheBaseReported() {
        Flask flask = Flask.of("thf", ProtonHolder.acid("amine", 0.25, 36), ProtonHolder.acid("alkane", 5, 51));
        Completion completion = Completion.of(flask, BUTYLLITHIUM);
        assertEquals(0.75, completion.leftOver(), 1e-15);
        assertEquals(0, completion.after().holders().get(0).protonsHeld());
        assertEquals(1, completion.after().holders().get(1).protonsHeld());
    }

    /** The second proton of a coupled pair is offered at the pKa it has once the first is gone. */
    @Test
    void aDianionIsFormedAtTheRaisedPKa() {
        ProtonHolder ketoester = new ProtonHolder("ketoester", 1,
                List.of(new ProtonPlace("C2", 14.2), new ProtonPlace("C4", 24)), List.of(new Coupling(0, 1, 10)), 2);
        Completion one = Completion.of(Flask.of("thf", ketoester), BUTYLLITHIUM.withProtons(2));
        assertEquals(List.of(0, 1), one.consumed().stream().map(Completion.Consumed::place).toList());
        assertEquals(34, one.consumed().get(1).level(), 1e-9);
        assertEquals(1, Completion.of(Flask.of("thf", ketoester), new IrreversibleBase("hydride", 2, 30)).leftOver(), 1e-15);
    }

    @Test
    void protonsAreOnlyEverMovedToTheBase() {
        RandomFlasks flasks = new RandomFlasks(21);
        for (int index = 0; index < 10_000; index++) {
            Flask flask = flasks.next();
            IrreversibleBase base = new IrreversibleBase("base", flasks.amount(-6, 3), flasks.pKa());
            Completion completion = Completion.of(flask, base);
            double consumed = completion.consumed().stream().mapToDouble(Completion.Consumed::protons).sum();
            double tolerance = 1e-12 * Math.max(flask.protons(), base.protons());
            assertEquals(base.protons(), consumed + completion.leftOver(), tolerance, flask::toString);
            assertEquals(flask.protons(), consumed + completion.after().protons(), tolerance, flask::toString);
            for (int taken = 0; taken < completion.consumed().size(); taken++) {
                assertTrue(completion.consumed().get(taken).level() < base.pKaOfConjugateAcid(), flask::toString);
                assertTrue(taken == 0 || completion.consumed().get(taken - 1).level() <= completion.consumed().get(taken).level());
            }
        }
    }
}
