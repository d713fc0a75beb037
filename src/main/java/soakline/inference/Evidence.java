package soakline.inference;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import soakline.problem.Code;
import soakline.problem.Finding;

/**
 * What a check found, before all checks of a run are judged together.
 *
 * @param diffusivity by the check's classic formula, with its limits; all empty where there is none
 * @param probability of a deviation at least this large by chance; empty when it could not be tested
 * @param pass what to say when chance explains it
 * @param concern what to say when it does not
 */
record Evidence(
        CheckName name,
        ClassicDiffusivity diffusivity,
        OptionalDouble ratioToFit,
        OptionalDouble probability,
        List<Check.Figure> figures,
        Finding pass,
        Finding concern) {

    static final double CAUTION = 0.05;
    static final double FAIL = 0.001;

    /** D by a classic formula and its limits. */
    record ClassicDiffusivity(OptionalDouble value, OptionalDouble low, OptionalDouble high) {

        static final ClassicDiffusivity NONE =
                new ClassicDiffusivity(OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty());

        /** D with an interval that is symmetric in ln D. */
        static ClassicDiffusivity of(double value, double reachOfLn) {
            if (!(value > 0) || !Double.isFinite(value) || !Double.isFinite(reachOfLn)) {
                return NONE;
            }
            return new ClassicDiffusivity(
                    OptionalDouble.of(value),
                    OptionalDouble.of(value * Math.exp(-reachOfLn)),
                    OptionalDouble.of(value * Math.exp(reachOfLn)));
        }
    }

    /** A check that these weighings do not allow. */
    static Evidence unknown(CheckName name, String why) {
        Finding finding = Finding.of(Code.CHECK_UNKNOWN, why);
        return new Evidence(
                name,
                ClassicDiffusivity.NONE,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                List.of(),
                finding,
                finding);
    }

    private Check judged(double adjusted) {
        Verdict verdict = probability.isEmpty()
                ? Verdict.UNKNOWN
                : adjusted < FAIL ? Verdict.FAIL : adjusted < CAUTION ? Verdict.CAUTION : Verdict.PASS;
        return new Check(
                name,
                verdict,
                diffusivity.value(),
                diffusivity.low(),
                diffusivity.high(),
                ratioToFit,
                probability,
                figures,
                verdict == Verdict.CAUTION || verdict == Verdict.FAIL ? concern : pass);
    }

    /** Judges all checks of one run together by Holm's method (Scandinavian Journal of Statistics 6 (1979) 65). */
    static List<Check> judge(List<Evidence> evidence) {
        double[] adjusted = holm(evidence.stream().map(Evidence::probability).toList());
        List<Check> checks = new ArrayList<>();
        for (int i = 0; i < evidence.size(); i++) {
            checks.add(evidence.get(i).judged(adjusted[i]));
        }
        return checks;
    }

    /** Holm's adjusted probabilities; NaN where there is none. */
    static double[] holm(List<OptionalDouble> probabilities) {
        double[] adjusted = new double[probabilities.size()];
        List<Integer> order = new ArrayList<>();
        for (int i = 0; i < adjusted.length; i++) {
            adjusted[i] = Double.NaN;
            if (probabilities.get(i).isPresent()) {
                order.add(i);
            }
        }
        Collections.sort(
                order, Comparator.comparingDouble(i -> probabilities.get(i).getAsDouble()));
        double highest = 0;
        for (int rank = 0; rank < order.size(); rank++) {
            int i = order.get(rank);
            highest = Math.max(
                    highest,
                    Math.min(1, (order.size() - rank) * probabilities.get(i).getAsDouble()));
            adjusted[i] = highest;
        }
        return adjusted;
    }
}
