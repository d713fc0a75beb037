package soakline.session;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.DirectoryIteratorException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFilePermissions;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.UUID;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Finding;
import soakline.wording.Wording;
import soakline.workspace.OutputFile;
import soakline.workspace.Workspace;

/**
 * Keeps a copy of an open document while it is unsaved, and finds the copies of documents whose window died. One for each open
 * document. All of it reads or writes files, so it belongs in the background; it may be called from any thread.
 *
 * <p>Beside each copy lies an empty file that its owner holds locked as long as it lives, so that no other process takes the copy
 * for a dead one. The copies of this process are known by their names, as to open and close a file would release its lock.
 */
public final class Recovery {

    private static final String COPY = ".csv";
    private static final String LOCK = ".lock";
    private static final String PROCESS = UUID.randomUUID().toString();
    private static final int TRIES = 5;

    private final Path folder;
    private Optional<Owned> owned = Optional.empty();
    private Workspace kept = Workspace.EMPTY;
    private boolean failing;
    private boolean ended;

    /** A place for a copy, and the lock that makes it ours. */
    private record Owned(Path copy, Path lock, FileChannel channel) {}

    /**
     * A copy whose owner is dead.
     *
     * @param original the file that its document was read from or saved to; empty when there was none or the copy does not say
     * @param name the document's name, or the copy's own where it does not say
     * @param kept when it was written last
     */
    public record Found(Path copy, Optional<Path> original, String name, Instant kept) {}

    /**
     * @param folder of the copies, made when it is needed; see {@link UserFolders#recovery()}
     */
    public Recovery(Path folder) {
        this.folder = folder;
    }

    /**
     * Writes a copy of what the document holds now, in place of the one before. A document that has nothing unsaved needs no copy,
     * and has none afterwards; so a call that comes late, after a save, does no harm.
     *
     * @throws Fault {@link Code#RECOVERY_NOT_KEPT} the first time that it fails; further failures are silent until it went well
     */
    public synchronized void keep(Document document) {
        if (ended) {
            return;
        }
        if (!document.isUnsaved()) {
            discard();
            return;
        }
        Workspace workspace = document.workspace();
        if (workspace.equals(kept)) {
            return;
        }
        try {
            RecoveryCopy.write(own().copy(), document, workspace, Instant.now());
            kept = workspace;
            failing = false;
        } catch (Fault fault) {
            if (!failing) {
                failing = true;
                throw Fault.of(Code.RECOVERY_NOT_KEPT, reason(fault.finding()));
            }
        }
    }

    private static String reason(Finding finding) {
        return finding.code() == Code.OUTPUT_NOT_WRITABLE
                ? finding.values().get(0) + ": " + finding.values().get(1)
                : Wording.sentence(finding);
    }

    /** Removes the copy, if there is one: the document was saved. */
    public synchronized void discard() {
        owned.ifPresent(own -> {
            remove(own.copy());
            close(own.channel());
            remove(own.lock());
        });
        owned = Optional.empty();
        kept = Workspace.EMPTY;
    }

    /** The user is done with the document, saved or not: removes the copy, and none is kept any more. */
    public synchronized void end() {
        discard();
        ended = true;
    }

    /** The copies whose owners are dead, the newest first; none where the folder cannot be read. */
    public List<Found> found() {
        List<Found> found = new ArrayList<>();
        try (DirectoryStream<Path> files = Files.newDirectoryStream(folder, "*{" + COPY + "," + LOCK + "}")) {
            for (Path file : files) {
                String name = file.getFileName().toString();
                if (name.startsWith(PROCESS)) {
                    continue;
                }
                if (name.endsWith(COPY)) {
                    look(file).ifPresent(found::add);
                } else if (!Files.exists(withEnding(file, COPY)) && isFree(file)) {
                    remove(file);
                }
            }
        } catch (IOException | DirectoryIteratorException e) {
            // no folder yet, or none that may be read: nothing to recover, and no reason not to start
        }
        found.sort(Comparator.comparing(Found::kept).reversed());
        return found;
    }

    private static Optional<Found> look(Path copy) {
        if (!isFree(withEnding(copy, LOCK))) {
            return Optional.empty();
        }
        Optional<RecoveryCopy.Head> head = RecoveryCopy.head(copy);
        if (head.isPresent()) {
            RecoveryCopy.Head h = head.get();
            return Optional.of(new Found(copy, h.original(), h.name(), h.kept()));
        }
        // damaged: shown all the same, and said when it is to be recovered
        return Optional.of(new Found(copy, Optional.empty(), copy.getFileName().toString(), modified(copy)));
    }

