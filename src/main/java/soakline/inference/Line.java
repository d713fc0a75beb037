package soakline.inference;

import java.util.function.IntPredicate;
import java.util.function.IntToDoubleFunction;

/** The weights with which contents enter the slope and the intercept of a least-squares line over some of the weighings. */
final class Line {
    private static final int LEAST_POINTS = 3;

    final double[] slope;
    final double[] intercept;
    final int points;
    final double first;
    final double last;

    private Line(double[] slope, double[] intercept, int points, double first, double last) {
        this.slope = slope;
        this.intercept = intercept;
        this.points = points;
        this.first = first;
        this.last = last;
    }

    /**
     * @param member which weighings take part: a stretch without a gap, as they are in order of time
     */
    static Line of(ResidualSpace space, IntPredicate member, IntToDoubleFunction weight, IntToDoubleFunction abscissa) {
        int n = space.size();
        int from = 0;
        while (from < n && !member.test(from)) {
            from++;
        }
        int to = from;
        while (to < n && member.test(to)) {
            to++;
        }
        int points = to - from;
        if (points < LEAST_POINTS) {
            return null;
        }
        double[] x = new double[points];
        double[] w = new double[points];
        double weights = 0;
        double mean = 0;
        for (int i = 0; i < points; i++) {
            x[i] = abscissa.applyAsDouble(from + i);
            w[i] = weight.applyAsDouble(from + i);
            weights += w[i];
            mean += w[i] * x[i];
        }
        mean /= weights;
        double spread = 0;
        for (int i = 0; i < points; i++) {
            x[i] -= mean;
            spread += w[i] * x[i] * x[i];
        }
        if (!(spread > 0)) {
            return null;
        }
        double[] slope = new double[n];
        double[] intercept = new double[n];
        for (int i = 0; i < points; i++) {
            slope[from + i] = w[i] * x[i] / spread;
            intercept[from + i] = w[i] / weights - mean * slope[from + i];
        }
        return new Line(slope, intercept, points, space.time(from), space.time(to - 1));
    }
}
