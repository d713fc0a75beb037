package soakline.uptake;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Fick's law with one constant D, faces brought to their final level at once; with bare edges the product solution,
 * 1 − G = Π (1 − G_i), each direction with its own diffusion path and the same D.
 *
 * <p>Source: Crank, The Mathematics of Diffusion, 2nd ed. (1975), ch. 4; product solution: Carslaw and Jaeger, Conduction of
 * Heat in Solids, 2nd ed. (1959), §1.15 (both from memory, checked numerically in the tests).
 */
public final class FickianModel implements UptakeModel {

    /** τ between start values that are tried: a factor of √10, well inside the basin of the optimum on either side. */
    private static final double START_FACTOR = Math.sqrt(10);

    /** Simpson's intervals for the mean time of a coupon with bare edges: error under 1e-9, as the tests show. */
    private static final int MEAN_TIME_INTERVALS = 400;

    private static final double MEAN_TIME_ROOT_TAU = 4.5;

    private final double[] paths;

    private FickianModel(double[] paths) {
        for (double path : paths) {
            if (!(path > 0) || !Double.isFinite(path)) {
                throw new IllegalArgumentException("a diffusion path must be positive: " + path);
            }
        }
        this.paths = paths;
    }

    /**
     * A sheet whose edges take no part.
     *
     * @param path through the thickness, m: half of it, or all of it with one face exposed
     */
    public static FickianModel through(double path) {
        return new FickianModel(new double[] {path});
    }

    /** The same sheet with further directions, m: half the width and half the length where all edges are bare. */
    public FickianModel with(double... furtherPaths) {
        double[] all = Arrays.copyOf(paths, paths.length + furtherPaths.length);
        System.arraycopy(furtherPaths, 0, all, paths.length, furtherPaths.length);
        return new FickianModel(all);
    }

    /** Whether only one direction takes part, so that the classic formulas of the plane sheet hold. */
    public boolean isPlain() {
        return paths.length == 1;
    }

    /** The diffusion path through the thickness, m. */
    public double path() {
        return paths[0];
    }

    @Override
    public String name() {
        return "fickian";
    }

    @Override
    public List<ShapeParameter> shape() {
        return List.of(ShapeParameter.DIFFUSIVITY);
    }

    @Override
    public void evaluate(double[] times, int count, double[] logShape, double[] g, double[][] dg) {
        double d = Math.exp(logShape[0]);
        double[] rate = dg == null ? null : dg[0];
        FickianKernel.evaluate(times, count, scale(d, 0), g, rate);
        if (isPlain()) {
            return;
        }
        double[] gi = new double[count];
        double[] ri = rate == null ? null : new double[count];
        for (int k = 1; k < paths.length; k++) {
            FickianKernel.evaluate(times, count, scale(d, k), gi, ri);
            for (int i = 0; i < count; i++) {
                // G = 1 − (1 − G)(1 − G_i), written so that small G keep their digits
                if (ri != null) {
                    rate[i] = rate[i] * (1 - gi[i]) + ri[i] * (1 - g[i]);
                }
                g[i] = g[i] + gi[i] - g[i] * gi[i];
            }
        }
    }

    @Override
    public double initialSlope(double[] logShape) {
        double d = Math.exp(logShape[0]);
        double sum = 0;
        for (double path : paths) {
            sum += 2 * Math.sqrt(d / Math.PI) / path;
        }
        return sum;
    }

    @Override
    public double meanTime(double[] logShape) {
        double d = Math.exp(logShape[0]);
        double unit = paths[0] * paths[0] / d;
        if (isPlain()) {
            return unit / 3;
        }
        // ∫ (1 − G) dτ = ∫ 2y (1 − G(y²)) dy by Simpson's rule; the root takes out the singular start
        double h = MEAN_TIME_ROOT_TAU / MEAN_TIME_INTERVALS;
        double sum = 0;
        for (int i = 0; i <= MEAN_TIME_INTERVALS; i++) {
            double y = i * h;
            double remaining = 1;
            for (double path : paths) {
                double ratio = paths[0] / path;
                remaining *= FickianKernel.remaining(y * y * ratio * ratio);
            }
            int weight = i == 0 || i == MEAN_TIME_INTERVALS ? 1 : i % 2 == 1 ? 4 : 2;
            sum += weight * 2 * y * remaining;
        }
        return unit * sum * h / 3;
    }

    @Override
    public List<double[]> starts(double first, double last) {
        // from 0.01 of the test's end, where only the initial slope shows, to a plateau reached before the first
        // weighing
        double shortest = 1 / Arrays.stream(paths).map(p -> 1 / (p * p)).sum();
        double lowest = 0.01 * shortest / last;
        double highest = 3 * paths[0] * paths[0] / first;
        List<double[]> starts = new ArrayList<>();
        for (double d = lowest; ; d *= START_FACTOR) {
            starts.add(new double[] {Math.log(d)});
            if (d >= highest) {
                return starts;
            }
        }
    }

    private double scale(double d, int direction) {
        return d / (paths[direction] * paths[direction]);
    }
}
