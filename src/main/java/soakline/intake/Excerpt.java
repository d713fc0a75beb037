package soakline.intake;

import java.util.List;

/** Pieces of a file, short and harmless enough to be shown in a sentence. */
final class Excerpt {

    private static final int LONGEST = 40;
    private static final int MOST_COLUMNS = 12;

    private Excerpt() {}

    static String of(String text) {
        String cut = text.length() > LONGEST ? text.substring(0, LONGEST) + "…" : text;
        StringBuilder s = new StringBuilder(cut);
        for (int i = 0; i < s.length(); i++) {
            if (Character.isISOControl(s.charAt(i))) {
                s.setCharAt(i, ' ');
            }
        }
        return s.toString().strip();
    }

    /** The titles in quotation marks, not all of them when there are many. */
    static String list(List<String> titles) {
        StringBuilder s = new StringBuilder();
        for (int i = 0; i < Math.min(titles.size(), MOST_COLUMNS); i++) {
            s.append(i == 0 ? "" : ", ").append('"').append(of(titles.get(i))).append('"');
        }
        return titles.size() > MOST_COLUMNS ? s.append(", …").toString() : s.toString();
    }
}
