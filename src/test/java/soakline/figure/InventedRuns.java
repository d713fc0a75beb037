package soakline.figure;

import java.util.List;
import java.util.Random;
import soakline.inference.Assessment;
import soakline.inference.AssessmentOptions;
import soakline.inference.Assessor;
import soakline.inference.Verdict;
import soakline.problem.Code;
import soakline.problem.Finding;
import soakline.quantity.Quantity;
import soakline.quantity.Unit;
import soakline.specimen.Edges;
import soakline.specimen.Faces;
import soakline.specimen.Facts;
import soakline.specimen.Run;
import soakline.specimen.ValueKind;
import soakline.specimen.Weighings;
import soakline.uptake.FickianModel;

/** Invented runs with known truth, for tests of figure and window. */
public final class InventedRuns {

    public static final double TRUE_D = 1e-12;
    private static final double PATH = 1e-3;
    private static final double RISE = 0.0179;
    private static final double SD = 1.2e-4;

    private InventedRuns() {}

    /** Run to its plateau; two weighings set aside. */
    public static Run plateau() {
        return run("P-07", 40, 1.6, 11, 0).withWeighings(setAside(weighings(40, 1.6, 11, 0)));
    }

    /** Stopped far before its plateau. */
    public static Run stoppedEarly() {
        return run("P-08 stopped early", 18, 0.12, 5, 0);
    }

    /** A slow second stage: not Fickian. */
    public static Run twoStage() {
        return run("P-09 second stage", 60, 6, 3, 0.25);
    }

    /** The same run with the verdict on Fick's law failed, whatever the checks of the day make of it. */
    public static Assessment notFickian() {
        Assessment a = Assessor.assess(twoStage(), AssessmentOptions.usual());
        return new Assessment(
                a.run(),
                a.estimate(),
                a.direction(),
                a.parameters(),
                a.combined(),
                a.checks(),
                a.shortTimeLine(),
                a.determined(),
                a.usable(),
                Verdict.FAIL,
                Finding.of(Code.FICKIAN_FAIL),
                List.of(Finding.of(Code.NOT_FICKIAN)),
                a.notes(),
                a.cautions());
    }

    /** A balance log. */
    public static Run log(int count) {
        return run("Log 3", count, 1.6, 17, 0);
    }

    /** Fewer weighings than an estimate needs. */
    public static Run tooFew() {
        return run("P-12 too few", 3, 1, 2, 0);
    }

    /** The file said nothing about the coupon. */
    public static Run withoutFacts() {
        return run("P-10", 30, 1.5, 23, 0).withFacts(Facts.of("P-10"));
    }

    private static Run run(String name, int count, double lastTau, long seed, double slowShare) {
        Facts facts = Facts.of(name)
                .withThickness(Quantity.of(2, Unit.MILLIMETRE).withStandardUncertainty(0.01))
                .withFaces(Faces.BOTH)
                .withEdges(Edges.SEALED);
        return new Run("invented.csv", facts, ValueKind.CONTENT, weighings(count, lastTau, seed, slowShare), List.of());
    }

    private static Weighings weighings(int count, double lastTau, long seed, double slowShare) {
        Random random = new Random(seed);
        FickianModel model = FickianModel.through(PATH);
        double last = lastTau * PATH * PATH / TRUE_D;
        double[] times = new double[count];
        double[] contents = new double[count];
        for (int i = 0; i < count; i++) {
            double root = (double) i / (count - 1);
            times[i] = last * root * root;
            double g = model.fraction(times[i], new double[] {Math.log(TRUE_D)});
            double slow = 1 - Math.exp(-times[i] / last * 2.5);
            contents[i] = RISE * ((1 - slowShare) * g + slowShare * slow) + SD * random.nextGaussian();
        }
        return Weighings.of(times, contents);
    }

    private static Weighings setAside(Weighings weighings) {
        Weighings.Builder builder = new Weighings.Builder();
        for (int i = 0; i < weighings.size(); i++) {
            if (i == 9 || i == 24) {
                builder.addSetAside(weighings.time(i), weighings.value(i) - 0.003, i + 2, "coupon touched");
            } else {
                builder.add(weighings.time(i), weighings.value(i), i + 2);
            }
        }
        return builder.build();
    }
}
