package soakline.window.view;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import com.formdev.flatlaf.FlatLaf;
import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.Transferable;
import java.awt.event.KeyEvent;
import java.io.File;
import java.nio.file.Path;
import java.util.List;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.TransferHandler.TransferSupport;
import org.assertj.swing.core.matcher.JButtonMatcher;
import org.assertj.swing.edt.GuiActionRunner;
import org.assertj.swing.finder.JFileChooserFinder;
import org.assertj.swing.fixture.FrameFixture;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import soakline.window.present.WindowState.Asking;
import soakline.window.present.WindowState.Result;
import soakline.window.present.WindowState.Unusable;
import soakline.window.present.WindowState.Welcome;

class WindowTest {

    private OpenWindow open;
    private FrameFixture frame;

    @BeforeEach
    void openWindow() {
        Display.require();
        open = new OpenWindow(Appearance.LIGHT);
        frame = open.frame();
    }

    @AfterEach
    void closeWindow() throws Exception {
        if (open != null) {
            open.close();
        }
    }

    @Test
    void aSampleRunIsShownAtAClick() {
        open.waitFor(Welcome.class);
        frame.button("sample-01-plateau.csv").click();
        open.waitFor(Result.class);

        frame.requireTitle("Soakline – 01-plateau.csv");
        assertThat(frame.textBox("headline").text()).startsWith("D = ");
        frame.label("status").requireText("40 weighings, 2 of them set aside");
        assertThat(chart().getAccessibleContext().getAccessibleName()).contains("P-07");
        assertThat(chart().getAccessibleContext().getAccessibleDescription()).startsWith("D = ");
    }

    @Test
    void aTestThatStoppedEarlyHasNoD() {
        frame.button("sample-02-stopped-early.csv").click();
        open.waitFor(Result.class);

        frame.textBox("headline").requireText("D not determined");
    }

    @Test
    void missingFactsAreAskedForInPlace() {
        openFile("no-facts.csv");
        open.waitFor(Asking.class);
        frame.textBox("field-thickness").requireEmpty();
        frame.radioButton("faces-both").requireNotSelected();
        frame.radioButton("faces-one").requireNotSelected();
        frame.button("estimate").click();
        assertThat(frame.textBox("complaint-faces").requireVisible().text()).startsWith("Faces:");

        frame.textBox("field-thickness").enterText("2 mm");
        frame.radioButton("faces-both").check();
        frame.button("estimate").click();
        open.waitFor(Result.class);
        assertThat(frame.textBox("headline").text()).startsWith("D = ");
    }

    @Test
    void aFaultIsSaidInPlaceAndTheResultStays() {
        frame.button("sample-01-plateau.csv").click();
        open.waitFor(Result.class);
        openFile("broken.csv");
        open.waitForMessage();

        assertThat(frame.textBox("message").text()).startsWith("broken.csv, line 3, column 2: ");
        frame.requireTitle("Soakline – 01-plateau.csv");
        assertThat(frame.textBox("headline").text()).startsWith("D = ");
        frame.button("message-close").click();
        assertThat(open.state().message()).isEmpty();
        assertThat(frame.robot()
                        .finder()
                        .findByName("message-bar", MessageBar.class, false)
                        .isVisible())
                .isFalse();
    }

    @Test
    void couponsOfAFileAreChosenAmong() {
        frame.button("sample-04-several.csv").click();
        open.waitFor(Result.class);
        frame.comboBox("coupons").requireItemCount(3).selectItem(1);
        open.waitFor(Result.class);
        frame.textBox("headline").requireText("D not determined");
        frame.comboBox("coupons").selectItem(2);
        open.waitFor(Unusable.class);
    }

    @Test
    void darkIsRemembered() {
        frame.button("sample-01-plateau.csv").click();
        open.waitFor(Result.class);
        frame.menuItemWithPath("View", "Dark").click();

        assertThat(GuiActionRunner.execute(FlatLaf::isLafDark)).isTrue();
        assertThat(open.preferences().appearance()).isEqualTo(Appearance.DARK);
        frame.menuItemWithPath("View", "Light").click();
        assertThat(open.preferences().appearance()).isEqualTo(Appearance.LIGHT);
    }

    @Test
    void controlOOpensTheChooser() {
        frame.button("open").focus();
        frame.robot().pressKey(KeyEvent.VK_CONTROL);
        frame.robot().pressAndReleaseKeys(KeyEvent.VK_O);
        frame.robot().releaseKey(KeyEvent.VK_CONTROL);
        JFileChooserFinder.findFileChooser("open-chooser")
                .withTimeout(10_000)
                .using(frame.robot())
                .cancel();
    }

    @Test
    void aFileCanBeDropped() {
        boolean taken = GuiActionRunner.execute(() -> {
            JComponent root = frame.targetCastedTo(javax.swing.JFrame.class).getRootPane();
            return root.getTransferHandler().importData(new TransferSupport(root, new Files("01-plateau.csv")));
        });

        assertThat(taken).isTrue();
        open.waitFor(Result.class);
    }

    @Test
    void everyButtonHasANameATooltipAndCanBeReachedByKey() {
        frame.button("sample-01-plateau.csv").click();
        open.waitFor(Result.class);
        for (JButton button : frame.robot()
                .finder()
                .findAll(frame.target(), JButtonMatcher.any().andShowing())) {
            if (button.getName() != null && !button.getName().startsWith("SplitPaneDivider")) {
                assertThat(button.getToolTipText()).as(button.getName()).isNotBlank();
                assertThat(button.getAccessibleContext().getAccessibleName())
                        .as(button.getName())
                        .isNotBlank();
            }
        }
    }

    @Test
    void theGuardSeesATouchOffTheEventThread() {
        EventThreadGuard guard = new EventThreadGuard();
        guard.addInvalidComponent(GuiActionRunner.execute(() -> new JPanel()));
        assertThatThrownBy(guard::verify).isInstanceOf(AssertionError.class);

        EventThreadGuard calm = new EventThreadGuard();
        GuiActionRunner.execute(() -> calm.addInvalidComponent(new JLabel()));
        calm.verify();
    }

    private JComponent chart() {
        return frame.robot().finder().findByName(frame.target(), "chart", org.jfree.chart.ChartPanel.class);
    }

    private void openFile(String name) {
        GuiActionRunner.execute(() -> open.window().presenter().open(Path.of(name)));
    }

    private record Files(String name) implements Transferable {
        @Override
        public DataFlavor[] getTransferDataFlavors() {
            return new DataFlavor[] {DataFlavor.javaFileListFlavor};
        }

        @Override
        public boolean isDataFlavorSupported(DataFlavor flavor) {
            return flavor.equals(DataFlavor.javaFileListFlavor);
        }

        @Override
        public Object getTransferData(DataFlavor flavor) {
            return List.of(new File(name));
        }
    }
}
