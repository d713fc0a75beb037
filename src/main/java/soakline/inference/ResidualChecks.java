package soakline.inference;

import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import soakline.inference.Evidence.ClassicDiffusivity;
import soakline.problem.Code;
import soakline.problem.Finding;

/** The checks of the residuals: runs of one sign, likeness of neighbours, normality, and the largest one. */
final class ResidualChecks {

    /** Up to this many residuals the number of runs has its exact distribution, beyond it the normal one. */
    private static final int EXACT_RUNS = 200;

    /** Longer series are thinned to this where signs and shapes are looked at, which would otherwise see their rounding. */
    private static final int MOST = 5000;

    private static final int LEAST_DEGREES = 3;

    private final ResidualSpace space;

    ResidualChecks(ResidualSpace space) {
        this.space = space;
    }

    List<Evidence> all() {
        return Side.bySide(space.size(), List.of(this::runs, this::autocorrelation, this::normality, this::largest));
    }

    private Evidence runs() {
        int positive = 0;
        int negative = 0;
        int runs = 0;
        int lastSign = 0;
        int taken = Math.min(space.size(), MOST);
        for (int k = 0; k < taken; k++) {
            int sign = (int) Math.signum(space.residual(thinned(k, taken)));
            if (sign == 0) {
                continue;
            }
            positive += sign > 0 ? 1 : 0;
            negative += sign < 0 ? 1 : 0;
            runs += sign == lastSign ? 0 : 1;
            lastSign = sign;
        }
        if (positive == 0 || negative == 0) {
            return Evidence.unknown(CheckName.RESIDUAL_RUNS, "all residuals have one sign or are zero");
        }
        double expected = 1 + 2.0 * positive * negative / (positive + negative);
        return new Evidence(
                CheckName.RESIDUAL_RUNS,
                ClassicDiffusivity.NONE,
                OptionalDouble.empty(),
                OptionalDouble.of(fewRuns(runs, positive, negative)),
                List.of(new Check.Figure("runs", runs), new Check.Figure("expectedRuns", expected)),
                Finding.of(Code.RUNS_PASS, runs, expected),
                Finding.of(Code.RUNS_FEW, runs, expected));
    }

    /** P(number of runs ≤ observed) given the numbers of signs (Wald and Wolfowitz, Annals of Mathematical Statistics 11 (1940) 147). */
    static double fewRuns(int runs, int positive, int negative) {
        double n = positive + negative;
        if (n > EXACT_RUNS) {
            double product = 2.0 * positive * negative;
            double mean = 1 + product / n;
            double variance = product * (product - n) / (n * n * (n - 1));
            return Quantiles.normal((runs + 0.5 - mean) / Math.sqrt(variance));
        }
        double sum = 0;
        for (int r = 2; r <= runs; r++) {
            int half = r / 2;
            sum += r % 2 == 0
                    ? 2 * choose(positive - 1, half - 1) * choose(negative - 1, half - 1)
                    : choose(positive - 1, half) * choose(negative - 1, half - 1)
                            + choose(positive - 1, half - 1) * choose(negative - 1, half);
        }
        return Math.min(1, sum / choose(positive + negative, positive));
    }

    private static double choose(int n, int k) {
        if (k < 0 || k > n) {
            return 0;
        }
        double value = 1;
        for (int i = 1; i <= k; i++) {
            value *= (double) (n - k + i) / i;
        }
        return value;
    }

    private Evidence autocorrelation() {
        if (space.degreesOfFreedom() < LEAST_DEGREES) {
            return Evidence.unknown(CheckName.RESIDUAL_AUTOCORRELATION, "too few weighings");
        }
        DurbinWatson test = new DurbinWatson(space);
        double statistic = test.statistic();
        double correlation = space.lagOneCorrelation();
        return new Evidence(
                CheckName.RESIDUAL_AUTOCORRELATION,
                ClassicDiffusivity.NONE,
                OptionalDouble.empty(),
                OptionalDouble.of(test.lowerTail(statistic)),
                List.of(
                        new Check.Figure("durbinWatson", statistic),
                        new Check.Figure("lagOneCorrelation", correlation)),
                Finding.of(Code.AUTOCORRELATION_PASS, statistic, correlation),
                Finding.of(Code.AUTOCORRELATION_POSITIVE, statistic, correlation));
    }

