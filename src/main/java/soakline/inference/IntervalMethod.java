package soakline.inference;

/** How an interval was made. */
public enum IntervalMethod {
    /** All values whose best fit is not worse than an F quantile allows. */
    PROFILE("profile"),
    /** Estimate ± t · standard error, on the log scale for D. */
    LINEARISED("linearised");

    private final String code;

    IntervalMethod(String code) {
        this.code = code;
    }

    /** Spelling on the command line and in JSON. */
    public String code() {
        return code;
    }
}
