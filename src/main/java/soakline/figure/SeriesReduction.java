package soakline.figure;

import java.util.Arrays;

/**
 * Picks from a long series the points that can be seen: in each narrow column of the picture the lowest and the highest, so that
 * no extreme is lost. Short series stay whole.
 */
final class SeriesReduction {

    /** More columns than the pixels of most charts. */
    static final int COLUMNS = 2000;

    private SeriesReduction() {}

    /**
     * Indices of the points to draw, rising; at most two a column.
     *
     * @param x rising or equal from point to point
     * @param y of the same length; a point that is not finite is never drawn
     */
    static int[] pick(double[] x, double[] y, int columns) {
        int n = x.length;
        if (n <= 2 * columns) {
            return finite(y);
        }
        double width = (x[n - 1] - x[0]) / columns;
        int[] picks = new int[2 * columns];
        int count = 0;
        int from = 0;
        while (from < n) {
            int column = column(x[from], x[0], width, columns);
            int lowest = -1;
            int highest = -1;
            int to = from;
            while (to < n && column(x[to], x[0], width, columns) == column) {
                if (Double.isFinite(y[to])) {
                    lowest = lowest < 0 || y[to] < y[lowest] ? to : lowest;
                    highest = highest < 0 || y[to] > y[highest] ? to : highest;
                }
                to++;
            }
            count = add(picks, count, Math.min(lowest, highest));
            if (lowest != highest) {
                count = add(picks, count, Math.max(lowest, highest));
            }
            from = to;
        }
        return Arrays.copyOf(picks, count);
    }

    private static int add(int[] picks, int count, int index) {
        if (index < 0) {
            return count;
        }
        picks[count] = index;
        return count + 1;
    }

    private static int column(double x, double first, double width, int columns) {
        return width > 0 ? Math.min(columns - 1, (int) ((x - first) / width)) : 0;
    }

    private static int[] finite(double[] y) {
        int[] all = new int[y.length];
        int count = 0;
        for (int i = 0; i < y.length; i++) {
            count = Double.isFinite(y[i]) ? add(all, count, i) : count;
        }
        return Arrays.copyOf(all, count);
    }
}
