package soakline.window.view;

import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.UnsupportedFlavorException;
import java.io.File;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Consumer;
import javax.swing.TransferHandler;

/** Takes files that are dropped on the window. */
final class FileDrop extends TransferHandler {

    private static final long serialVersionUID = 1L;

    private final transient Consumer<List<Path>> take;

    FileDrop(Consumer<List<Path>> take) {
        this.take = take;
    }

    @Override
    public boolean canImport(TransferSupport support) {
        return support.isDataFlavorSupported(DataFlavor.javaFileListFlavor);
    }

    @Override
    public boolean importData(TransferSupport support) {
        if (!canImport(support)) {
            return false;
        }
        try {
            List<?> files = (List<?>) support.getTransferable().getTransferData(DataFlavor.javaFileListFlavor);
            take.accept(files.stream().map(f -> ((File) f).toPath()).toList());
            return true;
        } catch (UnsupportedFlavorException | IOException e) {
            return false;
        }
    }
}
