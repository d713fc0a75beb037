package soakline.figure;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.api.Test;

class SeriesReductionTest {

    @Test
    void shortSeriesStaysWhole() {
        assertThat(SeriesReduction.pick(new double[] {0, 1, 2}, new double[] {5, 6, 7}, 2))
                .containsExactly(0, 1, 2);
    }

    @Test
    void everyColumnKeepsItsLowestAndHighest() {
        int n = 100_000;
        double[] x = new double[n];
        double[] y = new double[n];
        Random random = new Random(4);
        for (int i = 0; i < n; i++) {
            x[i] = i;
            y[i] = random.nextGaussian();
        }
        y[41_234] = 50;
        y[77_777] = -50;
        int[] picks = SeriesReduction.pick(x, y, 500);

        assertThat(picks).hasSizeLessThanOrEqualTo(1000).isSorted().contains(41_234, 77_777);
        double width = (n - 1) / 500.0;
        double[] low = new double[500];
        double[] high = new double[500];
        Arrays.fill(low, Double.POSITIVE_INFINITY);
        Arrays.fill(high, Double.NEGATIVE_INFINITY);
        for (int pick : picks) {
            int column = Math.min(499, (int) (x[pick] / width));
            low[column] = Math.min(low[column], y[pick]);
            high[column] = Math.max(high[column], y[pick]);
        }
        for (int point = 0; point < n; point++) {
            int column = Math.min(499, (int) (x[point] / width));
            assertThat(y[point]).isBetween(low[column], high[column]);
        }
    }

    @Test
    void equalPlacesAndHolesDoNoHarm() {
        double[] x = new double[5000];
        double[] y = new double[5000];
        y[7] = 3;
        y[8] = Double.NaN;
        assertThat(SeriesReduction.pick(x, y, 10)).containsExactly(0, 7);

        double[] holes = new double[5000];
        Arrays.fill(holes, Double.NaN);
        assertThat(SeriesReduction.pick(x, holes, 10)).isEmpty();
        assertThat(SeriesReduction.pick(new double[0], new double[0], 10)).isEmpty();
    }
}
