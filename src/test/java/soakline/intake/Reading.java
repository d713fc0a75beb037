package soakline.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.util.List;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Finding;
import soakline.specimen.Run;
import soakline.specimen.Weighings;

/** Short words for what the tests of this package do all the time. */
final class Reading {

    static final String NAME = "p07.csv";

    private Reading() {}

    static List<Run> all(String text) {
        return RunFileReader.readText(NAME, text, ReadOptions.of());
    }

    static Run one(String text) {
        return one(text, ReadOptions.of());
    }

    static Run one(String text, ReadOptions options) {
        List<Run> runs = RunFileReader.readText(NAME, text, options);
        assertThat(runs).hasSize(1);
        return runs.get(0);
    }

    static Finding fault(String text) {
        return fault(text, ReadOptions.of());
    }

    static Finding fault(String text, ReadOptions options) {
        Fault fault = catchThrowableOfType(Fault.class, () -> RunFileReader.readText(NAME, text, options));
        assertThat(fault).as("a fault is thrown").isNotNull();
        assertThat(fault.finding().code().kind()).isEqualTo(Code.Kind.INPUT);
        return fault.finding();
    }

    static double[] times(Run run) {
        Weighings w = run.weighings();
        double[] times = new double[w.size()];
        for (int i = 0; i < times.length; i++) {
            times[i] = w.time(i);
        }
        return times;
    }

    static double[] values(Run run) {
        Weighings w = run.weighings();
        double[] values = new double[w.size()];
        for (int i = 0; i < values.length; i++) {
            values[i] = w.value(i);
        }
        return values;
    }

    static List<Finding> notes(Run run, Code code) {
        return run.notes().stream().filter(n -> n.code() == code).toList();
    }

    /** Line and column of the only note of a kind. */
    static String where(Run run, Code code) {
        List<Finding> notes = notes(run, code);
        assertThat(notes).hasSize(1);
        return where(notes.get(0));
    }

    static String where(Finding finding) {
        return finding.place().line() + ":" + finding.place().column();
    }
}
