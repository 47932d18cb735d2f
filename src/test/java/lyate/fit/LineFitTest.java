package lyate.fit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import lyate.fit.LineFit.Point;
import org.junit.jupiter.api.Test;

class LineFitTest {

    private static List<Point> line(double slope, double intercept, double noise, int count) {
        Random random = new Random(7);
        List<Point> points = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            double x = 10.0 * i / count;
            points.add(new Point(x, slope * x + intercept + noise * random.nextGaussian()));
        }
        return points;
    }

    @Test
    void findsTheLineAndItsSpread() {
        LineFit fit = LineFit.through(line(1.7, 3, 0.5, 200), 1, 0.4);
        assertEquals(1.7, fit.slope(), 0.05);
        assertEquals(3, fit.intercept(), 0.3);
        assertEquals(0.5, fit.standardError(), 0.1);
    }

    @Test
    void aWrongValueHardlyMovesIt() {
        List<Point> points = line(1.7, 3, 0.3, 20);
        points.add(new Point(5, 40));
        LineFit fit = LineFit.through(points, 1.7, 0.4);
        assertEquals(1.7 * 5 + 3, fit.slope() * 5 + fit.intercept(), 0.3);
    }

    @Test
    void fewPointsInANarrowRangeKeepTheExpectedSlope() {
        List<Point> points = List.of(new Point(9.0, 17.0), new Point(9.1, 18.2), new Point(9.2, 16.9));
        assertEquals(1.3, LineFit.through(points, 1.3, 0.2).slope(), 0.1);
    }

    /** Every point lies 0.6 off the line y = x, above and below in turns, so that only their number differs. */
    private static List<Point> zigzag(int count) {
        List<Point> points = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            double side = i % 4 == 0 || i % 4 == 3 ? 1 : -1;
            points.add(new Point(i, i + 0.6 * side));
        }
        return points;
    }

    @Test
    void fewPointsAreLessSureThanManyOfTheSameSpread() {
        double few = LineFit.through(zigzag(4), 1, 0.4).standardError();
        double many = LineFit.through(zigzag(400), 1, 0.4).standardError();
        assertEquals(0.6, many, 0.01);
        assertTrue(few > 0.8, () -> few + " from four points");
    }
}
