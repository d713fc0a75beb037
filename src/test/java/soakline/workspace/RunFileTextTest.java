package soakline.workspace;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.stream.Stream;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import soakline.inference.AssessmentOptions;
import soakline.inference.IntervalMethod;
import soakline.intake.ReadOptions;
import soakline.intake.RunFile;
import soakline.intake.RunFileReader;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.quantity.ExactText;
import soakline.quantity.Quantity;
import soakline.quantity.Unit;
import soakline.session.OpenFile;
import soakline.specimen.Facts;
import soakline.specimen.Facts.Other;
import soakline.specimen.Run;
import soakline.specimen.ValueKind;
import soakline.specimen.Weighings;

/** The law of the round trip, and what a run file looks like. */
class RunFileTextTest {

    static Stream<Path> samples() throws IOException {
        try (Stream<Path> files = Files.list(Path.of("sample-runs"))) {
            return files.sorted().toList().stream();
        }
    }

    private static Workspace read(String text) {
        return OpenFile.workspace(RunFileReader.openText("saved.csv", text, ReadOptions.of()));
    }

    /** All that must come back, with every bit of every number. */
    private static List<String> contents(Workspace workspace) {
        List<String> lines = new ArrayList<>();
        for (Coupon coupon : workspace.coupons()) {
            Run run = coupon.run();
            Facts facts = run.facts();
            lines.add(facts + " " + run.kind());
            Stream.of(
                            facts.thickness(),
                            facts.width(),
                            facts.length(),
                            facts.temperature(),
                            facts.dryMass(),
                            facts.balance())
                    .flatMap(Optional::stream)
                    .forEach(q -> lines.add(
                            bits(q.si()) + " ± " + bits(q.standardUncertainty().orElse(-1)) + " " + q.unit()));
            AssessmentOptions options = coupon.options();
            lines.add(bits(options.level()) + " " + options.method());
            options.fixed().entrySet().stream()
                    .sorted(Map.Entry.comparingByKey())
                    .forEach(f -> lines.add(f.getKey() + " " + bits(f.getValue())));
            Weighings w = run.weighings();
            for (int i = 0; i < w.size(); i++) {
                lines.add(bits(w.time(i)) + " " + bits(w.value(i)) + " " + w.reason(i));
            }
        }
        return lines;
    }

    private static String bits(double value) {
        return value + "=" + Long.toHexString(Double.doubleToRawLongBits(value));
    }

    private static void assertComesBack(Workspace workspace) {
        String text = RunFileText.text(workspace);
        RunFile file = RunFileReader.openText("saved.csv", text, ReadOptions.of());
        Workspace back = OpenFile.workspace(file);
        assertThat(contents(back)).as(text).isEqualTo(contents(workspace));
        for (int c = 0; c < workspace.coupons().size(); c++) {
            assertThat(back.coupons().get(c).run().facts())
                    .isEqualTo(workspace.coupons().get(c).run().facts());
            assertThat(back.coupons().get(c).options())
                    .isEqualTo(workspace.coupons().get(c).options());
        }
        assertThat(RunFileText.text(back)).isEqualTo(text);
        assertThat(file.ownForm()).as(text).isTrue();
    }

    @Test
    void inventedWorkspacesComeBackBitForBit() {
        for (long seed = 1; seed <= 1000; seed++) {
            assertComesBack(InventedWorkspaces.of(seed));
        }
    }

    @ParameterizedTest
    @MethodSource("samples")
    void sampleRunsComeBackBitForBit(Path sample) throws IOException {
        Workspace workspace = read(Files.readString(sample));
        assertComesBack(workspace);
        assertComesBack(workspace.with(
                0,
                c -> c.withWeighings(
                        c.run().weighings().settingAside(3, "drop on the pan").correcting(4, 12.5, 0.0312))));
    }

    /** The unit, the decimals and the order of a file that a person typed. */
    @Test
    void aSampleRunLooksAsItDid() throws IOException {
        String typed = Files.readString(Path.of("sample-runs", "04-stopped-early.csv"));
        String written = RunFileText.text(read(typed));
        assertThat(written)
                .startsWith("# run file: 1\n# specimen: P-11 stopped early\n# thickness: 3.1 mm ± 0.02 mm\n");
        assertThat(written).contains("\ntime [d],mass [g]\n0,48.0258\n0.02,48.0593\n");
    }

    @Test
    void bytesAndTextAreTheSame() throws IOException {
        for (long seed = 1; seed <= 200; seed++) {
            ByteArrayOutputStream out = new ByteArrayOutputStream();
            RunFileText.write(InventedWorkspaces.of(seed), out);
            assertThat(out.toString(StandardCharsets.UTF_8)).isEqualTo(RunFileText.text(InventedWorkspaces.of(seed)));
        }
    }

