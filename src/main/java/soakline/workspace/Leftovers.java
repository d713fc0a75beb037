package soakline.workspace;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.Duration;
import java.time.Instant;
import java.util.UUID;

/** Temporary files of saves that were cut off, as by a power failure: told from those of living saves by a lock and by age. */
final class Leftovers {

    private static final String PREFIX = ".soakline-";
    private static final String SUFFIX = ".tmp";

    /** A save holds its lock until a moment before its file gets its real name. */
    private static final Duration OLD = Duration.ofMinutes(1);

    /** In the names of this process, which must not touch its own files: to close one would release the lock of the other. */
    private static final String PROCESS = UUID.randomUUID().toString();

    private Leftovers() {}

    /** A name for a temporary file; short, whatever the length of the target's own name. */
    static String newName() {
        return PREFIX + PROCESS + "-" + UUID.randomUUID() + SUFFIX;
    }

    /** Locks a temporary file as long as its channel is open, where the file system can. */
    static void markAsLiving(FileChannel channel) {
        try {
            channel.tryLock();
        } catch (IOException e) {
            // then its age alone protects it
        }
    }

    /** Removes what is left of dead saves. What cannot be removed stays: this is no reason not to save. */
    static void remove(Path folder) {
        try (DirectoryStream<Path> files = Files.newDirectoryStream(folder, PREFIX + "*" + SUFFIX)) {
            for (Path file : files) {
                boolean own = file.getFileName().toString().startsWith(PREFIX + PROCESS);
                if (!own && isOld(file) && isUnlocked(file)) {
                    Files.deleteIfExists(file);
                }
            }
        } catch (IOException | RuntimeException e) {
            // the next save tries again
        }
    }

    private static boolean isOld(Path file) throws IOException {
        return Files.getLastModifiedTime(file)
                .toInstant()
                .isBefore(Instant.now().minus(OLD));
    }

    private static boolean isUnlocked(Path file) {
        try (FileChannel channel = FileChannel.open(file, StandardOpenOption.WRITE)) {
            return channel.tryLock() != null;
        } catch (IOException | RuntimeException e) {
            return false;
        }
    }
}
