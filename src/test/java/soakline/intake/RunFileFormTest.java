package soakline.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import soakline.problem.Code;
import soakline.problem.Place;
import soakline.specimen.Facts.Other;
import soakline.specimen.Run;

/** What a run file keeps beside facts and weighings, and when nothing of a file would be lost by writing it anew. */
class RunFileFormTest {

    private static final String ROWS = "time [h],mass [g]\n0,31.2041\n1.5,31.2388\n";
    private static final String DATES = "date,mass [g]\n2026-03-01 08:30,1\n2026-03-02 08:30,2\n";

    @TempDir
    Path folder;

    private static List<FileCoupon> coupons(String text) {
        return RunFileReader.openText(Reading.NAME, text, ReadOptions.of()).coupons();
    }

    @Test
    void choicesForTheEstimateAreHandedOnWithTheirPlaces() {
        List<FileCoupon> coupons = coupons("""
                # fixed startContent: 0 %
                # Interval Level: 90 %
                # A1 fixed startContent: 0.1 %
                # A1 interval method: linearised
                time [h],A1 mass [g],A2 mass [g]
                0,1,1
                """);
        assertThat(coupons.get(0).choices())
                .containsExactlyInAnyOrder(
                        new Choice("fixed startContent", "0.1 %", new Place(Reading.NAME, 3, 0)),
                        new Choice("Interval Level", "90 %", new Place(Reading.NAME, 2, 0)),
                        new Choice("interval method", "linearised", new Place(Reading.NAME, 4, 0)));
        assertThat(coupons.get(1).choices())
                .containsExactlyInAnyOrder(
                        new Choice("fixed startContent", "0 %", new Place(Reading.NAME, 1, 0)),
                        new Choice("Interval Level", "90 %", new Place(Reading.NAME, 2, 0)));
        assertThat(coupons).allSatisfy(c -> {
            assertThat(c.run().notes()).isEmpty();
            assertThat(c.run().facts().other()).isEmpty();
        });
    }

    private static Optional<String> note(String line) {
        return Reading.one(line + "\n" + ROWS).facts().note();
    }

