package soakline.campaign;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import soakline.report.InventedAssessments;

class ReplicatesTest {

    @Test
    void meanAndSampleStandardDeviationOfTheUsableCoupons() {
        Replicates replicates = Replicates.of(List.of(
                InventedAssessments.usable("A", 1e-12),
                InventedAssessments.stoppedEarly(),
                InventedAssessments.usable("B", 2e-12),
                InventedAssessments.usable("C", 6e-12)));

        assertThat(replicates.coupons()).isEqualTo(4);
        Replicates.Spread d = replicates.spreads().get(0);
        assertThat(d.parameter().name()).isEqualTo("diffusivity");
        assertThat(d.number()).isEqualTo(3);
        assertThat(d.mean()).isCloseTo(3e-12, within(1e-26));
        // deviations −2, −1, 3: √(14/2)
        assertThat(d.standardDeviation().orElseThrow()).isCloseTo(Math.sqrt(7) * 1e-12, within(1e-26));
        assertThat(replicates.differences()).isEmpty();
        assertThat(replicates.apparent()).isFalse();
    }

    @Test
    void equalValuesHaveNoSpreadAndAFixedParameterIsNotAveraged() {
        Replicates replicates = Replicates.of(List.of(InventedAssessments.usable(), InventedAssessments.usable()));

        assertThat(replicates.spreads()).hasSize(2);
        assertThat(replicates.spreads().get(0).standardDeviation()).hasValue(0);
        assertThat(replicates.spreads()).noneMatch(s -> s.parameter().name().equals("startContent"));
    }

    @Test
    void oneUsableCouponHasNoSpread() {
        Replicates replicates =
                Replicates.of(List.of(InventedAssessments.usable(), InventedAssessments.stoppedEarly()));

        assertThat(replicates.spreads().get(0).standardDeviation()).isEmpty();
    }

    @Test
    void anApparentDiffusivityMakesTheMeanApparent() {
        assertThat(Replicates.of(List.of(InventedAssessments.usable(), InventedAssessments.apparent()))
                        .apparent())
                .isTrue();
    }
}
