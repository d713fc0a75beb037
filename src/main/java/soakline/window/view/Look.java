package soakline.window.view;

import com.formdev.flatlaf.FlatDarkLaf;
import com.formdev.flatlaf.FlatLaf;
import com.formdev.flatlaf.FlatLightLaf;
import com.formdev.flatlaf.util.UIScale;
import java.awt.Color;
import java.awt.Font;
import javax.swing.JComponent;
import javax.swing.JDialog;
import javax.swing.JFrame;
import javax.swing.UIManager;
import soakline.figure.ChartStyle;
import soakline.figure.ChartStyle.Ink;

/** The look and feel, and what is read from it. */
final class Look {

    /** Style of the button that goes on. */
    static final String MAIN_BUTTON =
            "background: $Component.accentColor; foreground: $Soakline.onAccent; borderColor: $Component.accentColor;"
                    + " hoverBackground: $Soakline.accentHover; pressedBackground: $Soakline.accentHover;"
                    + " focusedBackground: $Component.accentColor; margin: 6,20,6,20";

    private Look() {}

    /** Before the first component is made. */
    static void install(Appearance appearance) {
        FlatLaf.registerCustomDefaultsSource("soakline.window.view");
        JFrame.setDefaultLookAndFeelDecorated(true);
        JDialog.setDefaultLookAndFeelDecorated(true);
        setUp(appearance);
    }

    /** Changes the look of all open windows. */
    static void change(Appearance appearance) {
        setUp(appearance);
        FlatLaf.updateUI();
    }

    private static void setUp(Appearance appearance) {
        if (appearance == Appearance.DARK) {
            FlatDarkLaf.setup();
        } else {
            FlatLightLaf.setup();
        }
    }

    /** The chart's colours and font, of the look that is on now. */
    static ChartStyle chartStyle() {
        ChartStyle style = FlatLaf.isLafDark() ? ChartStyle.dark() : ChartStyle.light();
        return style.withInk(Ink.BACKGROUND, paper())
                .withInk(Ink.TEXT, UIManager.getColor("Label.foreground"))
                .withInk(Ink.QUIET_TEXT, quietText())
                .withFont(UIManager.getFont("Label.font"))
                .withScale(UIScale.getUserScaleFactor());
    }

    static Color paper() {
        return UIManager.getColor("Soakline.paper");
    }

    static Color quietText() {
        return UIManager.getColor("Soakline.quietText");
    }

    static Color line() {
        return UIManager.getColor("Soakline.line");
    }

    /** A font of the look, such as {@code h2.font} or {@code small.font}. */
    static Font font(String key) {
        Font font = UIManager.getFont(key);
        return font == null ? UIManager.getFont("Label.font") : font;
    }

    /** A length in the user's scale. */
    static int px(int pixels) {
        return UIScale.scale(pixels);
    }

    /** The width of a row of digits in the look's font. */
    static int digits(JComponent component, int count) {
        return component.getFontMetrics(UIManager.getFont("Label.font")).charWidth('0') * count;
    }

    /** MigLayout constraints with lengths in the user's scale: each {@code #12} becomes 12 scaled pixels. */
    static String scaled(String constraints) {
        StringBuilder text = new StringBuilder();
        int i = 0;
        while (i < constraints.length()) {
            char c = constraints.charAt(i++);
            if (c != '#') {
                text.append(c);
                continue;
            }
            int from = i;
            while (i < constraints.length() && Character.isDigit(constraints.charAt(i))) {
                i++;
            }
            text.append(px(Integer.parseInt(constraints.substring(from, i)))).append("px");
        }
        return text.toString();
    }
}
