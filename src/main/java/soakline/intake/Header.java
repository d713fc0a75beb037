package soakline.intake;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import soakline.intake.Column.Role;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Place;
import soakline.quantity.Dimension;
import soakline.quantity.Numbers;
import soakline.quantity.Unit;

/**
 * Which column holds what.
 *
 * @param time the column of times, or of dates
 * @param clock the column of clock times that belong to the dates, where they stand apart
 * @param values one column a coupon, at least one, with different coupon names where there are several
 */
record Header(Column time, Optional<Column> clock, List<Column> values, List<Column> setAside, int size) {

    /**
     * Reads the titles.
     *
     * @throws Fault when they name no time, no value, or more than one time
     */
    static Header of(List<String> titles, Place place) {
        List<Column> columns = new ArrayList<>();
        for (int i = 0; i < titles.size(); i++) {
            columns.add(Column.of(i, titles.get(i)));
        }
        if (columns.stream().noneMatch(c -> c.isTime() || c.role() == Role.VALUE) && holdsNumber(titles)) {
            throw Fault.of(Code.HEADER_MISSING).at(place);
        }
        List<Column> times = columns.stream().filter(Column::isTime).toList();
        if (times.isEmpty()) {
            times = columns.stream()
                    .filter(c -> c.role() == Role.OTHER
                            && Unit.find(c.unitText(), Dimension.TIME).isPresent())
                    .map(Column::asTime)
                    .toList();
        }
        if (times.isEmpty()) {
            throw Fault.of(Code.TIME_COLUMN_MISSING, Excerpt.list(titles)).at(place);
        }
        boolean joined = isDateAndClock(times);
        if (times.size() > 1 && !joined) {
            String first = Excerpt.of(times.get(0).title());
            String second = Excerpt.of(times.get(1).title());
            throw Fault.of(Code.TIME_COLUMN_TWICE, first, second)
                    .at(place.column(times.get(1).index() + 1));
        }
        List<Column> values =
                columns.stream().filter(c -> c.role() == Role.VALUE).toList();
        if (values.isEmpty()) {
            throw Fault.of(Code.VALUE_COLUMN_MISSING, Excerpt.list(titles)).at(place);
        }
        Column date = joined && times.get(0).role() != Role.DATE ? times.get(1) : times.get(0);
        Optional<Column> clock =
                joined ? times.stream().filter(c -> c.index() != date.index()).findFirst() : Optional.empty();
        List<Column> setAside =
                columns.stream().filter(c -> c.role() == Role.SET_ASIDE).toList();
        return new Header(date, clock, distinct(values), setAside, titles.size());
    }

    private static boolean holdsNumber(List<String> titles) {
        return titles.stream()
                        .anyMatch(
                                t -> !t.isBlank() && Character.isDigit(t.strip().charAt(0)))
                || titles.stream().anyMatch(t -> Numbers.parse(t).isPresent());
    }

    private static boolean isDateAndClock(List<Column> times) {
        return times.size() == 2
                && times.stream().filter(c -> c.role() == Role.DATE).count() == 1
                && times.stream().allMatch(c -> c.unit().isEmpty());
    }

    /** Whether every column is one that a run file has. */
    boolean isOwnForm() {
        boolean owned = setAside.stream()
                .allMatch(a -> a.coupon().isEmpty()
                        || values.stream().anyMatch(v -> v.coupon().equalsIgnoreCase(a.coupon())));
        return owned && clock.isEmpty() && 1 + values.size() + setAside.size() == size;
    }

    /** Two coupons of one name would be mixed up, so those are told apart by their column. */
    private static List<Column> distinct(List<Column> values) {
        List<Column> result = new ArrayList<>();
        for (Column c : values) {
            boolean twice = values.stream()
                    .anyMatch(o -> o.index() != c.index() && o.coupon().equalsIgnoreCase(c.coupon()));
            result.add(twice ? c.withCoupon((c.coupon() + " column " + (c.index() + 1)).strip()) : c);
        }
        return List.copyOf(result);
    }

    /** Whether a row below the titles holds units: at least one, and no number. */
    static boolean isUnitsRow(List<String> cells) {
        return cells.stream().anyMatch(c -> Unit.find(bare(c)).isPresent())
                && cells.stream().noneMatch(c -> Numbers.parse(c).isPresent());
    }

    /** The titles with the units of the row below them, where they have none of their own. */
    static List<String> withUnits(List<String> titles, List<String> units) {
        List<String> result = new ArrayList<>();
        for (int i = 0; i < titles.size(); i++) {
            String unit = i < units.size() ? bare(units.get(i)) : "";
            boolean complete =
                    unit.isEmpty() || !Column.of(i, titles.get(i)).unitText().isEmpty();
            result.add(complete ? titles.get(i) : titles.get(i) + " [" + unit + "]");
        }
        return result;
    }

    private static String bare(String unit) {
        String s = unit.strip();
        boolean square = s.startsWith("[") && s.endsWith("]");
        boolean bracketed = s.length() > 1 && (square || (s.startsWith("(") && s.endsWith(")")));
        return bracketed ? s.substring(1, s.length() - 1).strip() : s;
    }

    /**
     * The unit of a column that cannot do without.
     *
     * @throws Fault when it is missing or not known
     */
    static Unit requireUnit(Column column, Place header) {
        return column.unit().orElseThrow(() -> unitFault(column).at(header.column(column.index() + 1)));
    }

    private static Fault unitFault(Column column) {
        String title = Excerpt.of(column.title());
        if (column.unitText().isEmpty()) {
            String example =
                    column.dimension() == Dimension.TIME ? "h" : column.dimension() == Dimension.MASS ? "g" : "%";
            return Fault.of(Code.COLUMN_UNIT_MISSING, title, example);
        }
        return Fault.of(
                Code.COLUMN_UNIT_UNKNOWN, title, Excerpt.of(column.unitText()), Unit.symbols(column.dimension()));
    }
}
