package soakline.figure;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import soakline.estimate.Parameter;
import soakline.inference.Assessment;
import soakline.inference.Interval;
import soakline.inference.ParameterResult;
import soakline.problem.Code;
import soakline.problem.Finding;
import soakline.quantity.Numbers;
import soakline.quantity.Scientific;
import soakline.wording.Wording;

/** The lines above a figure. */
final class FigureWords {

    private static final String DIFFUSIVITY = "diffusivity";

    private FigureWords() {}

    /** D and M∞ with their intervals, or that D is not determined. */
    static List<String> result(Assessment assessment) {
        OptionalDouble d =
                assessment.parameter(DIFFUSIVITY).map(ParameterResult::value).orElse(OptionalDouble.empty());
        if (!assessment.determined() || d.isEmpty()) {
            return List.of(Wording.sentence(Finding.of(refusal(assessment))));
        }
        List<String> lines = new ArrayList<>();
        assessment
                .parameter(DIFFUSIVITY)
                .ifPresent(p -> lines.add(line(assessment.isApparent() ? "apparent D" : "D", p)));
        assessment
                .parameter(Parameter.EQUILIBRIUM_CONTENT.name())
                .filter(p -> p.value().isPresent())
                .ifPresent(p -> lines.add(line("M∞", p)));
        return lines;
    }

    private static Code refusal(Assessment assessment) {
        boolean early = assessment.problems().stream()
                .anyMatch(p -> p.code() == Code.NOT_DETERMINED_OPEN || p.code() == Code.NOT_DETERMINED_WIDE);
        return early ? Code.FIGURE_STOPPED_EARLY : Code.FIGURE_NOT_DETERMINED;
    }

    private static String line(String name, ParameterResult result) {
        var unit = result.parameter().unit();
        double value = unit.fromSi(result.value().orElseThrow());
        double error = unit.fromSi(result.standardError().orElse(Double.NaN));
        String text = name + " = " + Scientific.value(value, error) + " " + unit.symbol();
        if (result.fixed()) {
            return text + " (fixed)";
        }
        Optional<Interval> interval = result.interval();
        return interval.isEmpty() ? text : text + "  (" + interval(interval.get(), result) + ")";
    }

    private static String interval(Interval interval, ParameterResult result) {
        var unit = result.parameter().unit();
        return Numbers.shortest(interval.level() * 100) + " %: "
                + Scientific.interval(
                        unit.fromSi(result.value().orElseThrow()),
                        in(unit::fromSi, interval.low()),
                        in(unit::fromSi, interval.high()));
    }

    private static OptionalDouble in(DoubleUnaryOperator unit, OptionalDouble si) {
        return si.isEmpty() ? si : OptionalDouble.of(unit.applyAsDouble(si.getAsDouble()));
    }

    /** That a long series is not drawn whole. */
    static String reduced(int total, int drawn) {
        return Wording.sentence(Finding.of(Code.FIGURE_REDUCED, grouped(total), grouped(drawn)));
    }

    /** That some of those set aside are not in the picture. */
    static String outside(int count) {
        return Wording.sentence(Finding.of(Code.FIGURE_OUTSIDE, grouped(count)));
    }

    private static String grouped(int count) {
        return String.format(Locale.ROOT, "%,d", count);
    }
}
