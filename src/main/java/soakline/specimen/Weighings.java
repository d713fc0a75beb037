package soakline.specimen;

import java.util.Arrays;
import java.util.Collections;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * The weighings of one coupon in order of time: compact, because a balance log of a million rows is normal. Immutable.
 *
 * <p>Time is in seconds from time zero and may be negative (weighed before exposure); the value is a mass in kg or a content
 * as a fraction. A weighing may be set aside, with the reason; it is kept and takes no part in an estimate.
 */
public final class Weighings {

    private final double[] times;
    private final double[] values;
    private final int[] lines;
    private final Map<Integer, String> setAside;

    private Weighings(double[] times, double[] values, int[] lines, Map<Integer, String> setAside) {
        this.times = times;
        this.values = values;
        this.lines = lines;
        this.setAside = setAside;
    }

    /** Weighings typed in or computed: no lines of a file. Times must not fall. */
    public static Weighings of(double[] times, double[] values) {
        Builder builder = new Builder();
        for (int i = 0; i < times.length; i++) {
            builder.add(times[i], values[i], 0);
        }
        return builder.build();
    }

    public int size() {
        return times.length;
    }

    /** Number of weighings not set aside. */
    public int used() {
        return times.length - setAside.size();
    }

    /** Seconds from time zero. */
    public double time(int index) {
        return times[index];
    }

    /** Mass in kg, or content as a fraction. */
    public double value(int index) {
        return values[index];
    }

    /** Line of the file, from 1; 0 when it came from no file. */
    public int line(int index) {
        return lines[index];
    }

    public boolean isSetAside(int index) {
        return setAside.containsKey(index);
    }

    /** Why a weighing is set aside; empty when it is not. */
    public Optional<String> reason(int index) {
        return Optional.ofNullable(setAside.get(index));
    }

    /** Index of a weighing to the reason why it is set aside, in order of time. */
    public Map<Integer, String> setAside() {
        return setAside;
    }

    /** The same weighings with one more set aside. */
    public Weighings settingAside(int index, String reason) {
        TreeMap<Integer, String> next = new TreeMap<>(setAside);
        next.put(index, reason);
        return new Weighings(times, values, lines, Collections.unmodifiableMap(next));
    }

    /** The same weighings with one taken back. */
    public Weighings takingBack(int index) {
        TreeMap<Integer, String> next = new TreeMap<>(setAside);
        next.remove(index);
        return new Weighings(times, values, lines, Collections.unmodifiableMap(next));
    }

    /** The same weighings with one more, in its place by time, behind those of the same time. */
    public Weighings adding(double time, double value) {
        return rebuilt(-1, time, value, 0, null);
    }

    /** The same weighings with one corrected; it moves to its place by time and keeps its line and reason. */
    public Weighings correcting(int index, double time, double value) {
        boolean same = times[index] == time && values[index] == value;
        return same ? this : rebuilt(index, time, value, lines[index], setAside.get(index));
    }

    /** The same weighings without one. */
    public Weighings removing(int index) {
        return rebuilt(index, Double.NaN, Double.NaN, 0, null);
    }

    /** Without the one at an index, and with another one if its time is a number. */
    private Weighings rebuilt(int without, double time, double value, int line, String reason) {
        Builder builder = new Builder(times.length + 1);
        boolean pending = !Double.isNaN(time);
        for (int i = 0; i < times.length; i++) {
            if (i == without) {
                continue;
            }
            // a corrected weighing stays in front of others of its time that stood behind it
            boolean first = without >= 0 && i > without;
            boolean behind = first ? times[i] >= time : times[i] > time;
            if (pending && behind) {
                builder.put(time, value, line, reason);
                pending = false;
            }
            builder.put(times[i], values[i], lines[i], setAside.get(i));
        }
        if (pending) {
            builder.put(time, value, line, reason);
        }
        return builder.build();
    }

    /** Collects weighings, in order of time. One use. */
    public static final class Builder {
        private double[] times;
        private double[] values;
        private int[] lines;
        private int size;
        private final TreeMap<Integer, String> setAside = new TreeMap<>();

        public Builder() {
            this(64);
        }

        /** With room for a number of weighings; a good guess saves copies of a long log. */
        public Builder(int expected) {
            times = new double[Math.max(1, expected)];
            values = new double[times.length];
            lines = new int[times.length];
        }

        public Builder add(double time, double value, int line) {
            if (!Double.isFinite(time) || !Double.isFinite(value)) {
                throw new IllegalArgumentException("a weighing must be finite: " + time + " s, " + value);
            }
            if (size > 0 && time < times[size - 1]) {
                throw new IllegalArgumentException("weighings must come in order of time");
            }
            if (size == times.length) {
                int capacity = size * 2;
                times = Arrays.copyOf(times, capacity);
                values = Arrays.copyOf(values, capacity);
                lines = Arrays.copyOf(lines, capacity);
            }
            times[size] = time;
            values[size] = value;
            lines[size] = line;
            size++;
            return this;
        }

        public Builder addSetAside(double time, double value, int line, String reason) {
            put(time, value, line, reason);
            return this;
        }

        private void put(double time, double value, int line, String reason) {
            add(time, value, line);
            if (reason != null) {
                setAside.put(size - 1, reason);
            }
        }

        public int size() {
            return size;
        }

        public Weighings build() {
            if (size < times.length) {
                times = Arrays.copyOf(times, size);
                values = Arrays.copyOf(values, size);
                lines = Arrays.copyOf(lines, size);
            }
            return new Weighings(times, values, lines, Collections.unmodifiableMap(setAside));
        }
    }
}
