package soakline.window.view;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Dimension;
import java.awt.Graphics2D;
import java.awt.GraphicsConfiguration;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import javax.imageio.ImageIO;
import javax.swing.JComponent;
import javax.swing.JFrame;
import org.assertj.swing.edt.GuiActionRunner;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import soakline.window.present.WindowState.Asking;
import soakline.window.present.WindowState.Content;
import soakline.window.present.WindowState.Result;
import soakline.window.present.WindowState.Welcome;

/** Takes pictures of the window: into the build folder, or where {@code -Dsoakline.pictures} says. */
class PicturesTest {

    private static final Path FOLDER = Path.of(System.getProperty("soakline.pictures", "target/pictures"));

    @BeforeEach
    void display() {
        Display.require();
    }

    @ParameterizedTest
    @EnumSource(Appearance.class)
    void everyPartOfTheWindow(Appearance appearance) throws Exception {
        String name = appearance.name().toLowerCase(Locale.ROOT);
        try (OpenWindow open = new OpenWindow(appearance)) {
            resize(open, 1400, 900);
            open.waitFor(Welcome.class);
            take(open, "welcome-" + name);
            show(open, "01-plateau.csv", Result.class);
            take(open, "result-" + name);
            resize(open, 900, 650);
            take(open, "narrow-" + name);
            show(open, "02-stopped-early.csv", Result.class);
            resize(open, 1400, 900);
            take(open, "not-determined-" + name);
            show(open, "03-second-stage.csv", Result.class);
            take(open, "apparent-" + name);
            show(open, "no-facts-several.csv", Asking.class);
            open.frame().button("estimate").click();
            take(open, "asking-" + name);
            show(open, "04-several.csv", Result.class);
            GuiActionRunner.execute(() -> open.window().presenter().open(Path.of("broken.csv")));
            open.waitForMessage();
            take(open, "message-" + name);
        }
    }

    private static void show(OpenWindow open, String file, Class<? extends Content> kind) {
        GuiActionRunner.execute(() -> open.window().presenter().openSample(file));
        open.waitFor(kind);
    }

    private static void resize(OpenWindow open, int width, int height) {
        GuiActionRunner.execute(() -> open.window().frame().setSize(new Dimension(Look.px(width), Look.px(height))));
        open.frame().robot().waitForIdle();
    }

    private static void take(OpenWindow open, String name) throws IOException {
        open.frame().robot().waitForIdle();
        BufferedImage image = GuiActionRunner.execute(() -> {
            JFrame frame = open.window().frame();
            JComponent root = frame.getRootPane();
            GraphicsConfiguration screen = frame.getGraphicsConfiguration();
            double scale = screen.getDefaultTransform().getScaleX();
            BufferedImage picture = new BufferedImage(
                    (int) (root.getWidth() * scale), (int) (root.getHeight() * scale), BufferedImage.TYPE_INT_RGB);
            Graphics2D g = picture.createGraphics();
            g.scale(scale, scale);
            root.printAll(g);
            g.dispose();
            return picture;
        });
        Files.createDirectories(FOLDER);
        assertThat(ImageIO.write(
                        image, "png", FOLDER.resolve("window-" + name + ".png").toFile()))
                .isTrue();
    }
}