    @Test
    void aTextInQuotationMarksIsTakenWithoutThem() {
        assertThat(note("# note: \"one\\ntwo\"")).contains("one\ntwo");
        assertThat(note("# note: \"  a, \"")).contains("  a, ");
        assertThat(note("# note: \"\"")).contains("");
        assertThat(note("\"# note: \"\"a\\nb\"\"\",")).contains("a\nb");
        assertThat(note("# note: \"a\"\n# note: b")).contains("a; b");
        assertThat(note("# note: say \"hi\"")).contains("say \"hi\"");
        assertThat(note("# note: \"a\"; # b")).contains("\"a\"; # b");
        assertThat(note("# note: a\\nb")).contains("a\\nb");
        assertThat(note("# note: \"C:\\data\"")).contains("\"C:\\data\"");
        assertThat(note("# \"note\": x")).isEmpty();
        assertThat(note("# note:")).isEmpty();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "# \"a: b\": c|a: b|c",
                "# \"thickness\": thin|thickness|thin",
                "# \"-\": \"-\"|-|-",
                "# 5\" plate: 3\"|5\" plate|3\"",
                "# 5\" plate: the 3\": x|5\" plate|the 3\": x",
                "# a \"b: c\": d|a \"b: c\"|d",
                "# a \"b: c\" d: e|a \"b|c\" d: e"
            })
    void aNameMayStandInQuotationMarks(String line, String name, String value) {
        assertThat(Reading.one(line + "\n" + ROWS).facts().other()).containsExactly(new Other(name, value));
    }

    @Test
    void aCouponsOwnFactsHaveTheirNamesWithoutIt() {
        List<Run> runs = Reading.all("""
                # A_1  colour: red
                # A 1 "thickness": thin
                # a_1_thickness: 1 mm
                # B specimen: ""
                time [h],A_1 mass [g],B mass [g]
                0,1,1
                """);
        assertThat(runs.get(0).facts().other())
                .containsExactly(new Other("colour", "red"), new Other("thickness", "thin"));
        assertThat(runs.get(0).facts().thickness()).isPresent();
        assertThat(runs.get(1).facts().specimen()).isEmpty();
    }

    @Test
    void aReasonMayStandInQuotationMarks() {
        Run run = Reading.one(
                "time [h],mass [g],set aside\n0,1,\"\"\"=1+1\"\"\"\n1,2,\"\"\"\"\"\"\n2,3,\"\"\"a\\nb\"\"\"\n3,4,\n4,5,5\" off\n");
        assertThat(run.weighings().setAside()).isEqualTo(Map.of(0, "=1+1", 1, "", 2, "a\nb", 4, "5\" off"));
    }

    /** Else two reasons that look like numbers would outvote the rows on what the decimal sign is. */
    @Test
    void aQuotedReasonSaysNothingAboutTheDecimalSign() {
        Run run = Reading.one("time [s],mass [mg],set aside\n0,1,\"\"\"3,5\"\"\"\n1,2,\"\"\"4,5\"\"\"\n2,2.5,\n3,3,\n");
        assertThat(run.weighings().size()).isEqualTo(4);
        assertThat(run.weighings().value(2)).isEqualTo(2.5 * 1e-6);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "2026-03-01 08:30|2026-03-01 08:30",
                "2026-03-01T08:30:15|2026-03-01 08:30:15",
                "2026-03-01|2026-03-01 00:00",
                "2026-03-01 08:30:15.250|2026-03-01 08:30:15.25",
                "2026-03-01T08:30Z|2026-03-01 08:30Z",
                "2026-03-01T08:30:00+01:00|2026-03-01 08:30+01:00",
                "2026-03-01 08:30[Europe/Vienna]|2026-03-01 08:30+01:00"
            })
    void theCalendarTimeOfTimeZeroIsKept(String first, String expected) {
        String zone = first.replaceFirst("^.{10}(.\\d\\d:\\d\\d(:[0-9.]+)?)?", "");
        Run run = Reading.one("date,mass [g]\n" + first + ",1\n2026-03-02 00:00" + zone + ",2\n");
        assertThat(run.facts().other()).containsExactly(new Other("time zero", expected));
        assertThat(run.notes()).isEmpty();

        Run saved = Reading.one("# time zero: " + expected + "\n" + ROWS);
        assertThat(saved.facts().other()).containsExactly(new Other("time zero", expected));
        assertThat(saved.notes()).isEmpty();
    }

    @Test
    void timeZeroIsThatOfTheExposureAndOfEachCoupon() {
        assertThat(Reading.one("# exposed from: 2026-03-01 07:00\n" + DATES)
                        .facts()
                        .other())
                .containsExactly(new Other("time zero", "2026-03-01 07:00"));
        assertThat(Reading.one("# exposed from: 90.5 s\n" + DATES).facts().other())
                .containsExactly(new Other("time zero", "2026-03-01 08:31:30.5"));
        Run stated = Reading.one("# time zero: 2026-03-01 08:00\n" + DATES);
        assertThat(Reading.times(stated)).containsExactly(1800, 88_200);
        assertThat(stated.facts().other()).containsExactly(new Other("time zero", "2026-03-01 08:00"));
        assertThat(Reading.one("# time zero: 2026-03-01 08:00\n# exposed from: 30 min\n" + ROWS)
                        .facts()
                        .other())
                .containsExactly(new Other("time zero", "2026-03-01 08:30"));
        assertThat(Reading.one("# time zero: a Sunday\n# exposed from: 30 min\n" + ROWS)
                        .facts()
                        .other())
                .containsExactly(new Other("time zero", "a Sunday"));
        List<Run> two = Reading.all("date,A mass [g],B mass [g]\n2026-03-01 08:30,1,\n2026-03-02 09:00,2,5\n");
        assertThat(two.get(0).facts().other()).containsExactly(new Other("time zero", "2026-03-01 08:30"));
        assertThat(two.get(1).facts().other()).containsExactly(new Other("time zero", "2026-03-02 09:00"));
        assertThat(Reading.fault("# time zero: noon\n" + DATES).values().get(0)).isEqualTo("time zero");
    }

    @Test
    void theVersionOfTheFormIsKnownAndANewerOneIsSaid() {
        assertThat(Reading.one("# run file: 1\n" + ROWS).notes()).isEmpty();
        assertThat(Reading.one("# run file: 1\n" + ROWS).facts().other()).isEmpty();
        Run newer = Reading.one("# run file: 2\n" + ROWS);
        assertThat(Reading.notes(newer, Code.RUN_FILE_NEWER).get(0).values()).containsExactly(2, 1);
        assertThat(Reading.one("# run file: mine\n" + ROWS).facts().other())
                .containsExactly(new Other("run file", "mine"));
    }

    private RunFile open(byte[] bytes) throws IOException {
        Path file = Files.write(folder.resolve("run.csv"), bytes);
        return RunFileReader.open(file, ReadOptions.of(), Progress.NONE);
    }

    private boolean isOwnForm(String text) throws IOException {
        return open(text.getBytes(StandardCharsets.UTF_8)).ownForm();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "# thickness: 2 mm\n" + ROWS,
                "# run file: 1\n" + ROWS,
                "# A1 fixed startContent: 0 %\ntime [h],A1 mass [g]\n0,1\n",
                "# exposed from: 30 min\n" + ROWS,
                "# faces: both\ntime [h],A mass [g],B content [%],A set aside,set aside\n0,1,,x,\n1,2,0.1,,both\n\n2,3,0.2,,\n"
            })
    void nothingOfARunFileIsLostByWritingItAnew(String text) throws IOException {
        assertThat(isOwnForm(text)).isTrue();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                // nothing of ours in it: a balance's own export
                ROWS,
                "# batch: 7\n" + ROWS,
                "# run file: mine\n" + ROWS,
                // another dialect
                "# faces: both\ntime [h];mass [g]\n0;1.5\n",
                "# faces: both\ntime [h]\tmass [g]\n0\t1.5\n",
                "# faces: both\ntime [h],mass [g]\n0,\"1,5\"\n",
                "# faces: both\ntime,mass\nh,g\n0,1.5\n",
                // more in it than coupons hold
                "# faces: both\n" + DATES,
                "# faces: both\ntime [h],mass [g],operator\n0,1.5,AB\n",
                "# faces: both\ntime [h],mass [g],B set aside\n0,1.5,x\n",
                "# faces: both\ntime [h],mass [g],set aside\n0,1.5,\n1,,late\n",
                "# faces: both\ntime [h],mass [g]\n0,1.5,door opened\n",
                "# faces: both\ntime [h],mass [g]\n0,1.5\n# door opened\n1,2\n",
                "# faces: both\ntime [h],mass [g]\n0,1.5\n1,2\n# the end\n",
                "# faces: both\ntime [h],mass [g]\n0,1.5\n1,wet\n",
                "# faces: both\ntime [h],mass [g]\n0,1.5\nnoon,2\n",
                "# faces: both\ntime [h],mass [g]\n0,1.5\n1,inf\n",
                "# faces: both\ntime [h],mass [g]\n1,1.5\n0,2\n",
                "# faces: both\ntime [h],mass [g]\n1,1.5,7,8\n2,2\n",
                "# faces: both\n# faces: one\n" + ROWS
            })
    void aFileOfWhichSomethingWouldBeLostIsNot(String text) throws IOException {
        assertThat(isOwnForm(text)).isFalse();
    }

    @Test
    void noOtherEncodingOptionOrWorkbookIsOfTheOwnForm() throws IOException {
        String text = "# medium: Öl\n# faces: both\n" + ROWS;
        assertThat(isOwnForm(text)).isTrue();
        for (String charset : List.of("ISO-8859-1", "UTF-16")) {
            assertThat(open(text.getBytes(Charset.forName(charset))).ownForm())
                    .as(charset)
                    .isFalse();
        }
        Path file = Files.writeString(folder.resolve("named.csv"), text);
        ReadOptions named = ReadOptions.of().withColumns("time [h],mass [g]");
        assertThat(RunFileReader.open(file, named, Progress.NONE).ownForm()).isFalse();
        byte[] workbook = new Workbooks()
                .row("# faces", "both")
                .row("time [h]", "mass [g]")
                .row(0, 31.5)
                .bytes();
        assertThat(open(workbook).ownForm()).isFalse();
    }

    @Test
    void theDigestOfAWorkbookIsThatOfAllItsBytes() throws Exception {
        byte[] workbook =
                new Workbooks().row("time [h]", "mass [g]").row(0, 31.5).bytes();
        byte[] digest = MessageDigest.getInstance("SHA-256").digest(workbook);
        assertThat(open(workbook).digest()).isEqualTo(HexFormat.of().formatHex(digest));
    }

    /** The digests are those of the command sha256sum of GNU coreutils. */
    @Test
    void theDigestIsThatOfAllBytes() throws IOException {
        assertThat(open("time [h],mass [g]\n0,1\n".getBytes(StandardCharsets.UTF_8))
                        .digest())
                .isEqualTo("13c97d49a3dc6b5e22c63e76e1fe4deb4db3441e6366e7f7c23f7d6bba68e676");
        assertThat(open("time [h],mass [g]\n0,1\n\n\n# end".getBytes(StandardCharsets.UTF_8))
                        .digest())
                .isEqualTo("ae4402d4b6bf54768ec9e8e1cbb7baf280e366aacbc523c38b1e696ab5cc1c11");
    }
}
