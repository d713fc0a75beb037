package soakline.session;

import java.nio.file.Path;
import java.util.Optional;
import java.util.function.UnaryOperator;
import soakline.workspace.Workspace;

/**
 * What is open in a window: the workspace with its history, the file it came from, and whether it holds unsaved edits. Edits,
 * undo and redo come from one thread; the rest may be asked, and a save may end, on any.
 */
public final class Document {

    /**
     * The state of the file on the disk, as far as this document knows.
     *
     * @param inPlace whether to write the workspace over the file loses nothing of it
     * @param saved what the file holds; {@link Workspace#EMPTY} when it holds nothing of this
     */
    private record Saved(Optional<Path> file, String name, String digest, boolean inPlace, Workspace saved) {}

    private final History<Workspace> history;
    private volatile Saved state;

    /**
     * A document that is not to be saved in place: its file, if it has one, is not of the program's own form.
     *
     * @param file where it was read from; empty for a sample run or a recovered one without a file
     * @param name the file's name, for titles and reports
     * @param digest SHA-256 of the file as it was read, in hex; empty when it came from no file
     */
    public Document(Optional<Path> file, String name, String digest, Workspace workspace) {
        this(file, name, digest, workspace, false);
    }

    /**
     * A document as it was read.
     *
     * @param inPlace whether nothing of the file is lost by saving over it; see {@link soakline.intake.RunFile#ownForm()}
     */
    public Document(Optional<Path> file, String name, String digest, Workspace workspace, boolean inPlace) {
        this(new Saved(file, name, digest, inPlace, workspace), workspace);
    }

    private Document(Saved state, Workspace workspace) {
        this.history = new History<>(workspace);
        this.state = state;
    }

    /** A document of which no file holds the edits. */
    static Document unsaved(Optional<Path> file, String name, String digest, Workspace workspace, boolean inPlace) {
        return new Document(new Saved(file, name, digest, inPlace, Workspace.EMPTY), workspace);
    }

    /** Where it was read from or last saved to. */
    public Optional<Path> file() {
        return state.file();
    }

    public String name() {
        return state.name();
    }

    /** SHA-256 of the file as it was read or last saved, in lower-case hex; empty when there is none. */
    public String digest() {
        return state.digest();
    }

    /**
     * Whether a save may go over the file without asking. Not so where there is no file, and for a file from elsewhere, of which
     * something would be lost: there a save asks for another name.
     */
    public boolean canSaveInPlace() {
        return state.file().isPresent() && state.inPlace();
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
        return !state.saved().equals(history.now());
    }

    /**
     * Says that its file holds this workspace: edits made meanwhile stay unsaved. {@link SaveFile} says so itself, and where the
     * file is.
     */
    public void saved(Workspace written) {
        Saved now = state;
        state = new Saved(now.file(), now.name(), now.digest(), now.inPlace(), written);
    }

    /** Called when a save has ended well: the document now belongs to that file. */
    void saved(Path file, String digest, Workspace written) {
        Path name = file.getFileName();
        state = new Saved(
                Optional.of(file.toAbsolutePath()),
                name == null ? file.toString() : name.toString(),
                digest,
                true,
                written);
    }
}
