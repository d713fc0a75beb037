package soakline.workspace;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.channels.Channels;
import java.nio.channels.FileChannel;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;
import soakline.problem.Code;
import soakline.problem.Fault;

/**
 * Writes a result file whole or not at all: to a temporary file in the same folder, which takes the place of the old file only
 * when it is complete and on the disk. Whatever goes wrong, the old file is as it was and nothing is left behind.
 */
public final class OutputFile {

    private static final int BUFFER = 1 << 16;

    private OutputFile() {}

    /** What goes into the file. */
    @FunctionalInterface
    public interface Content {
        void writeTo(OutputStream out) throws IOException;
    }

    /**
     * Looks whether a file could be written, before long work is done for it.
     *
     * @throws Fault {@link Code#OUTPUT_NOT_WRITABLE}
     */
    public static void requireWritable(Path target) {
        place(target);
    }

    /**
     * Writes a file, in place of an old one if there is one.
     *
     * @throws Fault {@link Code#OUTPUT_NOT_WRITABLE}, naming the file and the reason
     */
    public static void write(Path target, Content content) {
        Path place = place(target);
        Leftovers.remove(place.getParent());
        Path temporary = place.resolveSibling(Leftovers.newName());
        boolean done = false;
        try {
            fill(temporary, content);
            takeOverPermissions(place, temporary);
            Files.move(temporary, place, StandardCopyOption.ATOMIC_MOVE);
            done = true;
        } catch (IOException e) {
            throw fault(target, reason(e));
        } finally {
            if (!done) {
                remove(temporary);
            }
        }
    }

    private static void fill(Path temporary, Content content) throws IOException {
        try (FileChannel channel =
                FileChannel.open(temporary, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE)) {
            Leftovers.markAsLiving(channel);
            OutputStream out = new BufferedOutputStream(Channels.newOutputStream(channel), BUFFER);
            content.writeTo(out);
            out.flush();
            channel.force(true);
        }
    }

    /** A file that others may read, or may not, stays so. */
    private static void takeOverPermissions(Path old, Path temporary) throws IOException {
        if (Files.exists(old)) {
            PosixFileAttributeView from = Files.getFileAttributeView(old, PosixFileAttributeView.class);
            PosixFileAttributeView to = Files.getFileAttributeView(temporary, PosixFileAttributeView.class);
            if (from != null && to != null) {
                to.setPermissions(from.readAttributes().permissions());
            }
        }
    }

    /** Where the file really lies: a link is followed, not replaced. */
    private static Path place(Path target) {
        Path place = target.toAbsolutePath();
        try {
            if (Files.exists(place)) {
                place = place.toRealPath();
            } else if (Files.isSymbolicLink(place)) {
                throw fault(target, "it is a link to a file that does not exist");
            }
        } catch (IOException e) {
            throw fault(target, reason(e));
        }
        Path folder = place.getParent();
        if (folder == null || Files.isDirectory(place)) {
            throw fault(target, "it is a folder");
        }
        if (!Files.isDirectory(folder)) {
            throw fault(target, Files.exists(folder) ? folder + " is not a folder" : "there is no folder " + folder);
        }
        if (!Files.isWritable(folder)) {
            throw fault(target, "nothing may be written into the folder " + folder);
        }
        if (Files.exists(place) && !Files.isRegularFile(place)) {
            throw fault(target, "it is a device and not a file");
        }
        if (Files.exists(place) && !Files.isWritable(place)) {
            throw fault(target, "the file that is there is protected from writing");
        }
        return place;
    }

    private static String reason(IOException e) {
        if (e instanceof NoSuchFileException) {
            return "the folder is no longer there";
        }
        if (e instanceof AccessDeniedException) {
            return "the system does not allow it";
        }
        String message = e instanceof FileSystemException f ? f.getReason() : e.getMessage();
        if (message == null || message.isBlank()) {
            return "the system gives no reason";
        }
        return message.contains("No space left") ? "the disk is full" : message;
    }

    private static void remove(Path temporary) {
        try {
            Files.deleteIfExists(temporary);
        } catch (IOException e) {
            // the fault that led here is already on its way to the user
            temporary.toFile().deleteOnExit();
        }
    }

    private static Fault fault(Path target, String reason) {
        return Fault.of(Code.OUTPUT_NOT_WRITABLE, target.toString(), reason);
    }
}
