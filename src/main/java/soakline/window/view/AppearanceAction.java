package soakline.window.view;

import java.awt.event.ActionEvent;
import java.util.function.Consumer;
import javax.swing.AbstractAction;

/** Switches to light or to dark. */
final class AppearanceAction extends AbstractAction {

    private static final long serialVersionUID = 1L;

    private final Appearance appearance;
    private final transient Consumer<Appearance> change;

    AppearanceAction(Appearance appearance, Consumer<Appearance> change) {
        super(appearance == Appearance.DARK ? "Dark" : "Light");
        this.appearance = appearance;
        this.change = change;
        putValue(MNEMONIC_KEY, (int) (appearance == Appearance.DARK ? 'D' : 'L'));
        putValue(SHORT_DESCRIPTION, appearance == Appearance.DARK ? "Dark window" : "Light window");
    }

    @Override
    public void actionPerformed(ActionEvent event) {
        change.accept(appearance);
    }
}
