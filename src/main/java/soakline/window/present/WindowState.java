package soakline.window.present;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import soakline.inference.Assessment;

/**
 * All that the window shows at one moment. Immutable; the view draws it whole.
 *
 * @param file name of the open file, empty when there is none
 * @param coupons names of the file's coupons
 * @param selected which of them is shown
 * @param message what went wrong last, until it is closed or something goes right
 * @param status a quiet line about what is shown
 */
public record WindowState(
        String file,
        Content content,
        List<String> coupons,
        int selected,
        Optional<Waiting> waiting,
        Optional<String> message,
        String status) {

    public WindowState {
        coupons = List.copyOf(coupons);
    }

    /** Title of the window. */
    public String title() {
        return file.isEmpty() ? "Soakline" : "Soakline – " + file;
    }

    /** The main part of the window. */
    public sealed interface Content permits Welcome, Asking, Result, Unusable {}

    /** Nothing is open yet. */
    public record Welcome(List<Sample> samples) implements Content {
        public Welcome {
            samples = List.copyOf(samples);
        }
    }

    /** Facts are missing. */
    public record Asking(Question question) implements Content {}

    /** There is something to say about a coupon. */
    public record Result(Assessment assessment, Findings findings) implements Content {}

    /** The coupon cannot be estimated; the message says why. */
    public record Unusable(String coupon, String reason) implements Content {}

    /**
     * A sample run to open.
     *
     * @param file its file name
     * @param words the name for people
     */
    public record Sample(String file, String words) {}

    /**
     * Work in the background.
     *
     * @param share from 0 to 1; empty while it is not known
     */
    public record Waiting(String sentence, OptionalDouble share) {}

    static WindowState welcome(List<Sample> samples) {
        return new WindowState("", new Welcome(samples), List.of(), 0, Optional.empty(), Optional.empty(), "");
    }

    WindowState withContent(Content value) {
        return new WindowState(file, value, coupons, selected, waiting, message, status);
    }

    WindowState withFile(String name, List<String> names) {
        return new WindowState(name, content, names, 0, waiting, message, status);
    }

    WindowState withSelected(int index) {
        return new WindowState(file, content, coupons, index, waiting, message, status);
    }

    WindowState withWaiting(Waiting value) {
        return new WindowState(file, content, coupons, selected, Optional.of(value), message, status);
    }

    WindowState withoutWaiting() {
        return new WindowState(file, content, coupons, selected, Optional.empty(), message, status);
    }

    WindowState withMessage(String text) {
        return new WindowState(file, content, coupons, selected, waiting, Optional.of(text), status);
    }

    WindowState withoutMessage() {
        return new WindowState(file, content, coupons, selected, waiting, Optional.empty(), status);
    }

    WindowState withStatus(String text) {
        return new WindowState(file, content, coupons, selected, waiting, message, text);
    }
}
