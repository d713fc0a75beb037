package soakline.report;

import java.awt.Font;
import java.awt.FontFormatException;
import java.io.IOException;
import java.io.InputStream;
import java.util.Arrays;

/** The fonts of reports, which travel with the program, so that a report looks the same from every machine. */
final class ReportFonts {

    static final String BODY = "Lato";
    static final String BODY_REGULAR = "Lato-Regular.ttf";
    static final String BODY_BOLD = "Lato-Bold.ttf";
    /** For all that the body font lacks. */
    static final String FALLBACK = "DejaVu Sans";

    static final String FALLBACK_REGULAR = "DejaVuSans.ttf";

    private ReportFonts() {}

    static InputStream open(String file) {
        return ReportFonts.class.getResourceAsStream("/soakline/report/fonts/" + file);
    }

    /** The body font for a picture. */
    static Font forPictures(float size) {
        return font(BODY_REGULAR).deriveFont(size);
    }

    /** Whether the fonts have all letters and signs of a text. */
    static boolean canShow(String text) {
        Font body = font(BODY_REGULAR);
        int[] rare = text.codePoints()
                .filter(c -> !Character.isISOControl(c) && !body.canDisplay(c))
                .distinct()
                .toArray();
        if (rare.length == 0) {
            return true;
        }
        Font fallback = font(FALLBACK_REGULAR);
        return Arrays.stream(rare).allMatch(fallback::canDisplay);
    }

    private static Font font(String file) {
        try (InputStream in = open(file)) {
            return Font.createFont(Font.TRUETYPE_FONT, in);
        } catch (FontFormatException | IOException e) {
            throw new IllegalStateException(e);
        }
    }
}
