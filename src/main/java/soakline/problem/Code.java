package soakline.problem;

/**
 * Every thing the program can tell a user. The sentence of each stands under the same name in {@code wording}; a test holds
 * the two together.
 */
public enum Code {
    // ---- wrong use: an option or argument ----
    OPTION_BAD(Kind.USE),
    OPTION_UNKNOWN_FIX(Kind.USE),
    MISSING_THICKNESS(Kind.USE),
    MISSING_FACES(Kind.USE),
    MISSING_WIDTH_LENGTH(Kind.USE),
    OUTPUT_NOT_WRITABLE(Kind.USE),
    OUTPUT_TYPE_UNKNOWN(Kind.USE),
    OUTPUT_STREAM_FAILED(Kind.USE),
    COMMAND_UNKNOWN(Kind.USE),
    COMMAND_WRONG(Kind.USE),

    // ---- input that cannot be read or used ----
    FILE_NOT_FOUND(Kind.INPUT),
    FILE_NOT_READABLE(Kind.INPUT),
    FILE_EMPTY(Kind.INPUT),
    FILE_BINARY(Kind.INPUT),
    FILE_FAILED(Kind.INPUT),
    FILE_CHANGED(Kind.INPUT),
    LINE_TOO_LONG(Kind.INPUT),
    QUOTES_NOT_CLOSED(Kind.INPUT),
    SHEET_NOT_READABLE(Kind.INPUT),
    TOO_LARGE(Kind.INPUT),
    HEADER_MISSING(Kind.INPUT),
    TIME_COLUMN_MISSING(Kind.INPUT),
    TIME_COLUMN_TWICE(Kind.INPUT),
    VALUE_COLUMN_MISSING(Kind.INPUT),
    COLUMN_UNIT_MISSING(Kind.INPUT),
    COLUMN_UNIT_UNKNOWN(Kind.INPUT),
    FACT_NOT_A_QUANTITY(Kind.INPUT),
    FACT_UNIT_MISSING(Kind.INPUT),
    FACT_UNIT_UNKNOWN(Kind.INPUT),
    FACT_NOT_POSITIVE(Kind.INPUT),
    FACT_NOT_ONE_OF(Kind.INPUT),
    FACT_LEVEL_BAD(Kind.INPUT),
    TEXT_TOO_LONG(Kind.INPUT),
    TIME_NOT_UNDERSTOOD(Kind.INPUT),
    EXPOSED_FROM_BAD(Kind.INPUT),
    DATE_PATTERN_BAD(Kind.INPUT),
    TOO_FEW_WEIGHINGS(Kind.INPUT),
    TIMES_ALL_EQUAL(Kind.INPUT),
    VALUES_ALL_EQUAL(Kind.INPUT),
    SAMPLE_MISSING(Kind.INPUT),

    // ---- saving and recovery ----
    SAVE_FOREIGN(Kind.USE),
    SAVE_EXISTS(Kind.USE),
    SAVE_GONE(Kind.USE),
    SAVE_CHANGED(Kind.USE),
    SAVE_UNKNOWN(Kind.USE),
    RECOVERY_NOT_KEPT(Kind.WARNING),
    RECOVERY_DAMAGED(Kind.INPUT),
    RECOVERY_TAKEN(Kind.USE),

    // ---- notes on what was read ----
    CELL_NOT_A_NUMBER(Kind.NOTE),
    CELL_NOT_FINITE(Kind.NOTE),
    MASS_NOT_POSITIVE(Kind.NOTE),
    TIME_CELL_BAD(Kind.NOTE),
    ROW_TOO_LONG(Kind.NOTE),
    ROWS_SORTED(Kind.NOTE),
    TIMES_REPEATED(Kind.NOTE),
    CELLS_EMPTY(Kind.NOTE),
    MORE_NOTES(Kind.NOTE),
    EDGES_TAKEN_SEALED(Kind.NOTE),
    FACT_UNKNOWN_KEPT(Kind.NOTE),
    FACT_REPEATED(Kind.NOTE),
    CONTENT_FROM_FIRST_WEIGHING(Kind.NOTE),
    RUN_FILE_NEWER(Kind.NOTE),
    BEFORE_EXPOSURE(Kind.NOTE),
    CLOCK_CHANGE(Kind.NOTE),

    // ---- warnings: the result stands, look again ----
    THICKNESS_UNLIKELY(Kind.WARNING),
    BELOW_DRY_MASS(Kind.WARNING),
    CONTENT_UNLIKELY(Kind.WARNING),
    DIFFUSIVITY_UNLIKELY(Kind.WARNING),
    THICKNESS_UNCERTAINTY_UNKNOWN(Kind.NOTE),

