package soakline.inference;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;
import soakline.estimate.Estimate;
import soakline.estimate.EstimationTask;
import soakline.estimate.Estimator;
import soakline.inference.CombinedUncertainty.Contribution;
import soakline.quantity.Quantity;
import soakline.specimen.Edges;
import soakline.specimen.Sheet;

/**
 * Folds the stated uncertainties of the coupon's lengths into that of D: u²(ln D) = u²(fit) + Σ S_i² (u_i/x_i)², S_i = ∂ ln D̂ / ∂
 * ln x_i by refit; limits by the effective degrees of freedom of Welch and Satterthwaite (JCGM 100:2008, 5.1.2 and G.4).
 */
final class UncertaintyBudget {

    /** Relative step of a length for its sensitivity: error of the central difference under 1e-6. */
    private static final double STEP = 1e-3;

    private UncertaintyBudget() {}

    static CombinedUncertainty of(Estimate estimate, Sheet sheet, double level) {
        double fit = estimate.workingStandardError(0);
        List<Source> sources = new ArrayList<>();
        sources.add(new Source("fit", 1, fit));
        addLength(sources, "thickness", estimate, sheet.thickness(), sheet::withThickness);
        if (sheet.edges() == Edges.BARE) {
            addLength(sources, "width", estimate, sheet.width().orElseThrow(), sheet::withWidth);
            addLength(sources, "length", estimate, sheet.length().orElseThrow(), sheet::withLength);
        }
        double variance = 0;
        for (Source s : sources) {
            variance += s.contribution() * s.contribution();
        }
        List<Contribution> contributions = new ArrayList<>();
        for (Source s : sources) {
            contributions.add(new Contribution(
                    s.name,
                    s.sensitivity,
                    s.relative,
                    variance > 0 ? s.contribution() * s.contribution() / variance : 0));
        }
        double u = Math.sqrt(variance);
        // the lengths' uncertainties count as known: only the fit's own has a finite number of degrees of freedom
        double effective = estimate.degreesOfFreedom() * Math.pow(u / fit, 4);
        double reach = Quantiles.twoSidedT(level, Math.min(effective, 1e9)) * u;
        double d = estimate.diffusivity();
        return new CombinedUncertainty(
                level,
                d * u,
                OptionalDouble.of(d * Math.exp(-reach)),
                OptionalDouble.of(d * Math.exp(reach)),
                effective,
                contributions);
    }

    /** ∂ ln D̂ / ∂ ln x of one length, by refits a little to either side. */
    static double sensitivity(Estimate estimate, Quantity length, Function<Quantity, Sheet> sheetWith) {
        return (lnDiffusivity(estimate, length, sheetWith, 1 + STEP)
                        - lnDiffusivity(estimate, length, sheetWith, 1 - STEP))
                / (Math.log1p(STEP) - Math.log1p(-STEP));
    }

    private static double lnDiffusivity(
            Estimate estimate, Quantity length, Function<Quantity, Sheet> sheetWith, double factor) {
        Sheet changed = sheetWith.apply(length.withSi(length.si() * factor));
        EstimationTask task = estimate.task().withModel(Coupons.model(changed));
        return Estimator.refit(task, estimate.working()).working(0);
    }

    private static void addLength(
            List<Source> sources,
            String name,
            Estimate estimate,
            Quantity length,
            Function<Quantity, Sheet> sheetWith) {
        if (length.standardUncertainty().isPresent()) {
            sources.add(new Source(name, sensitivity(estimate, length, sheetWith), length.relativeUncertainty()));
        }
    }

    private record Source(String name, double sensitivity, double relative) {
        double contribution() {
            return sensitivity * relative;
        }
    }
}
