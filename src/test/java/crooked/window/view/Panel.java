package crooked.window.view;

import crooked.command.Line;

/** Breaks the rules on purpose: the window knows the command. */
public final class Panel {

    public Object line() {
        return Line.window();
    }
}
