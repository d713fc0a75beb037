package soakline.session;

/**
 * Runs work away from the caller's thread and hands what became of it back there. The window's implementation hands back to the
 * event thread; the tests' runs everything at once on one thread.
 */
public interface BackgroundTasks {

    /** Starts work. Every call of {@code outcome} comes on the caller's thread, and exactly one of them ends it. */
    <T> Task start(Work<T> work, Outcome<T> outcome);

    /** What to do in the background. */
    @FunctionalInterface
    interface Work<T> {
        /**
         * @throws Exception handed to {@link Outcome#failed}
         */
        T run(Progress progress) throws Exception;
    }

    /** How far the work is, told by the work; and whether it should stop, asked by it. */
    interface Progress {

        /** The share of the work that is done, from 0 to 1. */
        void at(double share);

        /** Whether the work should stop; what it returns then is not looked at. */
        boolean isCancelled();
    }

    /** Where the result goes. */
    interface Outcome<T> {

        default void progress(double share) {}

        void done(T result);

        void failed(Exception reason);

        default void cancelled() {}
    }

    /** Work that was started. */
    interface Task {

        /** Asks the work to stop. Its outcome is then {@link Outcome#cancelled()}, at once. */
        void cancel();
    }
}
