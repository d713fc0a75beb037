package soakline.window.view;

import com.formdev.flatlaf.util.UIScale;
import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Component;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import javax.swing.Icon;
import javax.swing.UIManager;
import soakline.inference.Verdict;

/** The mark of a verdict: a shape of its own for each, so that colour is not needed to tell them apart. */
final class VerdictIcon implements Icon {

    private static final double GRID = 16;

    private final Verdict verdict;
    private final int size;

    /**
     * @param size at scale 1
     */
    VerdictIcon(Verdict verdict, int size) {
        this.verdict = verdict;
        this.size = size;
    }

    @Override
    public int getIconWidth() {
        return UIScale.scale(size);
    }

    @Override
    public int getIconHeight() {
        return UIScale.scale(size);
    }

    @Override
    public void paintIcon(Component c, Graphics g, int x, int y) {
        Graphics2D g2 = (Graphics2D) g.create();
        try {
            g2.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
            g2.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
            AffineTransform place = AffineTransform.getTranslateInstance(x, y);
            place.scale(getIconWidth() / GRID, getIconHeight() / GRID);
            g2.transform(place);
            g2.setColor(UIManager.getColor("Soakline." + verdict.code()));
            g2.setStroke(new BasicStroke(1.8f, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND));
            Shape ground = ground();
            if (verdict == Verdict.UNKNOWN) {
                g2.draw(ground);
            } else {
                g2.fill(ground);
                g2.setColor(paper());
            }
            g2.draw(sign());
        } finally {
            g2.dispose();
        }
    }

    private static Color paper() {
        return Look.paper();
    }

    private Shape ground() {
        return switch (verdict) {
            case PASS -> new Ellipse2D.Double(0.5, 0.5, 15, 15);
            case UNKNOWN -> new Ellipse2D.Double(1.5, 1.5, 13, 13);
            case CAUTION -> polygon(8, 0.6, 15.8, 15, 0.2, 15);
            case FAIL -> polygon(8, 0, 16, 8, 8, 16, 0, 8);
        };
    }

    private Shape sign() {
        Path2D path = new Path2D.Double();
        switch (verdict) {
            case PASS -> {
                path.moveTo(4.6, 8.3);
                path.lineTo(7, 10.8);
                path.lineTo(11.6, 5.4);
            }
            case CAUTION -> {
                path.moveTo(8, 5.8);
                path.lineTo(8, 9.4);
                path.moveTo(8, 12.4);
                path.lineTo(8, 12.5);
            }
            case FAIL -> {
                path.moveTo(5.8, 5.8);
                path.lineTo(10.2, 10.2);
                path.moveTo(10.2, 5.8);
                path.lineTo(5.8, 10.2);
            }
            case UNKNOWN -> {
                path.moveTo(5, 8);
                path.lineTo(11, 8);
            }
        }
        return path;
    }

    private static Shape polygon(double... corners) {
        Path2D path = new Path2D.Double();
        path.moveTo(corners[0], corners[1]);
        for (int i = 2; i < corners.length; i += 2) {
            path.lineTo(corners[i], corners[i + 1]);
        }
        path.closePath();
        return path;
    }
}
