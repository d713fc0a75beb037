package soakline.report;

import java.util.List;
import soakline.inference.Assessment;

/** The forms in which results are written as text. */
public enum ResultFormat {
    /** For people. */
    TEXT("text"),
    JSON("json"),
    CSV("csv");

    private final String code;

    ResultFormat(String code) {
        this.code = code;
    }

    /** Spelling on the command line. */
    public String code() {
        return code;
    }

    /** All of the coupons, with a line break at the end. */
    public String write(List<Assessment> assessments) {
        return switch (this) {
            case TEXT -> TextReport.write(assessments);
            case JSON -> JsonReport.write(assessments);
            case CSV -> CsvReport.write(assessments);
        };
    }
}
