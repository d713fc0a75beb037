package soakline.inference;

/** Whether the coupon took up or gave off, by the sign of M∞ − M0. */
public enum Direction {
    UPTAKE("uptake"),
    DRYING("drying");

    private final String code;

    Direction(String code) {
        this.code = code;
    }

    /** Spelling in JSON. */
    public String code() {
        return code;
    }
}
