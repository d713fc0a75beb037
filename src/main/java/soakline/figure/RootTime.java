package soakline.figure;

import soakline.quantity.Unit;

/** The √t axis: the unit that suits a test's length, and times in it. */
record RootTime(Unit unit) {

    private static final double LONGEST_IN_SECONDS = 200;
    private static final double LONGEST_IN_MINUTES = 3 * 3600.0;
    private static final double LONGEST_IN_HOURS = 20 * 86_400.0;

    static RootTime forSpan(double seconds) {
        if (seconds <= LONGEST_IN_SECONDS) {
            return new RootTime(Unit.SECOND);
        }
        if (seconds <= LONGEST_IN_MINUTES) {
            return new RootTime(Unit.MINUTE);
        }
        return new RootTime(seconds <= LONGEST_IN_HOURS ? Unit.HOUR : Unit.DAY);
    }

    /** √t in the root of the unit; a weighing before exposure is drawn at zero, where it counts as start content. */
    double of(double seconds) {
        return Math.sqrt(Math.max(0, unit.fromSi(seconds)));
    }

    /** The time in the unit at a place on the axis. */
    double time(double root) {
        return root * root;
    }

    /** Seconds at a place on the axis. */
    double seconds(double root) {
        return unit.toSi(time(root));
    }

    String label() {
        return "√t [√" + unit.symbol() + "]";
    }

    String timeLabel() {
        return "t [" + unit.symbol() + "]";
    }
}
