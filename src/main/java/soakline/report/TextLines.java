package soakline.report;

import java.util.ArrayList;
import java.util.List;

/** Lines of text of a limited width. */
final class TextLines {

    static final int WIDTH = 100;

    private final StringBuilder text = new StringBuilder();

    TextLines blank() {
        text.append('\n');
        return this;
    }

    /** An empty line between this and what went before, if anything did. */
    void separate() {
        if (text.length() > 0) {
            blank();
        }
    }

    /** A line as it stands. */
    TextLines line(String line) {
        text.append(line.stripTrailing()).append('\n');
        return this;
    }

    /** A text broken between words; the lines after the first are set in under its beginning. */
    TextLines wrapped(String first, String text) {
        return wrapped(first, words(clean(text)));
    }

    /** Items with commas between them, broken between items, so that a number keeps its unit. */
    TextLines listed(String first, List<String> items) {
        List<String> pieces = new ArrayList<>();
        for (int i = 0; i < items.size(); i++) {
            pieces.add(clean(items.get(i)) + (i + 1 < items.size() ? "," : ""));
        }
        return wrapped(first, pieces);
    }

    private TextLines wrapped(String first, List<String> pieces) {
        String indent = " ".repeat(first.length());
        StringBuilder line = new StringBuilder(first);
        boolean empty = true;
        for (String word : pieces) {
            if (!empty && line.length() + 1 + word.length() > WIDTH) {
                line(line.toString());
                line.setLength(0);
                line.append(indent);
                empty = true;
            }
            String rest = word;
            while (empty && line.length() + rest.length() > WIDTH) {
                int room = WIDTH - line.length();
                line(line + rest.substring(0, room));
                rest = rest.substring(room);
                line.setLength(0);
                line.append(indent);
            }
            line.append(empty ? "" : " ").append(rest);
            empty = false;
        }
        return line(line.toString());
    }

    private static List<String> words(String text) {
        List<String> words = new ArrayList<>();
        int from = 0;
        while (from < text.length()) {
            int to = text.indexOf(' ', from);
            to = to < 0 ? text.length() : to;
            if (to > from) {
                words.add(text.substring(from, to));
            }
            from = to + 1;
        }
        return words;
    }

    /** A cell of a table, filled up with blanks. */
    static String cell(String content, int width) {
        return content + " ".repeat(Math.max(1, width - content.length()));
    }

    /** What comes from a file must not steer a terminal or break a line. */
    static String clean(String text) {
        StringBuilder clean = null;
        for (int i = 0; i < text.length(); i++) {
            if (Character.isISOControl(text.charAt(i))) {
                clean = clean == null ? new StringBuilder(text) : clean;
                clean.setCharAt(i, ' ');
            }
        }
        return clean == null ? text : clean.toString();
    }

    @Override
    public String toString() {
        return text.toString();
    }
}
