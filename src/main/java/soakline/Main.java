package soakline;

import java.nio.file.Path;
import soakline.command.Commands;
import soakline.command.Console;
import soakline.intake.ReadOptions;
import soakline.intake.RunFileReader;
import soakline.problem.Code;
import soakline.problem.Finding;
import soakline.session.EstimateRequest;
import soakline.session.RunReader;

/** Where the program starts and where its parts are put together. */
public final class Main {

    private Main() {}

    public static void main(String[] args) {
        if (args.length > 0) {
            // a command needs no screen, and a display that is named but dead must not stop a figure
            System.setProperty("java.awt.headless", "true");
            System.exit(new Commands(reader(), Console.ofProcess()).run(args));
        } else if (Display.isThere()) {
            WindowStarter.start();
        } else {
            System.exit(sample(Console.ofProcess()));
        }
    }

    /** With no display: says so, and shows what the program does on the first sample run. */
    static int sample(Console console) {
        console.tell(Finding.of(Code.NO_DISPLAY, SampleRuns.FIRST));
        return new Commands(sampleReader(), console).estimate(Path.of(SampleRuns.FIRST));
    }

    static RunReader reader() {
        return (file, request, progress) -> RunFileReader.read(file, options(request), progress::accept);
    }

    private static RunReader sampleReader() {
        return (file, request, progress) ->
                RunFileReader.readText(file.toString(), SampleRuns.text(file.toString()), options(request));
    }

    private static ReadOptions options(EstimateRequest request) {
        return new ReadOptions(request.columns(), request.datePattern());
    }
}
