package soakline.session;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Optional;

/** Undo and redo as lists of whole values. Used from one thread. */
public final class History<T> {

    /** More steps than anybody goes back; a bound on what a long session holds. */
    private static final int MOST_STEPS = 200;

    private record Step<T>(T value, String act) {}

    /** Set from one thread; a background task that saves may read it. */
    private volatile T now;

    private final Deque<Step<T>> past = new ArrayDeque<>();
    private final Deque<Step<T>> future = new ArrayDeque<>();

    public History(T first) {
        now = first;
    }

    public T now() {
        return now;
    }

    /**
     * Goes on to another value.
     *
     * @param act what was done, in the words of a menu, such as {@code Set aside}
     */
    public void go(T next, String act) {
        past.push(new Step<>(now, act));
        if (past.size() > MOST_STEPS) {
            past.removeLast();
        }
        future.clear();
        now = next;
    }

    /** What {@link #undo()} would take back. */
    public Optional<String> undoable() {
        return Optional.ofNullable(past.peek()).map(Step::act);
    }

    /** What {@link #redo()} would do again. */
    public Optional<String> redoable() {
        return Optional.ofNullable(future.peek()).map(Step::act);
    }

    /** Takes back the last act, if there is one. */
    public void undo() {
        move(past, future);
    }

    /** Does again what was taken back, if there is something. */
    public void redo() {
        move(future, past);
    }

    private void move(Deque<Step<T>> from, Deque<Step<T>> to) {
        if (!from.isEmpty()) {
            Step<T> step = from.pop();
            to.push(new Step<>(now, step.act()));
            now = step.value();
        }
    }
}
