package soakline;

import java.awt.AWTError;
import java.awt.GraphicsEnvironment;
import java.awt.HeadlessException;

/** Whether there is a screen. Apart from {@link Main}, so that a command loads nothing of a window. */
final class Display {

    private Display() {}

    /** Asks for the screens themselves: a display may be named in the environment and not be there. */
    static boolean isThere() {
        try {
            return !GraphicsEnvironment.isHeadless()
                    && GraphicsEnvironment.getLocalGraphicsEnvironment().getScreenDevices().length > 0;
        } catch (HeadlessException | AWTError | LinkageError e) {
            return false;
        }
    }
}
