package soakline.quantity;

/** What a unit measures. */
public enum Dimension {
    TIME,
    LENGTH,
    MASS,
    /** Amount of the diffusing substance per dry mass; a fraction inside the program, shown in percent. */
    CONTENT,
    TEMPERATURE,
    DIFFUSIVITY
}
