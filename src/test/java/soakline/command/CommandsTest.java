package soakline.command;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Finding;
import soakline.problem.Place;
import soakline.report.InventedAssessments;
import soakline.session.EstimateRequest;
import soakline.session.RunReader;
import soakline.specimen.Facts;
import soakline.specimen.Run;

class CommandsTest {

    private final ByteArrayOutputStream out = new ByteArrayOutputStream();
    private final ByteArrayOutputStream err = new ByteArrayOutputStream();
    private EstimateRequest request;

    @TempDir
    Path folder;

    private final RunReader reader = (file, asked, progress) -> {
        request = asked;
        Run run = InventedAssessments.run("P-07", 400, 30);
        return switch (file.toString()) {
            case "good.csv" -> List.of(run);
            case "noted.csv" ->
                List.of(new Run(
                        "noted.csv",
                        run.facts(),
                        run.kind(),
                        run.weighings(),
                        List.of(Finding.of(Code.CELL_NOT_A_NUMBER, "x\u001b[2J")
                                .at(Place.of("noted.csv").line(7).column(2)))));
            case "early.csv" -> List.of(InventedAssessments.run("P-11", 15, 30));
            case "bare.csv" -> List.of(run.withFacts(Facts.of("P-10")));
            case "few.csv" -> List.of(InventedAssessments.run("P-12", 400, 3));
            case "broken.csv" -> throw new IllegalStateException("a mistake");
            default ->
                throw Fault.of(Code.FILE_NOT_FOUND)
                        .at(Place.of(file.getFileName().toString()));
        };
    };

    private int run(String... arguments) {
        out.reset();
        err.reset();
        return new Commands(reader, new Console(out, err)).run(arguments);
    }

    private String out() {
        return out.toString(StandardCharsets.UTF_8);
    }

    private String err() {
        String text = err.toString(StandardCharsets.UTF_8);
        assertThat(text.lines())
                .allMatch(l -> l.startsWith("note: ") || l.startsWith("warning: ") || l.startsWith("problem: "))
                .noneMatch(l -> l.contains("\tat "));
        return text;
    }

    private JsonNode json() throws IOException {
        return new ObjectMapper().readTree(out()).get(0);
    }

    @Test
    void aGoodFileIsDone() {
        assertThat(run("estimate", "good.csv")).isZero();

        assertThat(out()).startsWith("P-07").contains("Result: usable", "m²/s");
        assertThat(err()).contains("note: P-07: The edges are taken as sealed");
    }

    @Test
    void aResultThatIsNotUsableIsDoneWithStatusOne() throws IOException {
        assertThat(run("estimate", "early.csv", "--format", "json")).isEqualTo(1);

        assertThat(json().get("parameters").get(0).get("value").isNull()).isTrue();
        assertThat(err()).contains("problem: P-11: D is not determined");
    }

    @Test
    void theWorstCouponGivesTheStatus() {
        assertThat(run("estimate", "good.csv", "early.csv", "good.csv")).isEqualTo(1);

        assertThat(out()).contains("All 3 coupons");
    }

    @Test
    void missingFactsAreNamedAndNotAssumed() {
        assertThat(run("estimate", "bare.csv")).isEqualTo(2);
        assertThat(out()).isEmpty();
        assertThat(err()).contains("thickness").contains("P-10");

        assertThat(run("estimate", "bare.csv", "--thickness", "2 mm")).isEqualTo(2);
        assertThat(out()).isEmpty();
        assertThat(err()).contains("faces");

        assertThat(run("estimate", "bare.csv", "--thickness", "2 mm", "--faces", "both", "--edges", "bare"))
                .isEqualTo(2);
        assertThat(err()).contains("width and the length");

        assertThat(run("estimate", "bare.csv", "--thickness", "2,0 mm ± 0,01 mm", "--faces=both"))
                .isZero();
    }

