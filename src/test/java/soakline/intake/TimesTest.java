package soakline.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import soakline.problem.Code;
import soakline.specimen.Run;

/** Elapsed times, plain clocks, instants, stated patterns, and where zero is. */
class TimesTest {

    private static double[] secondsOf(String second, String first) {
        return Reading.times(Reading.one("date,mass [g]\n\"" + first + "\",1\n\"" + second + "\",2\n"));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "2026-03-01 08:30|2026-03-01 09:30|3600",
                "2026-03-01T08:30:00|2026-03-01T08:30:01.25|1.25",
                "2026-03-01|2026-03-02|86400",
                "2026-03-01 08:30:00,5|2026-03-01 08:30:01|0.5",
                "2026-03-01T08:30Z|2026-03-01T10:30+01:00|3600",
                "2026-03-01T08:30:00+0100|2026-03-01T08:30:00Z|3600",
                "2026-03-29T01:30+01:00[Europe/Vienna]|2026-03-29T03:30+02:00[Europe/Vienna]|3600",
                "2026-03-29 01:30[Europe/Vienna]|2026-03-29 03:30[Europe/Vienna]|3600",
                "2026-03-29 01:30|2026-03-29 03:30|7200",
                "2024-02-28|2024-03-01|172800",
                "2026-03-01  08:30|2026-03-01 08:30:00.000000001|1e-9"
            })
    void dateTimesCountFromTheFirstWeighing(String first, String second, double seconds) {
        assertThat(secondsOf(second, first)).containsExactly(new double[] {0, seconds}, within(1e-12));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "2026-02-30",
                "2026-13-01",
                "2026-03-01 24:00",
                "2026-03-01 08:60",
                "2026-03-01 08:30x",
                "2026-03-01T",
                "01.03.2026",
                "2026-03-01 08:30[Nowhere/Here]",
                "2026-03-01 08:30[",
                "2026-03-01 08:30+99:00",
                "2026-3-1",
                "20260301",
                "08:30"
            })
    void otherTextIsNoDateTime(String text) {
        Run run = Reading.one("date;mass [g]\n2026-01-01;1\n" + text + ";2\n2026-01-02;3\n");
        assertThat(run.weighings().size()).isEqualTo(2);
        assertThat(Reading.where(run, Code.TIME_CELL_BAD)).isEqualTo("3:1");
    }

    @Test
    void instantsAndClockTimesDoNotMix() {
        Run run = Reading.one("date,mass [g]\n2026-01-01T08:00Z,1\n2026-01-01T09:00,2\n");
        assertThat(Reading.where(run, Code.TIME_CELL_BAD)).isEqualTo("3:1");
    }

    @Test
    void aPatternIsReadAsStated() {
        ReadOptions options = ReadOptions.of().withDatePattern("dd.MM.yyyy HH:mm");
        Run run = Reading.one("Date;mass [g]\n01.03.2026 08:30;1\n02.03.2026 08:31;2\n", options);
        assertThat(Reading.times(run)).containsExactly(0, 86_460);
        Run digits = Reading.one(
                "date,mass [g]\n20260301,1\n20260302,2\n", ReadOptions.of().withDatePattern("yyyyMMdd"));
        assertThat(Reading.times(digits)).containsExactly(0, 86_400);
        Run named = Reading.one(
                "date,mass [g]\n1 mar 26 1:00 PM,1\n1 Mar 26 2:00 pm,2\n",
                ReadOptions.of().withDatePattern("d MMM yy h:mm a"));
        assertThat(Reading.times(named)).containsExactly(0, 3600);
    }

    @ParameterizedTest
    @ValueSource(strings = {"dd.mm.yyyy", "quux", "HH:mm", "", "dd.MM.YYYY", "[", "dd MM"})
    void aPatternThatCannotGiveADateIsAFault(String pattern) {
        assertThat(Reading.fault(
                                "date,mass [g]\n01.03.2026,1\n",
                                ReadOptions.of().withDatePattern(pattern))
                        .code())
                .isEqualTo(Code.DATE_PATTERN_BAD);
    }

    @Test
    void dateAndClockMayStandInTwoColumns() {
        Run run = Reading.one("Date,Time,mass [g]\n2026-03-01,08:30,1\n2026-03-01,10:30:30,2\n");
        assertThat(Reading.times(run)).containsExactly(0, 7230);
        Run swapped = Reading.one("clock;date;mass [g]\n23:00;2026-03-01;1\n01:00;2026-03-02;2\n");
        assertThat(Reading.times(swapped)).containsExactly(0, 7200);
    }

    @Test
    void elapsedTimesKeepTheirZero() {
        assertThat(Reading.times(Reading.one("time [h],mass [g]\n1.5,1\n2,2\n")))
                .containsExactly(5400, 7200);
        Run before = Reading.one("time [h],mass [g]\n-1,1\n0,1\n2,2\n");
        assertThat(Reading.times(before)).containsExactly(-3600, 0, 7200);
        assertThat(Reading.notes(before, Code.BEFORE_EXPOSURE).get(0).values()).containsExactly(1);
    }

    @Test
    void exposureMayBeStated() {
        Run elapsed = Reading.one("# exposed from: 30 min\ntime [h],mass [g]\n0,1\n0.5,1\n1,2\n");
        assertThat(Reading.times(elapsed)).containsExactly(-1800, 0, 1800);
        assertThat(Reading.notes(elapsed, Code.BEFORE_EXPOSURE).get(0).values()).containsExactly(1);
        String rows = "date,mass [g]\n2026-03-01 08:00,1\n2026-03-01 09:00,2\n";
        assertThat(Reading.times(Reading.one("# exposed from: 2026-03-01 08:15\n" + rows)))
                .containsExactly(-900, 2700);
        assertThat(Reading.times(Reading.one("# exposed from: 10 min\n" + rows)))
                .containsExactly(-600, 3000);
        assertThat(Reading.fault("# exposed from: 2026-03-01T08:15Z\n" + rows).code())
                .isEqualTo(Code.EXPOSED_FROM_BAD);
    }

    @Test
    void eachCouponBeginsWithItsOwnFirstWeighing() {
        var runs = Reading.all("date,A mass [g],B mass [g]\n2026-03-01,1,\n2026-03-02,2,5\n2026-03-03,3,6\n");
        assertThat(Reading.times(runs.get(0))).containsExactly(0, 86_400, 172_800);
        assertThat(Reading.times(runs.get(1))).containsExactly(0, 86_400);
    }

    @Test
    void aClockSetBackIsNoted() {
        Run run = Reading.one("""
                date,mass [g]
                2026-10-25 02:30,1
                2026-10-25 02:50,2
                2026-10-25 02:00,3
                2026-10-25 02:10,4
                """);
        assertThat(Reading.where(run, Code.CLOCK_CHANGE)).isEqualTo("4:1");
        assertThat(Reading.notes(run, Code.CLOCK_CHANGE).get(0).values()).containsExactly(3000L);
        assertThat(Reading.notes(run, Code.ROWS_SORTED)).hasSize(1);
        Run instants = Reading.one("date,mass [g]\n2026-10-25T02:50Z,2\n2026-10-25T02:00Z,3\n");
        assertThat(Reading.notes(instants, Code.CLOCK_CHANGE)).isEmpty();
    }

    @Test
    void aTitleNeedsAUnitOnlyForNumbers() {
        assertThat(Reading.times(Reading.one("Timestamp (UTC),mass [g]\n2026-03-01,1\n2026-03-02,2\n")))
                .containsExactly(0, 86_400);
        assertThat(Reading.fault("Timestamp (UTC),mass [g]\n1,1\n").code()).isEqualTo(Code.COLUMN_UNIT_UNKNOWN);
        assertThat(Reading.fault("time,mass [g]\n1,1\n").code()).isEqualTo(Code.COLUMN_UNIT_MISSING);
    }
}
