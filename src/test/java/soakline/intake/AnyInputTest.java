package soakline.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.specimen.Run;
import soakline.wording.Wording;

/** Whatever the bytes are, the result is runs or a fault with a sentence, and soon. */
class AnyInputTest {

    private static final Duration LONGEST = Duration.ofSeconds(60);

    private static final String TEXT = """
            # specimen: P-07
            # thickness: 2.03 mm ± 0.01 mm
            # faces: both
            # exposed from: 2026-03-01 08:00
            # A1 note: "x"
            date;A1 mass [g];A2 content [%];set aside
            2026-03-01 08:30;31,2041;0,1;
            2026-03-01T09:30:00.5;31,2388;0,2;"wet, ""very""\"
            2026-03-02 09:30+01:00;31,24;;
            2026-03-03;-1e5;NaN;
            """;

    @TempDir
    Path folder;

    private int runs;
    private int faults;

    private void read(byte[] bytes) throws IOException {
        Path file = Files.write(folder.resolve("any"), bytes);
        try {
            List<Run> read = RunFileReader.read(file, ReadOptions.of(), Progress.NONE);
            assertThat(read).isNotEmpty();
            read.forEach(run -> run.notes()
                    .forEach(note -> assertThat(Wording.withPlace(note)).isNotBlank()));
            runs++;
        } catch (Fault fault) {
            assertThat(fault.finding().code().kind()).isEqualTo(Code.Kind.INPUT);
            assertThat(Wording.withPlace(fault.finding())).isNotBlank();
            faults++;
        }
    }

    @Test
    void randomBytes() {
        Random random = new Random(1);
        assertTimeoutPreemptively(LONGEST, () -> {
            for (int i = 0; i < 500; i++) {
                byte[] bytes = new byte[random.nextInt(3000)];
                random.nextBytes(bytes);
                read(bytes);
            }
        });
        assertThat(faults).isPositive();
    }

    @Test
    void randomTextOfTheLettersThatMatter() {
        Random random = new Random(2);
        String letters = "0123456789.,;\t\n\r\"#:-+eE []()hg%timeass\u00b1\u00b5/T\u00a0";
        String header = "time [h],mass [g]\n";
        assertTimeoutPreemptively(LONGEST, () -> {
            for (int i = 0; i < 1500; i++) {
                StringBuilder text = new StringBuilder(i % 2 == 0 ? header : "");
                for (int k = random.nextInt(200); k > 0; k--) {
                    text.append(letters.charAt(random.nextInt(letters.length())));
                }
                read(text.toString().getBytes(StandardCharsets.UTF_8));
            }
        });
        assertThat(faults).isPositive();
        assertThat(runs).isPositive();
    }

    @Test
    void mutatedText() {
        mutated(TEXT.getBytes(StandardCharsets.UTF_8), 1500);
        assertThat(runs).isPositive();
        assertThat(faults).isPositive();
    }

    @Test
    void mutatedWideText() {
        mutated(TEXT.getBytes(StandardCharsets.UTF_16), 500);
        assertThat(runs).isPositive();
        assertThat(faults).isPositive();
    }

    @Test
    void mutatedWorkbook() {
        mutated(
                new Workbooks()
                        .row("# thickness", "2 mm")
                        .row("date", "mass [g]")
                        .row(new double[] {46_082.25, Workbooks.DATE_TIME}, 31.5)
                        .row(new double[] {46_083.25, Workbooks.DATE_TIME}, 32)
                        .bytes(),
                1000);
        assertThat(runs).isPositive();
        assertThat(faults).isPositive();
    }

    private void mutated(byte[] original, int times) {
        Random random = new Random(3);
        assertTimeoutPreemptively(LONGEST, () -> {
            for (int i = 0; i < times; i++) {
                byte[] bytes = original.clone();
                for (int k = random.nextInt(4); k >= 0; k--) {
                    int at = random.nextInt(bytes.length);
                    int length = Math.min(1 + random.nextInt(8), bytes.length - at);
                    if (random.nextBoolean()) {
                        bytes[at] = (byte) random.nextInt(256);
                    } else {
                        System.arraycopy(original, random.nextInt(original.length - length), bytes, at, length);
                    }
                }
                read(bytes);
            }
        });
    }
}
