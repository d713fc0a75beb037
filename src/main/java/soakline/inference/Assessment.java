package soakline.inference;

import java.util.List;
import java.util.Optional;
import soakline.estimate.Estimate;
import soakline.problem.Finding;
import soakline.specimen.Run;

/**
 * All there is to say about one coupon: the estimate, its intervals, its checks and the verdicts. Everything that is shown or
 * written comes from here; a parameter that the data do not determine has no value here, so that none can be shown.
 *
 * @param parameters in the order in which they are written
 * @param combined empty when D is not determined or fixed
 * @param determined whether the data determine D
 * @param usable false when the result must not be used as it stands
 * @param fickian verdict on whether the coupon is Fickian, with its sentence
 * @param problems what the user must know before using the numbers
 * @param notes what was read or assumed
 * @param cautions on safety and use
 */
public record Assessment(
        Run run,
        Estimate estimate,
        Direction direction,
        List<ParameterResult> parameters,
        Optional<CombinedUncertainty> combined,
        List<Check> checks,
        Optional<ShortTimeLine> shortTimeLine,
        boolean determined,
        boolean usable,
        Verdict fickian,
        Finding fickianFinding,
        List<Finding> problems,
        List<Finding> notes,
        List<Finding> cautions) {

    public Assessment {
        parameters = List.copyOf(parameters);
        checks = List.copyOf(checks);
        problems = List.copyOf(problems);
        notes = List.copyOf(notes);
        cautions = List.copyOf(cautions);
    }

    /** The result of one parameter, by its name in JSON; empty when it is not among them. */
    public Optional<ParameterResult> parameter(String name) {
        return parameters.stream()
                .filter(p -> p.parameter().name().equals(name))
                .findFirst();
    }

    /** Whether every output must say "apparent D". */
    public boolean isApparent() {
        return fickian == Verdict.FAIL;
    }
}
