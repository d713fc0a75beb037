package soakline.numeric;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/** Bracketed roots. */
public final class Roots {

    private static final int MOST_EVALUATIONS = 200;

    private Roots() {}

    /**
     * The root of a function between two places at which its signs differ, by Brent's method (Apache Commons Math).
     *
     * @param relative accuracy of the root, such as 1e-14
     * @throws org.apache.commons.math3.exception.NoBracketingException when the signs do not differ
     */
    public static double between(DoubleUnaryOperator f, double low, double high, double relative) {
        return new BrentSolver(relative, 1e-300).solve(MOST_EVALUATIONS, f::applyAsDouble, low, high);
    }
}
