package soakline.samples;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.time.format.DateTimeFormatter;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Random;
import java.util.function.DoubleUnaryOperator;

/**
 * Makes the runs in {@code sample-runs}: invented weighings from known parameters, each file from its own seed. The scenario: a small
 * workshop qualifies the invented resin "Marl 40" and a laminate of it for the covers of river-level sensors.
 *
 * <p>To write them anew after {@code mvn test-compile}: {@code java -cp target/test-classes soakline.samples.SampleGenerator
 * sample-runs}. A test holds the files and this class together. The curves come from a plain sum of the long-time series, not from
 * the program.
 */
public final class SampleGenerator {

    private static final double HOUR = 3600;

    private SampleGenerator() {}

    public static void main(String[] args) throws IOException {
        Path folder = Path.of(args.length > 0 ? args[0] : "sample-runs");
        Files.createDirectories(folder);
        for (Map.Entry<String, String> file : all().entrySet()) {
            Files.writeString(folder.resolve(file.getKey()), file.getValue(), StandardCharsets.UTF_8);
        }
    }

    /** File name to content, all of them. */
    public static Map<String, String> all() {
        Map<String, String> files = new LinkedHashMap<>();
        files.put("01-both-faces.csv", bothFaces());
        files.put("02-drying.csv", drying());
        files.put("03-one-face-dates.csv", oneFaceDates());
        files.put("04-stopped-early.csv", stoppedEarly());
        files.put("05-bare-edges.csv", bareEdges());
        files.put("06-three-coupons.csv", threeCoupons());
        files.put("07-two-stages.csv", twoStages());
        return files;
    }

    private static String bothFaces() {
        long seed = 2026120101;
        Random random = new Random(seed);
        // D = 1.10e-12 m²/s, M∞ = 1.80 %
        StringBuilder text = head(
                        seed,
                        "D = 1.10e-12 m2/s and 1.80 %",
                        "a Fickian coupon that ran long enough: every check passes")
                .append("# specimen: P-07\n# thickness: 2.03 mm ± 0.01 mm\n# width: 100 mm\n# length: 100 mm\n")
                .append("# faces: both\n# edges: sealed\n# temperature: 60 °C\n# medium: air at 85 % RH\n")
                .append("# dry mass: 31.2041 g\n# balance: 0.1 mg\ntime [h],mass [g]\n");
        for (double t : rootSpaced(40, 420)) {
            double g = sheet(1.10e-12 * t * HOUR / square(2.03e-3 / 2));
            text.append(plain(t, 2))
                    .append(',')
                    .append(mass(31.2041 * (1 + 0.0180 * g), 0.0024, random, 4))
                    .append('\n');
        }
        return text.toString();
    }

    private static String drying() {
        long seed = 2026120102;
        Random random = new Random(seed);
        // D = 6.5e-12 m²/s, from 2.40 % to 0.06 %
        StringBuilder text = head(
                        seed,
                        "D = 6.5e-12 m2/s, from 2.40 % to 0.06 %",
                        "content falls; the cautions on ovens and trapped moisture appear")
                .append("# specimen: K-3 drying\n# thickness: 1.52 mm ± 0.02 mm\n# faces: both\n# edges: sealed\n")
                .append("# temperature: 70 °C\n# medium: dry air\n# dry mass: 18.4410 g\n# balance: 0.2 mg\n")
                .append("time [min],mass [g]\n");
        for (double t : rootSpaced(32, 2400)) {
            double g = sheet(6.5e-12 * t * 60 / square(1.52e-3 / 2));
            text.append(plain(t, 0))
                    .append(',')
                    .append(mass(18.4410 * (1 + 0.0240 + (0.0006 - 0.0240) * g), 0.0015, random, 4))
                    .append('\n');
        }
        return text.toString();
    }

