package lyate.flask;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;

class DoseCurveTest {

    private static final ProtonHolder DIACID = new ProtonHolder("substrate", 1,
            List.of(new ProtonPlace("O1", 11), new ProtonPlace("C5", 20)), List.of(), 2);
    private static final Flask REST = Flask.of("dmso", DIACID, ProtonHolder.acid("water", 0.05, 31.4));

    /**
     * x of the acid taken by e equivalents: x² = K(1 − x)(e − x), hence e = x + x²/(K(1 − x)); K = 100 and x = 0.95 want
     * 0.95 + 0.9025/5 = 1.1305 equivalents.
     */
    @Test
    void theDoseThatTakesNinetyFivePercentFollowsFromK() {
        DoseCurve curve = DoseCurve.of(Flask.of("dmso", ProtonHolder.acid("acid", 1, 18)), ProtonHolder.base("base", 1, 20), 4);
        assertEquals(1.1305, curve.equivalentsTaking(0.95, "acid", 0).orElseThrow(), 1e-9);
    }

    @Test
    void aWeakBaseNeverGetsThere() {
        DoseCurve curve = DoseCurve.of(Flask.of("dmso", ProtonHolder.acid("acid", 1, 30)), ProtonHolder.base("base", 1, 20), 4);
        assertTrue(curve.equivalentsTaking(0.05, "acid", 0).isEmpty());
        assertTrue(curve.passings(0.05).isEmpty());
    }

    @Test
    void anIrreversibleBaseGoesInStraightLinesFromSiteToSite() {
        DoseCurve curve = DoseCurve.of(REST, new IrreversibleBase("hydride", 1, 36), 4);
        assertEquals(0.95, curve.equivalentsTaking(0.95, "substrate", 0).orElseThrow(), 1e-7);
        assertEquals(1.05, curve.equivalentsTaking(0.05, "substrate", 1).orElseThrow(), 1e-7);
        assertEquals(2.0025, curve.equivalentsTaking(0.05, "water", 0).orElseThrow(), 1e-7);
        DoseCurve.Passing next = curve.nextToPass(0.05, "substrate", 0).orElseThrow();
        assertEquals("substrate", next.holder());
        assertEquals(1, next.place());
        assertEquals("water", curve.nextToPass(0.05, "substrate", 1).orElseThrow().holder());
    }

    @Test
    void everyPointIsTheEquilibriumOfItsDoseAndNoneIsFarFromAStraightLine() {
        DoseCurve curve = DoseCurve.of(REST, ProtonHolder.base("base", 1, 32), 4);
        List<DosePoint> points = curve.points();
        assertEquals(0, points.get(0).equivalents());
        assertEquals(4, points.get(points.size() - 1).equivalents());
        for (int index = 1; index < points.size(); index++) {
            DosePoint from = points.get(index - 1);
            DosePoint to = points.get(index);
            assertTrue(to.equivalents() > from.equivalents());
            assertEquals(to.taken(0, 1), curve.solve(to.equivalents()).taken(0, 1));
            for (double part : new double[] {0.2, 0.4, 0.7}) {
                DosePoint within = curve.solve(from.equivalents() + part * (to.equivalents() - from.equivalents()));
                for (int place = 0; place < 2; place++) {
                    double straight = from.taken(0, place) + part * (to.taken(0, place) - from.taken(0, place));
                    assertEquals(straight, within.taken(0, place), 0.004, "at " + within.equivalents());
                }
            }
        }
    }

    @Test
    void noBaseTakesNothing() {
        DosePoint none = DoseCurve.of(REST, ProtonHolder.base("base", 1, 32), 4).points().get(0);
        assertEquals(0, none.taken(0, 0));
        assertEquals(0, none.taken(1, 0));
    }
}
