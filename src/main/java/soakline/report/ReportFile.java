package soakline.report;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleConsumer;
import java.util.function.UnaryOperator;
import java.util.regex.Pattern;
import org.jfree.chart.JFreeChart;
import soakline.figure.ChartStyle;
import soakline.figure.CouponFigure;
import soakline.inference.Assessment;
import soakline.workspace.OutputFile;

/**
 * Writes reports: one self-contained HTML page, or a PDF made from the same page. The same input gives the same bytes.
 *
 * <p>Where D is not determined, no D stands anywhere in a report.
 */
public final class ReportFile {

    private static final int CHART_WIDTH = 642;
    private static final int CHART_HEIGHT = 393;
    private static final float CHART_FONT = 12;
    /** Only names in a page that was opened from the web; a browser needs none. */
    private static final Pattern NAMESPACES = Pattern.compile(" xmlns(:\\w+)?=(\"[^\"]*\"|'[^']*')");

    private static final Pattern DECLARATION = Pattern.compile("^\\s*<\\?xml[^>]*\\?>\\s*");

    private final ReportInput input;
    private final ReportType type;
    private final DoubleConsumer progress;
    private final ChartStyle style;

    private ReportFile(ReportInput input, ReportType type, DoubleConsumer progress) {
        this.input = input;
        this.type = type;
        this.progress = progress;
        this.style = ChartStyle.light().withFont(ReportFonts.forPictures(CHART_FONT));
    }

    /**
     * Writes a report of the kind that the file's ending names.
     *
     * @throws soakline.problem.Fault when the ending is not known or the file cannot be written
     */
    public static void write(Path target, ReportInput input) {
        write(target, input, share -> {});
    }

    /**
     * Writes a report and tells how far it is.
     *
     * @param progress hears the share of the work that is done, from 0 to 1; what it throws stops the work, and nothing is written
     * @throws soakline.problem.Fault when the ending is not known or the file cannot be written
     */
    public static void write(Path target, ReportInput input, DoubleConsumer progress) {
        ReportType type = ReportType.of(target);
        OutputFile.requireWritable(target);
        byte[] report = new ReportFile(input, type, progress).bytes();
        OutputFile.write(target, out -> out.write(report));
        progress.accept(1);
    }

    private byte[] bytes() {
        List<Assessment> assessments = input.assessments();
        List<CouponPage> coupons = new ArrayList<>();
        for (int i = 0; i < assessments.size(); i++) {
            progress.accept(0.4 * i / assessments.size());
            coupons.add(CouponPageWriter.write(assessments.get(i), "coupon-" + (i + 1), drawing(i)));
        }
        boolean forPdf = type == ReportType.PDF;
        ReportPage words = ReportPage.of(input, forPdf, ReportTemplate.css(forPdf), coupons);
        String page = ReportTemplate.fill(words);
        if (forPdf && !ReportFonts.canShow(page)) {
            page = ReportTemplate.fill(words.withUnshown());
        }
        try {
            return forPdf
                    ? PdfWriter.write(page, input.made(), this::chartOfPdf)
                    : page.getBytes(StandardCharsets.UTF_8);
        } catch (IOException e) {
            // made in memory
            throw new UncheckedIOException(e);
        }
    }

    private UnaryOperator<String> drawing(int coupon) {
        return shows -> type == ReportType.PDF ? PdfWriter.object(coupon, shows) : inlineSvg(coupon, shows);
    }

    private JFreeChart chart(int coupon) {
        return CouponFigure.chartWithoutHead(input.assessments().get(coupon), style);
    }

    private JFreeChart chartOfPdf(int coupon) {
        // setting the page takes about as long as all that went before
        progress.accept(0.8 + 0.2 * coupon / input.assessments().size());
        return chart(coupon);
    }

    private String inlineSvg(int coupon, String shows) {
        JFreeChart chart = chart(coupon);
        Rectangle2D all = new Rectangle2D.Double(0, 0, CHART_WIDTH, CHART_HEIGHT);
        try {
            String svg = SvgDrawing.of(
                    CHART_WIDTH, CHART_HEIGHT, "c" + (coupon + 1) + "-", (Graphics2D g) -> chart.draw(g, all));
            String plain = NAMESPACES
                    .matcher(DECLARATION.matcher(svg).replaceFirst(""))
                    .replaceAll("");
            return plain.replaceFirst("<svg", "<svg role=\"img\" aria-label=\"" + shows + "\"");
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