    private static String oneFaceDates() {
        long seed = 2026120103;
        Random random = new Random(seed);
        // D = 3.2e-13 m²/s, M∞ = 3.10 %
        StringBuilder text = head(
                        seed,
                        "D = 3.2e-13 m2/s and 3.10 %",
                        "date-times and decimal commas; one face exposed, so the path is the whole thickness")
                .append("# specimen: coating C-12\n# thickness: 0,42 mm ± 0,005 mm\n# faces: one\n# edges: sealed\n")
                .append("# temperature: 23 °C\n# medium: water\n# balance: 0,05 mg\ndate and time;mass [mg]\n");
        LocalDateTime start = LocalDateTime.of(2026, 3, 1, 8, 30);
        DateTimeFormatter format = DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm");
        for (double t : rootSpaced(36, 260)) {
            double minutes = Math.rint(t * 60);
            double g = sheet(3.2e-13 * minutes * 60 / square(0.42e-3));
            text.append(format.format(start.plusMinutes((long) minutes)))
                    .append(';')
                    .append(mass(2154.60 * (1 + 0.0310 * g), 0.28, random, 2).replace('.', ','))
                    .append('\n');
        }
        return text.toString();
    }

    private static String stoppedEarly() {
        long seed = 2026120104;
        Random random = new Random(seed);
        // D = 4.4e-13 m²/s, M∞ = 1.62 %, stopped at G = 0.45
        StringBuilder text = head(
                        seed,
                        "a D and an M-infinity that nobody can tell apart yet",
                        "the test stopped at less than half of the rise: no D, only the initial slope")
                .append(
                        "# specimen: P-11 stopped early\n# thickness: 3.10 mm ± 0.02 mm\n# faces: both\n# edges: sealed\n")
                .append("# temperature: 40 °C\n# medium: water\n# dry mass: 48.0312 g\n# balance: 0.1 mg\n")
                .append("time [d],mass [g]\n");
        for (double t : rootSpaced(24, 10)) {
            double g = sheet(4.4e-13 * t * 24 * HOUR / square(3.10e-3 / 2));
            text.append(plain(t, 2))
                    .append(',')
                    .append(mass(48.0312 * (1 + 0.0162 * g), 0.0045, random, 4))
                    .append('\n');
        }
        return text.toString();
    }

    private static String bareEdges() {
        long seed = 2026120105;
        Random random = new Random(seed);
        // D = 9.0e-13 m²/s, M∞ = 2.20 %, all edges bare
        StringBuilder text = head(
                        seed,
                        "D = 9.0e-13 m2/s and 2.20 %",
                        "a stubby coupon: read as edges: sealed, its D comes out about half as high again")
                .append("# specimen: block S-2\n# thickness: 4.00 mm ± 0.02 mm\n# width: 20.0 mm ± 0.1 mm\n")
                .append("# length: 20.0 mm ± 0.1 mm\n# faces: both\n# edges: bare\n# temperature: 50 °C\n")
                .append("# medium: water\n# dry mass: 1.9204 g\n# balance: 0.02 mg\ntime [h],mass [mg]\n");
        for (double t : rootSpaced(30, 1500)) {
            double dt = 9.0e-13 * t * HOUR;
            double remaining = (1 - sheet(dt / square(2e-3))) * square(1 - sheet(dt / square(10e-3)));
            text.append(plain(t, 1))
                    .append(',')
                    .append(mass(1920.4 * (1 + 0.0220 * (1 - remaining)), 0.19, random, 2))
                    .append('\n');
        }
        return text.toString();
    }

