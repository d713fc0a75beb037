package soakline.wording;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.MissingResourceException;
import java.util.PropertyResourceBundle;
import soakline.problem.Code;
import soakline.problem.Finding;
import soakline.problem.Place;
import soakline.quantity.Numbers;

/** Turns findings into sentences: the same words for command, report and window. */
public final class Wording {

    private static final int DIGITS = 4;
    private static final PropertyResourceBundle SENTENCES = load();

    private Wording() {}

    /** The sentence with its place in front, such as {@code p07.csv, line 14, column 2: …}. */
    public static String withPlace(Finding finding) {
        String place = place(finding.place());
        return place.isEmpty() ? sentence(finding) : place + ": " + sentence(finding);
    }

    /** The sentence with its place in front and a full stop behind, as it stands in running text. */
    public static String text(Finding finding) {
        return withPlace(finding) + ".";
    }

    /** The sentence without its place and without a full stop. */
    public static String sentence(Finding finding) {
        return fill(template(finding.code()), finding.values());
    }

    /** A line number and a column as words; empty for no place. */
    public static String place(Place place) {
        StringBuilder text = new StringBuilder(place.source());
        if (place.line() > 0) {
            text.append(text.isEmpty() ? "line " : ", line ").append(place.line());
        }
        if (place.column() > 0) {
            text.append(", column ").append(place.column());
        }
        return text.toString();
    }

    /** The raw sentence of a code, with {@code {0}}, {@code {1}} … where values go. */
    static String template(Code code) {
        try {
            return SENTENCES.getString(code.name().toLowerCase(Locale.ROOT));
        } catch (MissingResourceException e) {
            throw new IllegalStateException("no sentence for " + code, e);
        }
    }

    private static String fill(String template, List<Object> values) {
        StringBuilder text = new StringBuilder();
        int at = 0;
        while (at < template.length()) {
            int open = template.indexOf('{', at);
            int close = open < 0 ? -1 : template.indexOf('}', open);
            if (close < 0) {
                text.append(template, at, template.length());
                break;
            }
            text.append(template, at, open);
            text.append(render(values.get(Integer.parseInt(template.substring(open + 1, close)))));
            at = close + 1;
        }
        return text.toString();
    }

    private static String render(Object value) {
        return value instanceof Double number ? Numbers.significant(number, DIGITS) : String.valueOf(value);
    }

    private static PropertyResourceBundle load() {
        try (InputStream in = Wording.class.getResourceAsStream("/soakline/wording/sentences.properties")) {
            return new PropertyResourceBundle(new InputStreamReader(in, StandardCharsets.UTF_8));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
