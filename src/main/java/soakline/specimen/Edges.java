package soakline.specimen;

/** Whether the four edges of the coupon let the substance through. */
public enum Edges {
    SEALED,
    /** All four edges exposed: the product solution applies, and width and length must be known. */
    BARE
}
