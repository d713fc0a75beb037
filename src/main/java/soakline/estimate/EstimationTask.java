package soakline.estimate;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import soakline.specimen.ContentSeries;
import soakline.uptake.ShapeParameter;
import soakline.uptake.UptakeModel;

/**
 * What to estimate: a model, the contents to fit it to, and which parameters are held fixed. Immutable.
 *
 * <p>Parameters stand in this order: the model's shape parameters (D first), the start content M0, and the level (M∞ or the
 * initial slope). Their working values are logarithms where {@link Parameter#logScale()} says so.
 */
public final class EstimationTask {

    private final UptakeModel model;
    private final ContentSeries data;
    private final LevelForm form;
    private final double[] fixed;
    private final List<Parameter> parameters;

    private EstimationTask(UptakeModel model, ContentSeries data, LevelForm form, double[] fixed) {
        this.model = model;
        this.data = data;
        this.form = form;
        this.fixed = fixed;
        List<Parameter> all = new ArrayList<>();
        for (ShapeParameter shape : model.shape()) {
            all.add(new Parameter(shape.name(), shape.unit(), true));
        }
        all.add(Parameter.START_CONTENT);
        all.add(form.parameter());
        this.parameters = List.copyOf(all);
    }

    /** All parameters free. */
    public static EstimationTask of(UptakeModel model, ContentSeries data) {
        double[] free = new double[model.shape().size() + 2];
        Arrays.fill(free, Double.NaN);
        return new EstimationTask(model, data, LevelForm.EQUILIBRIUM, free);
    }

    /** The same task with one parameter held at a working value. */
    public EstimationTask withFixed(int parameter, double working) {
        if (!Double.isFinite(working)) {
            throw new IllegalArgumentException(parameters.get(parameter).name() + " cannot be fixed at " + working);
        }
        double[] next = fixed.clone();
        next[parameter] = working;
        return new EstimationTask(model, data, form, next);
    }

    /**
     * The same task asking for the initial slope instead of the equilibrium content, which must be free.
     */
    public EstimationTask withInitialSlope() {
        if (isFixed(levelIndex())) {
            throw new IllegalStateException("the equilibrium content is fixed, so the initial slope follows from D");
        }
        return new EstimationTask(model, data, LevelForm.INITIAL_SLOPE, fixed);
    }

    /** The same task on other contents. */
    public EstimationTask withData(ContentSeries other) {
        return new EstimationTask(model, other, form, fixed);
    }

    /** The same task under another model with as many shape parameters, such as the same coupon a little thicker. */
    public EstimationTask withModel(UptakeModel other) {
        return new EstimationTask(other, data, form, fixed);
    }

    public UptakeModel model() {
        return model;
    }

    public ContentSeries data() {
        return data;
    }

    public LevelForm form() {
        return form;
    }

    public List<Parameter> parameters() {
        return parameters;
    }

    /** Where a parameter stands. @throws IllegalArgumentException when there is none of that name */
    public int indexOf(String name) {
        for (int i = 0; i < parameters.size(); i++) {
            if (parameters.get(i).name().equals(name)) {
                return i;
            }
        }
        throw new IllegalArgumentException("no parameter " + name);
    }

    public int shapeCount() {
        return fixed.length - 2;
    }

    public int startIndex() {
        return fixed.length - 2;
    }

    public int levelIndex() {
        return fixed.length - 1;
    }

    public boolean isFixed(int parameter) {
        return !Double.isNaN(fixed[parameter]);
    }

    /** The working value a parameter is held at. */
    public OptionalDouble fixedAt(int parameter) {
        return isFixed(parameter) ? OptionalDouble.of(fixed[parameter]) : OptionalDouble.empty();
    }

    /** Indices of the free parameters, rising. */
    public int[] free() {
        int[] free = new int[fixed.length];
        int n = 0;
        for (int i = 0; i < fixed.length; i++) {
            if (!isFixed(i)) {
                free[n++] = i;
            }
        }
        return Arrays.copyOf(free, n);
    }

    /** All working values: the fixed ones and, in their places, the free ones. */
    double[] complete(double[] freeValues) {
        double[] all = fixed.clone();
        int k = 0;
        for (int i = 0; i < all.length; i++) {
            if (!isFixed(i)) {
                all[i] = freeValues[k++];
            }
        }
        return all;
    }

    /** The free ones among all working values. */
    double[] reduce(double[] all) {
        int[] free = free();
        double[] values = new double[free.length];
        for (int k = 0; k < free.length; k++) {
            values[k] = all[free[k]];
        }
        return values;
    }
}
