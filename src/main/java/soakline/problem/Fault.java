package soakline.problem;

/** Work that cannot go on because of what the user gave. Carries the finding; never a stack trace for the user. */
public final class Fault extends RuntimeException {

    private final transient Finding finding;

    public Fault(Finding finding) {
        super(finding.toString(), null, false, false);
        this.finding = finding;
    }

    public static Fault of(Code code, Object... values) {
        return new Fault(Finding.of(code, values));
    }

    public Finding finding() {
        return finding;
    }

    /** The same fault, at a place. */
    public Fault at(Place place) {
        return new Fault(finding.at(place));
    }
}
