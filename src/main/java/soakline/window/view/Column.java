package soakline.window.view;

import java.awt.Component;
import java.awt.Container;
import java.awt.Dimension;
import java.awt.Rectangle;
import javax.swing.JPanel;
import javax.swing.Scrollable;
import net.miginfocom.swing.MigLayout;

/** A panel of stacked parts that is as wide as what it scrolls in, so that its texts wrap instead of running out of sight. */
class Column extends JPanel implements Scrollable {

    private static final long serialVersionUID = 1L;

    Column(String layout, String columns, String rows) {
        super(new MigLayout(Look.scaled(layout), Look.scaled(columns), Look.scaled(rows)));
    }

    void put(Component part, String constraints) {
        add(part, Look.scaled(constraints));
    }

    /** Lays out once more, now that the texts know how wide they are: their heights follow from it. */
    void settle() {
        invalidateAll(this);
        revalidate();
    }

    private static void invalidateAll(Container container) {
        for (Component part : container.getComponents()) {
            if (part instanceof Container inner) {
                invalidateAll(inner);
            }
            part.invalidate();
        }
    }

    @Override
    public Dimension getPreferredScrollableViewportSize() {
        return getPreferredSize();
    }

    @Override
    public int getScrollableUnitIncrement(Rectangle visible, int orientation, int direction) {
        return Look.px(24);
    }

    @Override
    public int getScrollableBlockIncrement(Rectangle visible, int orientation, int direction) {
        return visible.height;
    }

    @Override
    public boolean getScrollableTracksViewportWidth() {
        return true;
    }

    @Override
    public boolean getScrollableTracksViewportHeight() {
        return false;
    }
}
