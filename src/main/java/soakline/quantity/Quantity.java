package soakline.quantity;

import java.util.OptionalDouble;

/**
 * A value with its unit and, where known, its standard uncertainty.
 *
 * @param si value in SI (kelvin, fraction)
 * @param standardUncertainty in SI; empty when nobody stated one (which is not the same as zero)
 * @param unit the unit it was given in, kept so that it is shown as its owner wrote it
 */
public record Quantity(double si, OptionalDouble standardUncertainty, Unit unit) {

    public Quantity {
        if (!Double.isFinite(si)) {
            throw new IllegalArgumentException("a quantity must be finite: " + si);
        }
        if (standardUncertainty.isPresent() && !(standardUncertainty.getAsDouble() >= 0)) {
            throw new IllegalArgumentException("a standard uncertainty must not be negative: " + standardUncertainty);
        }
    }

    /** A value in a unit, of unknown uncertainty. */
    public static Quantity of(double value, Unit unit) {
        return new Quantity(unit.toSi(value), OptionalDouble.empty(), unit);
    }

    /** The same value with a standard uncertainty given in its own unit. */
    public Quantity withStandardUncertainty(double uncertainty) {
        return new Quantity(si, OptionalDouble.of(unit.differenceToSi(uncertainty)), unit);
    }

    /** The same uncertainty and unit at another SI value. */
    public Quantity withSi(double value) {
        return new Quantity(value, standardUncertainty, unit);
    }

    public Dimension dimension() {
        return unit.dimension();
    }

    /** u/x, or zero where no uncertainty is stated. */
    public double relativeUncertainty() {
        return standardUncertainty.orElse(0) / Math.abs(si);
    }

    /** As a person would write it, such as {@code 2.03 mm ± 0.01 mm}. */
    @Override
    public String toString() {
        String value = Numbers.shortest(unit.fromSi(si)) + " " + unit.symbol();
        return standardUncertainty.isPresent()
                ? value + " ± " + Numbers.shortest(unit.differenceFromSi(standardUncertainty.getAsDouble())) + " "
                        + unit.symbol()
                : value;
    }
}
