package soakline.report;

import com.samskivert.mustache.Mustache;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/** The one template of HTML and PDF, and its style sheets. */
final class ReportTemplate {

    private ReportTemplate() {}

    /** A page as XHTML that is HTML too. All texts in it are escaped and inert. */
    static String fill(ReportPage page) {
        return Mustache.compiler()
                .escapeHTML(true)
                .emptyStringIsFalse(true)
                .strictSections(true)
                .withFormatter(
                        value -> value instanceof Markup ? value.toString() : InertText.of(String.valueOf(value)))
                .compile(text("report.html"))
                .execute(page);
    }

    static Markup css(boolean forPdf) {
        return new Markup(text("report.css") + text(forPdf ? "pdf.css" : "screen.css"));
    }

    private static String text(String name) {
        try (InputStream in = ReportTemplate.class.getResourceAsStream("/soakline/report/" + name)) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
