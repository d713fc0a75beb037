package soakline.inference;

import java.util.ArrayList;
import java.util.List;
import soakline.estimate.Estimate;
import soakline.estimate.EstimationTask;
import soakline.problem.Code;
import soakline.problem.Finding;
import soakline.quantity.Quantity;
import soakline.specimen.ContentSeries;
import soakline.specimen.Run;

/** Looks for the common slips: wrong units, a wrong dry mass, facts that nobody stated. */
final class Plausibility {

    /** Diffusivities met in solids, m²/s, with a margin on either side (common practice, no source). */
    private static final double SLOWEST = 1e-17;

    private static final double FASTEST = 1e-6;

    /** Thicknesses of coupons, m: from a film to a block; outside it a unit is usually wrong (common practice, no source). */
    private static final double THINNEST = 3e-6;

    private static final double THICKEST = 0.05;

    /** A content beyond this is more solvent than solid; some gels do so, a slip of units far more often. */
    private static final double HIGHEST_CONTENT = 2;

    private Plausibility() {}

    static List<Finding> ofInput(Run run, ContentSeries data, Estimate estimate) {
        List<Finding> findings = new ArrayList<>();
        Quantity thickness = run.facts().thickness().orElseThrow();
        if (thickness.si() < THINNEST || thickness.si() > THICKEST) {
            findings.add(Finding.of(Code.THICKNESS_UNLIKELY, thickness.toString()));
        }
        if (data.reference() == ContentSeries.Reference.FIRST_WEIGHING) {
            findings.add(Finding.of(Code.CONTENT_FROM_FIRST_WEIGHING));
        }
        if (data.reference() == ContentSeries.Reference.DRY_MASS) {
            belowDryMass(run, data, estimate, findings);
        }
        return findings;
    }

    /** Weighings below the dry mass by more than the scatter. */
    private static void belowDryMass(Run run, ContentSeries data, Estimate estimate, List<Finding> findings) {
        double scatter = estimate.isOptimum() ? 4 * estimate.residualStandardDeviation() : 0;
        int below = 0;
        double first = Double.NaN;
        for (int i = 0; i < data.size(); i++) {
            if (data.content(i) < -scatter) {
                first = below == 0 ? data.time(i) : first;
                below++;
            }
        }
        if (below > 0) {
            findings.add(Finding.of(
                    Code.BELOW_DRY_MASS,
                    below,
                    run.facts().dryMass().orElseThrow().toString(),
                    first / 3600));
        }
    }

    static List<Finding> ofResult(Estimate estimate) {
        List<Finding> findings = new ArrayList<>();
        double d = estimate.diffusivity();
        if (d < SLOWEST || d > FASTEST) {
            findings.add(Finding.of(Code.DIFFUSIVITY_UNLIKELY, d));
        }
        EstimationTask task = estimate.task();
        double level = estimate.working(task.levelIndex());
        if (Math.abs(level) > HIGHEST_CONTENT) {
            findings.add(Finding.of(Code.CONTENT_UNLIKELY, level * 100));
        }
        return findings;
    }

    /** What the reader of the file noted, and what was taken for granted. */
    static List<Finding> notes(Run run) {
        List<Finding> notes = new ArrayList<>(run.notes());
        if (run.facts().edges().isEmpty()) {
            notes.add(Finding.of(Code.EDGES_TAKEN_SEALED));
        }
        if (run.facts().thickness().isPresent()
                && run.facts().thickness().get().standardUncertainty().isEmpty()) {
            notes.add(Finding.of(Code.THICKNESS_UNCERTAINTY_UNKNOWN));
        }
        return notes;
    }
}
