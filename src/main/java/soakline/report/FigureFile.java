package soakline.report;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import javax.imageio.ImageIO;
import org.jfree.chart.JFreeChart;
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
        String svg = SvgDrawing.of(WIDTH, HEIGHT * charts.size(), "", graphics -> draw(charts, graphics));
        out.write(svg.getBytes(StandardCharsets.UTF_8));
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
