package soakline.inference;

/**
 * The straight line of content against √t through the early weighings.
 *
 * @param slope fraction per √s
 * @param intercept fraction
 * @param lastRootTime √s of the last weighing that took part
 */
public record ShortTimeLine(double slope, double intercept, double lastRootTime) {}
