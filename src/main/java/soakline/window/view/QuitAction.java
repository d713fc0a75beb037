package soakline.window.view;

import java.awt.Toolkit;
import java.awt.event.ActionEvent;
import java.awt.event.KeyEvent;
import javax.swing.AbstractAction;
import javax.swing.KeyStroke;

/** Closes the window. */
final class QuitAction extends AbstractAction {

    private static final long serialVersionUID = 1L;

    private final transient Runnable close;

    QuitAction(Runnable close) {
        super("Quit");
        this.close = close;
        putValue(MNEMONIC_KEY, KeyEvent.VK_Q);
        putValue(
                ACCELERATOR_KEY,
                KeyStroke.getKeyStroke(
                        KeyEvent.VK_Q, Toolkit.getDefaultToolkit().getMenuShortcutKeyMaskEx()));
    }

    @Override
    public void actionPerformed(ActionEvent event) {
        close.run();
    }
}
