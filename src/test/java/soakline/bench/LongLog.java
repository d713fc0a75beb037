package soakline.bench;

import java.io.BufferedWriter;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.time.format.DateTimeFormatter;
import java.util.Locale;
import java.util.Random;
import soakline.uptake.FickianModel;

/** Writes an invented balance log of many rows (seed 2026120199). Arguments: the file, how many rows, and hours or dates. */
public final class LongLog {

    private static final long SEED = 2026120199;

    private LongLog() {}

    public static void main(String[] args) throws IOException {
        write(Path.of(args[0]), Integer.parseInt(args[1]), args.length > 2 && args[2].equals("dates"));
    }

    static void write(Path file, int rows, boolean dates) throws IOException {
        Random random = new Random(SEED);
        FickianModel model = FickianModel.through(1e-3);
        double[] shape = {Math.log(1e-12)};
        LocalDateTime start = LocalDateTime.of(2026, 3, 2, 8, 0);
        DateTimeFormatter form = DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm:ss");
        try (BufferedWriter out = Files.newBufferedWriter(file)) {
            out.write("# specimen: invented log\n# note: invented data, seed " + SEED + "\n");
            out.write("# thickness: 2 mm\n# faces: both\n# edges: sealed\n# dry mass: 30.0000 g\n");
            out.write(dates ? "date-time,mass [g]\n" : "time [h],mass [g]\n");
            for (int i = 0; i < rows; i++) {
                double seconds = Math.rint(1.5e6 * i / rows * 100) / 100;
                double mass = 30 * (1 + 0.018 * model.fraction(seconds, shape)) + 2e-4 * random.nextGaussian();
                String time = dates
                        ? form.format(start.plusSeconds((long) seconds))
                        : String.format(Locale.ROOT, "%.5f", seconds / 3600);
                out.write(time + "," + String.format(Locale.ROOT, "%.4f", mass) + "\n");
            }
        }
    }
}