    private static Instant modified(Path file) {
        try {
            return Files.getLastModifiedTime(file).toInstant();
        } catch (IOException e) {
            return Instant.EPOCH;
        }
    }

    /**
     * Takes over a copy: its document, with nothing saved yet. The copy stays until the document is saved or discarded, and is
     * now this one's own.
     *
     * @throws Fault {@link Code#RECOVERY_TAKEN}; {@link Code#RECOVERY_DAMAGED}, and then the copy stays as it is
     * @throws IllegalStateException when there is a copy already, of another document
     */
    public synchronized Document recover(Found found) {
        if (owned.isPresent()) {
            throw new IllegalStateException("one copy is kept already");
        }
        Path lock = withEnding(found.copy(), LOCK);
        try (FileChannel channel = take(found)) {
            Document document = RecoveryCopy.read(found.copy());
            Files.move(found.copy(), own().copy(), StandardCopyOption.ATOMIC_MOVE);
            kept = document.workspace();
            close(channel);
            remove(lock);
            return document;
        } catch (IOException e) {
            throw Fault.of(Code.RECOVERY_TAKEN, found.copy().toString());
        }
    }

    /**
     * Removes a copy that nobody wants.
     *
     * @throws Fault {@link Code#RECOVERY_TAKEN}
     */
    public void discard(Found found) {
        try (FileChannel channel = take(found)) {
            Files.delete(found.copy());
            close(channel);
        } catch (IOException e) {
            throw Fault.of(Code.RECOVERY_TAKEN, found.copy().toString());
        }
        remove(withEnding(found.copy(), LOCK));
    }

    /** Locks a dead owner's copy. */
    private static FileChannel take(Found found) throws IOException {
        Fault taken = Fault.of(Code.RECOVERY_TAKEN, found.copy().toString());
        if (found.copy().getFileName().toString().startsWith(PROCESS) || !Files.exists(found.copy())) {
            throw taken;
        }
        FileChannel channel =
                FileChannel.open(withEnding(found.copy(), LOCK), StandardOpenOption.CREATE, StandardOpenOption.WRITE);
        if (!isLocked(channel)) {
            channel.close();
            throw taken;
        }
        return channel;
    }

    /** The place of this copy, made at the first need. */
    private Owned own() {
        if (owned.isEmpty()) {
            makeFolder();
            OutputFile.requireWritable(folder.resolve("copy"));
            owned = Optional.of(newPlace());
        }
        return owned.get();
    }

    private void makeFolder() {
        try {
            boolean posix = folder.getFileSystem().supportedFileAttributeViews().contains("posix");
            if (posix) {
                // what is unsaved is nobody else's business
                Files.createDirectories(
                        folder, PosixFilePermissions.asFileAttribute(PosixFilePermissions.fromString("rwx------")));
            } else {
                Files.createDirectories(folder);
            }
        } catch (IOException e) {
            // what is wrong with it is said when it is to be written into
        }
    }

    private Owned newPlace() {
        for (int k = 0; k < TRIES; k++) {
            String name = PROCESS + "-" + UUID.randomUUID();
            Path lock = folder.resolve(name + LOCK);
            try {
                FileChannel channel = FileChannel.open(lock, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE);
                // another process may just have taken the new file for a dead one's and removed it
                if (isLocked(channel) && Files.exists(lock)) {
                    return new Owned(folder.resolve(name + COPY), lock, channel);
                }
                channel.close();
            } catch (IOException e) {
                throw Fault.of(Code.OUTPUT_NOT_WRITABLE, lock.toString(), "no file can be made and locked there");
            }
        }
        throw Fault.of(Code.OUTPUT_NOT_WRITABLE, folder.toString(), "files that are made there are not left alone");
    }

    /** Whether nobody holds a lock file. */
    private static boolean isFree(Path lock) {
        if (Files.notExists(lock)) {
            return true;
        }
        try (FileChannel channel = FileChannel.open(lock, StandardOpenOption.WRITE)) {
            return isLocked(channel);
        } catch (IOException e) {
            // not to be opened, so it cannot be said: then it is left alone
            return false;
        }
    }

    private static boolean isLocked(FileChannel channel) throws IOException {
        try {
            return channel.tryLock() != null;
        } catch (OverlappingFileLockException e) {
            return false;
        }
    }

    private static Path withEnding(Path file, String ending) {
        String name = file.getFileName().toString();
        return file.resolveSibling(name.substring(0, name.lastIndexOf('.')) + ending);
    }

    private static void close(FileChannel channel) {
        try {
            channel.close();
        } catch (IOException e) {
            // the end of the process closes it
        }
    }

    private static void remove(Path file) {
        try {
            Files.deleteIfExists(file);
        } catch (IOException e) {
            // it will be found again
        }
    }
}