    @ParameterizedTest
    @CsvSource({"missing.csv,There is no such file", "few.csv,Only 3 usable weighings"})
    void unusableInputLeavesStandardOutputEmpty(String file, String sentence) {
        assertThat(run("estimate", "good.csv", file, "good.csv")).isEqualTo(3);

        assertThat(out()).isEmpty();
        assertThat(err()).contains("problem: ").contains(sentence);
    }

    @Test
    void badInputWeighsMoreThanAMissingFactAndBothAreSaid() {
        assertThat(run("estimate", "bare.csv", "missing.csv")).isEqualTo(3);

        assertThat(err()).contains("thickness", "missing.csv: There is no such file");
    }

    @Test
    void aMistakeOfTheProgramHasNoStackTrace() {
        assertThat(run("estimate", "broken.csv")).isEqualTo(3);

        assertThat(out()).isEmpty();
        assertThat(err().lines()).hasSize(1);
        assertThat(err()).contains("Something went wrong", "a mistake");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "--thickness|2.03|has no unit",
                "--thickness|2 g|unit \"g\" is not known here",
                "--thickness|thick|is not a number with a unit",
                "--thickness|0 mm|must be more than zero",
                "--thickness|-2 mm|must be more than zero",
                "--dry-mass|0 g|must be more than zero",
                "--thickness|2 mm \ufffd\ufffd 0.01 mm|Write +/- for ±",
                "--width|1 s|is not known here",
                "--length|x|is not a number",
                "--faces|two|not one of both, one",
                "--edges|open|not one of bare, sealed",
                "--model|other|not one of fickian",
                "--noise|known|not one of estimated",
                "--interval|bootstrap|not one of profile, linearised",
                "--format|xml|not one of text, json, csv",
                "--level|1|between 0.5 and 1",
                "--level|NaN|between 0.5 and 1",
                "--fix|startContent|has no value",
                "--fix|speed=1|equilibriumContent",
                "--fix|diffusivity=0|must be more than zero",
                "--fix|diffusivity=1 mm|is not known here",
                "--fix|startContent=1 % ± 0.1 %|has no uncertainty",
                "--fix|startContent=NaN|finite",
                "--free|speed|startContent",
                "--figure|a.pdf|.svg or .png",
                "--nonsense|1|Unknown option",
            })
    void wrongUseIsSaidBeforeAnyFileIsRead(String option, String value, String sentence) {
        assertThat(run("estimate", "good.csv", option, value)).isEqualTo(2);

        assertThat(request).isNull();
        assertThat(out()).isEmpty();
        assertThat(err()).startsWith("problem: ").contains(sentence);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "estimate",
                "estimate good.csv --thickness",
                "estimate good.csv --faces both --faces one",
                "estimate good.csv --report a.docx",
                "estimat good.csv",
                "good.csv",
                "--nonsense",
                "estimate good.csv --fix startContent=0 --fix startContent=1",
                "estimate good.csv --fix startContent=0 --free startContent"
            })
    void wrongCommandLinesAreRefusedInOneLine(String line) {
        assertThat(run(line.split(" ", -1))).isEqualTo(2);

        assertThat(out()).isEmpty();
        assertThat(err().lines()).hasSize(1);
    }

    @Test
    void fixTakesTheUnitOfTheResultOrItsOwn() throws IOException {
        assertThat(run("estimate", "good.csv", "--fix", "equilibriumContent=1.8"))
                .isZero();
        assertThat(request.options().fixed())
                .hasEntrySatisfying("equilibriumContent", v -> assertThat(v).isCloseTo(0.018, within(1e-15)));

        assertThat(run("estimate", "good.csv", "--fix", "equilibriumContent=0,018 g/g", "--fix=startContent=0"))
                .isZero();
        assertThat(request.options().fixed())
                .containsEntry("equilibriumContent", 0.018)
                .containsEntry("startContent", 0.0);

        assertThat(run("estimate", "good.csv", "--fix", "diffusivity=1e-6 mm2/s", "--format", "json"))
                .isZero();
        assertThat(json().get("parameters").get(0).get("fixed").asBoolean()).isTrue();
        assertThat(json().get("combined").isNull()).isTrue();
    }

    @Test
    void optionsReachTheRequest() {
        run(
                "estimate",
                "good.csv",
                "--columns",
                "time [h],mass [g]",
                "--date-pattern",
                "dd.MM.yyyy",
                "--level",
                "90 %",
                "--interval",
                "linearised",
                "--dry-mass",
                "31,2 g");

        assertThat(request.columns()).contains("time [h],mass [g]");
        assertThat(request.datePattern()).contains("dd.MM.yyyy");
        assertThat(request.options().level()).isEqualTo(0.9);
        assertThat(request.options().method().code()).isEqualTo("linearised");
        assertThat(request.overrides().dryMass().orElseThrow().si()).isEqualTo(0.0312);
    }

    @Test
    void helpNamesEveryOption() {
        assertThat(run("estimate", "--help")).isZero();

        for (EstimateOptions.Option option : EstimateOptions.ALL) {
            assertThat(out()).contains(option.name() + "=" + option.label());
        }
        assertThat(out()).contains("(%)", "Exit status: 0 done", "--help");
        assertThat(out().lines()).allMatch(l -> l.length() <= 100);
        assertThat(err()).isEmpty();
        assertThat(run("--help")).isZero();
        assertThat(out()).contains("estimate FILE", "--version");
        assertThat(run("--version")).isZero();
        assertThat(out()).matches("Soakline \\S+\n");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "a.csv",
                "a.csv b.csv",
                "--format json a.csv --level=0.9 b.csv",
                "--fix a=1 x --fix=b=2 --free c",
                "x --columns= --width=-1",
                "--format=a=b x"
            })
    void theShortParserAgreesWithTheFullOne(String line) {
        List<String> arguments = List.of(line.split(" ", -1));
        Optional<Words> words = Words.plain(arguments, EstimateOptions.names(false), EstimateOptions.names(true));

        assertThat(words).isPresent();
        assertThat(new EstimateParser().parse(arguments)).isEqualTo(words);
    }

    @Test
    void rareSpellingsAreLeftToTheFullParser() {
        assertThat(run("estimate", "--format", "json", "--", "good.csv")).isZero();
        assertThat(out()).startsWith("[");
    }

    @Test
    void anOutputThatCannotBeWrittenIsWrongUse() throws IOException {
        Path nowhere = folder.resolve("nowhere").resolve("a.svg");

        assertThat(run("estimate", "good.csv", "--figure", nowhere.toString())).isEqualTo(2);

        assertThat(request).isNull();
        assertThat(out()).isEmpty();
        assertThat(err()).contains("there is no folder");
        try (var files = Files.list(folder)) {
            assertThat(files).isEmpty();
        }
    }

    @Test
    void notesStandOnStandardErrorWithTheirPlaceAndSteerNoTerminal() {
        assertThat(run("estimate", "noted.csv")).isZero();

        assertThat(err())
                .contains("note: noted.csv, line 7, column 2: \"x [2J\" is not a number; this weighing is set aside");
    }

    @Test
    void fullAndBrokenOutputs() {
        Commands full = new Commands(reader, new Console(failing("No space left on device"), err));
        assertThat(full.run("estimate", "good.csv")).isEqualTo(2);
        assertThat(err()).contains("problem: Standard output cannot be written: the disk is full");

        err.reset();
        Commands left = new Commands(reader, new Console(failing("Broken pipe"), err));
        assertThat(left.run("estimate", "good.csv")).isZero();
        assertThat(err()).doesNotContain("pipe");
    }

    private static OutputStream failing(String message) {
        return new OutputStream() {
            @Override
            public void write(int b) throws IOException {
                throw new IOException(message);
            }
        };
    }
}
