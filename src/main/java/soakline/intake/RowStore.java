package soakline.intake;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Place;

/** The rows of a table in the order of the file, in arrays: a time, a line and a value a coupon (NaN where there is none). */
final class RowStore {

    /** Eight months of a log that weighs every second, and well within the memory of a desktop. */
    static final int MOST_ROWS = 20_000_000;

    private static final int FIRST_CAPACITY = 1024;

    private final int mostRows;
    private final Place place;
    private double[] times = new double[FIRST_CAPACITY];
    private int[] lines = new int[FIRST_CAPACITY];
    private final double[][] values;
    private final List<Map<Integer, String>> reasons = new ArrayList<>();
    private int size;

    RowStore(int coupons, int mostRows, Place place) {
        this.mostRows = mostRows;
        this.place = place;
        values = new double[coupons][FIRST_CAPACITY];
        for (int c = 0; c < coupons; c++) {
            reasons.add(new HashMap<>());
        }
    }

    /**
     * Adds a row, as yet without values.
     *
     * @throws Fault when there are more than can be kept
     */
    void add(double time, int line) {
        if (size == mostRows) {
            throw Fault.of(Code.TOO_LARGE, mostRows).at(place.line(line));
        }
        if (size == times.length) {
            int capacity = Math.min(mostRows, size * 2);
            times = Arrays.copyOf(times, capacity);
            lines = Arrays.copyOf(lines, capacity);
            for (int c = 0; c < values.length; c++) {
                values[c] = Arrays.copyOf(values[c], capacity);
            }
        }
        times[size] = time;
        lines[size] = line;
        for (double[] ofCoupon : values) {
            ofCoupon[size] = Double.NaN;
        }
        size++;
    }

    /** Sets the value of a coupon in the last row. */
    void setValue(int coupon, double value) {
        values[coupon][size - 1] = value;
    }

    /** Sets the last row aside for a coupon. */
    void setAside(int coupon, String reason) {
        reasons.get(coupon).put(size - 1, reason);
    }

    int size() {
        return size;
    }

    double time(int row) {
        return times[row];
    }

    int line(int row) {
        return lines[row];
    }

    /** NaN where there is none. */
    double value(int coupon, int row) {
        return values[coupon][row];
    }

    Optional<String> reason(int coupon, int row) {
        Map<Integer, String> ofCoupon = reasons.get(coupon);
        // most runs set nothing aside, and a million look-ups would take longer than the sorting
        return ofCoupon.isEmpty() ? Optional.empty() : Optional.ofNullable(ofCoupon.get(row));
    }

    /** How often a row is earlier than the one above it. */
    int stepsBack() {
        int steps = 0;
        for (int row = 1; row < size; row++) {
            steps += times[row] < times[row - 1] ? 1 : 0;
        }
        return steps;
    }

    /** Rows in order of time; those of the same time as they stand in the file. */
    int[] inOrder() {
        int[] order = new int[size];
        for (int row = 0; row < size; row++) {
            order[row] = row;
        }
        if (stepsBack() == 0) {
            return order;
        }
        int[] merged = new int[size];
        for (int width = 1; width > 0 && width < size; width *= 2) {
            for (int from = 0; from < size; from += 2 * width) {
                merge(order, merged, from, Math.min(from + width, size), Math.min(from + 2 * width, size));
            }
            int[] swap = order;
            order = merged;
            merged = swap;
        }
        return order;
    }

    private void merge(int[] from, int[] to, int start, int middle, int end) {
        int left = start;
        int right = middle;
        for (int k = start; k < end; k++) {
            boolean takeLeft = left < middle && (right >= end || times[from[left]] <= times[from[right]]);
            to[k] = takeLeft ? from[left++] : from[right++];
        }
    }
}
