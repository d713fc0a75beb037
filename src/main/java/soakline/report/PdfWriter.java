package soakline.report;

import com.openhtmltopdf.extend.FSObjectDrawer;
import com.openhtmltopdf.extend.FSObjectDrawerFactory;
import com.openhtmltopdf.outputdevice.helper.BaseRendererBuilder.FontStyle;
import com.openhtmltopdf.outputdevice.helper.ExternalResourceControlPriority;
import com.openhtmltopdf.pdfboxout.PDFontSupplier;
import com.openhtmltopdf.pdfboxout.PdfBoxRenderer;
import com.openhtmltopdf.pdfboxout.PdfRendererBuilder;
import com.openhtmltopdf.util.XRLog;
import java.awt.geom.Rectangle2D;
import java.io.ByteArrayOutputStream;
import java.io.Closeable;
import java.io.IOException;
import java.io.InputStream;
import java.time.ZonedDateTime;
import java.util.ArrayList;
import java.util.GregorianCalendar;
import java.util.List;
import java.util.Map;
import java.util.function.IntFunction;
import java.util.logging.Level;
import java.util.logging.Logger;
import java.util.stream.Stream;
import org.apache.fontbox.ttf.TTFParser;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.io.RandomAccessReadBuffer;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.font.PDType0Font;
import org.jfree.chart.JFreeChart;
import org.w3c.dom.Element;

/**
 * Sets a page as a tagged PDF with its fonts embedded and its charts drawn as vectors. Reads nothing but the page. The same page and
 * date give the same bytes.
 */
final class PdfWriter {

    private static final String CHART = "application/x-chart";
    private static final int BOLD = 700;
    private static final int REGULAR = 400;

    /** Held, since a logger that nobody holds forgets its level; what they say is for programmers and not for standard error. */
    private static final List<Logger> QUIET = Stream.of(
                    "com.openhtmltopdf", "org.apache.pdfbox", "org.apache.fontbox", "org.apache.xmpbox", "de.rototor")
            .map(Logger::getLogger)
            .toList();

    private PdfWriter() {}

    /** The place of a chart in a page. */
    static String object(int chart, String shows) {
        return "<object type=\"" + CHART + "\" data-chart=\"" + chart + "\" alt=\"" + shows + "\"></object>";
    }

    /**
     * Sets a page.
     *
     * @param charts the chart with a number
     */
    static byte[] write(String page, ZonedDateTime made, IntFunction<JFreeChart> charts) throws IOException {
        XRLog.setLoggingEnabled(false);
        QUIET.forEach(logger -> logger.setLevel(Level.OFF));
        PdfRendererBuilder builder = new PdfRendererBuilder();
        builder.usePdfUaAccessibility(true);
        builder.useExternalResourceAccessControl(
                (uri, type) -> false, ExternalResourceControlPriority.RUN_BEFORE_RESOLVING_URI);
        builder.useFont(
                () -> ReportFonts.open(ReportFonts.BODY_REGULAR), ReportFonts.BODY, REGULAR, FontStyle.NORMAL, true);
        builder.useReplacementText("\ufffd");
        builder.withProducer(ProgramVersion.text());
        builder.useObjectDrawerFactory(new Charts(charts));
        if (RightToLeft.isIn(page)) {
            builder.useUnicodeBidiSplitter(RightToLeft::new);
            builder.useUnicodeBidiReorderer(new RightToLeft());
        }
        builder.withHtmlContent(page, null);
        try (PDDocument document = new PDDocument();
                Fonts fonts = new Fonts(document)) {
            builder.usePDDocument(document);
            builder.useFont(fonts.load(ReportFonts.BODY_REGULAR), ReportFonts.BODY, REGULAR, FontStyle.NORMAL, true);
            builder.useFont(fonts.load(ReportFonts.BODY_BOLD), ReportFonts.BODY, BOLD, FontStyle.NORMAL, true);
            builder.useFont(
                    fonts.load(ReportFonts.FALLBACK_REGULAR), ReportFonts.FALLBACK, REGULAR, FontStyle.NORMAL, true);
            try (PdfBoxRenderer renderer = builder.buildPdfRenderer()) {
                renderer.createPDFWithoutClosing();
                document.getDocumentInformation().setCreator(ProgramVersion.text());
                document.getDocumentInformation().setCreationDate(GregorianCalendar.from(made));
                // instead of one made from the clock
                document.setDocumentId(made.toInstant().toEpochMilli());
                ByteArrayOutputStream out = new ByteArrayOutputStream();
                document.save(out);
                return out.toByteArray();
            }
        }
    }

    /** The fonts of a document, open until it is saved. */
    private static final class Fonts implements Closeable {

        private final PDDocument document;
        private final List<TrueTypeFont> open = new ArrayList<>();

        Fonts(PDDocument document) {
            this.document = document;
        }

        PDFontSupplier load(String file) throws IOException {
            try (InputStream in = ReportFonts.open(file)) {
                TrueTypeFont font = new TTFParser().parse(new RandomAccessReadBuffer(in));
                open.add(font);
                // ligatures would be found by nobody who searches for the letters
                font.setEnableGsub(false);
                return new PDFontSupplier(PDType0Font.load(document, font, true));
            }
        }

        @Override
        public void close() throws IOException {
            for (TrueTypeFont font : open) {
                font.close();
            }
        }
    }

    /** Draws the charts where the page has their places. */
    private record Charts(IntFunction<JFreeChart> charts) implements FSObjectDrawerFactory {

        @Override
        public boolean isReplacedObject(Element element) {
            return element.getAttribute("type").equals(CHART);
        }

        @Override
        public FSObjectDrawer createDrawer(Element element) {
            return (place, x, y, width, height, device, context, dotsPerPixel) -> {
                double w = width / dotsPerPixel;
                double h = height / dotsPerPixel;
                JFreeChart chart = charts.apply(Integer.parseInt(place.getAttribute("data-chart")));
                device.drawWithGraphics(
                        (float) x,
                        (float) y,
                        (float) w,
                        (float) h,
                        graphics -> chart.draw(graphics, new Rectangle2D.Double(0, 0, w, h)));
                return Map.of();
            };
        }
    }
}
