package soakline;

import java.util.Optional;
import soakline.window.view.SoaklineWindow;

/** Opens the window. Apart from {@link Main}, so that a command loads nothing of a window. */
final class WindowStarter {

    private WindowStarter() {}

    static void start() {
        SoaklineWindow.open(new FileCoupons(), Optional.empty());
    }
}
