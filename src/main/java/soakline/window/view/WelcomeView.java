package soakline.window.view;

import java.awt.BorderLayout;
import java.util.function.Consumer;
import javax.swing.Action;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.SwingConstants;
import soakline.problem.Code;
import soakline.problem.Finding;
import soakline.window.present.WindowState.Sample;
import soakline.window.present.WindowState.Welcome;
import soakline.wording.Wording;

/** What to do when nothing is open. */
final class WelcomeView extends JPanel {

    private static final long serialVersionUID = 1L;

    private final transient Action open;
    private final transient Consumer<String> openSample;
    private final JScrollPane scroll = new JScrollPane();

    WelcomeView(Action open, Consumer<String> openSample) {
        super(new BorderLayout());
        this.open = open;
        this.openSample = openSample;
        setName("welcome");
        scroll.setBorder(BorderFactory.createEmptyBorder());
        add(scroll);
    }

    void show(Welcome welcome) {
        Column page = new Column("insets #56 #32 #32 #32, wrap 1, gapy #12", "[grow, center]", "");
        Column column = new Column("insets 0, wrap 1, gapy #14", "[grow, fill, 0::]", "");
        column.put(new WrappingText("Soakline", "h00.font", "Label.foreground"), "growx, wmin 0");
        column.put(WrappingText.plain(Wording.text(Finding.of(Code.WELCOME_OPEN))), "growx, wmin 0");
        JButton button = new JButton(open);
        button.setName("welcome-open");
        button.putClientProperty("FlatLaf.style", Look.MAIN_BUTTON);
        column.put(button, "grow 0, gapbottom #14");
        if (!welcome.samples().isEmpty()) {
            column.put(WrappingText.plain(Wording.text(Finding.of(Code.WELCOME_SAMPLES))), "growx, wmin 0");
            Column samples = new Column("insets 0, wrap 2, gap #10", "[grow, fill, sg, 0::][grow, fill, sg, 0::]", "");
            for (Sample sample : welcome.samples()) {
                samples.put(button(sample), "growx, wmin 0");
            }
            column.put(samples, "growx, wmin 0");
        }
        page.put(column, "growx, wmin 0, wmax #620");
        page.setBackground(Look.paper());
        column.setOpaque(false);
        for (java.awt.Component part : column.getComponents()) {
            if (part instanceof Column inner) {
                inner.setOpaque(false);
            }
        }
        scroll.setViewportView(page);
        scroll.getViewport().setBackground(Look.paper());
    }

    private JButton button(Sample sample) {
        JButton button = new JButton(sample.words());
        button.setName("sample-" + sample.file());
        button.setToolTipText("Open the sample run " + sample.file());
        button.putClientProperty("FlatLaf.style", "margin: 6,12,6,12");
        button.setHorizontalAlignment(SwingConstants.LEADING);
        button.addActionListener(event -> openSample.accept(sample.file()));
        return button;
    }

    /** A page that says why a coupon has no result. */
    static JPanel unusable(String coupon, String reason) {
        JPanel panel = new JPanel(new BorderLayout());
        panel.setName("unusable");
        Column column = new Column("insets #40 #32 #32 #32, wrap 1, gapy #10", "[grow, fill, 0::]", "");
        column.setBackground(Look.paper());
        JLabel title = new JLabel(coupon);
        title.setFont(Look.font("h2.font"));
        column.put(title, "growx, wmin 0");
        column.put(WrappingText.plain(reason), "growx, wmin 0, wmax #620");
        panel.add(column);
        return panel;
    }
}
