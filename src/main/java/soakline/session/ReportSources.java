package soakline.session;

import java.io.IOException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Place;
import soakline.report.SourceFile;

/** The files that a report is made from, each with the digest of its bytes. */
public final class ReportSources {

    private ReportSources() {}

    /**
     * Takes the digests.
     *
     * @throws Fault when a file cannot be read
     */
    public static List<SourceFile> of(List<Path> files) {
        List<SourceFile> sources = new ArrayList<>();
        for (Path file : files) {
            sources.add(of(file));
        }
        return sources;
    }

    private static SourceFile of(Path file) {
        String name = String.valueOf(file.getFileName());
        try {
            return new SourceFile(name, Digests.of(file));
        } catch (NoSuchFileException e) {
            throw Fault.of(Code.FILE_NOT_FOUND).at(Place.of(name));
        } catch (IOException e) {
            throw Fault.of(Code.FILE_NOT_READABLE, String.valueOf(e.getMessage()))
                    .at(Place.of(name));
        }
    }

    /**
     * Takes the digests again, after the files were read.
     *
     * @throws Fault {@link Code#FILE_CHANGED} when one is no longer what it was, so that nobody knows which bytes were read
     */
    public static void requireUnchanged(List<Path> files, List<SourceFile> before) {
        List<SourceFile> after = of(files);
        for (int i = 0; i < after.size(); i++) {
            if (!after.get(i).equals(before.get(i))) {
                throw Fault.of(Code.FILE_CHANGED).at(Place.of(after.get(i).name()));
            }
        }
    }
}
