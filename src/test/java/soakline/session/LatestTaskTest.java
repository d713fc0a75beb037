package soakline.session;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import soakline.session.BackgroundTasks.Outcome;

class LatestTaskTest {

    private final HeldTasks tasks = HeldTasks.onDemand();
    private final LatestTask latest = new LatestTask(tasks);
    private final List<String> heard = new ArrayList<>();

    @Test
    void onlyTheNewestResultArrives() {
        latest.start(progress -> "old", listener());
        latest.start(progress -> "new", listener());
        tasks.runNext();
        tasks.runNext();

        assertThat(heard).containsExactly("new");
    }

    @Test
    void overtakenWorkIsAskedToStop() {
        List<Boolean> asked = new ArrayList<>();
        latest.start(progress -> asked.add(progress.isCancelled()), silent());
        latest.start(progress -> asked.add(progress.isCancelled()), silent());
        tasks.runNext();
        tasks.runNext();

        assertThat(asked).containsExactly(true, false);
    }

    @Test
    void cancelIsToldOnce() {
        latest.start(progress -> "late", listener());
        latest.cancel();
        latest.cancel();
        tasks.runNext();

        assertThat(heard).containsExactly("cancelled");
    }

    @Test
    void failureAndProgressArrive() {
        latest.start(
                progress -> {
                    progress.at(0.5);
                    throw new IllegalStateException("broken");
                },
                listener());
        tasks.runNext();

        assertThat(heard).containsExactly("0.5", "broken");
    }

    private Outcome<String> listener() {
        return new Outcome<>() {
            @Override
            public void progress(double share) {
                heard.add(Double.toString(share));
            }

            @Override
            public void done(String result) {
                heard.add(result);
            }

            @Override
            public void failed(Exception reason) {
                heard.add(reason.getMessage());
            }

            @Override
            public void cancelled() {
                heard.add("cancelled");
            }
        };
    }

    private static Outcome<Boolean> silent() {
        return new Outcome<>() {
            @Override
            public void done(Boolean result) {}

            @Override
            public void failed(Exception reason) {}
        };
    }
}
