package slantfall.figure;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import org.junit.jupiter.api.Test;

class TicksTest {

    private static String labels(double low, double high, int most) {
        Ticks t = Ticks.of(low, high, most);
        StringBuilder all = new StringBuilder();
        for (int i = 0; i < t.count(); i++) {
            all.append(t.label(i)).append(' ');
        }
        return all.toString().trim();
    }

    @Test
    void stepsAreOneTwoOrFive() {
        assertThat(labels(0, 1, 6)).isEqualTo("0 0.2 0.4 0.6 0.8 1.0");
        assertThat(labels(0, 0.047, 6)).isEqualTo("0 0.01 0.02 0.03 0.04");
        assertThat(labels(-3, 7, 6)).isEqualTo("−2 0 2 4 6");
        assertThat(labels(0, 1234, 4)).isEqualTo("0 500 1000");
        assertThat(labels(101000, 101400, 5)).isEqualTo("101000 101100 101200 101300 101400");
    }

    @Test
    void everyAxisGetsItsTicksInside() {
        Random random = new Random(11);
        for (int i = 0; i < 2000; i++) {
            double low = (random.nextDouble() - 0.5) * Math.pow(10, random.nextInt(12) - 6);
            double high = low + Math.pow(10, random.nextInt(12) - 6) * (0.01 + random.nextDouble());
            int most = 2 + random.nextInt(10);
            Ticks t = Ticks.of(low, high, most);
            assertThat(t.count()).isBetween(0, most + 6);
            for (int k = 0; k < t.count(); k++) {
                assertThat(t.at(k)).isBetween(low - 1e-6 * t.step(), high + 1e-6 * t.step());
            }
        }
    }
}
