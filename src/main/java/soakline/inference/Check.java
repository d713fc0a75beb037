package soakline.inference;

import java.util.List;
import java.util.OptionalDouble;
import soakline.problem.Finding;

/**
 * One check of an estimate: its figures, its verdict and what to say.
 *
 * @param diffusivity what the check's own classic formula gives, m²/s; only for plain sheets, and never when D is not determined
 * @param low lower limit of that diffusivity at the level of the estimate
 * @param high upper limit
 * @param ratioToFit diffusivity that the check sees in the data over what it sees in the fitted curve
 * @param pValue chance of a deviation at least this large if model and noise are right; empty when the check is no test
 * @param figures further numbers, such as an intercept or a Durbin–Watson statistic, in SI
 */
public record Check(
        CheckName name,
        Verdict verdict,
        OptionalDouble diffusivity,
        OptionalDouble low,
        OptionalDouble high,
        OptionalDouble ratioToFit,
        OptionalDouble pValue,
        List<Figure> figures,
        Finding finding) {

    /**
     * A further number of a check.
     *
     * @param name in camel case, as in JSON
     */
    public record Figure(String name, double value) {}

    public Check {
        figures = List.copyOf(figures);
    }

    /** A check that could not be made. */
    static Check unknown(CheckName name, Finding why) {
        return new Check(
                name,
                Verdict.UNKNOWN,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                List.of(),
                why);
    }
}
