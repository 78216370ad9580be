package stirwright.chart.internal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;

class SpreadTest {
    @Test
    void labelsWithRoomStay() {
        assertArrayEquals(new double[] {100, 20, 60}, Spread.apart(new double[] {100, 20, 60}, 18, 0, 200), 1e-12);
    }

    @Test
    void labelsThatMeetShareTheirMiddle() {
        assertArrayEquals(new double[] {91, 109}, Spread.apart(new double[] {99, 101}, 18, 0, 200), 1e-12);
        assertArrayEquals(new double[] {82, 100, 118}, Spread.apart(new double[] {100, 100, 100}, 18, 0, 200), 1e-12);
    }

    @Test
    void theEdgesHold() {
        assertArrayEquals(new double[] {9, 27}, Spread.apart(new double[] {-50, 3}, 18, 0, 200), 1e-12);
        assertArrayEquals(new double[] {173, 191}, Spread.apart(new double[] {195, 400}, 18, 0, 200), 1e-12);
    }

    @Test
    void noneEverOverlapsOrSwaps() {
        Random random = new Random(3);
        for (int round = 0; round < 500; round++) {
            double[] wanted = random.doubles(1 + random.nextInt(6), -50, 350).toArray();
            double[] placed = Spread.apart(wanted, 18, 0, 300);
            for (int i = 0; i < wanted.length; i++) {
                assertTrue(placed[i] >= 9 - 1e-9 && placed[i] <= 291 + 1e-9);
                for (int k = 0; k < i; k++) {
                    assertTrue(Math.abs(placed[i] - placed[k]) >= 18 - 1e-9);
                    assertTrue(wanted[i] == wanted[k] || wanted[i] < wanted[k] == placed[i] < placed[k]);
                }
            }
        }
    }
}
