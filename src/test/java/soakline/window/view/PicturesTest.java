package soakline.window.view;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Dimension;
import java.awt.Graphics2D;
import java.awt.GraphicsConfiguration;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import javax.imageio.ImageIO;
import javax.swing.JComponent;
import javax.swing.JFrame;
import org.assertj.swing.edt.GuiActionRunner;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import soakline.Samples;
import soakline.inference.Assessment;
import soakline.report.FigureFile;
import soakline.window.present.WindowState.Asking;
import soakline.window.present.WindowState.Content;
import soakline.window.present.WindowState.Result;
import soakline.window.present.WindowState.Welcome;

/**
 * Takes pictures of the window and of figures, all from the sample runs, into the build folder; those of the documents also into the
 * folder that {@code -Dsoakline.pictures} names.
 */
class PicturesTest {

    private static final Path FOLDER = Path.of("target", "pictures");
    private static final Optional<Path> DOCUMENTS =
            Optional.ofNullable(System.getProperty("soakline.pictures")).map(Path::of);

    @TempDir
    private Path files;

    @BeforeEach
    void display() {
        Display.require();
    }

    @ParameterizedTest
    @EnumSource(Appearance.class)
    void everyPartOfTheWindow(Appearance appearance) throws Exception {
        String name = appearance.name().toLowerCase(Locale.ROOT);
        try (OpenWindow open = new OpenWindow(appearance, Samples.service())) {
            resize(open, 1400, 900);
            open.waitFor(Welcome.class);
            take(open, "welcome-" + name);
            for (String sample : Samples.names()) {
                GuiActionRunner.execute(() -> open.window().presenter().openSample(sample));
                waitForFile(open, sample, Result.class);
                take(open, sample.substring(0, 2) + "-" + name);
            }
            GuiActionRunner.execute(() -> open.window().presenter().select(1));
            resize(open, 900, 650);
            take(open, "narrow-" + name);
            resize(open, 1400, 900);

            Path bare = Files.writeString(files.resolve("no-facts.csv"), withoutFacts());
            GuiActionRunner.execute(() -> open.window().presenter().open(bare));
            waitForFile(open, "no-facts.csv", Asking.class);
            take(open, "asking-" + name);
            open.frame().button("estimate").click();
            take(open, "complaints-" + name);

            GuiActionRunner.execute(() -> open.window().presenter().openSample("01-both-faces.csv"));
            waitForFile(open, "01-both-faces.csv", Result.class);
            Path broken = Files.writeString(files.resolve("broken.csv"), "time [h],mass\n0,31.2041\n");
            GuiActionRunner.execute(() -> open.window().presenter().open(broken));
            open.waitForMessage();
            take(open, "message-" + name);
        }
    }

    @Test
    void theWindowInTheDocuments() throws Exception {
        try (OpenWindow open = new OpenWindow(Appearance.LIGHT, Samples.service())) {
            resize(open, 1320, 860);
            for (String[] picture : List.of(
                    new String[] {"01-both-faces.csv", "window-light"},
                    new String[] {"04-stopped-early.csv", "stopped-early"},
                    new String[] {"07-two-stages.csv", "two-stages"})) {
                GuiActionRunner.execute(() -> open.window().presenter().openSample(picture[0]));
                waitForFile(open, picture[0], Result.class);
                document(open, picture[1]);
            }
        }
        try (OpenWindow open = new OpenWindow(Appearance.DARK, Samples.service())) {
            resize(open, 1320, 860);
            GuiActionRunner.execute(() -> open.window().presenter().openSample("02-drying.csv"));
            waitForFile(open, "02-drying.csv", Result.class);
            document(open, "window-dark");
        }
    }

    @Test
    void figures() throws IOException {
        Files.createDirectories(FOLDER);
        for (String sample : Samples.names()) {
            List<Assessment> assessments = Samples.assessments(sample);
            FigureFile.write(FOLDER.resolve("figure-" + sample.substring(0, 2) + ".svg"), assessments);
            FigureFile.write(FOLDER.resolve("figure-" + sample.substring(0, 2) + ".png"), assessments);
        }
        if (DOCUMENTS.isPresent()) {
            Files.createDirectories(DOCUMENTS.get());
            FigureFile.write(DOCUMENTS.get().resolve("figure.png"), Samples.assessments("05-bare-edges.csv"));
        }
        assertThat(FOLDER.resolve("figure-01.png")).isNotEmptyFile();
    }

    private static String withoutFacts() throws IOException {
        StringBuilder text = new StringBuilder();
        Files.readAllLines(Samples.file("01-both-faces.csv")).stream()
                .filter(line -> !line.startsWith("#"))
                .forEach(line -> text.append(line).append('\n'));
        return text.toString();
    }

    private static void waitForFile(OpenWindow open, String file, Class<? extends Content> kind) {
        open.waitFor(kind, state -> state.title().contains(file));
    }

    private static void resize(OpenWindow open, int width, int height) {
        GuiActionRunner.execute(() -> open.window().frame().setSize(new Dimension(Look.px(width), Look.px(height))));
        open.frame().robot().waitForIdle();
    }

    private static void document(OpenWindow open, String name) throws IOException {
        BufferedImage picture = picture(open);
        write(picture, FOLDER.resolve("document-" + name + ".png"));
        if (DOCUMENTS.isPresent()) {
            write(picture, DOCUMENTS.get().resolve(name + ".png"));
        }
    }

    private static void take(OpenWindow open, String name) throws IOException {
        write(picture(open), FOLDER.resolve("window-" + name + ".png"));
    }

    private static void write(BufferedImage picture, Path file) throws IOException {
        Files.createDirectories(file.getParent());
        assertThat(ImageIO.write(picture, "png", file.toFile())).isTrue();
    }

    private static BufferedImage picture(OpenWindow open) {
        open.frame().robot().waitForIdle();
        return GuiActionRunner.execute(() -> {
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
    }
}
