package crooked.command;

import crooked.window.view.Panel;

/** Breaks the rules on purpose: the command knows the window. */
public final class Line {

    private Line() {}

    public static Object window() {
        return new Panel();
    }
}
