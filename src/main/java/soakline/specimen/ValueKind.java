package soakline.specimen;

/** What the value column of a run holds. */
public enum ValueKind {
    MASS,
    CONTENT
}
