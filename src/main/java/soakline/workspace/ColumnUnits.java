package soakline.workspace;

import java.util.ArrayList;
import java.util.List;
import java.util.function.IntToDoubleFunction;
import soakline.quantity.ExactText;
import soakline.quantity.Unit;
import soakline.specimen.Weighings;

/**
 * Chooses the units of columns: of those in which every value can be had exactly, the one that takes the fewest characters. So a
 * column comes out in the unit in which it was typed, or in one in which it is as short.
 */
final class ColumnUnits {

    private static final List<Unit> TIMES = List.of(Unit.HOUR, Unit.DAY, Unit.MINUTE, Unit.SECOND);
    private static final List<Unit> MASSES = List.of(Unit.GRAM, Unit.MILLIGRAM, Unit.KILOGRAM);
    private static final List<Unit> CONTENTS = List.of(Unit.PERCENT, Unit.FRACTION);
    private static final int LOOKED_AT = 200;

    private record Values(int size, IntToDoubleFunction si) {}

    private ColumnUnits() {}

    static Unit ofTimes(List<Weighings> columns) {
        return choose(
                TIMES, columns.stream().map(w -> new Values(w.size(), w::time)).toList());
    }

    /** One unit for all, if they have one in common that is not the plain SI one; else each its own. */
    static List<Unit> ofMasses(List<Weighings> columns) {
        return together(MASSES, columns);
    }

    static List<Unit> ofContents(List<Weighings> columns) {
        return together(CONTENTS, columns);
    }

    private static List<Unit> together(List<Unit> units, List<Weighings> columns) {
        List<Values> values =
                columns.stream().map(w -> new Values(w.size(), w::value)).toList();
        Unit common = choose(units, values);
        List<Unit> chosen = new ArrayList<>();
        for (Values column : values) {
            chosen.add(common == units.get(units.size() - 1) ? choose(units, List.of(column)) : common);
        }
        return chosen;
    }

    /** The last of the units is the SI one, in which there is every value. */
    private static Unit choose(List<Unit> units, List<Values> columns) {
        Unit best = units.get(units.size() - 1);
        long least = Long.MAX_VALUE;
        for (Unit unit : units) {
            if (columns.stream().allMatch(c -> isExact(c, unit))) {
                long length = columns.stream().mapToLong(c -> length(c, unit)).sum();
                if (length < least) {
                    least = length;
                    best = unit;
                }
            }
        }
        return best;
    }

    private static boolean isExact(Values column, Unit unit) {
        for (int i = 0; i < column.size(); i++) {
            if (!ExactText.exists(column.si().applyAsDouble(i), unit)) {
                return false;
            }
        }
        return true;
    }

    private static long length(Values column, Unit unit) {
        long length = 0;
        int taken = Math.min(column.size(), LOOKED_AT);
        for (int k = 0; k < taken; k++) {
            int i = (int) ((long) k * column.size() / taken);
            length += ExactText.of(column.si().applyAsDouble(i), unit)
                    .orElseThrow()
                    .length();
        }
        return length;
    }
}
