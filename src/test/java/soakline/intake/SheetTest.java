package soakline.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.specimen.Facts;
import soakline.specimen.Run;

/** Spreadsheets, told by their content whatever the file is called. */
class SheetTest {

    @TempDir
    Path folder;

    private Run read(byte[] bytes) throws IOException {
        Path file = Files.write(folder.resolve("log.xlsx"), bytes);
        return RunFileReader.read(file, ReadOptions.of(), Progress.NONE).get(0);
    }

    private static double[] dated(double day) {
        return new double[] {day, Workbooks.DATE_TIME};
    }

    @Test
    void factsHeaderAndSerialDatesAreRead() throws IOException {
        Run run = read(new Workbooks()
                .row("# specimen: P-07")
                .row("# thickness:", "2.03 mm ± 0.01 mm")
                .row("# dry mass", 31.2041, "g")
                .row("# resin", "batch 12")
                .gap()
                .row("Date", "mass [g]", "set aside")
                .row(dated(46_082.25), 31.5)
                .row(dated(46_082.5), 32.25, "wet")
                .row(dated(46_083.25), "n/a")
                .row(dated(46_084.25), 33)
                .bytes());
        assertThat(run.name()).isEqualTo("P-07");
        assertThat(run.facts().thickness().orElseThrow().toString()).isEqualTo("2.03 mm ± 0.01 mm");
        assertThat(run.facts().dryMass().orElseThrow().si()).isCloseTo(0.0312041, within(1e-15));
        assertThat(run.facts().other())
                .containsExactly(
                        new Facts.Other("resin", "batch 12"), new Facts.Other("time zero", "2026-03-01 06:00"));
        assertThat(Reading.times(run)).containsExactly(0, 21_600, 172_800);
        assertThat(Reading.values(run)).containsExactly(new double[] {0.0315, 0.03225, 0.033}, within(1e-12));
        assertThat(run.weighings().reason(1)).contains("wet");
        assertThat(run.weighings().line(0)).isEqualTo(7);
        assertThat(Reading.where(run, Code.CELL_NOT_A_NUMBER)).isEqualTo("9:2");
    }

    @Test
    void aStatedExposureMeetsTheRightDay() throws IOException {
        // 46 082 is 2026-03-01 when days count from 1900, and 44 620 when they count from 1904
        for (boolean from1904 : new boolean[] {false, true}) {
            Workbooks workbook = from1904 ? new Workbooks().from1904() : new Workbooks();
            double day = from1904 ? 44_620 : 46_082;
            Run run = read(workbook.row("# exposed from: 2026-03-01 06:00")
                    .row("date", "mass [g]")
                    .row(dated(day), 1)
                    .row(dated(day + 0.5), 2)
                    .bytes());
            assertThat(Reading.times(run)).containsExactly(-21_600, 21_600);
        }
    }

    @Test
    void elapsedTimesAndClockColumnsAreRead() throws IOException {
        Run elapsed = read(new Workbooks()
                .row("time [h]", "mass [g]")
                .row(0, 1.5)
                .row(1.5E-1, 2)
                .bytes());
        assertThat(Reading.times(elapsed)).containsExactly(new double[] {0, 540}, within(1e-9));
        Run joined = read(new Workbooks()
                .row("date", "time", "mass [g]")
                .row(dated(46_082), new double[] {0.25, Workbooks.CLOCK}, 1)
                .row(dated(46_083), new double[] {0.75, Workbooks.CLOCK}, 2)
                .bytes());
        assertThat(Reading.times(joined)).containsExactly(0, 129_600);
    }

    @Test
    void aDateUnderATitleWithAUnitIsNoElapsedTime() throws IOException {
        Run run = read(new Workbooks()
                .row("time [h]", "mass [g]")
                .row(1, 1)
                .row(dated(46_082), 2)
                .bytes());
        assertThat(Reading.where(run, Code.TIME_CELL_BAD)).isEqualTo("3:1");
    }

    @Test
    void aWorkbookWithoutStylesIsRead() throws IOException {
        Run run = read(new Workbooks()
                .withoutStyles()
                .row("time [h]", "mass [g]")
                .row(0, 1.5)
                .row(1, 2)
                .bytes());
        assertThat(Reading.times(run)).containsExactly(0, 3600);
    }

    @Test
    void aDamagedOrEmptyWorkbookIsAFault() throws IOException {
        byte[] whole = new Workbooks().row("time [h]", "mass [g]").row(0, 1).bytes();
        assertThat(fault(Arrays.copyOf(whole, whole.length / 2))).isEqualTo(Code.SHEET_NOT_READABLE);
        assertThat(fault(new byte[] {'P', 'K', 3, 4, 0, 0})).isEqualTo(Code.SHEET_NOT_READABLE);
        assertThat(fault(new Workbooks().bytes())).isEqualTo(Code.FILE_EMPTY);
        assertThat(fault(new Workbooks().row("a", "b").bytes())).isEqualTo(Code.TIME_COLUMN_MISSING);
    }

    @Test
    void theReadingCanBeStopped() throws IOException {
        Path file = Files.write(
                folder.resolve("x"), new Workbooks().row("time [h]", "mass [g]").bytes());
        assertThat(catchThrowableOfType(
                        CancellationException.class,
                        () -> RunFileReader.read(file, ReadOptions.of(), f -> {
                            throw new CancellationException();
                        })))
                .isNotNull();
    }

    private Code fault(byte[] bytes) {
        return catchThrowableOfType(Fault.class, () -> read(bytes)).finding().code();
    }
}
