package soakline;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import soakline.command.Commands;
import soakline.command.Console;

/** Real files through the whole command: what goes wrong is said once, with its place, and nothing is half written. */
class WholeCommandTest {

    private static final String FACTS = "# thickness: 2 mm\n# faces: both\n";
    private static final String GOOD = "0,31.20\n10,31.25\n40,31.30\n90,31.35\n160,31.38\n300,31.40\n500,31.405\n";

    private final ByteArrayOutputStream out = new ByteArrayOutputStream();
    private final ByteArrayOutputStream err = new ByteArrayOutputStream();

    @TempDir
    Path folder;

    private int run(String... arguments) {
        return new Commands(Main.reader(), new Console(out, err)).run(arguments);
    }

    private String out() {
        return out.toString(StandardCharsets.UTF_8);
    }

    private String err() {
        return err.toString(StandardCharsets.UTF_8);
    }

    private Path file(String text) throws IOException {
        return Files.writeString(folder.resolve("run.csv"), text);
    }

    static Stream<Arguments> badInput() {
        return Stream.of(
                Arguments.of(3, "", "holds no rows"),
                Arguments.of(3, FACTS, "holds no rows"),
                Arguments.of(3, FACTS + "shelf,mass [g]\n" + GOOD, "line 3: No column is called time"),
                Arguments.of(
                        3,
                        FACTS + "time [h],time [d],mass [g]\n0,0,31.2\n",
                        "line 3, column 2: Two columns are called time"),
                Arguments.of(
                        3,
                        FACTS + "time [h],mass\n" + GOOD,
                        "line 3, column 2: The column \"mass\" does not say its unit"),
                Arguments.of(3, FACTS + "time [h],mass [stone]\n" + GOOD, "line 3, column 2"),
                Arguments.of(3, FACTS + "time,mass [g]\n" + GOOD, "line 3, column 1"),
                Arguments.of(3, "# thickness: 0 mm\n# faces: both\ntime [h],mass [g]\n" + GOOD, "line 1"),
                Arguments.of(3, "# thickness: -2 mm\n# faces: both\ntime [h],mass [g]\n" + GOOD, "line 1"),
                Arguments.of(3, "# thickness: 2\n# faces: both\ntime [h],mass [g]\n" + GOOD, "line 1"),
                Arguments.of(3, "# thickness: 2 furlong\n# faces: both\ntime [h],mass [g]\n" + GOOD, "line 1"),
                Arguments.of(2, "# faces: both\ntime [h],mass [g]\n" + GOOD, "thickness"),
                Arguments.of(2, "# thickness: 2 mm\ntime [h],mass [g]\n" + GOOD, "faces"),
                Arguments.of(3, FACTS + "time [h],mass [g]\n0,31.2\n1,31.2\n2,31.2\n3,31.2\n4,31.2\n", "run.csv"),
                Arguments.of(3, FACTS + "time [h],mass [g]\n0,31.2\n1,31.3\n2,31.4\n", "run.csv"),
                Arguments.of(3, FACTS + "time [h],mass [g]\n5,31.2\n5,31.3\n5,31.4\n5,31.5\n5,31.6\n", "run.csv"),
                Arguments.of(3, FACTS + "time [h],mass [g]\nNaN,31.2\n1,NaN\n2,inf\n3,-Infinity\n", "run.csv"),
                Arguments.of(3, FACTS + "time [h],mass [g]\n" + "7".repeat(10_000_000), "run.csv, line 4"));
    }

    @ParameterizedTest
    @MethodSource("badInput")
    void oneLineWithThePlaceAndNothingOnStandardOutput(int status, String text, String sentence) throws IOException {
        Path file = file(text);
        Path figure = folder.resolve("figure.svg");

        assertThat(run("estimate", file.toString(), "--figure", figure.toString()))
                .isEqualTo(status);

        assertThat(out()).isEmpty();
        assertThat(err().lines().filter(l -> l.startsWith("problem: ")))
                .singleElement()
                .asString()
                .contains(sentence);
        assertThat(err()).doesNotContain("Exception").doesNotContain("\tat ");
        assertThat(err().length()).isLessThan(1500);
        assertThat(figure).doesNotExist();
        assertThat(folder.toFile().list()).containsExactly("run.csv");
    }

