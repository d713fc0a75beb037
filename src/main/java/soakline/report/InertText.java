package soakline.report;

/** Text from a file made harmless for a page: nothing in it steers a reader's program or the order of its letters. */
final class InertText {

    /** Stands where something was that cannot be shown. */
    private static final char MARK = '\ufffd';

    private static final int ZERO_WIDTH_NON_JOINER = 0x200c;
    private static final int ZERO_WIDTH_JOINER = 0x200d;

    private InertText() {}

    /** The text with blanks for line breaks and tabs, and a mark for each other character that is no letter, sign or space. */
    static String of(String text) {
        StringBuilder clean = new StringBuilder(text.length());
        text.codePoints().forEach(c -> {
            switch (Character.getType(c)) {
                case Character.CONTROL -> clean.append(Character.isWhitespace(c) || c == 0x85 ? ' ' : MARK);
                case Character.LINE_SEPARATOR, Character.PARAGRAPH_SEPARATOR -> clean.append(' ');
                // the two joiners belong to the spelling of words; overrides of the direction do not
                case Character.FORMAT -> {
                    boolean spelling = c == ZERO_WIDTH_JOINER || c == ZERO_WIDTH_NON_JOINER;
                    clean.appendCodePoint(spelling ? c : MARK);
                }
                case Character.SURROGATE, Character.UNASSIGNED -> clean.append(MARK);
                default -> clean.appendCodePoint(c);
            }
        });
        return clean.toString();
    }

    /** The beginning of a text that is longer than a number of characters. */
    static String shortened(String text, int most) {
        if (text.codePointCount(0, text.length()) <= most) {
            return text;
        }
        return text.substring(0, text.offsetByCodePoints(0, most - 1)).stripTrailing() + "…";
    }
}
