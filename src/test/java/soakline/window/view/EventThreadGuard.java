package soakline.window.view;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import javax.swing.JComponent;
import javax.swing.RepaintManager;
import javax.swing.SwingUtilities;

/** Notes every touch of a component from outside the event thread. */
final class EventThreadGuard extends RepaintManager {

    private final List<Throwable> touches = Collections.synchronizedList(new ArrayList<>());

    @Override
    public synchronized void addInvalidComponent(JComponent component) {
        check(component);
        super.addInvalidComponent(component);
    }

    @Override
    public void addDirtyRegion(JComponent component, int x, int y, int w, int h) {
        check(component);
        super.addDirtyRegion(component, x, y, w, h);
    }

    private void check(JComponent component) {
        if (!SwingUtilities.isEventDispatchThread()) {
            touches.add(new IllegalStateException(component.getClass().getName() + " was touched from thread "
                    + Thread.currentThread().getName()));
        }
    }

    /** Fails when there was such a touch. */
    void verify() {
        if (!touches.isEmpty()) {
            throw new AssertionError(touches.size() + " touches off the event thread", touches.get(0));
        }
    }
}
