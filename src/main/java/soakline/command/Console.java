package soakline.command;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashSet;
import java.util.Set;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Finding;
import soakline.wording.Wording;

/** Standard output and standard error, in UTF-8 whatever the locale. */
public final class Console {

    private final OutputStream out;
    private final OutputStream err;
    private final Set<String> said = new LinkedHashSet<>();

    public Console(OutputStream out, OutputStream err) {
        this.out = out;
        this.err = err;
    }

    /** Those of the process. Not {@code System.out}, which hides what goes wrong in writing. */
    public static Console ofProcess() {
        return new Console(new FileOutputStream(FileDescriptor.out), new FileOutputStream(FileDescriptor.err));
    }

    /**
     * Writes a result, in one go.
     *
     * @throws Fault when it could not be written to its end; not when its reader has read enough and left
     */
    void result(String text) {
        try {
            out.write(text.getBytes(StandardCharsets.UTF_8));
            out.flush();
        } catch (IOException e) {
            String message = String.valueOf(e.getMessage());
            if (!message.contains("Broken pipe") && !message.contains("pipe is being closed")) {
                throw Fault.of(
                        Code.OUTPUT_STREAM_FAILED, message.contains("No space left") ? "the disk is full" : message);
            }
        }
    }

    /** Tells a finding on standard error, with its kind in front; the same line only once. */
    public void tell(Finding finding) {
        tell(finding, "");
    }

    /**
     * Tells a finding about a coupon.
     *
     * @param about the coupon's name; left out where the finding has a place of its own
     */
    void tell(Finding finding, String about) {
        String prefix = prefix(finding.code().kind());
        boolean placed = about.isEmpty() || !Wording.place(finding.place()).isEmpty();
        line(prefix + (placed ? "" : about + ": ") + Wording.withPlace(finding));
    }

    private static String prefix(Code.Kind kind) {
        return switch (kind) {
            case NOTE, CAUTION -> "note: ";
            case WARNING -> "warning: ";
            case USE, INPUT, RESULT -> "problem: ";
        };
    }

    private void line(String text) {
        StringBuilder line = new StringBuilder(text);
        for (int i = 0; i < line.length(); i++) {
            // what comes from a file must not steer a terminal
            if (Character.isISOControl(line.charAt(i))) {
                line.setCharAt(i, ' ');
            }
        }
        if (!said.add(line.toString())) {
            return;
        }
        try {
            err.write(line.append('\n').toString().getBytes(StandardCharsets.UTF_8));
            err.flush();
        } catch (IOException e) {
            // nobody is left to tell; the exit status still says it
            said.add(e.toString());
        }
    }
}
