package soakline.session;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.Test;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.quantity.Quantity;
import soakline.quantity.Unit;
import soakline.report.InventedAssessments;
import soakline.session.EstimateCoupons.Outcome;
import soakline.specimen.Facts;
import soakline.specimen.Run;

class EstimateCouponsTest {

    /** A file holds as many coupons as its name has letters; one called "bad" cannot be read. */
    private static final RunReader READER = (file, request, progress) -> {
        progress.accept(0.5);
        String name = file.toString();
        if (name.equals("bad")) {
            throw Fault.of(Code.FILE_NOT_FOUND);
        }
        List<Run> runs = new ArrayList<>();
        for (int i = 0; i < name.length(); i++) {
            runs.add(InventedAssessments.run(name + i, 400, 20));
        }
        return runs;
    };

    private static EstimateRequest request(String... files) {
        return EstimateRequest.of(List.of(files).stream().map(Path::of).toList());
    }

    @Test
    void estimatesAllCouponsOfAllFilesInOrder() {
        Outcome outcome = new EstimateCoupons(READER).run(request("ab", "c"), EstimateCoupons.UNWATCHED);

        assertThat(outcome.failures()).isEmpty();
        assertThat(outcome.assessments().stream().map(a -> a.run().name())).containsExactly("ab0", "ab1", "c0");
    }

    @Test
    void aFileThatFailsIsNamedAndTheOthersAreLookedAt() {
        Outcome outcome = new EstimateCoupons(READER).run(request("bad", "c"), EstimateCoupons.UNWATCHED);

        assertThat(outcome.assessments()).hasSize(1);
        assertThat(outcome.failures()).hasSize(1);
        assertThat(outcome.failures().get(0).place().source()).isEqualTo("bad");
    }

    @Test
    void whatIsSaidHoldsInPlaceOfTheFile() {
        Facts twice = Facts.of("").withThickness(Quantity.of(4, Unit.MILLIMETRE));
        EstimateCoupons estimate = new EstimateCoupons(READER);

        double d = estimate.run(request("a"), EstimateCoupons.UNWATCHED)
                .assessments()
                .get(0)
                .estimate()
                .diffusivity();
        double overridden = estimate.run(request("a").withOverrides(twice), EstimateCoupons.UNWATCHED)
                .assessments()
                .get(0)
                .estimate()
                .diffusivity();

        assertThat(overridden / d).isBetween(3.9999, 4.0001);
    }

    @Test
    void progressRisesToOne() {
        List<Double> shares = new ArrayList<>();

        new EstimateCoupons(READER).run(request("ab", "bad", "c"), shares::add);

        assertThat(shares).isSorted().endsWith(1.0).allMatch(s -> s >= 0 && s <= 1);
    }

    @Test
    void canBeStopped() {
        assertThatThrownBy(() -> new EstimateCoupons(READER).run(request("a"), share -> {
                    throw new CancellationException();
                }))
                .isInstanceOf(CancellationException.class);
    }
}
