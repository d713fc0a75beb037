package soakline.figure;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.image.BufferedImage;
import java.io.File;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import javax.imageio.ImageIO;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.plot.CombinedDomainXYPlot;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.title.TextTitle;
import org.jfree.data.xy.XYDataset;
import org.junit.jupiter.api.Test;
import soakline.inference.Assessment;
import soakline.inference.AssessmentOptions;
import soakline.inference.Assessor;
import soakline.specimen.Run;

class CouponFigureTest {

    @Test
    void determinedRunShowsCurvePlateauAndResult() throws IOException {
        JFreeChart chart = CouponFigure.chart(assess(InventedRuns.plateau()), ChartStyle.light());

        assertThat(series(chart))
                .contains("weighings", "set aside", "fitted curve", "short-time line", "plateau M∞", "residuals");
        assertThat(texts(chart)).anyMatch(t -> t.startsWith("D = ") && t.contains("×10⁻") && t.contains("95 %"));
        assertThat(texts(chart)).anyMatch(t -> t.startsWith("M∞ = "));
        draw(chart, "plateau");
        draw(CouponFigure.chart(assess(InventedRuns.plateau()), ChartStyle.dark()), "plateau-dark");
    }

    @Test
    void runStoppedEarlyShowsNeitherPlateauNorD() throws IOException {
        Assessment assessment = assess(InventedRuns.stoppedEarly());
        assertThat(assessment.determined()).isFalse();
        JFreeChart chart = CouponFigure.chart(assessment, ChartStyle.light());

        assertThat(series(chart)).doesNotContain("plateau M∞");
        assertThat(texts(chart))
                .contains("D not determined: stopped before the plateau")
                .noneMatch(t -> t.contains("D =") || t.contains("m²/s"));
        double last = Math.sqrt(assessment.estimate().task().data().lastTime() / 3600);
        XYDataset curve = dataset(chart, "fitted curve");
        assertThat(curve.getXValue(0, curve.getItemCount(0) - 1)).isLessThanOrEqualTo(last * (1 + 1e-9));
        draw(chart, "stopped-early");
    }

    @Test
    void notFickianIsCalledApparent() throws IOException {
        Assessment assessment = InventedRuns.notFickian();
        JFreeChart chart = CouponFigure.chart(assessment, ChartStyle.light());

        assertThat(texts(chart)).anyMatch(t -> t.startsWith("apparent D = "));
        draw(chart, "apparent");
    }

    @Test
    void longSeriesIsReducedAndSaysSo() throws IOException {
        JFreeChart chart = CouponFigure.chart(assess(InventedRuns.log(200_000)), ChartStyle.light());

        assertThat(dataset(chart, "weighings").getItemCount(0)).isBetween(2_000, 4_000);
        assertThat(texts(chart)).anyMatch(t -> t.matches("200,000 weighings drawn as [34],\\d{3}: extremes kept"));
        draw(chart, "long");
    }

    @Test
    void readsTheSameInEveryLocale() {
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.GERMANY);
            List<String> german = texts(CouponFigure.chart(assess(InventedRuns.plateau()), ChartStyle.light()));
            Locale.setDefault(Locale.ROOT);
            assertThat(german).isEqualTo(texts(CouponFigure.chart(assess(InventedRuns.plateau()), ChartStyle.light())));
        } finally {
            Locale.setDefault(before);
        }
    }

    private static Assessment assess(Run run) {
        return Assessor.assess(run, AssessmentOptions.usual());
    }

    private static List<String> texts(JFreeChart chart) {
        List<String> texts = new ArrayList<>();
        texts.add(chart.getTitle().getText());
        for (Object title : chart.getSubtitles()) {
            if (title instanceof TextTitle text) {
                texts.add(text.getText());
            }
        }
        return texts;
    }

    private static List<String> series(JFreeChart chart) {
        return datasets(chart).stream().map(s -> s.getSeriesKey(0).toString()).toList();
    }

    private static XYDataset dataset(JFreeChart chart, String name) {
        return datasets(chart).stream()
                .filter(s -> s.getSeriesKey(0).equals(name))
                .findFirst()
                .orElseThrow();
    }

    private static List<XYDataset> datasets(JFreeChart chart) {
        List<XYDataset> sets = new ArrayList<>();
        for (Object plot : ((CombinedDomainXYPlot) chart.getPlot()).getSubplots()) {
            XYPlot sub = (XYPlot) plot;
            for (int i = 0; i < sub.getDatasetCount(); i++) {
                sets.add(sub.getDataset(i));
            }
        }
        return sets;
    }

    private static void draw(JFreeChart chart, String name) throws IOException {
        BufferedImage image = chart.createBufferedImage(900, 640);
        File folder = new File("target/pictures");
        folder.mkdirs();
        assertThat(ImageIO.write(image, "png", new File(folder, "figure-" + name + ".png")))
                .isTrue();
    }
}
