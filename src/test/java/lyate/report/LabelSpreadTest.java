package lyate.report;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.api.Test;

class LabelSpreadTest {

    @Test
    void labelsWithRoomStayWhereTheyBelong() {
        assertArrayEquals(new double[] {20, 60, 90}, LabelSpread.spread(new double[] {20, 60, 90}, 10, 0, 100), 1e-12);
    }

    @Test
    void twoLabelsAtOnePlaceMoveApartEvenly() {
        assertArrayEquals(new double[] {45, 55}, LabelSpread.spread(new double[] {50, 50}, 10, 0, 100), 1e-12);
    }

    @Test
    void labelsNeverOverlapNorLeaveTheirRangeNorChangeOrder() {
        Random random = new Random(11);
        for (int round = 0; round < 500; round++) {
            double[] wanted = random.doubles(1 + random.nextInt(12), -20, 220).sorted().toArray();
            double[] placed = LabelSpread.spread(wanted, 15, 0, 200);
            for (int i = 0; i < placed.length; i++) {
                assertTrue(placed[i] >= 7.5 - 1e-9 && placed[i] <= 192.5 + 1e-9, Arrays.toString(placed));
                assertTrue(i == 0 || placed[i] - placed[i - 1] >= 15 - 1e-9, Arrays.toString(wanted) + " -> " + Arrays.toString(placed));
            }
        }
    }

    @Test
    void tooManyLabelsShareTheRoomEvenly() {
        double[] placed = LabelSpread.spread(new double[10], 15, 0, 100);
        assertTrue(placed[9] <= 95 + 1e-9 && placed[0] >= 5 - 1e-9);
        assertTrue(placed[1] - placed[0] > 9.9);
    }
}
