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
        for (int column = 0; column < 500; column++) {
            double[] block = Arrays.copyOfRange(y, column * 200, column * 200 + 200);
            int from = column * 200;
            double[] kept = Arrays.stream(picks)
                    .filter(p -> p >= from + 1 && p < from + 199)
                    .mapToDouble(p -> y[p])
                    .toArray();
            assertThat(kept.length).isLessThanOrEqualTo(4);
            assertThat(Arrays.stream(block).max().orElseThrow()).isLessThanOrEqualTo(50);
        }
        double highest = Arrays.stream(picks).mapToDouble(p -> y[p]).max().orElseThrow();
        assertThat(highest).isEqualTo(50);
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
