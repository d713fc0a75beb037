package soakline.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.IOException;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Finding;
import soakline.problem.Place;
import soakline.wording.Wording;

/** Input that cannot be used ends in a fault that says why and where. */
class BadInputTest {

    @TempDir
    Path folder;

    private Finding faultOf(byte[] bytes) throws IOException {
        return faultOf(Files.write(folder.resolve("run.csv"), bytes));
    }

    private static Finding faultOf(Path file) {
        return catchThrowableOfType(Fault.class, () -> RunFileReader.read(file, ReadOptions.of(), Progress.NONE))
                .finding();
    }

    @Test
    void filesThatCannotBeOpened() {
        assertThat(faultOf(folder.resolve("none.csv")).code()).isEqualTo(Code.FILE_NOT_FOUND);
        assertThat(faultOf(folder).code()).isEqualTo(Code.FILE_NOT_READABLE);
        assertThat(faultOf(folder.resolve("none.csv")).place().source()).isEqualTo("none.csv");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"", "\n\n", "# thickness: 2 mm\n", "# a\n\r\n#b", "\ufeff", ",,\n , \n", "time [h],mass [g]\n"})
    void filesWithoutRows(String text) throws IOException {
        assertThat(faultOf(text.getBytes(StandardCharsets.UTF_8)).code()).isEqualTo(Code.FILE_EMPTY);
    }

    @Test
    void filesThatAreNoText() throws IOException {
        byte[] bytes = "time [h],mass [g]\n0,1\n\0\1\2\n".getBytes(StandardCharsets.US_ASCII);
        Finding finding = faultOf(bytes);
        assertThat(finding.code()).isEqualTo(Code.FILE_BINARY);
        assertThat(finding.values()).containsExactly(23L);
        assertThat(faultOf(new byte[1000]).code()).isEqualTo(Code.FILE_BINARY);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "mass [g],length [mm]\\n1,2|TIME_COLUMN_MISSING|1:0",
                "\\n# x: 1\\nfoo,bar\\n1,2|TIME_COLUMN_MISSING|3:0",
                "time [h],elapsed [s],mass [g]\\n1,2,3|TIME_COLUMN_TWICE|1:2",
                "date,time [h],mass [g]\\n2026-03-01,1,3|TIME_COLUMN_TWICE|1:2",
                "time [h],length [mm]\\n1,2|VALUE_COLUMN_MISSING|1:0",
                "time [h]\\n1|VALUE_COLUMN_MISSING|1:0",
                "0,31.5\\n1,32|HEADER_MISSING|1:0",
                "time [h],mass\\n0,1|COLUMN_UNIT_MISSING|1:2",
                "time,mass [g]\\n0,1|COLUMN_UNIT_MISSING|1:1",
                "time [h],mass [oz]\\n0,1|COLUMN_UNIT_UNKNOWN|1:2",
                "time [fortnight],mass [g]\\n0,1|COLUMN_UNIT_UNKNOWN|1:1",
                "time [h],uptake [g]\\n0,1|COLUMN_UNIT_UNKNOWN|1:2",
                "time [h],mass [%]\\n0,1|COLUMN_UNIT_UNKNOWN|1:2",
                "time [h],mass [g]\\nnow,1\\nthen,2|TIME_NOT_UNDERSTOOD|2:1",
                "date,mass [g]\\n01.03.2026,1\\n02.03.2026,2|TIME_NOT_UNDERSTOOD|2:1",
                "time [h],mass [g],remark\\n0,1,ok\\n1,2,\"open\\n2,3,x|QUOTES_NOT_CLOSED|3:0"
            })
    void tablesThatMakeNoRun(String text, Code expected, String where) {
        Finding finding = Reading.fault(text.replace("\\n", "\n"));
        assertThat(finding.code()).isEqualTo(expected);
        assertThat(Reading.where(finding)).isEqualTo(where);
        assertThat(finding.place().source()).isEqualTo(Reading.NAME);
        assertThat(Wording.withPlace(finding)).startsWith(Reading.NAME + ", line ");
    }

    @Test
    void anOptionIsNamedAsThePlaceOfItsFault() {
        Finding finding = Reading.fault("0,1\n", ReadOptions.of().withColumns("time [h],mass"));
        assertThat(finding.code()).isEqualTo(Code.COLUMN_UNIT_MISSING);
        assertThat(finding.place()).isEqualTo(new Place("--columns", 0, 2));
        assertThat(Reading.fault("0,1\n", ReadOptions.of().withColumns("")).code())
                .isEqualTo(Code.TIME_COLUMN_MISSING);
    }

    @Test
    void tooFewWeighingsAreLeftToTheRun() {
        assertThatThrownBy(
                        () -> Reading.one("time [h],mass [g]\n0,1\n1,2\n2,3\n").contents())
                .isInstanceOfSatisfying(
                        Fault.class, f -> assertThat(f.finding().code()).isEqualTo(Code.TOO_FEW_WEIGHINGS));
    }

    @Test
    void aLineThatNeverEndsIsGivenUpEarly() throws IOException {
        Finding finding = Reading.fault("time [h],mass [g]\n0,1\n" + "1".repeat(10_000_000));
        assertThat(finding.code()).isEqualTo(Code.LINE_TOO_LONG);
        assertThat(Reading.where(finding)).isEqualTo("3:0");
        CountingReader endless = new CountingReader("x");
        assertThatThrownBy(() -> new CsvTable(endless, Place.NONE)).isInstanceOf(Fault.class);
        assertThat(endless.count).isLessThan(1_000_000);
    }

    @Test
    void quotationMarksThatNeverCloseAreGivenUpEarly() {
        CountingReader endless = new CountingReader("0,\"1\n2,3\n");
        assertThatThrownBy(() -> {
                    CsvTable table = new CsvTable(endless, Place.NONE);
                    while (table.next()) {
                        assertThat(table.size()).isPositive();
                    }
                })
                .isInstanceOfSatisfying(
                        Fault.class, f -> assertThat(f.finding().code()).isEqualTo(Code.QUOTES_NOT_CLOSED));
        assertThat(endless.count).isLessThan(3L * GuardedReader.LONGEST_ROW);
    }

    @Test
    void moreRowsThanFitAreRefused() {
        RowStore store = new RowStore(1, 3000, Place.of("x"));
        for (int i = 0; i < 3000; i++) {
            store.add(i, i + 2);
        }
        assertThatThrownBy(() -> store.add(0, 3002))
                .isInstanceOfSatisfying(
                        Fault.class,
                        f -> assertThat(f.finding())
                                .isEqualTo(Finding.of(Code.TOO_LARGE, 3000)
                                        .at(Place.of("x").line(3002))));
    }

    @Test
    void progressIsHeardAndCanStopTheReading() throws IOException {
        Path file = Files.writeString(folder.resolve("long.csv"), "time [s],mass [g]\n" + "1,31.2041\n".repeat(50_000));
        List<Double> heard = new ArrayList<>();
        RunFileReader.read(file, ReadOptions.of(), heard::add);
        assertThat(heard).isSorted().hasSizeGreaterThan(3).last().isEqualTo(1.0);
        assertThatThrownBy(() -> RunFileReader.read(file, ReadOptions.of(), fraction -> {
                    throw new CancellationException();
                }))
                .isInstanceOf(CancellationException.class);
    }

    /** Begins with a quotation mark that stays open, or has no line end: the same text for ever. */
    private static final class CountingReader extends Reader {
        private final String text;
        private boolean first = true;
        private long count;

        CountingReader(String text) {
            this.text = text;
        }

        @Override
        public int read(char[] target, int offset, int length) {
            for (int i = 0; i < length; i++) {
                char c = text.charAt((int) (count++ % text.length()));
                target[offset + i] = c == '"' && !first ? ' ' : c;
                first &= c != '"';
            }
            return length;
        }

        @Override
        public void close() {
            // nothing is held
        }
    }
}
