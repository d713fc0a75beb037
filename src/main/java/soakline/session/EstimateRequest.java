package soakline.session;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import soakline.inference.AssessmentOptions;
import soakline.specimen.Facts;

/**
 * What to estimate, and what is said beside the files.
 *
 * @param overrides facts that hold in place of those of the files
 * @param columns a header in place of the files' own
 * @param datePattern how the files write date-times
 */
public record EstimateRequest(
        List<Path> files,
        Facts overrides,
        Optional<String> columns,
        Optional<String> datePattern,
        AssessmentOptions options) {

    public EstimateRequest {
        files = List.copyOf(files);
    }

    /** Files as they stand. */
    public static EstimateRequest of(List<Path> files) {
        return new EstimateRequest(files, Facts.of(""), Optional.empty(), Optional.empty(), AssessmentOptions.usual());
    }

    public EstimateRequest withOverrides(Facts value) {
        return new EstimateRequest(files, value, columns, datePattern, options);
    }

    public EstimateRequest withColumns(String value) {
        return new EstimateRequest(files, overrides, Optional.of(value), datePattern, options);
    }

    public EstimateRequest withDatePattern(String value) {
        return new EstimateRequest(files, overrides, columns, Optional.of(value), options);
    }

    public EstimateRequest withOptions(AssessmentOptions value) {
        return new EstimateRequest(files, overrides, columns, datePattern, value);
    }
}
