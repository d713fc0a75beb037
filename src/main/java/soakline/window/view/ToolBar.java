package soakline.window.view;

import java.awt.BorderLayout;
import java.util.function.IntConsumer;
import javax.swing.Action;
import javax.swing.BorderFactory;
import javax.swing.DefaultComboBoxModel;
import javax.swing.JButton;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JPanel;
import soakline.window.present.WindowState;

/** Open a file and choose among its coupons. */
final class ToolBar extends JPanel {

    private static final long serialVersionUID = 1L;

    private final JLabel couponLabel = new JLabel("Coupon");
    private final JComboBox<String> coupons = new JComboBox<>();
    private boolean showing;

    ToolBar(Action open, IntConsumer select) {
        super(new BorderLayout());
        JButton button = new JButton(open);
        button.setName("open");
        coupons.setName("coupons");
        coupons.setToolTipText("Which coupon of the file is shown");
        couponLabel.setDisplayedMnemonic('P');
        couponLabel.setLabelFor(coupons);
        coupons.addActionListener(event -> {
            if (!showing) {
                select.accept(coupons.getSelectedIndex());
            }
        });
        Column line = new Column("insets #8 #16 #8 #16, gapx #10, hidemode 3", "[]#16[][0:#200:#320]", "[center]");
        line.setOpaque(false);
        line.put(button, "");
        line.put(couponLabel, "");
        line.put(coupons, "growx");
        add(line);
    }

    void show(WindowState state) {
        setBorder(BorderFactory.createMatteBorder(0, 0, 1, 0, Look.line()));
        boolean several = state.coupons().size() > 1;
        couponLabel.setVisible(several);
        coupons.setVisible(several);
        showing = true;
        try {
            if (!sameNames(state)) {
                coupons.setModel(new DefaultComboBoxModel<>(state.coupons().toArray(new String[0])));
            }
            if (several) {
                coupons.setSelectedIndex(state.selected());
            }
        } finally {
            showing = false;
        }
    }

    private boolean sameNames(WindowState state) {
        if (coupons.getItemCount() != state.coupons().size()) {
            return false;
        }
        for (int i = 0; i < coupons.getItemCount(); i++) {
            if (!coupons.getItemAt(i).equals(state.coupons().get(i))) {
                return false;
            }
        }
        return true;
    }
}
