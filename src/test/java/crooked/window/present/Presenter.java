package crooked.window.present;

import crooked.window.view.Panel;
import javax.swing.JLabel;

/** Breaks the rules on purpose: a presenter that knows components and its own view. */
public final class Presenter {

    private Presenter() {}

    public static Object label() {
        return new JLabel(new Panel().getClass().getName());
    }
}
