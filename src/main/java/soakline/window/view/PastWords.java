package soakline.window.view;

import java.awt.Component;
import javax.swing.LayoutFocusTraversalPolicy;

/** The tab key goes past words that can be selected but not changed; there are dozens of them. */
final class PastWords extends LayoutFocusTraversalPolicy {

    private static final long serialVersionUID = 1L;

    @Override
    protected boolean accept(Component component) {
        return !(component instanceof WrappingText) && super.accept(component);
    }
}
