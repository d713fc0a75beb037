package soakline.command;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import picocli.CommandLine;
import picocli.CommandLine.Help.Ansi;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.Model.PositionalParamSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;
import soakline.problem.Code;
import soakline.problem.Fault;

/** The full parser of the command {@code estimate}: for its help, for slips and for rare spellings. */
final class EstimateParser {

    private final CommandLine line;

    EstimateParser() {
        line = new CommandLine(spec());
        line.setExpandAtFiles(false);
    }

    String help() {
        return line.getUsageMessage(Ansi.OFF);
    }

    /**
     * Takes a command line apart.
     *
     * @return empty when help is asked for
     * @throws Fault saying what is wrong with it
     */
    Optional<Words> parse(List<String> arguments) {
        ParseResult result;
        try {
            result = line.parseArgs(arguments.toArray(String[]::new));
        } catch (ParameterException e) {
            throw Fault.of(Code.COMMAND_WRONG, sentence(e), Commands.PROGRAM + " estimate --help");
        }
        if (result.isUsageHelpRequested()) {
            return Optional.empty();
        }
        Map<String, List<String>> options = new LinkedHashMap<>();
        for (OptionSpec option : result.matchedOptions()) {
            options.put(option.longestName(), option.originalStringValues());
        }
        return Optional.of(new Words(result.matchedPositional(0).originalStringValues(), options));
    }

    private static CommandSpec spec() {
        CommandSpec spec = CommandSpec.create().name("soakline estimate");
        spec.usageMessage()
                .customSynopsis(Commands.PROGRAM + " estimate FILE... [OPTION]...")
                .description(EstimateOptions.DESCRIPTION + "%n")
                .sortOptions(false)
                .width(EstimateOptions.WIDTH_OF_HELP)
                .footer(EstimateOptions.FOOTER.toArray(String[]::new));
        spec.addPositional(PositionalParamSpec.builder()
                .paramLabel("FILE")
                .arity("1..*")
                .required(true)
                .type(List.class)
                .auxiliaryTypes(String.class)
                .description("run files: CSV or .xlsx, one or several coupons each")
                .build());
        for (EstimateOptions.Option option : EstimateOptions.ALL) {
            OptionSpec.Builder builder = OptionSpec.builder(option.name())
                    .paramLabel(option.label())
                    .arity("1")
                    .description(option.description().replace("%", "%%"));
            spec.addOption((option.often()
                            ? builder.type(List.class).auxiliaryTypes(String.class)
                            : builder.type(String.class))
                    .build());
        }
        spec.addOption(OptionSpec.builder("-h", "--help")
                .usageHelp(true)
                .description("shows this and ends")
                .build());
        return spec;
    }

    /** The parser's own words, as far as the first line. */
    private static String sentence(ParameterException e) {
        String first = String.valueOf(e.getMessage()).lines().findFirst().orElse("The options make no sense");
        return first.endsWith(".") ? first.substring(0, first.length() - 1) : first;
    }
}
