package soakline.session;

import soakline.session.BackgroundTasks.Outcome;
import soakline.session.BackgroundTasks.Task;
import soakline.session.BackgroundTasks.Work;

/**
 * One place for work of which only the newest matters, such as refits: a newer request cancels the older, whose result never
 * arrives even if it was ready. Used from one thread.
 */
public final class LatestTask {

    private final BackgroundTasks tasks;
    private Task running;
    private long newest;

    public LatestTask(BackgroundTasks tasks) {
        this.tasks = tasks;
    }

    /** Starts work in place of what runs now. */
    public <T> void start(Work<T> work, Outcome<T> outcome) {
        drop();
        long number = newest;
        Task task = tasks.start(work, new OnlyWhileNewest<>(number, outcome));
        if (newest == number) {
            running = task;
        }
    }

    /** Stops what runs, and tells its outcome. */
    public void cancel() {
        if (running != null) {
            Task task = running;
            running = null;
            task.cancel();
        }
    }

    /** Stops what runs without telling anyone: it has been overtaken. */
    public void drop() {
        newest++;
        cancel();
    }

    private final class OnlyWhileNewest<T> implements Outcome<T> {
        private final long number;
        private final Outcome<T> outcome;

        OnlyWhileNewest(long number, Outcome<T> outcome) {
            this.number = number;
            this.outcome = outcome;
        }

        @Override
        public void progress(double share) {
            if (number == newest) {
                outcome.progress(share);
            }
        }

        @Override
        public void done(T result) {
            if (number == newest) {
                running = null;
                outcome.done(result);
            }
        }

        @Override
        public void failed(Exception reason) {
            if (number == newest) {
                running = null;
                outcome.failed(reason);
            }
        }

        @Override
        public void cancelled() {
            if (number == newest) {
                running = null;
                outcome.cancelled();
            }
        }
    }
}
