package soakline.window.view;

import java.awt.Rectangle;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import java.util.logging.Level;
import java.util.logging.Logger;
import java.util.prefs.Preferences;

/** What the window remembers from one start to the next. */
final class WindowPreferences {

    private static final String APPEARANCE = "appearance";
    private static final String FOLDER = "folder";
    /** The library reports the making of its folder on standard error, which is no news to a user. */
    private static final Logger QUIET = Logger.getLogger("java.util.prefs");

    private final Preferences node;

    WindowPreferences(Preferences node) {
        this.node = node;
    }

    static WindowPreferences ofUser() {
        QUIET.setLevel(Level.OFF);
        return new WindowPreferences(Preferences.userRoot().node("soakline"));
    }

    Appearance appearance() {
        String name = node.get(APPEARANCE, Appearance.LIGHT.name()).toUpperCase(Locale.ROOT);
        return name.equals(Appearance.DARK.name()) ? Appearance.DARK : Appearance.LIGHT;
    }

    void setAppearance(Appearance value) {
        node.put(APPEARANCE, value.name());
    }

    /** Where the last file was opened. */
    Optional<Path> folder() {
        try {
            return Optional.ofNullable(node.get(FOLDER, null)).map(Path::of);
        } catch (InvalidPathException e) {
            return Optional.empty();
        }
    }

    void setFolder(Path value) {
        node.put(FOLDER, value.toString());
    }

    /** Place and size of the window; empty when never shown. */
    Optional<Rectangle> bounds() {
        Rectangle bounds = new Rectangle(
                node.getInt("x", 0), node.getInt("y", 0), node.getInt("width", 0), node.getInt("height", 0));
        return bounds.isEmpty() ? Optional.empty() : Optional.of(bounds);
    }

    void setBounds(Rectangle bounds) {
        node.putInt("x", bounds.x);
        node.putInt("y", bounds.y);
        node.putInt("width", bounds.width);
        node.putInt("height", bounds.height);
    }
}