    // ---- the estimate ----
    NOT_CONVERGED(Kind.RESULT),
    SINGULAR(Kind.RESULT),
    NOT_DETERMINED_OPEN(Kind.RESULT),
    NOT_DETERMINED_FAST(Kind.RESULT),
    NOT_DETERMINED_WIDE(Kind.RESULT),
    NOT_FICKIAN(Kind.WARNING),
    PARAMETER_ALL_FIXED(Kind.USE),
    REPLICATES_UNLIKE(Kind.NOTE),

    // ---- checks, one sentence a verdict ----
    CHECK_UNKNOWN(Kind.NOTE),
    CHECK_RESIDUALS_ZERO(Kind.NOTE),
    SHORT_TIME_PASS(Kind.NOTE),
    SHORT_TIME_DIFFERS(Kind.NOTE),
    SHORT_TIME_SLOPE_PASS(Kind.NOTE),
    SHORT_TIME_SLOPE_DIFFERS(Kind.NOTE),
    HALF_TIME_PASS(Kind.NOTE),
    HALF_TIME_DIFFERS(Kind.NOTE),
    LATE_TIME_PASS(Kind.NOTE),
    LATE_TIME_DIFFERS(Kind.NOTE),
    MEAN_TIME_PASS(Kind.NOTE),
    MEAN_TIME_DIFFERS(Kind.NOTE),
    EXPONENT_PASS(Kind.NOTE),
    EXPONENT_DIFFERS(Kind.NOTE),
    PLATEAU_PASS(Kind.NOTE),
    PLATEAU_SHORT(Kind.NOTE),
    PLATEAU_NOT_REACHED(Kind.NOTE),
    RUNS_PASS(Kind.NOTE),
    RUNS_FEW(Kind.NOTE),
    AUTOCORRELATION_PASS(Kind.NOTE),
    AUTOCORRELATION_POSITIVE(Kind.NOTE),
    NORMALITY_PASS(Kind.NOTE),
    NORMALITY_DIFFERS(Kind.NOTE),
    LARGEST_PASS(Kind.NOTE),
    LARGEST_STANDS_OUT(Kind.NOTE),
    FICKIAN_PASS(Kind.NOTE),
    FICKIAN_CAUTION(Kind.NOTE),
    FICKIAN_FAIL(Kind.NOTE),
    FICKIAN_UNKNOWN(Kind.NOTE),

    // ---- cautions: safety and use ----
    CAUTION_APPARENT(Kind.CAUTION),
    CAUTION_OVEN(Kind.CAUTION),
    CAUTION_DRYING_CHANGES(Kind.CAUTION),
    CAUTION_TRAPPED_MOISTURE(Kind.CAUTION),
    CAUTION_HYDROGEN(Kind.CAUTION),

    // ---- the figure and the window ----
    FIGURE_REDUCED(Kind.NOTE),
    FIGURE_OUTSIDE(Kind.NOTE),
    FIGURE_STOPPED_EARLY(Kind.RESULT),
    FIGURE_NOT_DETERMINED(Kind.RESULT),
    WELCOME_OPEN(Kind.NOTE),
    WELCOME_SAMPLES(Kind.NOTE),
    ASK_FACTS(Kind.NOTE),
    ASK_THICKNESS(Kind.NOTE),
    ASK_FACES(Kind.NOTE),
    ASK_SIZE(Kind.NOTE),
    WAIT_READING(Kind.NOTE),
    WAIT_ESTIMATING(Kind.NOTE),
    WAIT_CANCELLED(Kind.NOTE),
    DROP_ONE_FILE(Kind.USE),
    FACT_EMPTY(Kind.USE),
    FACES_NOT_CHOSEN(Kind.USE),

    // ---- the program itself ----
    NO_DISPLAY(Kind.NOTE),
    UNEXPECTED(Kind.INPUT);

    /** What a code means for the work and for the exit status. */
    public enum Kind {
        /** Wrong use of the command: exit status 2. */
        USE,
        /** Unreadable or unusable input: exit status 3. */
        INPUT,
        /** A result that is marked as not usable: exit status 1. */
        RESULT,
        WARNING,
        NOTE,
        CAUTION
    }

    private final Kind kind;

    Code(Kind kind) {
        this.kind = kind;
    }

    public Kind kind() {
        return kind;
    }
}
