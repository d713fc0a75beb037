package soakline.intake;

import java.util.Optional;
import java.util.OptionalDouble;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Place;
import soakline.quantity.Dimension;
import soakline.quantity.QuantityFormatException;
import soakline.quantity.QuantityText;
import soakline.quantity.Unit;

/**
 * Cells to times in seconds. The first cell that can be read decides what the column holds: numbers with the unit of the title,
 * readings of a plain clock, or instants.
 *
 * <p>Numbers are elapsed times and keep their own zero: a log that begins at 1.5 h was exposed 1.5 h before. Date-times have no
 * zero of their own; here they count from the first one read, and the first weighing becomes zero later.
 */
final class TimeReader {

    private enum Kind {
        UNDECIDED,
        NUMBER,
        MOMENT
    }

    private final Column column;
    private final Place header;
    private final NumberCells numbers;
    private final MomentFormat format;
    private final boolean patternStated;
    private Kind kind = Kind.UNDECIDED;
    private double secondsPerUnit;
    private Moment origin = Moment.plain(0, 0);

    /**
     * @param header where the titles stand, for a fault about the unit
     * @throws Fault when the pattern is none
     */
    TimeReader(Column column, Place header, NumberCells numbers, Optional<String> pattern) {
        this.column = column;
        this.header = header;
        this.numbers = numbers;
        this.patternStated = pattern.isPresent();
        this.format = patternStated ? new PatternMoments(pattern.get()) : new IsoMoments();
    }

    /**
     * Seconds from the zero of numbers, or from the first date-time.
     *
     * @return NaN when the cell is no time like those before it
     * @throws Fault when the column holds numbers and its title no unit
     */
    double read(String cell) {
        return switch (kind) {
            case NUMBER -> number(cell);
            case MOMENT -> moment(cell);
            case UNDECIDED -> decide(cell);
        };
    }

    /** Whether a cell could be a time, without deciding anything. */
    boolean isReadable(String cell) {
        return format.read(cell).isPresent() || numbers.read(cell).isPresent();
    }

    private double decide(String cell) {
        Optional<Moment> moment = format.read(cell);
        if (moment.isPresent()) {
            kind = Kind.MOMENT;
            origin = moment.get();
            return 0;
        }
        if (numbers.read(cell).isEmpty() || (patternStated && column.unit().isEmpty())) {
            return Double.NaN;
        }
        Unit unit = Header.requireUnit(column, header);
        kind = Kind.NUMBER;
        secondsPerUnit = unit.toSi(1);
        return number(cell);
    }

    private double number(String cell) {
        OptionalDouble number = numbers.read(cell);
        double seconds = number.isPresent() ? number.getAsDouble() * secondsPerUnit : Double.NaN;
        return Double.isFinite(seconds) ? seconds : Double.NaN;
    }

    private double moment(String cell) {
        Optional<Moment> moment = format.read(cell);
        return moment.isPresent() && moment.get().zoned() == origin.zoned()
                ? moment.get().since(origin)
                : Double.NaN;
    }

    /** Whether any cell could be read. */
    boolean isDecided() {
        return kind != Kind.UNDECIDED;
    }

    /** Whether the first weighing is time zero, as date-times have none of their own. */
    boolean hasNoZero() {
        return kind == Kind.MOMENT;
    }

    /** Whether the times are readings of a clock that may be set back. */
    boolean isPlainClock() {
        return kind == Kind.MOMENT && !origin.zoned();
    }

    /** A time on the scale of {@link #read} as a calendar time, where the times are date-times. */
    String calendar(double seconds) {
        return origin.plus(seconds).text();
    }

    /**
     * The time of exposure on the scale of {@link #read}.
     *
     * @param fact a date-time like those of the column, or a time with its unit
     * @param first the first weighing, from which a time with a unit counts among date-times
     * @throws Fault when it is neither
     */
    double exposure(FactLine fact, double first, Place place) {
        Optional<Moment> moment = format.read(fact.text()).or(() -> new IsoMoments().read(fact.text()));
        if (moment.isPresent() && kind == Kind.MOMENT && moment.get().zoned() == origin.zoned()) {
            return moment.get().since(origin);
        }
        if (moment.isEmpty()) {
            try {
                double seconds = QuantityText.parse(fact.text(), Dimension.TIME).si();
                return kind == Kind.MOMENT ? first + seconds : seconds;
            } catch (QuantityFormatException e) {
                throw exposureFault(fact, place);
            }
        }
        throw exposureFault(fact, place);
    }

    private Fault exposureFault(FactLine fact, Place place) {
        String example = kind == Kind.NUMBER ? "1.5 h" : origin.zoned() ? "2026-03-01T08:30Z" : "2026-03-01 08:30";
        return Fault.of(Code.EXPOSED_FROM_BAD, Excerpt.of(fact.name()), Excerpt.of(fact.value()), example)
                .at(place.line(fact.line()));
    }
}
