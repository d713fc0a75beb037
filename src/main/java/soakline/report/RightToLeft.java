package soakline.report;

import com.openhtmltopdf.bidi.BidiReorderer;
import com.openhtmltopdf.bidi.BidiSplitter;
import com.openhtmltopdf.bidi.BidiTextRun;
import java.text.Bidi;
import java.text.BreakIterator;
import java.util.Locale;

/**
 * Sets Hebrew and Arabic in a PDF in the order in which they are read. Arabic letters are not joined: a name can be read, but is not
 * set well.
 */
final class RightToLeft implements BidiSplitter, BidiReorderer {

    private static final String BRACKETS = "()[]{}<>«»‹›";

    private Bidi bidi;

    /** Whether a text has anything that is read from right to left. */
    static boolean isIn(String text) {
        return Bidi.requiresBidi(text.toCharArray(), 0, text.length());
    }

    @Override
    public void setParagraph(String paragraph, byte defaultDirection) {
        bidi = new Bidi(
                paragraph, defaultDirection == RTL ? Bidi.DIRECTION_RIGHT_TO_LEFT : Bidi.DIRECTION_LEFT_TO_RIGHT);
    }

    @Override
    public int countTextRuns() {
        return bidi.getRunCount();
    }

    @Override
    public BidiTextRun getVisualRun(int runIndex) {
        int start = bidi.getRunStart(runIndex);
        boolean fromRight = bidi.getRunLevel(runIndex) % 2 == 1;
        return new BidiTextRun(start, bidi.getRunLimit(runIndex) - start, fromRight ? RTL : LTR);
    }

    @Override
    public byte getBaseDirection(String paragraph) {
        return LTR;
    }

    /** Turned round letter by letter, each with its accents, and brackets as in a mirror. */
    @Override
    public String reorderRTLTextToLTR(String text) {
        BreakIterator letters = BreakIterator.getCharacterInstance(Locale.ROOT);
        letters.setText(text);
        StringBuilder turned = new StringBuilder(text.length());
        int end = letters.last();
        for (int start = letters.previous(); start != BreakIterator.DONE; start = letters.previous()) {
            String letter = text.substring(start, end);
            int bracket = BRACKETS.indexOf(letter);
            turned.append(letter.length() == 1 && bracket >= 0 ? BRACKETS.charAt(bracket ^ 1) : letter);
            end = start;
        }
        return turned.toString();
    }

    @Override
    public String shapeText(String text) {
        return text;
    }

    @Override
    public String deshapeText(String text) {
        return text;
    }

    @Override
    public boolean isLiveImplementation() {
        return true;
    }
}
