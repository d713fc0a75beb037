package soakline.window.view;

import java.awt.BorderLayout;
import java.util.Optional;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JPanel;
import javax.swing.UIManager;

/** Says in place what went wrong and what to do about it. What was shown before stays below it. */
final class MessageBar extends JPanel {

    private static final long serialVersionUID = 1L;

    private final WrappingText text = new WrappingText("", "defaultFont", "Soakline.messageText");

    MessageBar(Runnable close) {
        super(new BorderLayout());
        setName("message-bar");
        text.setName("message");
        JButton button = new JButton("Close");
        button.setName("message-close");
        button.setMnemonic('C');
        button.setToolTipText("Close this message");
        button.addActionListener(event -> close.run());
        Column line = new Column("insets #10 #16 #10 #12, gapx #12", "[grow, fill, 0::][]", "[center]");
        line.setOpaque(false);
        line.put(text, "growx, wmin 0");
        line.put(button, "");
        add(line);
        setVisible(false);
    }

    void show(Optional<String> message) {
        setBackground(UIManager.getColor("Soakline.messageBackground"));
        setBorder(BorderFactory.createMatteBorder(0, 0, 1, 0, Look.line()));
        String words = message.orElse("");
        text.setText(words);
        text.getAccessibleContext().setAccessibleName(words);
        setVisible(message.isPresent());
        revalidate();
    }
}
