package soakline.intake;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Pattern;
import soakline.quantity.Dimension;
import soakline.quantity.Unit;
import soakline.specimen.RunFileWords;

/**
 * What the title of a column says.
 *
 * @param index from 0
 * @param title as written
 * @param coupon the part of a value column's title that names the coupon; empty when nothing does
 * @param unitText the unit as written; empty when there is none
 * @param dimension that the values must have
 */
record Column(int index, Role role, String title, String coupon, String unitText, Dimension dimension) {

    /** What a column is for. */
    enum Role {
        TIME,
        /** A calendar date without a clock time. */
        DATE,
        VALUE,
        SET_ASIDE,
        OTHER
    }

    private static final Pattern NOT_A_NAME = Pattern.compile(
            "(?i)(?<![\\p{L}\\p{N}])(" + String.join("|", RunFileWords.wordsOfNoCoupon()) + ")(?![\\p{L}\\p{N}])");
    private static final Pattern LOOSE_ENDS = Pattern.compile("^[\\s_:,.;-]+|[\\s_:,.;-]+$");

    /** Reads a title such as {@code A1 mass [g]}, {@code Time (h)} or {@code m/g}. */
    static Column of(int index, String title) {
        String name = title.strip();
        String unit = "";
        char open = name.indexOf('[') >= 0 ? '[' : '(';
        int from = name.lastIndexOf(open);
        int to = open == '[' ? name.lastIndexOf(']') : name.lastIndexOf(')');
        int slash = name.lastIndexOf('/');
        if (from >= 0 && to > from) {
            from = open == '(' ? opening(name, to) : from;
            unit = name.substring(from + 1, to).strip();
            name = (name.substring(0, from) + " " + name.substring(to + 1)).strip();
        } else if (slash > 0 && Unit.find(name.substring(slash + 1)).isPresent()) {
            unit = name.substring(slash + 1).strip();
            name = name.substring(0, slash).strip();
        }
        return named(index, title.strip(), name, unit);
    }

    /** The bracket that belongs to the last closing one, so that {@code (% (m/m))} is one unit. */
    private static int opening(String name, int close) {
        int depth = 0;
        for (int i = close; i >= 0; i--) {
            depth += name.charAt(i) == ')' ? 1 : name.charAt(i) == '(' ? -1 : 0;
            if (depth == 0) {
                return i;
            }
        }
        return name.indexOf('(');
    }

    private static Column named(int index, String title, String name, String unit) {
        String lower = name.toLowerCase(Locale.ROOT);
        Set<String> words = Set.copyOf(Arrays.asList(lower.split("[^\\p{L}\\p{N}]+")));
        boolean isContent = words.stream().anyMatch(RunFileWords.CONTENT_TITLES::contains);
        if (words.containsAll(RunFileWords.SET_ASIDE_TITLE)) {
            return new Column(index, Role.SET_ASIDE, title, coupon(name), unit, Dimension.CONTENT);
        }
        if (words.stream().anyMatch(RunFileWords.TIME_TITLES::contains) || lower.equals("t")) {
            Role role = words.contains("date") && !words.contains("time") ? Role.DATE : Role.TIME;
            return new Column(index, role, title, "", unit, Dimension.TIME);
        }
        if (lower.length() > 2 && Unit.find(lower, Dimension.TIME).isPresent()) {
            return new Column(index, Role.TIME, title, "", unit.isEmpty() ? lower : unit, Dimension.TIME);
        }
        if (isContent) {
            return new Column(index, Role.VALUE, title, coupon(name), unit, Dimension.CONTENT);
        }
        // a mass is known by its unit, even when the title is only the coupon's name
        boolean isMass = words.stream().anyMatch(RunFileWords.MASS_TITLES::contains) || lower.equals("m");
        if (isMass || Unit.find(unit, Dimension.MASS).isPresent()) {
            return new Column(index, Role.VALUE, title, lower.equals("m") ? "" : coupon(name), unit, Dimension.MASS);
        }
        return new Column(index, Role.OTHER, title, "", unit, Dimension.CONTENT);
    }

    private static String coupon(String name) {
        String rest = NOT_A_NAME.matcher(name).replaceAll(" ").replaceAll("\\s+", " ");
        return LOOSE_ENDS.matcher(rest).replaceAll("");
    }

    boolean isTime() {
        return role == Role.TIME || role == Role.DATE;
    }

    /** The unit; empty when it is missing or not known. */
    Optional<Unit> unit() {
        return unitText.isEmpty() ? Optional.empty() : Unit.find(unitText, dimension);
    }

    /** The column as one of time, when nothing but its unit says so. */
    Column asTime() {
        return new Column(index, Role.TIME, title, "", unitText, Dimension.TIME);
    }

    Column withCoupon(String value) {
        return new Column(index, role, title, value, unitText, dimension);
    }
}
