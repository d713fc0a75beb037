package soakline.quantity;

/** A text is not a quantity of the wanted dimension. The reader of the file or option turns it into a fault with a place. */
public final class QuantityFormatException extends Exception {

    /** What is wrong with the text. */
    public enum Reason {
        EMPTY,
        NOT_A_NUMBER,
        NOT_FINITE,
        UNIT_MISSING,
        UNIT_UNKNOWN,
        UNCERTAINTY_BAD
    }

    private final Reason reason;
    private final String part;

    public QuantityFormatException(Reason reason, String part) {
        super(reason + ": " + part);
        this.reason = reason;
        this.part = part;
    }

    public Reason reason() {
        return reason;
    }

    /** The piece of the text that could not be read. */
    public String part() {
        return part;
    }
}
