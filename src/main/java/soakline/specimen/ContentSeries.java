package soakline.specimen;

import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Place;

/**
 * Content against time of the weighings that take part in an estimate: what the models are fitted to. Immutable.
 *
 * <p>Content is (mass − reference)/reference as a fraction; times are in seconds from time zero and never fall.
 */
public final class ContentSeries {

    /** What the content is relative to. */
    public enum Reference {
        DRY_MASS,
        /** No dry mass is known: relative to the first weighing. The diffusivity does not depend on it. */
        FIRST_WEIGHING,
        /** The file gave contents. */
        AS_GIVEN
    }

    private final double[] times;
    private final double[] contents;
    private final int[] indices;
    private final Reference reference;
    private final double referenceMass;

    private ContentSeries(double[] times, double[] contents, int[] indices, Reference reference, double referenceMass) {
        this.times = times;
        this.contents = contents;
        this.indices = indices;
        this.reference = reference;
        this.referenceMass = referenceMass;
    }

    /** Contents as fractions, already known. Arrays are copied. */
    public static ContentSeries of(double[] times, double[] contents) {
        int[] indices = new int[times.length];
        for (int i = 0; i < indices.length; i++) {
            indices[i] = i;
        }
        return new ContentSeries(times.clone(), contents.clone(), indices, Reference.AS_GIVEN, Double.NaN);
    }

    static ContentSeries of(Run run) {
        Weighings w = run.weighings();
        int n = w.used();
        double[] times = new double[n];
        double[] contents = new double[n];
        int[] indices = new int[n];
        int k = 0;
        for (int i = 0; i < w.size(); i++) {
            if (!w.isSetAside(i)) {
                times[k] = w.time(i);
                contents[k] = w.value(i);
                indices[k++] = i;
            }
        }
        if (!(times[n - 1] > times[0])) {
            throw Fault.of(Code.TIMES_ALL_EQUAL, run.name()).at(Place.of(run.source()));
        }
        requireDifferent(contents, run);
        Reference reference = Reference.AS_GIVEN;
        double dry = Double.NaN;
        if (run.kind() == ValueKind.MASS) {
            reference = run.dryMass().isPresent() ? Reference.DRY_MASS : Reference.FIRST_WEIGHING;
            dry = run.dryMass().orElse(contents[0]);
            for (int i = 0; i < n; i++) {
                contents[i] = (contents[i] - dry) / dry;
            }
        }
        return new ContentSeries(times, contents, indices, reference, dry);
    }

    private static void requireDifferent(double[] values, Run run) {
        for (double v : values) {
            if (v != values[0]) {
                return;
            }
        }
        throw Fault.of(Code.VALUES_ALL_EQUAL, run.name()).at(Place.of(run.source()));
    }

    public int size() {
        return times.length;
    }

    /** Seconds from time zero; negative when weighed before exposure. */
    public double time(int i) {
        return times[i];
    }

    /** Content as a fraction. */
    public double content(int i) {
        return contents[i];
    }

    /** Which weighing of the run this is. */
    public int weighing(int i) {
        return indices[i];
    }

    public double lastTime() {
        return times[times.length - 1];
    }

    public Reference reference() {
        return reference;
    }

    /** The mass that content is relative to, kg; NaN when the file gave contents. */
    public double referenceMass() {
        return referenceMass;
    }

    /** Copies a block of times and contents; the models work on blocks so that a million rows need no second copy. */
    public void copy(int from, int count, double[] timesOut, double[] contentsOut) {
        System.arraycopy(times, from, timesOut, 0, count);
        System.arraycopy(contents, from, contentsOut, 0, count);
    }

    /** All times, a copy. */
    public double[] times() {
        return times.clone();
    }

    /** All contents, a copy. */
    public double[] contents() {
        return contents.clone();
    }
}
