package soakline;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import soakline.problem.Code;
import soakline.problem.Fault;

/** The sample runs that travel with the program: invented data. */
final class SampleRuns {

    /** The one that is shown where there is no display. */
    static final String FIRST = "01-both-faces.csv";

    /** All of them, in order. */
    static final List<String> NAMES = List.of(
            FIRST,
            "02-drying.csv",
            "03-one-face-dates.csv",
            "04-stopped-early.csv",
            "05-bare-edges.csv",
            "06-three-coupons.csv",
            "07-two-stages.csv");

    private static final String FOLDER = "/soakline/sample-runs/";

    private SampleRuns() {}

    /**
     * A sample run as it stands in its file.
     *
     * @throws Fault when the program was built without it
     */
    static String text(String name) {
        try (InputStream in = SampleRuns.class.getResourceAsStream(FOLDER + name)) {
            if (in == null) {
                throw Fault.of(Code.SAMPLE_MISSING, name);
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw Fault.of(Code.SAMPLE_MISSING, name);
        }
    }
}
