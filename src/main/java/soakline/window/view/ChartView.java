package soakline.window.view;

import java.awt.BorderLayout;
import javax.swing.BorderFactory;
import javax.swing.JPanel;
import org.jfree.chart.ChartPanel;
import org.jfree.chart.JFreeChart;
import soakline.figure.CouponFigure;
import soakline.inference.Assessment;

/** The figure of the coupon. */
final class ChartView extends JPanel {

    private static final long serialVersionUID = 1L;

    private final ChartPanel panel;

    ChartView() {
        super(new BorderLayout());
        // unbuffered, so that it is sharp on screens of any density
        panel = new ChartPanel(
                null, 640, 480, 0, 0, Integer.MAX_VALUE, Integer.MAX_VALUE, false, false, false, false, false, true);
        panel.setName("chart");
        panel.setPopupMenu(null);
        panel.setMouseZoomable(false);
        panel.setBorder(BorderFactory.createEmptyBorder());
        panel.setMinimumSize(new java.awt.Dimension(0, 0));
        add(panel);
    }

    void show(Assessment assessment, String result) {
        JFreeChart chart = CouponFigure.chart(assessment, Look.chartStyle());
        panel.setChart(chart);
        panel.setBackground(Look.paper());
        setBackground(Look.paper());
        panel.getAccessibleContext()
                .setAccessibleName(
                        "Content against root time of " + assessment.run().name() + ", with residuals");
        panel.getAccessibleContext().setAccessibleDescription(result);
    }

    JFreeChart chart() {
        return panel.getChart();
    }
}
