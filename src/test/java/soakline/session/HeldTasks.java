package soakline.session;

import java.util.ArrayDeque;
import java.util.Deque;

/** A double that holds work until it is told to run it, on the caller's thread. */
public final class HeldTasks implements BackgroundTasks {

    private final Deque<Held<?>> held = new ArrayDeque<>();
    private final boolean atOnce;

    private HeldTasks(boolean atOnce) {
        this.atOnce = atOnce;
    }

    /** Runs work as soon as it is started. */
    public static HeldTasks atOnce() {
        return new HeldTasks(true);
    }

    /** Runs work when {@link #runNext()} says so. */
    public static HeldTasks onDemand() {
        return new HeldTasks(false);
    }

    @Override
    public <T> Task start(Work<T> work, Outcome<T> outcome) {
        Held<T> task = new Held<>(work, outcome);
        held.add(task);
        if (atOnce) {
            runNext();
        }
        return task;
    }

    public int waiting() {
        return held.size();
    }

    /** Runs the oldest work that is waiting, even if it was cancelled meanwhile. */
    public void runNext() {
        held.remove().run();
    }

    private static final class Held<T> implements Task, Progress {
        private final Work<T> work;
        private final Outcome<T> outcome;
        private boolean ended;
        private boolean cancelled;

        Held(Work<T> work, Outcome<T> outcome) {
            this.work = work;
            this.outcome = outcome;
        }

        void run() {
            try {
                T result = work.run(this);
                if (!ended) {
                    ended = true;
                    outcome.done(result);
                }
            } catch (Exception e) {
                if (!ended) {
                    ended = true;
                    outcome.failed(e);
                }
            }
        }

        @Override
        public void cancel() {
            cancelled = true;
            if (!ended) {
                ended = true;
                outcome.cancelled();
            }
        }

        @Override
        public void at(double share) {
            if (!ended) {
                outcome.progress(share);
            }
        }

        @Override
        public boolean isCancelled() {
            return cancelled;
        }
    }
}
