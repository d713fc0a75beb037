package soakline.window.view;

import java.util.UUID;
import java.util.concurrent.TimeUnit;
import java.util.function.Predicate;
import java.util.prefs.BackingStoreException;
import java.util.prefs.Preferences;
import javax.swing.RepaintManager;
import org.assertj.swing.core.BasicRobot;
import org.assertj.swing.core.Robot;
import org.assertj.swing.edt.GuiActionRunner;
import org.assertj.swing.fixture.FrameFixture;
import org.assertj.swing.timing.Condition;
import org.assertj.swing.timing.Pause;
import org.assertj.swing.timing.Timeout;
import soakline.window.present.CouponService;
import soakline.window.present.InventedService;
import soakline.window.present.WindowState;

/** A window on the display, with preferences of its own and a guard on the event thread. */
final class OpenWindow implements AutoCloseable {

    private final Preferences node = Preferences.userRoot().node("soakline-test-" + UUID.randomUUID());
    private final EventThreadGuard guard = new EventThreadGuard();
    private final Robot robot;
    private final FrameFixture frame;
    private final MainWindow window;

    OpenWindow(Appearance appearance) {
        this(appearance, new InventedService());
    }

    OpenWindow(Appearance appearance, CouponService service) {
        robot = BasicRobot.robotWithNewAwtHierarchy();
        RepaintManager.setCurrentManager(guard);
        window = GuiActionRunner.execute(() -> {
            Look.install(appearance);
            WindowPreferences preferences = new WindowPreferences(node);
            preferences.setAppearance(appearance);
            MainWindow made = new MainWindow(service, new SwingTasks(), preferences);
            made.open();
            return made;
        });
        frame = new FrameFixture(robot, window.frame());
    }

    FrameFixture frame() {
        return frame;
    }

    MainWindow window() {
        return window;
    }

    WindowPreferences preferences() {
        return new WindowPreferences(node);
    }

    WindowState state() {
        return GuiActionRunner.execute(() -> window.presenter().state());
    }

    /** Waits until the window shows content of a kind and no work goes on. */
    void waitFor(Class<? extends WindowState.Content> kind) {
        waitFor(kind, state -> true);
    }

    /** Waits, as above, until the state is also one that is wanted. */
    void waitFor(Class<? extends WindowState.Content> kind, Predicate<WindowState> wanted) {
        Pause.pause(
                new Condition(kind.getSimpleName()) {
                    @Override
                    public boolean test() {
                        WindowState state = state();
                        return kind.isInstance(state.content())
                                && state.waiting().isEmpty()
                                && wanted.test(state);
                    }
                },
                Timeout.timeout(20, TimeUnit.SECONDS));
        robot.waitForIdle();
    }

    void waitForMessage() {
        Pause.pause(
                new Condition("message") {
                    @Override
                    public boolean test() {
                        return state().message().isPresent();
                    }
                },
                Timeout.timeout(20, TimeUnit.SECONDS));
        robot.waitForIdle();
    }

    @Override
    public void close() throws BackingStoreException {
        frame.cleanUp();
        RepaintManager.setCurrentManager(null);
        node.removeNode();
        guard.verify();
    }
}
