package soakline.inference;

/** What a check says. In order of rising concern, {@link #UNKNOWN} aside. */
public enum Verdict {
    UNKNOWN("unknown"),
    PASS("pass"),
    CAUTION("caution"),
    FAIL("fail");

    private final String code;

    Verdict(String code) {
        this.code = code;
    }

    /** Spelling in JSON. */
    public String code() {
        return code;
    }
}