    private static String threeCoupons() {
        long seed = 2026120106;
        Random random = new Random(seed);
        double[] thickness = {1.98e-3, 2.01e-3, 2.04e-3};
        double[] dry = {30.1127, 30.5518, 31.0240};
        double[] level = {0.0179, 0.0181, 0.0180};
        StringBuilder text = head(
                        seed,
                        "D = 1.10e-12 m2/s and about 1.80 %",
                        "three coupons in one table, with gaps, and one weighing of A2 that does not fit")
                .append(
                        "# faces: both\n# edges: sealed\n# temperature: 60 °C\n# medium: air at 85 % RH\n# balance: 0.1 mg\n");
        for (int k = 0; k < 3; k++) {
            text.append("# A")
                    .append(k + 1)
                    .append(" thickness: ")
                    .append(plain(thickness[k] * 1e3, 2))
                    .append(" mm ± 0.01 mm\n");
            text.append("# A")
                    .append(k + 1)
                    .append(" dry mass: ")
                    .append(plain(dry[k], 4))
                    .append(" g\n");
        }
        text.append("time [h],A1 mass [g],A2 mass [g],A3 mass [g]\n");
        int row = 0;
        for (double t : rootSpaced(28, 480)) {
            text.append(plain(t, 1));
            for (int k = 0; k < 3; k++) {
                double g = sheet(1.10e-12 * t * HOUR / square(thickness[k] / 2));
                // A2 is weighed wet once: some 20 mg of surface water
                double wet = k == 1 && row == 13 ? 0.0210 : 0;
                String value = mass(dry[k] * (1 + level[k] * g) + wet, 0.0024, random, 4);
                boolean gap = (row + 2 * k) % 11 == 7;
                text.append(',').append(gap ? "" : value);
            }
            text.append('\n');
            row++;
        }
        return text.toString();
    }

    private static String twoStages() {
        long seed = 2026120107;
        Random random = new Random(seed);
        // Fickian 1.40 % with D = 1.3e-12 m²/s and 0.55 % more by slow relaxation with a rate of 1/(320 h)
        StringBuilder text = head(
                        seed,
                        "a Fickian 1.40 % followed by a slow 0.55 %",
                        "the uptake goes on after the first plateau: not Fickian, so an apparent D only")
                .append("# specimen: P-21 two stages\n# thickness: 2.00 mm ± 0.01 mm\n# faces: both\n# edges: sealed\n")
                .append(
                        "# temperature: 80 °C\n# medium: water\n# dry mass: 30.8820 g\n# balance: 0.1 mg\ntime [h],mass [g]\n");
        for (double t : rootSpaced(36, 900)) {
            double g = sheet(1.3e-12 * t * HOUR / square(1e-3));
            double content = 0.0140 * g + 0.0055 * (1 - Math.exp(-t / 320));
            text.append(plain(t, 1))
                    .append(',')
                    .append(mass(30.8820 * (1 + content), 0.0024, random, 4))
                    .append('\n');
        }
        return text.toString();
    }

    private static StringBuilder head(long seed, String truth, String see) {
        return new StringBuilder("# note: invented data, seed " + seed + ", made from " + truth + "; " + see + "\n");
    }

    /** Times evenly spaced in √t from 0 to the end. */
    private static double[] rootSpaced(int count, double end) {
        double[] times = new double[count];
        for (int i = 0; i < count; i++) {
            times[i] = end * square((double) i / (count - 1));
        }
        return times;
    }

    private static String mass(double mass, double sd, Random random, int decimals) {
        return plain(mass + sd * random.nextGaussian(), decimals);
    }

    private static String plain(double value, int decimals) {
        return new BigDecimal(value).setScale(decimals, RoundingMode.HALF_EVEN).toPlainString();
    }

    private static double square(double x) {
        return x * x;
    }

    /** Fractional uptake of a sheet by the long-time series, summed until it no longer changes. */
    static double sheet(double tau) {
        if (tau <= 0) {
            return 0;
        }
        DoubleUnaryOperator term =
                m -> 8 / (m * m * Math.PI * Math.PI) * Math.exp(-m * m * Math.PI * Math.PI * tau / 4);
        double sum = 0;
        for (int m = 1; m < 200_000; m += 2) {
            double next = term.applyAsDouble(m);
            sum += next;
            if (next < 1e-18) {
                break;
            }
        }
        return 1 - sum;
    }
}
