package soakline.session;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class HistoryTest {

    @Test
    void goesBackAndForthAndForgetsTheFutureAtANewAct() {
        History<Integer> history = new History<>(0);
        history.undo();
        history.go(1, "one");
        history.go(2, "two");
        history.undo();

        assertThat(history.now()).isEqualTo(1);
        assertThat(history.undoable()).contains("one");
        assertThat(history.redoable()).contains("two");

        history.redo();
        assertThat(history.now()).isEqualTo(2);
        assertThat(history.redoable()).isEmpty();

        history.undo();
        history.go(3, "three");
        assertThat(history.redoable()).isEmpty();
        history.undo();
        history.undo();
        history.undo();
        assertThat(history.now()).isZero();
    }

    @Test
    void holdsAsMuchAsItSays() {
        History<Integer> history = new History<>(0);
        for (int i = 1; i <= 1000; i++) {
            history.go(i, "step");
        }
        int steps = 0;
        while (history.undoable().isPresent()) {
            history.undo();
            steps++;
        }
        assertThat(steps).isEqualTo(200);
        assertThat(history.now()).isEqualTo(800);
    }
}
