package soakline.campaign;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import soakline.estimate.Parameter;
import soakline.inference.Assessment;
import soakline.inference.ParameterResult;

/**
 * What several coupons say together: mean, standard deviation and number of each parameter, over the coupons whose result is
 * usable and where the parameter was estimated.
 *
 * @param coupons how many there are, usable or not
 * @param apparent whether a diffusivity among those averaged is an apparent one only
 * @param differences in what the averaged coupons differ although replicates would not
 */
public record Replicates(int coupons, boolean apparent, List<Spread> spreads, List<String> differences) {

    /**
     * A parameter over the coupons, in SI.
     *
     * @param mean the arithmetic mean
     * @param standardDeviation of the sample (n − 1); empty for a single coupon
     */
    public record Spread(Parameter parameter, int number, double mean, OptionalDouble standardDeviation) {}

    public Replicates {
        spreads = List.copyOf(spreads);
        differences = List.copyOf(differences);
    }

    public static Replicates of(List<Assessment> assessments) {
        List<Assessment> usable =
                assessments.stream().filter(Assessment::usable).toList();
        Map<Parameter, List<Double>> values = new LinkedHashMap<>();
        for (Assessment assessment : usable) {
            for (ParameterResult result : assessment.parameters()) {
                if (!result.fixed() && result.value().isPresent()) {
                    values.computeIfAbsent(result.parameter(), p -> new ArrayList<>())
                            .add(result.value().getAsDouble());
                }
            }
        }
        List<Spread> spreads = new ArrayList<>();
        values.forEach((parameter, list) -> spreads.add(spread(parameter, list)));
        return new Replicates(
                assessments.size(), usable.stream().anyMatch(Assessment::isApparent), spreads, differences(usable));
    }

    private static Spread spread(Parameter parameter, List<Double> values) {
        int n = values.size();
        // relative to the first, so that equal values have a spread of exactly zero
        double first = values.get(0);
        double sum = 0;
        for (double v : values) {
            sum += v - first;
        }
        double mean = first + sum / n;
        double squares = 0;
        for (double v : values) {
            squares += (v - mean) * (v - mean);
        }
        return new Spread(
                parameter, n, mean, n > 1 ? OptionalDouble.of(Math.sqrt(squares / (n - 1))) : OptionalDouble.empty());
    }

    private static List<String> differences(List<Assessment> assessments) {
        List<String> differences = new ArrayList<>();
        addIfDifferent(differences, "direction", assessments, a -> Optional.of(a.direction()));
        addIfDifferent(
                differences,
                "temperature",
                assessments,
                a -> a.run().facts().temperature().map(t -> Math.round(t.si() * 10)));
        addIfDifferent(differences, "medium", assessments, a -> a.run().facts().medium());
        return differences;
    }

    /** What a coupon does not state counts as no difference. */
    private static void addIfDifferent(
            List<String> differences,
            String what,
            List<Assessment> assessments,
            Function<Assessment, Optional<?>> value) {
        long kinds = assessments.stream()
                .map(value)
                .flatMap(Optional::stream)
                .distinct()
                .count();
        if (kinds > 1) {
            differences.add(what);
        }
    }
}
