package soakline.report;

import java.awt.Color;
import java.awt.Dimension;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.OutputStream;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.jfree.chart.JFreeChart;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import soakline.figure.ChartStyle;
import soakline.figure.CouponFigure;
import soakline.inference.Assessment;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.workspace.OutputFile;

/** Writes the pictures of coupons, one below the other, as SVG or PNG. The same coupons give the same bytes. */
public final class FigureFile {

    private static final int WIDTH = 900;
    private static final int HEIGHT = 620;
    private static final int SHARPNESS = 2;
    /** More pixels than this do not fit into the usual memory. */
    private static final long MOST_PIXELS = 120_000_000;

    private FigureFile() {}

    /**
     * Writes a figure file of the kind that its ending names.
     *
     * @throws Fault when the ending is not known or the file cannot be written
     */
    public static void write(Path file, List<Assessment> assessments) {
        FigureType type = FigureType.of(file);
        int scale = type == FigureType.PNG ? scale(file, assessments.size()) : 1;
        List<JFreeChart> charts = assessments.stream()
                .map(a -> CouponFigure.chart(a, ChartStyle.light()))
                .toList();
        OutputFile.write(file, out -> {
            switch (type) {
                case SVG -> svg(charts, out);
                case PNG -> png(charts, scale, out);
            }
        });
    }

    private static int scale(Path file, int charts) {
        for (int scale = SHARPNESS; scale >= 1; scale--) {
            if ((long) charts * WIDTH * HEIGHT * scale * scale <= MOST_PIXELS) {
                return scale;
            }
        }
        throw Fault.of(
                Code.OUTPUT_NOT_WRITABLE,
                file.toString(),
                charts + " coupons are too many for one picture of pixels; .svg holds them");
    }

    private static void svg(List<JFreeChart> charts, OutputStream out) throws IOException {
        Document document = emptyDrawing();
        SVGGeneratorContext context = SVGGeneratorContext.createDefault(document);
        context.setComment("Soakline");
        SVGGraphics2D graphics = new SVGGraphics2D(context, false);
        graphics.setSVGCanvasSize(new Dimension(WIDTH, HEIGHT * charts.size()));
        draw(charts, graphics);
        StringWriter text = new StringWriter();
        Element root = graphics.getRoot();
        // so that a viewer can scale it
        root.setAttribute("viewBox", "0 0 " + WIDTH + " " + HEIGHT * charts.size());
        graphics.stream(root, text, true, false);
        out.write(withoutDoctype(text.toString()).getBytes(StandardCharsets.UTF_8));
    }

    /** The type declaration names a page on the web, which strict readers fetch or, offline, fail on. */
    private static String withoutDoctype(String svg) {
        int from = svg.indexOf("<!DOCTYPE");
        int to = svg.indexOf('>', from) + 1;
        return from < 0 || to <= from ? svg : svg.substring(0, from) + svg.substring(to);
    }

    private static Document emptyDrawing() {
        try {
            return DocumentBuilderFactory.newDefaultInstance()
                    .newDocumentBuilder()
                    .getDOMImplementation()
                    .createDocument("http://www.w3.org/2000/svg", "svg", null);
        } catch (ParserConfigurationException e) {
            throw new IllegalStateException(e);
        }
    }

    private static void png(List<JFreeChart> charts, int scale, OutputStream out) throws IOException {
        BufferedImage image =
                new BufferedImage(WIDTH * scale, HEIGHT * charts.size() * scale, BufferedImage.TYPE_INT_RGB);
        Graphics2D graphics = image.createGraphics();
        graphics.scale(scale, scale);
        draw(charts, graphics);
        graphics.dispose();
        ImageIO.setUseCache(false);
        if (!ImageIO.write(image, "png", out)) {
            throw new IOException("this Java has no writer for PNG");
        }
    }

    private static void draw(List<JFreeChart> charts, Graphics2D graphics) {
        graphics.setColor(Color.WHITE);
        graphics.fill(new Rectangle2D.Double(0, 0, WIDTH, (double) HEIGHT * charts.size()));
        for (int i = 0; i < charts.size(); i++) {
            charts.get(i).draw(graphics, new Rectangle2D.Double(0, (double) HEIGHT * i, WIDTH, HEIGHT));
        }
    }
}
