package soakline.inference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import soakline.Samples;
import soakline.quantity.ResultUnit;

/** Sample runs against SciPy 1.10.1: {@code outside/sample-estimates.py} says how the numbers were made. */
class OutsideEstimatesTest {

    static List<String> rows() throws IOException {
        return Files.readAllLines(Path.of("src/test/resources/outside/sample-estimates.csv"), StandardCharsets.UTF_8)
                .stream()
                .filter(l -> !l.startsWith("#"))
                .skip(1)
                .toList();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void valuesAndErrorsToSixDigitsAndLimitsToFour(String line) {
        List<String> row = List.of(line.split(",", -1));
        AssessmentOptions options = AssessmentOptions.usual();
        if (!row.get(1).isEmpty()) {
            options = options.withFixed(Map.of("startContent", Double.parseDouble(row.get(1)) / 100));
        }
        ParameterResult found = Assessor.assess(Samples.run(row.get(0)), options)
                .parameter(row.get(2))
                .orElseThrow();
        ResultUnit unit = found.parameter().unit();
        double value = Double.parseDouble(row.get(3));
        double error = Double.parseDouble(row.get(4));
        double low = Double.parseDouble(row.get(5));
        double high = Double.parseDouble(row.get(6));

        // a start content near zero has as many digits as its error leaves it
        double size = Math.max(Math.abs(value), error);
        assertThat(unit.fromSi(found.value().getAsDouble())).isCloseTo(value, within(1e-6 * size));
        assertThat(unit.fromSi(found.standardError().getAsDouble())).isCloseTo(error, within(1e-6 * error));
        Interval interval = found.interval().orElseThrow();
        assertThat(unit.fromSi(interval.low().getAsDouble()))
                .isCloseTo(low, within(1e-4 * Math.max(Math.abs(low), error)));
        assertThat(unit.fromSi(interval.high().getAsDouble()))
                .isCloseTo(high, within(1e-4 * Math.max(Math.abs(high), error)));
    }
}
