package soakline.report;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.awt.AWTError;
import java.awt.GraphicsEnvironment;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collections;
import java.util.List;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.w3c.dom.Document;
import soakline.inference.Assessment;
import soakline.problem.Code;
import soakline.problem.Fault;

class FigureFileTest {

    private static final List<Assessment> TWO =
            List.of(InventedAssessments.usable("First coupon", 1e-12), InventedAssessments.usable("Second", 1e-12));

    @TempDir
    Path folder;

    /** A display that is named but not there stops drawing in this process; the command's own tests draw without one. */
    private static void assumeGraphics() {
        try {
            GraphicsEnvironment.getLocalGraphicsEnvironment();
        } catch (AWTError | NoClassDefFoundError e) {
            assumeTrue(false, "the display is not there");
        }
    }

    @Test
    void severalCouponsStandInOneDrawingWithTextAsText() throws Exception {
        Path file = folder.resolve("a.svg");

        assumeGraphics();
        FigureFile.write(file, TWO);

        Document drawing =
                DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(file.toFile());
        assertThat(drawing.getDocumentElement().getTagName()).isEqualTo("svg");
        assertThat(drawing.getDocumentElement().getAttribute("height")).isEqualTo("1240");
        assertThat(drawing.getElementsByTagName("text").getLength()).isPositive();
        assertThat(Files.readString(file)).contains("First coupon", "Second");
    }

    @Test
    void theSameCouponsGiveTheSameBytes() throws IOException {
        Path a = folder.resolve("a.svg");
        Path b = folder.resolve("b.svg");

        assumeGraphics();
        FigureFile.write(a, TWO);
        FigureFile.write(b, TWO);

        assertThat(a).hasSameBinaryContentAs(b);
    }

    @Test
    void aPngIsTwiceAsSharp() throws IOException {
        Path file = folder.resolve("a.PNG");

        assumeGraphics();
        FigureFile.write(file, TWO);

        BufferedImage image = ImageIO.read(file.toFile());
        assertThat(image.getWidth()).isEqualTo(1800);
        assertThat(image.getHeight()).isEqualTo(2 * 1240);
    }

    @Test
    void morePixelsThanFitAreRefused() {
        List<Assessment> many = Collections.nCopies(500, TWO.get(0));

        Fault fault = catchThrowableOfType(Fault.class, () -> FigureFile.write(folder.resolve("a.png"), many));

        assertThat(fault.finding().code()).isEqualTo(Code.OUTPUT_NOT_WRITABLE);
    }

    @ParameterizedTest
    @ValueSource(strings = {"a.pdf", "a", "svg", ".svg", "a.svg.gz", "a.svgx"})
    void anotherEndingIsRefused(String name) {
        Fault fault = catchThrowableOfType(Fault.class, () -> FigureType.of(folder.resolve(name)));

        assertThat(fault.finding().code()).isEqualTo(Code.OUTPUT_TYPE_UNKNOWN);
    }
}
