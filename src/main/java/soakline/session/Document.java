package soakline.session;

import java.nio.file.Path;
import java.util.Optional;
import java.util.function.UnaryOperator;
import soakline.workspace.Workspace;

/**
 * What is open in a window: the workspace with its history, the file it came from, and whether it holds unsaved edits. Used from
 * one thread.
 */
public final class Document {

    private final Optional<Path> file;
    private final String name;
    private final String digest;
    private final History<Workspace> history;
    private Workspace saved;

    /**
     * @param file where it was read from and is saved to; empty for a sample run or a recovered one without a file
     * @param name the file's name, for titles and reports
     * @param digest SHA-256 of the file as it was read, in hex; empty when it came from no file
     */
    public Document(Optional<Path> file, String name, String digest, Workspace workspace) {
        this.file = file;
        this.name = name;
        this.digest = digest;
        this.history = new History<>(workspace);
        this.saved = workspace;
    }

    public Optional<Path> file() {
        return file;
    }

    public String name() {
        return name;
    }

    public String digest() {
        return digest;
    }

    public Workspace workspace() {
        return history.now();
    }

    /** Makes an edit; one that changes nothing leaves no step to undo. */
    public void edit(String act, UnaryOperator<Workspace> edit) {
        Workspace next = edit.apply(history.now());
        if (!next.equals(history.now())) {
            history.go(next, act);
        }
    }

    public History<Workspace> history() {
        return history;
    }

    /** Whether there are edits that no file holds. */
    public boolean isUnsaved() {
        return !saved.equals(history.now());
    }

    /** Called when a save has ended well, with what was saved: edits made meanwhile stay unsaved. */
    public void saved(Workspace written) {
        saved = written;
    }
}
