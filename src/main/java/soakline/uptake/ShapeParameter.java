package soakline.uptake;

import soakline.quantity.ResultUnit;

/**
 * A parameter that shapes the curve of fractional uptake: positive, and worked with as its natural logarithm.
 *
 * @param name as in the machine-readable result, such as {@code diffusivity}
 */
public record ShapeParameter(String name, ResultUnit unit) {

    public static final ShapeParameter DIFFUSIVITY =
            new ShapeParameter("diffusivity", ResultUnit.SQUARE_METRE_PER_SECOND);
}
