package soakline.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assertions.assertTimeout;

import java.io.BufferedWriter;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import soakline.problem.Code;
import soakline.problem.Place;
import soakline.specimen.Run;
import soakline.specimen.Weighings;

/** Balance logs of a size that shows what is kept a row. */
class LongLogTest {

    private static final int ROWS = 1_000_000;

    @TempDir
    Path folder;

    private Path log(boolean reversed) throws IOException {
        Path file = folder.resolve("log.csv");
        try (BufferedWriter out = Files.newBufferedWriter(file)) {
            out.write("# thickness: 2 mm\ntime [s],mass [g]\n");
            for (int i = 0; i < ROWS; i++) {
                int k = reversed ? ROWS - 1 - i : i;
                out.write(k + ",31." + (2041 + k % 5000) + "\n");
            }
        }
        return file;
    }

    @Test
    void aMillionRowsAreReadWithEveryCellInItsPlace() throws IOException {
        Path file = log(false);
        // many times what it takes: a bound for a slip in the order of growth, not a measurement
        Run run = assertTimeout(
                Duration.ofSeconds(20),
                () -> RunFileReader.read(file, ReadOptions.of(), Progress.NONE).get(0));
        assertThat(run.notes()).isEmpty();
        assertInPlace(run.weighings(), false);
    }

    @Test
    void aReversedLogIsSorted() throws IOException {
        Run run = RunFileReader.read(log(true), ReadOptions.of(), Progress.NONE).get(0);
        assertThat(Reading.notes(run, Code.ROWS_SORTED).get(0).values()).containsExactly(ROWS - 1);
        assertInPlace(run.weighings(), true);
    }

    private static void assertInPlace(Weighings w, boolean reversed) {
        assertThat(w.size()).isEqualTo(ROWS);
        for (int i = 0; i < ROWS; i++) {
            double mass = Double.parseDouble("31." + (2041 + i % 5000)) * 1e-3;
            int line = reversed ? ROWS + 2 - i : i + 3;
            if (w.time(i) != i || w.value(i) != mass || w.line(i) != line) {
                assertThat(w.time(i) + " " + w.value(i) + " " + w.line(i)).isEqualTo(i + " " + mass + " " + line);
            }
        }
    }

    @Test
    void sortingIsStableAcrossBlocks() {
        Random random = new Random(5);
        RowStore store = new RowStore(0, 100_000, Place.NONE);
        for (int i = 0; i < 50_000; i++) {
            store.add(random.nextInt(1000), i);
        }
        store.sort();
        for (int k = 1; k < store.size(); k++) {
            int before = store.inOrder(k - 1);
            int row = store.inOrder(k);
            boolean inOrder =
                    store.time(before) < store.time(row) || (store.time(before) == store.time(row) && before < row);
            assertThat(inOrder).as("place " + k).isTrue();
        }
    }
}
