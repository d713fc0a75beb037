package soakline.estimate;

import soakline.specimen.ContentSeries;
import soakline.uptake.UptakeModel;

/**
 * Start values, so that the user never has to guess: each of the model's candidate shapes in turn, with the contents, which enter
 * linearly, solved exactly; the one with the smallest sum of squares wins.
 */
final class StartScan {

    /** More weighings than this are thinned for the scan only. */
    static final int MOST_WEIGHINGS = 512;

    private static final int PARTS = 8;

    private final EstimationTask task;
    private final double[] times;
    private final double[] contents;
    private final double shift;

    private double bestSum = Double.POSITIVE_INFINITY;
    private double[] best;

    StartScan(EstimationTask task, ContentSeries data) {
        this.task = task;
        this.times = data.times();
        this.contents = data.contents();
        // the contents are measured from the first one, so that the sums below do not cancel
        this.shift = contents[0];
        for (int i = 0; i < contents.length; i++) {
            contents[i] -= shift;
        }
    }

    /**
     * All working values of the best candidate.
     */
    double[] best() {
        UptakeModel model = task.model();
        double last = times[times.length - 1];
        double first = last;
        for (double t : times) {
            if (t > 0) {
                first = t;
                break;
            }
        }
        double[] g = new double[times.length];
        double[] previous = null;
        for (double[] candidate : model.starts(first, last)) {
            for (int k = 0; k < candidate.length; k++) {
                candidate[k] = task.fixedAt(k).orElse(candidate[k]);
            }
            if (task.form() == LevelForm.INITIAL_SLOPE && previous != null) {
                considerBetween(previous, candidate, g);
            }
            model.evaluate(times, times.length, candidate, g, null);
            consider(candidate, g);
            previous = candidate;
        }
        return best;
    }

    /** With the slope in the place of the level the basin begins abruptly, where the curve leaves the √t law. */
    private void considerBetween(double[] from, double[] to, double[] g) {
        for (int part = 1; part < PARTS; part++) {
            double[] candidate = new double[from.length];
            for (int k = 0; k < candidate.length; k++) {
                candidate[k] = from[k] + (to[k] - from[k]) * part / PARTS;
            }
            task.model().evaluate(times, times.length, candidate, g, null);
            consider(candidate, g);
        }
    }

    private void consider(double[] shape, double[] g) {
        // normal equations of content = M0 (1 − g) + M∞ g, enough for a start value
        double aa = 0;
        double ab = 0;
        double bb = 0;
        double ay = 0;
        double by = 0;
        double yy = 0;
        for (int i = 0; i < g.length; i++) {
            double b = g[i];
            double a = 1 - b;
            double y = contents[i];
            aa += a * a;
            ab += a * b;
            bb += b * b;
            ay += a * y;
            by += b * y;
            yy += y * y;
        }
        if (task.form() == LevelForm.INITIAL_SLOPE && task.isFixed(task.levelIndex())) {
            considerHeldSlope(shape, g);
            return;
        }
        boolean startFixed = task.isFixed(task.startIndex());
        boolean levelFixed = task.form() == LevelForm.EQUILIBRIUM && task.isFixed(task.levelIndex());
        double start = startFixed ? task.fixedAt(task.startIndex()).getAsDouble() - shift : 0;
        double level = levelFixed ? task.fixedAt(task.levelIndex()).getAsDouble() - shift : 0;
        double determinant = aa * bb - ab * ab;
        if (!startFixed && !levelFixed && determinant > 1e-14 * aa * bb) {
            start = (ay * bb - by * ab) / determinant;
            level = (by * aa - ay * ab) / determinant;
        } else if (startFixed && !levelFixed && bb > 0) {
            level = (by - ab * start) / bb;
        } else if (!startFixed && levelFixed && aa > 0) {
            start = (ay - ab * level) / aa;
        } else if (!(startFixed && levelFixed)) {
            return;
        }
        double sum =
                yy - 2 * (start * ay + level * by) + start * start * aa + 2 * start * level * ab + level * level * bb;
        double held = task.form() == LevelForm.EQUILIBRIUM
                ? level + shift
                : (level - start) * task.model().initialSlope(shape);
        keepIfBest(sum, shape, start + shift, held);
    }

    /** With the initial slope held, the rise follows from the shape and only the start content is left to solve for. */
    private void considerHeldSlope(double[] shape, double[] g) {
        double slope = task.fixedAt(task.levelIndex()).getAsDouble();
        double rise = slope / task.model().initialSlope(shape);
        double mean = 0;
        for (int i = 0; i < g.length; i++) {
            mean += (contents[i] - rise * g[i]) / g.length;
        }
        double start = task.isFixed(task.startIndex())
                ? task.fixedAt(task.startIndex()).getAsDouble() - shift
                : mean;
        double sum = 0;
        for (int i = 0; i < g.length; i++) {
            double residual = contents[i] - start - rise * g[i];
            sum += residual * residual;
        }
        keepIfBest(sum, shape, start + shift, slope);
    }

    private void keepIfBest(double sum, double[] shape, double start, double level) {
        if (sum < bestSum || best == null) {
            bestSum = sum;
            best = new double[shape.length + 2];
            System.arraycopy(shape, 0, best, 0, shape.length);
            best[task.startIndex()] = start;
            best[task.levelIndex()] = level;
        }
    }
}
