package soakline.window.view;

import java.nio.file.Path;
import java.util.Optional;
import javax.swing.SwingUtilities;
import soakline.window.present.CouponService;

/** Where the window starts. */
public final class SoaklineWindow {

    private SoaklineWindow() {}

    /** Opens the window, with a file when one is given. Returns at once; the program ends when the window is closed. */
    public static void open(CouponService service, Optional<Path> file) {
        SwingUtilities.invokeLater(() -> {
            WindowPreferences preferences = WindowPreferences.ofUser();
            Look.install(preferences.appearance());
            MainWindow window = new MainWindow(service, new SwingTasks(), preferences);
            window.open();
            file.ifPresent(window.presenter()::open);
        });
    }
}
