package soakline.session;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.security.DigestOutputStream;
import java.security.MessageDigest;
import java.util.Locale;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.session.BackgroundTasks.Progress;
import soakline.workspace.OutputFile;
import soakline.workspace.RunFileText;
import soakline.workspace.Workspace;

/** Saves a document as a run file, whole or not at all. To be called in the background. */
public final class SaveFile {

    private static final String ENDING = ".csv";

    /** What may happen to a file that is already there. */
    public enum Existing {
        /** Only the document's own file is replaced, and only while it is what the document was read from or last saved to. */
        KEEP,
        /** The user has been asked, and agreed to replace whatever is there. */
        REPLACE
    }

    private SaveFile() {}

    /**
     * Saves what the document holds now. When this returns, the document belongs to the target and has, but for edits made
     * meanwhile, nothing unsaved; when it throws, the file and the document are as they were.
     *
     * @throws Fault saying why not: {@link Code#SAVE_FOREIGN}, {@link Code#SAVE_CHANGED}, {@link Code#SAVE_GONE} and
     *     {@link Code#SAVE_EXISTS} only with {@link Existing#KEEP}; {@link Code#OUTPUT_TYPE_UNKNOWN},
     *     {@link Code#OUTPUT_NOT_WRITABLE}, or what {@link RunFileText} cannot write
     * @throws java.util.concurrent.CancellationException when the progress says that it is cancelled
     */
    public static void save(Document document, Path target, Existing existing, Progress progress) {
        boolean own = isOwn(document, target);
        boolean ownForm = own && document.canSaveInPlace();
        if (!ownForm && !target.toString().toLowerCase(Locale.ROOT).endsWith(ENDING)) {
            throw Fault.of(Code.OUTPUT_TYPE_UNKNOWN, target.toString(), ENDING);
        }
        if (existing == Existing.KEEP) {
            requireFree(document, target, own);
        }
        Workspace workspace = document.workspace();
        MessageDigest sha256 = Digests.sha256();
        OutputFile.write(target, out -> {
            OutputStream digesting = new DigestOutputStream(out, sha256);
            RunFileText.write(workspace, digesting, share -> OpenFile.watch(share, progress));
        });
        document.saved(target, Digests.hex(sha256), workspace);
    }

    private static boolean isOwn(Document document, Path target) {
        if (document.file().isEmpty()) {
            return false;
        }
        Path file = document.file().get();
        try {
            return Files.isSameFile(file, target);
        } catch (IOException e) {
            // one of them is not there
            return file.toAbsolutePath()
                    .normalize()
                    .equals(target.toAbsolutePath().normalize());
        }
    }

    private static void requireFree(Document document, Path target, boolean own) {
        String name = target.toString();
        if (own && !document.canSaveInPlace()) {
            throw Fault.of(Code.SAVE_FOREIGN, name);
        }
        if (!own && Files.exists(target) && !Files.isDirectory(target)) {
            throw Fault.of(Code.SAVE_EXISTS, name);
        }
        if (own && Files.notExists(target)) {
            throw Fault.of(Code.SAVE_GONE, name);
        }
        if (own && !digest(target).equals(document.digest())) {
            throw Fault.of(Code.SAVE_CHANGED, name);
        }
    }

    private static String digest(Path file) {
        try {
            return Digests.of(file);
        } catch (NoSuchFileException e) {
            throw Fault.of(Code.SAVE_GONE, file.toString());
        } catch (IOException e) {
            throw Fault.of(Code.SAVE_UNKNOWN, file.toString());
        }
    }
}
