package soakline.estimate;

import soakline.numeric.Triangle;
import soakline.specimen.ContentSeries;
import soakline.uptake.UptakeModel;

/**
 * Observed content minus M(t) = M0 + (M∞ − M0) G(t), and the Jacobian of M, for one task. Keeps work space: one object per
 * minimisation, not shared between threads.
 */
final class ContentResiduals implements ResidualModel {

    /** Of the largest content: what rounding of masses many times the content leaves. */
    private static final double ROUNDING = 5e-14;

    private final EstimationTask task;
    private final ContentSeries data;
    private final UptakeModel model;
    private final int[] free;
    private final boolean shapeFree;
    private final double[] times = new double[Triangle.BLOCK];
    private final double[] contents = new double[Triangle.BLOCK];
    private final double[] g = new double[Triangle.BLOCK];
    private final double[][] dg;
    private final double[] shape;
    private int loadedFrom = -1;

    ContentResiduals(EstimationTask task) {
        this.task = task;
        this.data = task.data();
        this.model = task.model();
        this.free = task.free();
        this.shape = new double[task.shapeCount()];
        this.shapeFree = free.length > 0 && free[0] < shape.length;
        this.dg = shapeFree ? new double[shape.length][Triangle.BLOCK] : null;
    }

    @Override
    public int parameters() {
        return free.length;
    }

    @Override
    public int observations() {
        return data.size();
    }

    @Override
    public boolean isLinear() {
        return !shapeFree;
    }

    @Override
    public double roundingFloor() {
        double largest = 0;
        for (int i = 0; i < data.size(); i++) {
            largest = Math.max(largest, Math.abs(data.content(i)));
        }
        return data.size() * largest * largest * ROUNDING * ROUNDING;
    }

    @Override
    public void fill(double[] point, int from, int count, double[][] block) {
        double[] all = task.complete(point);
        System.arraycopy(all, 0, shape, 0, shape.length);
        if (loadedFrom != from) {
            data.copy(from, count, times, contents);
            loadedFrom = from;
        }
        model.evaluate(times, count, shape, g, dg);
        double start = all[task.startIndex()];
        double level = all[task.levelIndex()];
        boolean slope = task.form() == LevelForm.INITIAL_SLOPE;
        double perSlope = slope ? 1 / model.initialSlope(shape) : 1;
        double rise = slope ? level * perSlope : level - start;

        double[] residual = block[free.length];
        for (int i = 0; i < count; i++) {
            residual[i] = contents[i] - (start + rise * g[i]);
        }
        for (int k = 0; k < free.length; k++) {
            double[] column = block[k];
            int parameter = free[k];
            if (parameter < shape.length) {
                fillShape(column, count, parameter, rise, slope);
            } else if (parameter == task.startIndex()) {
                for (int i = 0; i < count; i++) {
                    column[i] = slope ? 1 : 1 - g[i];
                }
            } else {
                for (int i = 0; i < count; i++) {
                    column[i] = g[i] * perSlope;
                }
            }
        }
    }

    private void fillShape(double[] column, int count, int parameter, double rise, boolean slope) {
        double[] derivative = dg[parameter];
        for (int i = 0; i < count; i++) {
            column[i] = rise * derivative[i];
        }
        if (slope && parameter == 0) {
            // with the slope held, the rise falls as D^(−1/2)
            for (int i = 0; i < count; i++) {
                column[i] -= rise * g[i] / 2;
            }
        }
    }
}
