package soakline.window.view;

import java.awt.Component;
import java.awt.Toolkit;
import java.awt.event.ActionEvent;
import java.awt.event.KeyEvent;
import java.io.File;
import java.nio.file.Path;
import java.util.function.Consumer;
import javax.swing.AbstractAction;
import javax.swing.JFileChooser;
import javax.swing.KeyStroke;
import javax.swing.filechooser.FileNameExtensionFilter;

/** Lets the user choose a run file. */
final class OpenAction extends AbstractAction {

    private static final long serialVersionUID = 1L;

    private final transient Component parent;
    private final transient WindowPreferences preferences;
    private final transient Consumer<Path> open;

    OpenAction(Component parent, WindowPreferences preferences, Consumer<Path> open) {
        super("Open…");
        this.parent = parent;
        this.preferences = preferences;
        this.open = open;
        putValue(SHORT_DESCRIPTION, "Open a run file (Ctrl+O), or drop one on the window");
        putValue(MNEMONIC_KEY, KeyEvent.VK_O);
        putValue(
                ACCELERATOR_KEY,
                KeyStroke.getKeyStroke(
                        KeyEvent.VK_O, Toolkit.getDefaultToolkit().getMenuShortcutKeyMaskEx()));
    }

    @Override
    public void actionPerformed(ActionEvent event) {
        JFileChooser chooser = new JFileChooser();
        chooser.setName("open-chooser");
        chooser.setDialogTitle("Open a run file");
        chooser.setFileFilter(
                new FileNameExtensionFilter("Run files (CSV, text, spreadsheet)", "csv", "txt", "tsv", "dat", "xlsx"));
        preferences.folder().map(Path::toFile).filter(File::isDirectory).ifPresent(chooser::setCurrentDirectory);
        if (chooser.showOpenDialog(parent) == JFileChooser.APPROVE_OPTION) {
            Path file = chooser.getSelectedFile().toPath();
            if (file.getParent() != null) {
                preferences.setFolder(file.getParent());
            }
            open.accept(file);
        }
    }
}
