package soakline.workspace;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.wording.Wording;

class OutputFileTest {

    @TempDir
    Path folder;

    private static byte[] bytes(String text) {
        return text.getBytes(StandardCharsets.UTF_8);
    }

    private List<String> names() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(f -> f.getFileName().toString()).toList();
        }
    }

    private static String refusal(Path target, OutputFile.Content content) {
        Fault fault = catchThrowableOfType(Fault.class, () -> OutputFile.write(target, content));
        assertThat(fault.finding().code()).isEqualTo(Code.OUTPUT_NOT_WRITABLE);
        return Wording.sentence(fault.finding());
    }

    @Test
    void writesAndReplaces() throws IOException {
        Path target = folder.resolve("a.svg");

        OutputFile.write(target, out -> out.write(bytes("one")));
        OutputFile.write(target, out -> out.write(bytes("two")));

        assertThat(target).hasContent("two");
        assertThat(names()).containsExactly("a.svg");
    }

    @Test
    void aFailureMidwayLeavesTheOldFileAndNothingElse() throws IOException {
        Path target = Files.writeString(folder.resolve("a.svg"), "old");

        String sentence = refusal(target, out -> {
            out.write(new byte[200_000]);
            throw new IOException("No space left on device");
        });

        assertThat(sentence).contains("a.svg cannot be written: the disk is full");
        assertThat(target).hasContent("old");
        assertThat(names()).containsExactly("a.svg");
    }

    @Test
    void aMistakeOfTheProgramLeavesNothingEither() throws IOException {
        Path target = folder.resolve("a.svg");

        assertThatThrownBy(() -> OutputFile.write(target, out -> {
                    out.write(1);
                    throw new IllegalStateException("a mistake");
                }))
                .isInstanceOf(IllegalStateException.class);

        assertThat(names()).isEmpty();
    }

    @Test
    void namesTheFolderThatIsNotThere() {
        Path missing = folder.resolve("nowhere");

        assertThat(refusal(missing.resolve("a.svg"), out -> out.write(1)))
                .contains("there is no folder " + missing)
                .endsWith("Choose another folder or free some space");
    }

    @Test
    void refusesAFolderAndAFileInThePlaceOfAFolder() throws IOException {
        Path file = Files.writeString(folder.resolve("file"), "old");

        assertThat(refusal(folder, out -> out.write(1))).contains("it is a folder");
        assertThat(refusal(file.resolve("a.svg"), out -> out.write(1))).contains(file + " is not a folder");
    }

    @Test
    void refusesADevice() {
        Path full = Path.of("/dev/full");
        assumeTrue(Files.exists(full), "this system has no such device");

        assertThat(refusal(full, out -> out.write(1))).contains("it is a device and not a file");
    }

    @Test
    void refusesAFolderThatMayNotBeWritten() throws IOException {
        Files.setPosixFilePermissions(folder, PosixFilePermissions.fromString("r-xr-xr-x"));
        try {
            // the administrator may write everywhere but into the system's own tables
            boolean administrator = Files.isWritable(folder);
            Path closed = administrator ? Path.of("/proc/self") : folder;
            assertThat(refusal(closed.resolve("a.svg"), out -> out.write(1)))
                    .contains(administrator ? "cannot be written" : "nothing may be written")
                    .doesNotContain("Exception");
        } finally {
            Files.setPosixFilePermissions(folder, PosixFilePermissions.fromString("rwxr-xr-x"));
        }
    }

    @Test
    void theSystemRefusesTheNameInPlainWords() {
        assertThat(refusal(folder.resolve("a".repeat(300) + ".svg"), out -> out.write(1)))
                .doesNotContain("Exception");
    }

    @Test
    void aLinkIsFollowedAndPermissionsAreKept() throws IOException {
        Path real = Files.writeString(folder.resolve("real.svg"), "old");
        Files.setPosixFilePermissions(real, PosixFilePermissions.fromString("rw-r-----"));
        Path link = Files.createSymbolicLink(folder.resolve("link.svg"), real);

        OutputFile.write(link, out -> out.write(bytes("new")));

        assertThat(link).isSymbolicLink();
        assertThat(real).hasContent("new");
        assertThat(PosixFilePermissions.toString(Files.getPosixFilePermissions(real)))
                .isEqualTo("rw-r-----");
    }
}
