package soakline.report;

import soakline.inference.Check;
import soakline.quantity.ResultUnit;

/** The units in which the figures of checks are written. */
final class CheckFigures {

    private CheckFigures() {}

    /** Contents are written in percent, like every content; all else is in SI. */
    static ResultUnit unit(Check.Figure figure) {
        if (figure.name().startsWith("intercept")) {
            return ResultUnit.PERCENT;
        }
        return figure.name().startsWith("slope") ? ResultUnit.PERCENT_PER_ROOT_SECOND : ResultUnit.NONE;
    }
}
