package soakline.figure;

/** Stand-in. */
public final class ChartStyle {

    private ChartStyle() {}

    public static ChartStyle light() {
        return new ChartStyle();
    }
}
