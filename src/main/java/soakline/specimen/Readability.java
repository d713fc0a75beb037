package soakline.specimen;

import java.util.OptionalDouble;

/** The smallest step between the values of a run: what the balance, or the person who wrote them down, could tell apart. */
public final class Readability {

    private static final int MOST_VALUES = 500;
    private static final int LARGEST_POWER = -1;
    private static final int SMALLEST_POWER = -10;
    private static final int[] MULTIPLES = {5, 2, 1};

    private Readability() {}

    /**
     * The largest step of 1, 2 or 5 times a power of ten, in SI, of which every value is a whole multiple.
     *
     * @return empty when there is none from 1e-10 on, as with computed values
     */
    public static OptionalDouble of(Weighings weighings) {
        for (int power = LARGEST_POWER; power >= SMALLEST_POWER; power--) {
            for (int multiple : MULTIPLES) {
                double step = multiple * Math.pow(10, power);
                if (divides(step, weighings)) {
                    return OptionalDouble.of(step);
                }
            }
        }
        return OptionalDouble.empty();
    }

    private static boolean divides(double step, Weighings weighings) {
        int n = weighings.size();
        int taken = Math.min(n, MOST_VALUES);
        for (int k = 0; k < taken; k++) {
            double steps = weighings.value((int) ((long) k * n / taken)) / step;
            if (Math.abs(steps - Math.rint(steps)) > 1e-6 * Math.max(1, Math.abs(steps) * 1e-6)) {
                return false;
            }
        }
        return true;
    }
}
