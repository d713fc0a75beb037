package soakline.intake;

import java.util.ArrayList;
import java.util.List;

/**
 * How a table is written down.
 *
 * @param delimiter between cells
 * @param decimalSign comma or point; 0 when the first rows show neither
 */
record Dialect(char delimiter, char decimalSign) {

    /** In order of preference where lines have several of them: a comma is often a decimal sign, a tab never is. */
    private static final char[] DELIMITERS = {'\t', ';', ','};

    /** Finds delimiter and decimal sign from the first lines (the last of which may be cut off). */
    static Dialect of(String sample) {
        List<String> lines = new ArrayList<>();
        sample.lines().filter(l -> !l.isBlank() && !l.startsWith("#")).forEach(lines::add);
        char best = ',';
        int most = 0;
        for (char delimiter : DELIMITERS) {
            int count = 0;
            for (String line : lines) {
                count += cells(line, delimiter).size() > 1 ? 1 : 0;
            }
            if (count > most) {
                most = count;
                best = delimiter;
            }
        }
        return new Dialect(best, decimalSign(lines, best));
    }

    /** The sign that more numbers have. A number with both, or with one of them twice, shows nothing. */
    private static char decimalSign(List<String> lines, char delimiter) {
        int points = 0;
        int commas = 0;
        for (String line : lines) {
            for (String cell : cells(line, delimiter)) {
                char sign = signOf(cell.strip());
                points += sign == '.' ? 1 : 0;
                commas += sign == ',' ? 1 : 0;
            }
        }
        if (points == 0 && commas == 0) {
            return 0;
        }
        return commas > points ? ',' : '.';
    }

    /** The decimal sign of a plain number; 0 when it has none or the text is no number. */
    static char signOf(String cell) {
        char sign = 0;
        for (int i = 0; i < cell.length(); i++) {
            char c = cell.charAt(i);
            if (c == '.' || c == ',') {
                if (sign != 0) {
                    return 0;
                }
                sign = c;
            } else if ((c < '0' || c > '9') && !(i == 0 && (c == '-' || c == '+'))) {
                return 0;
            }
        }
        return sign;
    }

    /** A rough cut, good enough to count: quoted cells lose their quotation marks. */
    private static List<String> cells(String line, char delimiter) {
        List<String> cells = new ArrayList<>();
        StringBuilder cell = new StringBuilder();
        boolean quoted = false;
        for (int i = 0; i < line.length(); i++) {
            char c = line.charAt(i);
            if (c == '"' && quoted && i + 1 < line.length() && line.charAt(i + 1) == '"') {
                // a mark of the text itself, which is then no number
                cell.append(c);
            } else if (c == '"') {
                quoted = !quoted;
            } else if (c == delimiter && !quoted) {
                cells.add(cell.toString());
                cell.setLength(0);
            } else {
                cell.append(c);
            }
        }
        cells.add(cell.toString());
        return cells;
    }
}
