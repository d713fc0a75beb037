package soakline.estimate;

/** What {@link LevenbergMarquardt} minimises: residuals and the model's Jacobian, row block by row block. */
public interface ResidualModel {

    /** Number of free parameters. */
    int parameters();

    /** Number of rows. */
    int observations();

    /**
     * Fills one block of rows.
     *
     * @param point the parameters
     * @param from first row
     * @param count rows in the block, at most {@link soakline.numeric.Triangle#BLOCK}
     * @param block column k receives ∂model/∂parameter k; the last column receives observed − model
     */
    void fill(double[] point, int from, int count, double[][] block);

    /** A sum of squares that is rounding only: below it the data lie on the curve. */
    default double roundingFloor() {
        return 0;
    }

    /** Whether the model is linear in every free parameter, so that one step solves it. */
    default boolean isLinear() {
        return false;
    }
}
