package soakline;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The program as a process of its own. */
class MainTest {

    private static final Path SAMPLE = Path.of("sample-runs", "01-both-faces.csv");

    @TempDir
    Path folder;

    private record Ended(int status, String out, String err) {}

    private Ended run(List<String> options, ProcessBuilder.Redirect output, String... arguments) throws Exception {
        List<String> command = new ArrayList<>();
        command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
        command.addAll(options);
        command.addAll(List.of("-cp", System.getProperty("java.class.path"), "soakline.Main"));
        command.addAll(List.of(arguments));
        Path err = folder.resolve("err.txt");
        ProcessBuilder builder =
                new ProcessBuilder(command).redirectOutput(output).redirectError(err.toFile());
        builder.environment().put("DISPLAY", ":99999");
        builder.environment().put("LC_ALL", "C");
        int status = builder.start().waitFor();
        Path out = folder.resolve("out.txt");
        return new Ended(status, Files.exists(out) ? read(out) : "", read(err));
    }

    private Ended run(String... arguments) throws Exception {
        return run(
                List.of(), ProcessBuilder.Redirect.to(folder.resolve("out.txt").toFile()), arguments);
    }

    private static String read(Path file) throws IOException {
        return Files.readString(file, StandardCharsets.UTF_8);
    }

    @Test
    void withADeadDisplayTheFirstSampleIsEstimated() throws Exception {
        Ended ended = run();

        assertThat(ended.err()).startsWith("note: There is no display").contains("01-both-faces.csv");
        assertThat(ended.err()).doesNotContain("\tat ", "Exception");
        assertThat(ended.out()).startsWith("P-07").contains("m²/s", "M∞");
        assertThat(ended.status()).isZero();
    }

    @Test
    void figuresAreDrawnWithoutADisplay() throws Exception {
        for (String name : List.of("a.svg", "a.png")) {
            Ended ended = run(
                    "estimate",
                    SAMPLE.toString(),
                    "--figure",
                    folder.resolve(name).toString());

            assertThat(ended.err()).doesNotContain("problem:");
            assertThat(ended.status()).isZero();
            assertThat(folder.resolve(name)).isNotEmptyFile();
        }
    }

    @Test
    void theLocaleChangesNothing() throws Exception {
        String plain = run("estimate", SAMPLE.toString(), "--format", "json").out();
        Ended german = run(
                List.of("-Duser.language=de", "-Duser.country=DE", "-Dfile.encoding=ISO-8859-1"),
                ProcessBuilder.Redirect.to(folder.resolve("out.txt").toFile()),
                "estimate",
                SAMPLE.toString(),
                "--format",
                "json");

        assertThat(german.out()).isEqualTo(plain).contains("\"model\": \"fickian\"");
    }

    @Test
    void noWindowIsLoadedForACommand() throws Exception {
        Ended ended = run(
                List.of("-Xlog:class+load:file=" + folder.resolve("classes.txt")),
                ProcessBuilder.Redirect.to(folder.resolve("out.txt").toFile()),
                "estimate",
                SAMPLE.toString());

        assertThat(ended.status()).isZero();
        assertThat(read(folder.resolve("classes.txt")))
                .contains("soakline.command.Commands")
                .doesNotContain(" java.awt.", " javax.swing.", " org.jfree.", " picocli.", " com.fasterxml.");
    }

    @Test
    void aFullStandardOutputIsSaid() throws Exception {
        Path full = Path.of("/dev/full");
        assumeTrue(Files.exists(full), "this system has no such device");

        Ended ended = run(List.of(), ProcessBuilder.Redirect.to(full.toFile()), "estimate", SAMPLE.toString());

        assertThat(ended.status()).isEqualTo(2);
        assertThat(ended.err())
                .contains("problem: Standard output cannot be written: the disk is full")
                .doesNotContain("\tat ", "Exception");
    }
}
