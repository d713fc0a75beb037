package soakline.report;

import java.awt.Font;
import java.awt.FontFormatException;
import java.io.IOException;
import java.io.InputStream;

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
        try (InputStream in = open(BODY_REGULAR)) {
            return Font.createFont(Font.TRUETYPE_FONT, in).deriveFont(size);
        } catch (FontFormatException | IOException e) {
            throw new IllegalStateException(e);
        }
    }
}