    @Test
    void aMissingFileAndABinaryOne() throws IOException {
        assertThat(run("estimate", folder.resolve("none.csv").toString())).isEqualTo(3);
        assertThat(err()).isEqualTo("problem: none.csv: There is no such file. Check the name and the folder\n");

        err.reset();
        byte[] bytes = new byte[5000];
        new Random(3).nextBytes(bytes);
        Path binary = Files.write(folder.resolve("binary.csv"), bytes);
        assertThat(run("estimate", binary.toString())).isEqualTo(3);
        assertThat(err()).startsWith("problem: binary.csv").doesNotContain("Exception");
        assertThat(out()).isEmpty();
    }

    @ParameterizedTest
    @ValueSource(strings = {"2 µm", "2000 mm"})
    void aThicknessAThousandTimesOffIsWarnedOf(String thickness) {
        int status = run("estimate", "sample-runs/01-both-faces.csv", "--thickness", thickness);

        assertThat(status).isZero();
        assertThat(err()).contains("warning: ");
        assertThat(out()).contains("m²/s");
    }

    @Test
    void massBelowTheDryMassIsWarnedOf() {
        assertThat(run("estimate", "sample-runs/01-both-faces.csv", "--dry-mass", "31.5 g"))
                .isZero();
        assertThat(err()).contains("warning: ").contains("dry mass");
    }

    @ParameterizedTest
    @ValueSource(strings = {"text", "csv", "json"})
    void theTestThatStoppedEarlySpeaksOfNoFittedDiffusivity(String format) {
        run("estimate", "sample-runs/04-stopped-early.csv", "--format", format);

        assertThat(out() + err())
                .doesNotContain("fitted D")
                .doesNotContain("D holds")
                .doesNotContain("value is an apparent D");
    }

    @ParameterizedTest
    @ValueSource(strings = {"text", "csv"})
    void theTestThatStoppedEarlyGivesNoDiffusivity(String format) {
        assertThat(run("estimate", "sample-runs/04-stopped-early.csv", "--format", format))
                .isEqualTo(1);

        assertThat(out()).doesNotContain("m²/s").doesNotContainPattern("[0-9]e-1[0-9]");
        assertThat(err()).contains("D is not determined");
    }

    @Test
    void theTestThatStoppedEarlyGivesNoDiffusivityInJsonAndFigures() throws IOException {
        Path figure = folder.resolve("early.svg");
        assertThat(run(
                        "estimate",
                        "sample-runs/04-stopped-early.csv",
                        "--format",
                        "json",
                        "--figure",
                        figure.toString()))
                .isEqualTo(1);

        JsonNode coupon = new ObjectMapper().readTree(out()).get(0);
        assertThat(coupon.get("usable").asBoolean()).isFalse();
        assertThat(coupon.get("combined").isNull()).isTrue();
        coupon.get("parameters").forEach(p -> {
            boolean known = p.get("name").asText().matches("initialSlope|startContent");
            assertThat(p.get("value").isNull()).as(p.toString()).isEqualTo(!known);
            assertThat(p.get("interval").isNull()).isEqualTo(!known);
        });
        coupon.get("checks")
                .forEach(c -> assertThat(c.get("diffusivity").isNull()).isTrue());
        assertThat(Files.readString(figure)).doesNotContain("m²/s").doesNotContain("10⁻¹");
    }

    @Test
    void everySampleGivesWhatItPromises() throws IOException {
        for (String name : SampleRuns.NAMES) {
            out.reset();
            int status = run("estimate", "sample-runs/" + name, "--format", "json");
            assertThat(status).as(name).isEqualTo(name.startsWith("04") ? 1 : 0);
            JsonNode coupons = new ObjectMapper().readTree(out());
            assertThat(coupons.size()).isEqualTo(name.startsWith("06") ? 3 : 1);
            assertThat(coupons.get(0).get("fickian").get("verdict").asText())
                    .as(name)
                    .isEqualTo(name.startsWith("04") ? "unknown" : name.startsWith("07") ? "fail" : "pass");
        }
    }
}
