package soakline.command;

import soakline.problem.Code;

/** The exit statuses of the program. */
final class ExitStatus {

    static final int DONE = 0;
    /** Done, but a result is not usable. */
    static final int NOT_USABLE = 1;

    static final int WRONG_USE = 2;
    static final int BAD_INPUT = 3;

    private ExitStatus() {}

    static int of(Code code) {
        if (code == Code.DATE_PATTERN_BAD) {
            // found while reading, but a slip in an option
            return WRONG_USE;
        }
        return switch (code.kind()) {
            case USE -> WRONG_USE;
            case RESULT -> NOT_USABLE;
            case INPUT, WARNING, NOTE, CAUTION -> BAD_INPUT;
        };
    }
}
