package soakline.window.view;

import static org.assertj.core.api.Assertions.fail;
import static org.junit.jupiter.api.Assumptions.abort;

import java.awt.AWTError;
import java.awt.GraphicsEnvironment;

/** Whether there is a display to test the window on. */
final class Display {

    private Display() {}

    /** Skips the test when there is none; fails it where a display is required. */
    static void require() {
        if (!isThere()) {
            if (Boolean.getBoolean("soakline.display.required")) {
                fail("a display is required, and there is none");
            }
            abort("there is no display");
        }
    }

    private static boolean isThere() {
        try {
            return !GraphicsEnvironment.isHeadless()
                    && GraphicsEnvironment.getLocalGraphicsEnvironment().getScreenDevices().length > 0;
        } catch (AWTError | NoClassDefFoundError e) {
            return false;
        }
    }
}