    private static Coupon coupon(String specimen, double[] times, double... values) {
        return Coupon.of(new Run("x", Facts.of(specimen), ValueKind.MASS, Weighings.of(times, values), List.of()));
    }

    @Test
    void severalCouponsShareTheRowsOfTheSameTime() {
        Coupon first = coupon("A1", new double[] {0, 0, 3600}, 0.01, 0.011, 0.012);
        Coupon second = coupon("time", new double[] {0, 1800, 3600, 3600}, 0.02, 0.021, 0.022, 0.023);
        Workspace two = new Workspace(List.of(
                first.withFacts(first.run().facts().withThickness(Quantity.of(2, Unit.MILLIMETRE))),
                second.withWeighings(second.run().weighings().settingAside(1, "=1+1, wet"))
                        .withOptions(AssessmentOptions.usual()
                                .withFixed(Map.of("startContent", 0.0, "diffusivity", 1e-12))
                                .withLevel(0.9)
                                .withMethod(IntervalMethod.LINEARISED))));
        assertThat(RunFileText.text(two)).isEqualTo("""
                # run file: 1
                # A1 thickness: 2 mm
                # C2 specimen: time
                # C2 fixed diffusivity: 1E-12 m²/s
                # C2 fixed startContent: 0 %
                # C2 interval level: 0.9
                # C2 interval method: linearised
                time [h],A1 mass [g],C2 mass [g],C2 set aside
                0,10,20,
                0,11,,
                0.5,,21,"\""=1+1, wet""\"
                1,12,22,
                1,,23,
                """);
        assertComesBack(two);
    }

    @Test
    void whatAllCouponsHaveAlikeStandsOnce() {
        Facts facts = Facts.of("A")
                .withDryMass(Quantity.of(31.2, Unit.GRAM))
                .withOther(List.of(new Other("batch", "7"), new Other("time zero", "2026-03-01 08:30")));
        Coupon one = coupon("A", new double[] {0}, 0.03).withFacts(facts);
        Coupon other = one.withFacts(facts.withSpecimen("B"));
        Coupon dry = one.withFacts(facts.withSpecimen("dry"));
        assertThat(RunFileText.text(new Workspace(List.of(one, other))))
                .startsWith("# run file: 1\n# dry mass: 31.2 g\n# batch: 7\n# time zero: 2026-03-01 08:30\ntime");
        assertThat(RunFileText.text(new Workspace(List.of(one, dry)))).contains("\n# dry mass: 31.2 g\n# batch: 7\n");
        assertComesBack(new Workspace(List.of(one, dry)));
        assertComesBack(new Workspace(List.of(one, other.withFacts(facts.withSpecimen("batch")))));
    }

    /** A choice that only a later version knows is neither used nor lost. */
    @Test
    void anUnknownChoiceStaysOne() {
        String text = "# fixed biotNumber: 3\n# faces: both\ntime [h],mass [g]\n0,1\n1,2\n";
        Workspace workspace = read(text);
        assertThat(workspace.coupons().get(0).options()).isEqualTo(AssessmentOptions.usual());
        assertThat(workspace.coupons().get(0).run().notes())
                .anyMatch(n -> n.code() == Code.FACT_UNKNOWN_KEPT && n.place().line() == 1);
        assertThat(RunFileText.text(workspace)).contains("\n# fixed biotNumber: 3\n");
        assertComesBack(workspace);
    }

    @Test
    void badChoicesAreFaultsWithTheirLine() {
        Map<String, Code> bad = Map.of(
                "fixed diffusivity: 0 m2/s", Code.FACT_NOT_POSITIVE,
                "fixed diffusivity: fast", Code.FACT_NOT_A_QUANTITY,
                "fixed startContent: 1 mm", Code.FACT_UNIT_UNKNOWN,
                "fixed startContent: inf", Code.FACT_NOT_A_QUANTITY,
                "interval level: 95", Code.FACT_LEVEL_BAD,
                "interval level: high", Code.FACT_LEVEL_BAD,
                "interval method: best", Code.FACT_NOT_ONE_OF);
        bad.forEach((line, code) -> {
            Fault fault = catchThrowableOfType(
                    Fault.class, () -> read("# faces: both\n# " + line + "\ntime [h],mass [g]\n0,1\n"));
            assertThat(fault.finding().code()).as(line).isEqualTo(code);
            assertThat(fault.finding().place().line()).as(line).isEqualTo(2);
        });
        assertThat(read("# fixed STARTCONTENT: 0.5\n# interval level: 90 %\ntime [h],mass [g]\n0,1\n")
                        .coupons()
                        .get(0)
                        .options())
                .isEqualTo(AssessmentOptions.usual()
                        .withFixed(Map.of("startContent", 0.005))
                        .withLevel(0.9));
    }

