package soakline.workspace;

import soakline.inference.AssessmentOptions;
import soakline.specimen.Facts;
import soakline.specimen.Run;
import soakline.specimen.Weighings;

/** One coupon as the user has it: its run with all edits, and what was chosen for its estimate. Immutable. */
public record Coupon(Run run, AssessmentOptions options) {

    /** A run as it was read. */
    public static Coupon of(Run run) {
        return new Coupon(run, AssessmentOptions.usual());
    }

    public Coupon withFacts(Facts value) {
        return new Coupon(run.withFacts(value), options);
    }

    public Coupon withWeighings(Weighings value) {
        return new Coupon(run.withWeighings(value), options);
    }

    public Coupon withOptions(AssessmentOptions value) {
        return new Coupon(run, value);
    }
}
