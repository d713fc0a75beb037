package soakline.inference;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.EnumMap;
import java.util.Locale;
import java.util.Map;
import java.util.Random;
import java.util.function.Supplier;
import soakline.specimen.Run;
import soakline.uptake.FickianModel;

/** Prints how often the verdict on Fick's law is what it is, for simulated tests (seeded). Argument: sets a row. */
public final class VerdictRates {

    private VerdictRates() {}

    public static void main(String[] args) {
        int sets = args.length > 0 ? Integer.parseInt(args[0]) : 2000;
        PrintStream out = new PrintStream(new FileOutputStream(FileDescriptor.out), true, StandardCharsets.UTF_8);
        out.println("| simulated test | n | pass % | caution % | fail % |");
        out.println("|---|---|---|---|---|");
        for (int n : new int[] {12, 24, 40}) {
            Random random = new Random(100 + n);
            row(out, "Fickian, white noise", n, sets, () -> Simulated.run(n, 1.5, 0, random));
        }
        for (int n : new int[] {24, 40, 100}) {
            Random random = new Random(200 + n);
            row(out, "Fickian, AR(1) 0.6", n, sets, () -> Simulated.run(n, 1.5, 0.6, random));
        }
        for (double share : new double[] {0.05, 0.1, 0.2}) {
            Random random = new Random(300);
            String name = String.format(Locale.ROOT, "second stage, %.0f %% of the rise", 100 * share);
            row(out, name, 40, sets, () -> twoStages(share, random));
        }
    }

    private static void row(PrintStream out, String name, int n, int sets, Supplier<Run> test) {
        Map<Verdict, Integer> count = new EnumMap<>(Verdict.class);
        for (int k = 0; k < sets; k++) {
            count.merge(Assessor.assess(test.get(), AssessmentOptions.usual()).fickian(), 1, Integer::sum);
        }
        out.printf(
                Locale.ROOT,
                "| %s | %d | %.1f | %.1f | %.1f |%n",
                name,
                n,
                100.0 * count.getOrDefault(Verdict.PASS, 0) / sets,
                100.0 * count.getOrDefault(Verdict.CAUTION, 0) / sets,
                100.0 * count.getOrDefault(Verdict.FAIL, 0) / sets);
    }

    /** A share of the rise comes by a first-order step with a fifth of the rate of the late approach. */
    private static Run twoStages(double share, Random random) {
        double[] times = Simulated.times(40, 3);
        double[] contents = new double[40];
        FickianModel.through(Simulated.PATH).evaluate(times, 40, new double[] {Math.log(Simulated.D)}, contents, null);
        for (int i = 0; i < 40; i++) {
            double slow = 1 - Math.exp(-times[i] / Simulated.UNIT / 2);
            contents[i] = Simulated.RISE
                    * ((1 - share) * contents[i] + share * slow + Simulated.SIGMA * random.nextGaussian());
        }
        return Simulated.run(times, contents);
    }
}
