package soakline.inference;

/** The checks that stand beside every estimate, in the order in which they are shown. */
public enum CheckName {
    SHORT_TIME_SLOPE("short-time-slope", "short-time slope"),
    HALF_TIME("half-time", "half-time"),
    LATE_TIME_SLOPE("late-time-slope", "late-time slope"),
    MEAN_TIME("mean-time", "mean time"),
    TIME_EXPONENT("time-exponent", "time exponent"),
    PLATEAU("plateau", "plateau"),
    RESIDUAL_RUNS("residual-runs", "residual runs"),
    RESIDUAL_AUTOCORRELATION("residual-autocorrelation", "residual autocorrelation"),
    RESIDUAL_NORMALITY("residual-normality", "residual normality"),
    LARGEST_RESIDUAL("largest-residual", "largest residual");

    private final String code;
    private final String words;

    CheckName(String code, String words) {
        this.code = code;
        this.words = words;
    }

    /** Spelling in JSON. */
    public String code() {
        return code;
    }

    /** The name for people. */
    public String words() {
        return words;
    }
}