    /** In the unit it was set in, a value that was worked out may have no decimal; then the SI unit keeps it exact. */
    @Test
    void aValueWithNoDecimalInItsUnitIsKeptExactly() {
        double si = 0.001 * 1.9999999999999998;
        for (int k = 0; ExactText.exists(si, Unit.MILLIMETRE); k++) {
            si = Math.nextUp(si);
            assertThat(k).isLessThan(1000);
        }
        Quantity odd = Quantity.of(2, Unit.MILLIMETRE).withSi(si);
        Coupon coupon = coupon("A", new double[] {0}, 0.03);
        Workspace back = read(RunFileText.text(
                new Workspace(List.of(coupon.withFacts(coupon.run().facts().withThickness(odd))))));
        Quantity read = back.coupons().get(0).run().facts().thickness().orElseThrow();
        assertThat(read.si()).isEqualTo(si);
        assertThat(read.unit()).isEqualTo(Unit.METRE);
    }

    @Test
    void whatNoReaderWouldTakeIsRefusedBeforeItIsWritten() {
        Coupon coupon = coupon("A", new double[] {0}, 0.03);
        Facts facts = coupon.run().facts();
        assertRefused(coupon.withFacts(facts.withDryMass(Quantity.of(0, Unit.GRAM))), Code.FACT_NOT_POSITIVE);
        String long1 = "x".repeat(RunFileText.LONGEST_LINE - "# batch: ".length());
        assertComesBack(new Workspace(List.of(coupon.withFacts(facts.withOther(List.of(new Other("batch", long1)))))));
        assertRefused(coupon.withFacts(facts.withOther(List.of(new Other("batch", long1 + "x")))), Code.TEXT_TOO_LONG);
        assertRefused(
                coupon.withWeighings(coupon.run().weighings().settingAside(0, "y".repeat(RunFileText.LONGEST_LINE))),
                Code.TEXT_TOO_LONG);
        assertThatThrownBy(() -> RunFileText.text(Workspace.EMPTY)).isInstanceOf(IllegalArgumentException.class);
    }

    private static void assertRefused(Coupon coupon, Code code) {
        Fault fault = catchThrowableOfType(Fault.class, () -> RunFileText.text(new Workspace(List.of(coupon))));
        assertThat(fault.finding().code()).isEqualTo(code);
    }

    /** Whatever a spreadsheet takes for a separator: no cell, as it sees it, is a formula. */
    @ParameterizedTest
    @ValueSource(chars = {',', ';', '\t'})
    void noTextIsAFormula(char delimiter) throws IOException {
        CSVFormat format = CSVFormat.Builder.create()
                .setDelimiter(delimiter)
                .setQuote('"')
                .setTrailingData(true)
                .setLenientEof(true)
                .get();
        for (long seed = 1; seed <= 1000; seed++) {
            String text = RunFileText.text(InventedWorkspaces.of(seed));
            for (CSVRecord row : CSVParser.parse(text, format)) {
                for (String cell : row) {
                    boolean number = cell.matches("-?[0-9.]+(E[+-][0-9]+)?([,\t].*)?");
                    assertThat(number || !cell.matches("(?s)\\s*[=+\\-@].*"))
                            .as(row + text)
                            .isTrue();
                }
            }
        }
    }

    @Test
    void aMillionRowsGoThroughInPieces() throws IOException {
        int rows = 1_000_000;
        double[] times = new double[rows];
        double[] values = new double[rows];
        for (int i = 0; i < rows; i++) {
            times[i] = i;
            values[i] = Unit.GRAM.toSi(31 + (i % 50_000) / 10_000.0);
        }
        Workspace workspace = new Workspace(List.of(coupon("log", times, values)));
        Pieces pieces = new Pieces();
        List<Double> shares = new ArrayList<>();
        RunFileText.write(workspace, pieces, shares::add);
        assertThat(pieces.lines).isEqualTo(rows + 3);
        assertThat(pieces.longest).isLessThan(200_000);
        assertThat(shares).isSorted().hasSizeGreaterThan(100).endsWith(1.0);
        assertThatThrownBy(() -> RunFileText.write(workspace, new Pieces(), share -> {
                    throw new CancellationException();
                }))
                .isInstanceOf(CancellationException.class);
    }

    /** Counts, and keeps nothing. */
    private static final class Pieces extends OutputStream {
        private int lines;
        private int longest;

        @Override
        public void write(int b) {
            write(new byte[] {(byte) b}, 0, 1);
        }

        @Override
        public void write(byte[] bytes, int offset, int length) {
            longest = Math.max(longest, length);
            for (int i = offset; i < offset + length; i++) {
                lines += bytes[i] == '\n' ? 1 : 0;
            }
        }
    }
}
