package soakline.window.view;

import java.awt.Color;
import java.awt.Font;
import javax.swing.JTextArea;
import javax.swing.UIManager;

/** Words that wrap at the width they are given and can be selected and copied. */
final class WrappingText extends JTextArea {

    private static final long serialVersionUID = 1L;

    private final String fontKey;
    private final String colourKey;

    /**
     * @param fontKey of the look, such as {@code defaultFont}
     * @param colourKey of the look, such as {@code Label.foreground}
     */
    WrappingText(String text, String fontKey, String colourKey) {
        super(text);
        this.fontKey = fontKey;
        this.colourKey = colourKey;
        setEditable(false);
        setLineWrap(true);
        setWrapStyleWord(true);
        setOpaque(false);
        setBorder(null);
        getAccessibleContext().setAccessibleName(text);
        dress();
    }

    static WrappingText plain(String text) {
        return new WrappingText(text, "defaultFont", "Label.foreground");
    }

    static WrappingText quiet(String text) {
        return new WrappingText(text, "defaultFont", "Soakline.quietText");
    }

    @Override
    public void updateUI() {
        super.updateUI();
        // files dropped here belong to the window
        setDropTarget(null);
        setOpaque(false);
        setBorder(null);
        dress();
    }

    private void dress() {
        if (fontKey == null) {
            return;
        }
        Font font = Look.font(fontKey);
        Color colour = UIManager.getColor(colourKey);
        setFont(font);
        setForeground(colour);
        setMargin(null);
    }
}
