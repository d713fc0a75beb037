package soakline.quantity;

/** The units in which results are shown and written, each with its factor from SI. */
public enum ResultUnit {
    SQUARE_METRE_PER_SECOND("m2/s", "m²/s", 1),
    PERCENT("%", "%", 100),
    /** Of content on the root of time. */
    PERCENT_PER_ROOT_SECOND("%/s^0.5", "%/√s", 100),
    PER_SECOND("1/s", "1/s", 1),
    NONE("1", "", 1);

    private final String code;
    private final String symbol;
    private final double perSi;

    ResultUnit(String code, String symbol, double perSi) {
        this.code = code;
        this.symbol = symbol;
        this.perSi = perSi;
    }

    /** Spelling in JSON and CSV. */
    public String code() {
        return code;
    }

    /** Spelling for people. */
    public String symbol() {
        return symbol;
    }

    /** An SI value in this unit. */
    public double fromSi(double si) {
        return si * perSi;
    }

    /** A value in this unit, in SI. */
    public double toSi(double value) {
        return value / perSi;
    }
}
