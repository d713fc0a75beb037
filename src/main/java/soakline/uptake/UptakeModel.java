package soakline.uptake;

import java.util.List;

/**
 * Fractional uptake G of one coupon against time: 0 at the start, 1 at the plateau. Knows the coupon's geometry and no data.
 * Immutable and safe to share between threads.
 *
 * <p>Every method takes the natural logarithms of the shape parameters, in the order of {@link #shape()}; the first is always
 * the diffusivity in m²/s.
 */
public interface UptakeModel {

    /** Name as in the machine-readable result, such as {@code fickian}. */
    String name();

    List<ShapeParameter> shape();

    /**
     * G and its derivatives at many times.
     *
     * @param times s; at or below zero G is 0
     * @param count how many of them
     * @param logShape ln of each shape parameter
     * @param g receives G
     * @param dg receives dG/d ln(shape parameter k) in row k; null when not wanted
     */
    void evaluate(double[] times, int count, double[] logShape, double[] g, double[][] dg);

    /** G at one time, s. */
    default double fraction(double time, double[] logShape) {
        double[] g = new double[1];
        evaluate(new double[] {time}, 1, logShape, g, null);
        return g[0];
    }

    /** The c of G → c √t as t → 0, s^(−1/2). Proportional to √D. */
    double initialSlope(double[] logShape);

    /** The mean time ∫ (1 − G) dt, s. */
    double meanTime(double[] logShape);

    /**
     * Start values to try for a test whose first weighing after exposure came at one time and the last at another: close enough
     * together that the best of them lies in the basin of the optimum.
     *
     * @param first s, positive
     * @param last s, not less than {@code first}
     */
    List<double[]> starts(double first, double last);
}
