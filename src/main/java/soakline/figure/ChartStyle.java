package soakline.figure;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Stroke;
import java.util.EnumMap;
import java.util.Map;

/**
 * Colours, font and size of a chart. Immutable.
 *
 * <p>The inks differ in lightness as well as in hue, and each line has a pattern of its own, so that a chart can be read in grey
 * and by people who do not tell red from green.
 */
public final class ChartStyle {

    /** What is drawn in one colour. */
    public enum Ink {
        BACKGROUND,
        TEXT,
        QUIET_TEXT,
        GRID,
        WEIGHING,
        SET_ASIDE,
        CURVE,
        SHORT_TIME,
        PLATEAU
    }

    private static final int MARKER_ALPHA = 150;

    private final Map<Ink, Color> inks;
    private final Font font;
    private final double scale;

    private ChartStyle(Map<Ink, Color> inks, Font font, double scale) {
        this.inks = inks;
        this.font = font;
        this.scale = scale;
    }

    /** Dark ink on white: for the light window and for paper. */
    public static ChartStyle light() {
        Map<Ink, Color> inks = new EnumMap<>(Ink.class);
        inks.put(Ink.BACKGROUND, Color.WHITE);
        inks.put(Ink.TEXT, new Color(0x1d2730));
        inks.put(Ink.QUIET_TEXT, new Color(0x55626d));
        inks.put(Ink.GRID, new Color(0xe3e8ec));
        inks.put(Ink.WEIGHING, new Color(0x1f5c99));
        inks.put(Ink.SET_ASIDE, new Color(0x6d7780));
        inks.put(Ink.CURVE, new Color(0xc7500a));
        inks.put(Ink.SHORT_TIME, new Color(0x00796b));
        inks.put(Ink.PLATEAU, new Color(0x7a4a9e));
        return new ChartStyle(inks, new Font(Font.SANS_SERIF, Font.PLAIN, 13), 1);
    }

    /** Pale ink on a dark ground. */
    public static ChartStyle dark() {
        Map<Ink, Color> inks = new EnumMap<>(Ink.class);
        inks.put(Ink.BACKGROUND, new Color(0x1e2429));
        inks.put(Ink.TEXT, new Color(0xe6ebef));
        inks.put(Ink.QUIET_TEXT, new Color(0xa4b0ba));
        inks.put(Ink.GRID, new Color(0x343d45));
        inks.put(Ink.WEIGHING, new Color(0x6fb1f0));
        inks.put(Ink.SET_ASIDE, new Color(0x9aa5ae));
        inks.put(Ink.CURVE, new Color(0xff9d4d));
        inks.put(Ink.SHORT_TIME, new Color(0x4fd1bd));
        inks.put(Ink.PLATEAU, new Color(0xc9a0ee));
        return new ChartStyle(inks, new Font(Font.SANS_SERIF, Font.PLAIN, 13), 1);
    }

    public ChartStyle withInk(Ink ink, Color colour) {
        Map<Ink, Color> next = new EnumMap<>(inks);
        next.put(ink, colour);
        return new ChartStyle(next, font, scale);
    }

    /** The same style in another font, whose size is that of the axis labels. */
    public ChartStyle withFont(Font value) {
        return new ChartStyle(inks, value, scale);
    }

    /** The same style with lines, markers and gaps drawn larger; the font has its own size. */
    public ChartStyle withScale(double value) {
        return new ChartStyle(inks, font, value);
    }

    public Color ink(Ink ink) {
        return inks.get(ink);
    }

    /** The ink of markers, which let what lies below shine through. */
    Color translucent(Ink ink) {
        Color c = ink(ink);
        return new Color(c.getRed(), c.getGreen(), c.getBlue(), MARKER_ALPHA);
    }

    Font font() {
        return font;
    }

    Font titleFont() {
        return font.deriveFont(Font.BOLD, font.getSize2D() * 1.2f);
    }

    Font smallFont() {
        return font.deriveFont(font.getSize2D() * 0.92f);
    }

    /** A length, given at scale 1. */
    double length(double pixels) {
        return pixels * scale;
    }

    Stroke solid(double width) {
        return new BasicStroke((float) length(width), BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);
    }

    Stroke dashed(double width) {
        return patterned(width, 7, 5);
    }

    Stroke dotted(double width) {
        return patterned(width, 0.1, 4.5);
    }

    private Stroke patterned(double width, double on, double off) {
        float[] dash = {(float) length(on), (float) length(off)};
        return new BasicStroke((float) length(width), BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND, 1, dash, 0);
    }
}
