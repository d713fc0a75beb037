package soakline.inference;

import java.util.List;
import java.util.OptionalDouble;

/**
 * The uncertainty of D with the stated uncertainties of the coupon's lengths folded in (JCGM 100).
 *
 * @param standardUncertainty of D, m²/s
 * @param low limit of D, m²/s: ln D − t(effective degrees of freedom) · u(ln D); empty when open
 * @param contributions what it is made of; the shares of the variance of ln D sum to 1
 */
public record CombinedUncertainty(
        double level,
        double standardUncertainty,
        OptionalDouble low,
        OptionalDouble high,
        double effectiveDegreesOfFreedom,
        List<Contribution> contributions) {

    /**
     * One source of uncertainty.
     *
     * @param source such as {@code fit} or {@code thickness}
     * @param sensitivity ∂ ln D / ∂ ln x; 1 for the fit itself
     * @param relativeUncertainty u(x)/x; u(ln D) for the fit itself
     * @param share of the variance of ln D
     */
    public record Contribution(String source, double sensitivity, double relativeUncertainty, double share) {}

    public CombinedUncertainty {
        contributions = List.copyOf(contributions);
    }
}
