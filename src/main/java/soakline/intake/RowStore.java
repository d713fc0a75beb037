package soakline.intake;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Place;

/**
 * The rows of a table, first as they come and then in order of time: a time, a line and a value a coupon (NaN where there is
 * none). Kept in blocks, which need no copying to grow.
 */
final class RowStore {

    /** Eight months of a log that weighs every second, and well within the memory of a desktop. */
    static final int MOST_ROWS = 20_000_000;

    private static final int BLOCK_BITS = 14;
    private static final int BLOCK_ROWS = 1 << BLOCK_BITS;

    private final int coupons;
    private final int mostRows;
    private final Place place;
    private final List<Block> blocks = new ArrayList<>();
    private final List<Map<Integer, String>> reasons = new ArrayList<>();
    private int size;
    private int stepsBack;
    /** Row of the file at each place in order of time; empty while both are the same. */
    private int[] order = {};

    RowStore(int coupons, int mostRows, Place place) {
        this.coupons = coupons;
        this.mostRows = mostRows;
        this.place = place;
        for (int c = 0; c < coupons; c++) {
            reasons.add(new HashMap<>());
        }
    }

    /**
     * Adds a row; its values are to be set next, all of them.
     *
     * @throws Fault when there are more than can be kept
     */
    void add(double time, int line) {
        if (size == mostRows) {
            throw Fault.of(Code.TOO_LARGE, mostRows).at(place.line(line));
        }
        if (size % BLOCK_ROWS == 0) {
            blocks.add(new Block(coupons));
        }
        stepsBack += size > 0 && time < time(size - 1) ? 1 : 0;
        Block block = blocks.get(size >> BLOCK_BITS);
        block.times[size % BLOCK_ROWS] = time;
        block.lines[size % BLOCK_ROWS] = line;
        size++;
    }

    /** Sets the value of a coupon in the last row, NaN when it has none. */
    void setValue(int coupon, double value) {
        blocks.get((size - 1) >> BLOCK_BITS).values[coupon][(size - 1) % BLOCK_ROWS] = value;
    }

    /** Sets the last row aside for a coupon. */
    void setAside(int coupon, String reason) {
        reasons.get(coupon).put(size - 1, reason);
    }

    int size() {
        return size;
    }

    /** How often a row of the file is earlier than the one above it. */
    int stepsBack() {
        return stepsBack;
    }

    /** Time of a row of the file. */
    double time(int row) {
        return blocks.get(row >> BLOCK_BITS).times[row % BLOCK_ROWS];
    }

    int line(int row) {
        return blocks.get(row >> BLOCK_BITS).lines[row % BLOCK_ROWS];
    }

    /** NaN where there is none. */
    double value(int coupon, int row) {
        return blocks.get(row >> BLOCK_BITS).values[coupon][row % BLOCK_ROWS];
    }

    Optional<String> reason(int coupon, int row) {
        Map<Integer, String> ofCoupon = reasons.get(coupon);
        // most runs set nothing aside, and a million look-ups would take longer than the sorting
        return ofCoupon.isEmpty() ? Optional.empty() : Optional.ofNullable(ofCoupon.get(row));
    }

    /** Row of the file that comes at a place in order of time, once {@link #sort} was called. */
    int inOrder(int index) {
        return order.length == 0 ? index : order[index];
    }

    /** Finds the order of time; rows of the same time stay as they stand in the file. */
    void sort() {
        if (stepsBack == 0) {
            return;
        }
        order = new int[size];
        for (int row = 0; row < size; row++) {
            order[row] = row;
        }
        int[] merged = new int[size];
        for (int width = 1; width < size; width *= 2) {
            for (int from = 0; from < size; from += 2 * width) {
                merge(order, merged, from, Math.min(from + width, size), Math.min(from + 2 * width, size));
            }
            int[] swap = order;
            order = merged;
            merged = swap;
        }
    }

    private void merge(int[] from, int[] to, int start, int middle, int end) {
        int left = start;
        int right = middle;
        for (int k = start; k < end; k++) {
            boolean takeLeft = left < middle && (right >= end || time(from[left]) <= time(from[right]));
            to[k] = takeLeft ? from[left++] : from[right++];
        }
    }

    private static final class Block {
        private final double[] times = new double[BLOCK_ROWS];
        private final int[] lines = new int[BLOCK_ROWS];
        private final double[][] values;

        Block(int coupons) {
            values = new double[coupons][BLOCK_ROWS];
        }
    }
}
