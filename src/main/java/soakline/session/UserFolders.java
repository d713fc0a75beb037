package soakline.session;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/** Where a program keeps what belongs to a user and to no document. */
public final class UserFolders {

    private static final String PROGRAM = "soakline";
    private static final String RECOVERY = "recovery";

    private UserFolders() {}

    /**
     * The folder of recovery copies; it may not be there yet.
     *
     * <p>Sources: XDG Base Directory Specification 0.8, {@code $XDG_STATE_HOME}, which counts only when absolute; Windows known
     * folder LocalAppData; Apple, File System Programming Guide, Application Support.
     */
    public static Path recovery() {
        return recovery(System.getProperty("os.name"), System.getenv(), Path.of(System.getProperty("user.home")));
    }

    static Path recovery(String system, Map<String, String> environment, Path home) {
        String name = system.toLowerCase(Locale.ROOT);
        if (name.startsWith("windows")) {
            return absolute(environment.get("LOCALAPPDATA"))
                    .orElse(home.resolve("AppData").resolve("Local"))
                    .resolve("Soakline")
                    .resolve(RECOVERY);
        }
        if (name.startsWith("mac")) {
            return home.resolve("Library")
                    .resolve("Application Support")
                    .resolve("Soakline")
                    .resolve(RECOVERY);
        }
        return absolute(environment.get("XDG_STATE_HOME"))
                .orElse(home.resolve(".local").resolve("state"))
                .resolve(PROGRAM)
                .resolve(RECOVERY);
    }

    private static Optional<Path> absolute(String folder) {
        try {
            return Optional.ofNullable(folder)
                    .filter(f -> !f.isEmpty())
                    .map(Path::of)
                    .filter(Path::isAbsolute);
        } catch (InvalidPathException e) {
            return Optional.empty();
        }
    }
}
