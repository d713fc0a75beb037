package soakline.uptake;

import org.apache.commons.numbers.gamma.Erfcx;

/**
 * Fractional uptake of a plane sheet after a step at its exposed face, constant D: G(τ) and τ dG/dτ, τ = D t/L².
 *
 * <p>Source: Crank, The Mathematics of Diffusion, 2nd ed. (1975), ch. 4, the long-time and the short-time series, which agree at
 * every τ. They meet at {@value #JOINT}: above it five terms of the long form from one exponential (the powers q^(m²) by
 * multiplication), below it one term of the short form, and below {@value #NO_CORRECTION} the root alone, as the term left out
 * is then under 1e-16.
 *
 * <p>Domain: every τ, ±∞ included; G is 0 at and below τ = 0. Accuracy measured against the values computed with mpmath that
 * stand in the tests: |error| of G at most 3e-16, of τ dG/dτ at most 3e-16.
 */
final class FickianKernel {

    /** Cheapest where the long form needs five terms and the short form one. */
    static final double JOINT = 0.12;

    private static final double NO_CORRECTION = 0.0265;

    private static final double QUARTER_PI_SQUARED = Math.PI * Math.PI / 4;
    private static final double EIGHT_OVER_PI_SQUARED = 8 / (Math.PI * Math.PI);
    private static final double INVERSE_ROOT_PI = 1 / Math.sqrt(Math.PI);

    private FickianKernel() {}

    /**
     * @param scale D/L², 1/s
     * @param g receives G
     * @param rate receives τ dG/dτ; null when not wanted
     */
    static void evaluate(double[] times, int count, double scale, double[] g, double[] rate) {
        if (rate == null) {
            for (int i = 0; i < count; i++) {
                g[i] = fraction(times[i] * scale);
            }
            return;
        }
        for (int i = 0; i < count; i++) {
            double tau = times[i] * scale;
            if (tau > JOINT) {
                double q = Math.exp(-QUARTER_PI_SQUARED * tau);
                double q2 = q * q;
                double q4 = q2 * q2;
                double q8 = q4 * q4;
                double q16 = q8 * q8;
                double p9 = q * q8;
                double p25 = p9 * q16;
                double p49 = p25 * (q16 * q8);
                double p81 = p49 * (q16 * q16);
                g[i] = 1 - EIGHT_OVER_PI_SQUARED * (q + p9 / 9 + p25 / 25 + p49 / 49 + p81 / 81);
                // q is 0 long before tau is infinite, so 0 · ∞ is kept away
                rate[i] = q == 0 ? 0 : 2 * tau * (q + p9 + p25 + p49 + p81);
            } else if (tau > 0) {
                double root = Math.sqrt(tau);
                double plain = root * INVERSE_ROOT_PI;
                if (tau > NO_CORRECTION) {
                    double x = 1 / root;
                    double e = Math.exp(-x * x);
                    // −2 ierfc(x)·2√τ with ierfc(x) = e^(−x²)(1/√π − x erfcx(x))
                    g[i] = 2 * plain - 4 * root * e * (INVERSE_ROOT_PI - x * Erfcx.value(x));
                    double e4 = e * e * e * e;
                    rate[i] = plain * (1 - 2 * e + 2 * e4);
                } else {
                    g[i] = 2 * plain;
                    rate[i] = plain;
                }
            } else {
                g[i] = 0;
                rate[i] = 0;
            }
        }
    }

    /** G at one τ. */
    static double fraction(double tau) {
        if (tau > JOINT) {
            return 1 - remaining(tau);
        }
        if (!(tau > 0)) {
            return 0;
        }
        double root = Math.sqrt(tau);
        double plain = 2 * root * INVERSE_ROOT_PI;
        if (tau <= NO_CORRECTION) {
            return plain;
        }
        double x = 1 / root;
        return plain - 4 * root * Math.exp(-x * x) * (INVERSE_ROOT_PI - x * Erfcx.value(x));
    }

    /** 1 − G at one τ, without cancellation however small it is. */
    static double remaining(double tau) {
        if (!(tau > JOINT)) {
            return 1 - fraction(tau);
        }
        double q = Math.exp(-QUARTER_PI_SQUARED * tau);
        double q2 = q * q;
        double q4 = q2 * q2;
        double q8 = q4 * q4;
        double q16 = q8 * q8;
        double p9 = q * q8;
        double p25 = p9 * q16;
        double p49 = p25 * (q16 * q8);
        double p81 = p49 * (q16 * q16);
        return EIGHT_OVER_PI_SQUARED * (q + p9 / 9 + p25 / 25 + p49 / 49 + p81 / 81);
    }
}
