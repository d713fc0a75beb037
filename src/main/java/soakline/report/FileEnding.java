package soakline.report;

import java.nio.file.Path;
import java.util.Locale;

/** What the end of a file's name says about its kind. */
final class FileEnding {

    private FileEnding() {}

    /** Whether a file's name ends so, in any case; a name that is nothing but the ending is a hidden file without one. */
    static boolean isOf(Path file, String ending) {
        String name = String.valueOf(file.getFileName());
        return name.length() > ending.length() && name.toLowerCase(Locale.ROOT).endsWith(ending);
    }
}