    private Evidence normality() {
        if (space.degreesOfFreedom() < LEAST_DEGREES) {
            return Evidence.unknown(CheckName.RESIDUAL_NORMALITY, "too few weighings");
        }
        int taken = Math.min(space.size(), MOST);
        double[] standardised = new double[taken];
        for (int k = 0; k < taken; k++) {
            int i = thinned(k, taken);
            standardised[k] = space.residual(i)
                    / (space.standardDeviation() * Math.sqrt(Math.max(1e-12, space.residualVariance(i))));
        }
        double statistic = andersonDarling(standardised);
        return new Evidence(
                CheckName.RESIDUAL_NORMALITY,
                ClassicDiffusivity.NONE,
                OptionalDouble.empty(),
                OptionalDouble.of(normalityTail(statistic)),
                List.of(new Check.Figure("andersonDarling", statistic)),
                Finding.of(Code.NORMALITY_PASS, statistic),
                Finding.of(Code.NORMALITY_DIFFERS, statistic));
    }

    /** The k-th of some weighings spread evenly over all. */
    private int thinned(int k, int taken) {
        return (int) ((long) k * space.size() / taken);
    }

    /**
     * The Anderson–Darling statistic against a normal distribution of unknown mean and variance, with Stephens' factor for the
     * number of values (D'Agostino and Stephens, Goodness-of-Fit Techniques (1986), table 4.7; from memory, checked by simulation).
     */
    static double andersonDarling(double[] values) {
        double[] z = values.clone();
        Arrays.sort(z);
        int n = z.length;
        double mean = 0;
        for (double v : z) {
            mean += v / n;
        }
        double variance = 0;
        for (double v : z) {
            variance += (v - mean) * (v - mean) / (n - 1);
        }
        double sd = Math.sqrt(variance);
        double sum = 0;
        for (int i = 0; i < n; i++) {
            double lower = Math.max(1e-300, Quantiles.normal((z[i] - mean) / sd));
            double upper = Math.max(1e-300, Quantiles.normalTail((z[n - 1 - i] - mean) / sd));
            sum += (2 * i + 1) * (Math.log(lower) + Math.log(upper));
        }
        return (-n - sum / n) * (1 + 0.75 / n + 2.25 / ((double) n * n));
    }

    /** P of so large a statistic (the same book, table 4.9; from memory, checked by simulation). */
    static double normalityTail(double a) {
        if (a >= 0.6) {
            // the quadratic turns up beyond its range, where the chance is far below any limit used here
            double x = Math.min(a, 13);
            return Math.exp(1.2937 - 5.709 * x + 0.0186 * x * x);
        }
        if (a >= 0.34) {
            return Math.exp(0.9177 - 4.279 * a - 1.38 * a * a);
        }
        return a >= 0.2
                ? 1 - Math.exp(-8.318 + 42.796 * a - 59.938 * a * a)
                : 1 - Math.exp(-13.436 + 101.14 * a - 223.73 * a * a);
    }

    private Evidence largest() {
        if (space.degreesOfFreedom() < LEAST_DEGREES) {
            return Evidence.unknown(CheckName.LARGEST_RESIDUAL, "too few weighings");
        }
        int worst = 0;
        double largest = -1;
        for (int i = 0; i < space.size(); i++) {
            double variance = space.residualVariance(i);
            // a weighing that the fit passes through whatever it is cannot be judged
            double size = variance < 1e-9
                    ? 0
                    : Math.abs(space.residual(i)) / (space.standardDeviation() * Math.sqrt(variance));
            if (size > largest) {
                largest = size;
                worst = i;
            }
        }
        // Bonferroni's bound on the largest of n is nearly exact where it matters, in the tail
        double probability = Math.min(1, space.size() * space.tailOfStudentised(largest));
        double hours = space.time(worst) / 3600;
        return new Evidence(
                CheckName.LARGEST_RESIDUAL,
                ClassicDiffusivity.NONE,
                OptionalDouble.empty(),
                OptionalDouble.of(probability),
                List.of(
                        new Check.Figure("standardised", largest),
                        new Check.Figure("time", space.time(worst)),
                        new Check.Figure(
                                "weighing", space.estimate().task().data().weighing(worst) + 1)),
                Finding.of(Code.LARGEST_PASS, largest, hours),
                Finding.of(Code.LARGEST_STANDS_OUT, largest, hours));
    }
}
