package soakline.window.view;

import java.awt.BorderLayout;
import java.util.Optional;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JProgressBar;
import javax.swing.Timer;
import soakline.window.present.WindowState.Waiting;

/** A quiet line at the foot of the window; while work goes on, how far it is and a way to stop it. */
final class StatusBar extends JPanel {

    private static final long serialVersionUID = 1L;

    private static final int SHOWN_AFTER_MILLIS = 150;
    private static final int STEPS = 1000;

    private final JLabel status = new JLabel(" ");
    private final JLabel waiting = new JLabel();
    private final JProgressBar bar = new JProgressBar(0, STEPS);
    private final JButton cancel = new JButton("Stop");
    /** Work that is done at once must not flicker. */
    private final Timer late;

    StatusBar(Runnable stop) {
        super(new BorderLayout());
        setName("status-bar");
        status.setName("status");
        waiting.setName("waiting");
        bar.setName("progress");
        bar.getAccessibleContext().setAccessibleName("Progress");
        cancel.setName("stop");
        cancel.setMnemonic('S');
        cancel.setToolTipText("Stop this work; what is shown stays");
        cancel.addActionListener(event -> stop.run());
        Column line =
                new Column("insets #4 #16 #4 #12, gapx #10, hidemode 3", "[grow, fill, 0::][][#140!][]", "[#26!]");
        line.setOpaque(false);
        line.put(status, "wmin 0");
        line.put(waiting, "wmin 0");
        line.put(bar, "");
        line.put(cancel, "");
        add(line);
        late = new Timer(SHOWN_AFTER_MILLIS, event -> setWorking(true));
        late.setRepeats(false);
        setWorking(false);
    }

    void show(String text, Optional<Waiting> work) {
        setBorder(BorderFactory.createMatteBorder(1, 0, 0, 0, Look.line()));
        status.setForeground(Look.quietText());
        status.setText(text.isEmpty() ? " " : text);
        if (work.isEmpty()) {
            late.stop();
            setWorking(false);
            return;
        }
        waiting.setText(work.get().sentence());
        bar.setIndeterminate(work.get().share().isEmpty());
        work.get().share().ifPresent(share -> bar.setValue((int) (share * STEPS)));
        if (!bar.isVisible() && !late.isRunning()) {
            late.start();
        }
    }

    private void setWorking(boolean working) {
        waiting.setVisible(working);
        bar.setVisible(working);
        cancel.setVisible(working);
    }
}
