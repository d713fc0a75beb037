package soakline.estimate;

/** Which parameter says how far the content goes. The curves are the same; what differs is what is free, fixed or asked for. */
public enum LevelForm {
    /** The equilibrium content M∞. */
    EQUILIBRIUM(Parameter.EQUILIBRIUM_CONTENT),
    /**
     * The initial slope of content on √t: what a test that stopped before its plateau still knows.
     */
    INITIAL_SLOPE(Parameter.INITIAL_SLOPE);

    @SuppressWarnings("ImmutableEnumChecker") // a record of immutable values
    private final Parameter parameter;

    LevelForm(Parameter parameter) {
        this.parameter = parameter;
    }

    public Parameter parameter() {
        return parameter;
    }
}
