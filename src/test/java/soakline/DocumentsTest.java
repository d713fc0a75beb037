package soakline;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import soakline.command.Commands;
import soakline.command.Console;
import soakline.intake.ReadOptions;
import soakline.intake.RunFileReader;
import soakline.specimen.Run;

/** What the documents show is true: run files are read, commands run, results are those printed, links lead somewhere. */
class DocumentsTest {

    private static final Path README = Path.of("README.md");
    private static final Pattern BLOCK = Pattern.compile("(?ms)^ *```(\\w*)\\n(.*?)^ *```$");
    private static final Pattern WORD = Pattern.compile("\"([^\"]*)\"|(\\S+)");
    private static final Pattern LINK = Pattern.compile("\\]\\(([^)#]+)\\)");
    private static final String COMMAND = "java -jar target/soakline.jar ";
    private static final String BARE_TABLE =
            "time [h],mass [mg]\n0,2154.55\n5.3,2168.65\n30.6,2188.32\n96.5,2208.10\n192.5,2216.02\n240,2217.6\n";

    @TempDir
    Path folder;

    static List<Path> documents() throws IOException {
        List<Path> documents = new ArrayList<>(List.of(README, Path.of("DEVELOPERS.md")));
        try (Stream<Path> docs = Files.list(Path.of("docs"))) {
            docs.filter(p -> p.toString().endsWith(".md")).sorted().forEach(documents::add);
        }
        return documents;
    }

    private static List<String> blocks(Path document, String kind) throws IOException {
        return BLOCK.matcher(Files.readString(document))
                .results()
                .filter(r -> r.group(1).equals(kind))
                .map(r -> r.group(2))
                .toList();
    }

    private static List<String> allBlocks(String kind) throws IOException {
        List<String> all = new ArrayList<>();
        for (Path document : documents()) {
            all.addAll(blocks(document, kind));
        }
        return all;
    }

    @Test
    void everyRunFileInThemIsReadWithoutABadCell() throws IOException {
        List<String> runFiles = allBlocks("csv");
        assertThat(runFiles).hasSizeGreaterThan(5);
        for (String text : runFiles) {
            for (Run run : RunFileReader.readText("example.csv", text, ReadOptions.of())) {
                assertThat(run.sheet().path()).isPositive();
                assertThat(run.contents().size()).isGreaterThanOrEqualTo(Run.LEAST_WEIGHINGS);
                assertThat(run.notes()).as(text).isEmpty();
            }
        }
    }

    @Test
    void everyEstimateInThemRuns() throws IOException {
        int commands = 0;
        for (String block : allBlocks("")) {
            for (String line : block.lines().toList()) {
                if (line.startsWith(COMMAND)) {
                    commands++;
                    assertThat(run(line.substring(COMMAND.length())).status)
                            .as(line)
                            .isZero();
                }
            }
        }
        assertThat(commands).isGreaterThanOrEqualTo(4);
    }

    @Test
    void theResultInTheReadmeIsThatOfTheProgram() throws IOException {
        String shown = blocks(README, "").stream()
                .filter(b -> b.startsWith("P-07"))
                .findFirst()
                .orElseThrow();

        List<String> printed =
                run("estimate sample-runs/01-both-faces.csv").text.lines().toList();

        assertThat(printed)
                .containsAll(shown.lines().filter(l -> !l.contains("…")).toList());
    }

    @ParameterizedTest
    @MethodSource("documents")
    void everyLinkLeadsSomewhere(Path document) throws IOException {
        Path base = document.toAbsolutePath().getParent();
        List<String> broken = new ArrayList<>();
        for (MatchResult link :
                LINK.matcher(Files.readString(document)).results().toList()) {
            if (!Files.exists(base.resolve(link.group(1)))) {
                broken.add(link.group(1));
            }
        }
        assertThat(broken).isEmpty();
    }

    private record Outcome(int status, String text) {}

    /** A name that is in no folder here stands for a table without facts. */
    private Outcome run(String line) throws IOException {
        List<String> words = new ArrayList<>();
        for (MatchResult word : WORD.matcher(line).results().toList()) {
            String text = word.group(1) == null ? word.group(2) : word.group(1);
            boolean invented = text.endsWith(".csv") && !Files.exists(Path.of(text));
            words.add(
                    invented
                            ? Files.writeString(folder.resolve(text), BARE_TABLE)
                                    .toString()
                            : text);
        }
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        int status = new Commands(Main.reader(), new Console(out, new ByteArrayOutputStream()))
                .run(words.toArray(String[]::new));
        return new Outcome(status, out.toString(StandardCharsets.UTF_8));
    }
}
