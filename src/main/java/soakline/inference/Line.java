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

    static Line of(ResidualSpace space, IntPredicate member, IntToDoubleFunction weight, IntToDoubleFunction abscissa) {
        int n = space.size();
        int points = 0;
        double weights = 0;
        double mean = 0;
        double first = Double.NaN;
        double last = Double.NaN;
        for (int i = 0; i < n; i++) {
            if (member.test(i)) {
                double w = weight.applyAsDouble(i);
                weights += w;
                mean += w * abscissa.applyAsDouble(i);
                first = points == 0 ? space.time(i) : first;
                last = space.time(i);
                points++;
            }
        }
        mean /= weights;
        double spread = 0;
        for (int i = 0; i < n; i++) {
            if (member.test(i)) {
                double x = abscissa.applyAsDouble(i) - mean;
                spread += weight.applyAsDouble(i) * x * x;
            }
        }
        if (points < LEAST_POINTS || !(spread > 0)) {
            return null;
        }
        double[] slope = new double[n];
        double[] intercept = new double[n];
        for (int i = 0; i < n; i++) {
            if (member.test(i)) {
                double w = weight.applyAsDouble(i);
                slope[i] = w * (abscissa.applyAsDouble(i) - mean) / spread;
                intercept[i] = w / weights - mean * slope[i];
            }
        }
        return new Line(slope, intercept, points, first, last);
    }
}
