package crooked.numeric;

import crooked.specimen.Coupon;
import org.apache.commons.math3.optim.MaxEval;

/** Breaks the rules on purpose: a room below uses one above, in a circle, and reaches for the optimiser. */
public final class Roots {

    private Roots() {}

    public static int of(Coupon coupon) {
        return coupon.weighings() + new MaxEval(3).getMaxEval();
    }
}
