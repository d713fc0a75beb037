package soakline.estimate;

import soakline.quantity.ResultUnit;

/**
 * A parameter of an estimate.
 *
 * @param name as in the machine-readable result
 * @param logScale whether it is worked with as its natural logarithm
 */
public record Parameter(String name, ResultUnit unit, boolean logScale) {

    public static final Parameter START_CONTENT = new Parameter("startContent", ResultUnit.PERCENT, false);
    public static final Parameter EQUILIBRIUM_CONTENT = new Parameter("equilibriumContent", ResultUnit.PERCENT, false);
    /** Slope of content on √t at the start; in the place of the equilibrium content where a test stopped early. */
    public static final Parameter INITIAL_SLOPE =
            new Parameter("initialSlope", ResultUnit.PERCENT_PER_ROOT_SECOND, false);

    /** The SI value that a working value stands for. */
    public double fromWorking(double working) {
        return logScale ? Math.exp(working) : working;
    }

    /** The working value of an SI value. */
    public double toWorking(double si) {
        return logScale ? Math.log(si) : si;
    }
}
