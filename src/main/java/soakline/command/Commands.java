package soakline.command;

import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.IntSupplier;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Finding;
import soakline.report.ProgramVersion;
import soakline.session.RunReader;

/** The command line: arguments to exit status. No exception leaves it, and no stack trace reaches a user. */
public final class Commands {

    private static final String ESTIMATE = "estimate";
    static final String PROGRAM = "java -jar soakline.jar";
    private static final String HELP = """
            Usage: java -jar soakline.jar [COMMAND]
            Diffusivity and equilibrium content of flat coupons, with an honest uncertainty, from weighings.

            Commands:
              estimate FILE…   estimates each coupon of one or more run files

            Options:
              -h, --help       shows this and ends; "estimate --help" shows the options of the command
                  --version    shows the version and ends

            Without a command the window opens; without a display, the first sample run is estimated.
            Exit status: 0 done; 1 done, but a result is not usable; 2 wrong use; 3 unusable input.
            """;

    private final RunReader reader;
    private final Console console;

    public Commands(RunReader reader, Console console) {
        this.reader = reader;
        this.console = console;
    }

    /** Runs a command line. */
    public int run(String... arguments) {
        return guarded(() -> dispatch(arguments));
    }

    /** Estimates one file as it stands. */
    public int estimate(Path file) {
        return guarded(() -> EstimateCommand.of(file).run(reader, console));
    }

    private int dispatch(String... arguments) {
        String first = arguments.length == 0 ? "--help" : arguments[0];
        switch (first) {
            case "-h", "--help", "help" -> console.result(HELP);
            case "-V", "--version" -> console.result(ProgramVersion.text() + "\n");
            case ESTIMATE -> {
                return estimate(Arrays.asList(arguments).subList(1, arguments.length));
            }
            default ->
                throw first.startsWith("-")
                        ? Fault.of(Code.COMMAND_WRONG, "Unknown option " + first, PROGRAM + " --help")
                        : Fault.of(Code.COMMAND_UNKNOWN, first, ESTIMATE);
        }
        return ExitStatus.DONE;
    }

    private int estimate(List<String> arguments) {
        Optional<Words> words = Words.plain(arguments, EstimateOptions.names(false), EstimateOptions.names(true));
        if (words.isEmpty()) {
            EstimateParser parser = new EstimateParser();
            words = parser.parse(arguments);
            if (words.isEmpty()) {
                console.result(parser.help());
                return ExitStatus.DONE;
            }
        }
        EstimateCommand command;
        try {
            command = EstimateCommand.of(words.get());
        } catch (Fault fault) {
            // a bad value is bad input in a file and wrong use in an option
            console.tell(fault.finding());
            return ExitStatus.WRONG_USE;
        }
        return command.run(reader, console);
    }

    private int guarded(IntSupplier work) {
        try {
            return work.getAsInt();
        } catch (Fault fault) {
            console.tell(fault.finding());
            return ExitStatus.of(fault.finding().code());
        } catch (RuntimeException | Error e) {
            console.tell(Finding.of(Code.UNEXPECTED, e.toString()));
            return ExitStatus.BAD_INPUT;
        }
    }
}
