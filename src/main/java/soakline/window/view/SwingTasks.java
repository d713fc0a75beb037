package soakline.window.view;

import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.atomic.AtomicBoolean;
import javax.swing.SwingUtilities;
import soakline.session.BackgroundTasks;

/** Work on threads of its own, results on the event thread. */
final class SwingTasks implements BackgroundTasks {

    private final ExecutorService threads = Executors.newCachedThreadPool(work -> {
        Thread thread = new Thread(work, "soakline-work");
        thread.setDaemon(true);
        return thread;
    });

    @Override
    public <T> Task start(Work<T> work, Outcome<T> outcome) {
        Running<T> running = new Running<>(work, outcome);
        threads.execute(running);
        return running;
    }

    private static final class Running<T> implements Task, Progress, Runnable {
        private static final long TOLD_EVERY_NANOS = 50_000_000;

        private final Work<T> work;
        private final Outcome<T> outcome;
        private final AtomicBoolean cancelled = new AtomicBoolean();
        private long told = System.nanoTime();
        /** On the event thread only: one outcome is the last. */
        private boolean ended;

        Running(Work<T> work, Outcome<T> outcome) {
            this.work = work;
            this.outcome = outcome;
        }

        @Override
        public void run() {
            try {
                T result = work.run(this);
                end(() -> outcome.done(result));
            } catch (Exception e) {
                end(() -> outcome.failed(e));
            } catch (OutOfMemoryError | StackOverflowError e) {
                end(() -> outcome.failed(new IllegalStateException(e.toString(), e)));
            }
        }

        private void end(Runnable last) {
            SwingUtilities.invokeLater(() -> {
                if (!ended) {
                    ended = true;
                    last.run();
                }
            });
        }

        @Override
        public void cancel() {
            cancelled.set(true);
            if (!ended) {
                ended = true;
                outcome.cancelled();
            }
        }

        @Override
        public void at(double share) {
            long now = System.nanoTime();
            if (now - told >= TOLD_EVERY_NANOS) {
                told = now;
                SwingUtilities.invokeLater(() -> {
                    if (!ended) {
                        outcome.progress(share);
                    }
                });
            }
        }

        @Override
        public boolean isCancelled() {
            return cancelled.get();
        }
    }
}
