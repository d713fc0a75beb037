package soakline.command;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * A command line taken apart: files, and options with their values as texts.
 *
 * @param options name with its dashes to its values, in their order
 */
record Words(List<String> files, Map<String, List<String>> options) {

    Words {
        files = List.copyOf(files);
        options = Map.copyOf(options);
    }

    /** The value of an option that may be given once. */
    Optional<String> value(String option) {
        return Optional.ofNullable(options.get(option)).map(values -> values.get(0));
    }

    /** All values of an option. */
    List<String> values(String option) {
        return options.getOrDefault(option, List.of());
    }

    /**
     * Takes a plain command line apart without the full parser, which takes three times as long to load as an estimate takes.
     *
     * @param once options that may be given once
     * @param often options that may be given several times
     * @return empty for everything that is not plain (help, a slip, a rare spelling): that is for the full parser to judge
     */
    static Optional<Words> plain(List<String> arguments, Set<String> once, Set<String> often) {
        List<String> files = new ArrayList<>();
        Map<String, List<String>> options = new LinkedHashMap<>();
        for (int i = 0; i < arguments.size(); i++) {
            String argument = arguments.get(i);
            if (!argument.startsWith("-")) {
                files.add(argument);
                continue;
            }
            int sign = argument.indexOf('=');
            String name = sign < 0 ? argument : argument.substring(0, sign);
            boolean known = once.contains(name) ? !options.containsKey(name) : often.contains(name);
            boolean valueFollows = sign < 0
                    && i + 1 < arguments.size()
                    && !arguments.get(i + 1).startsWith("-");
            if (!known || (sign < 0 && !valueFollows)) {
                return Optional.empty();
            }
            String value = sign < 0 ? arguments.get(++i) : argument.substring(sign + 1);
            options.computeIfAbsent(name, n -> new ArrayList<>()).add(value);
        }
        return files.isEmpty() ? Optional.empty() : Optional.of(new Words(files, options));
    }
}
