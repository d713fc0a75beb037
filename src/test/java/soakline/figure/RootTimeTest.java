package soakline.figure;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import soakline.quantity.Unit;

class RootTimeTest {

    @Test
    void theUnitSuitsTheSpan() {
        assertThat(RootTime.forSpan(90).unit()).isEqualTo(Unit.SECOND);
        assertThat(RootTime.forSpan(3600).unit()).isEqualTo(Unit.MINUTE);
        assertThat(RootTime.forSpan(5 * 86_400.0).unit()).isEqualTo(Unit.HOUR);
        assertThat(RootTime.forSpan(90 * 86_400.0).label()).isEqualTo("√t [√d]");
    }

    @Test
    void placesAndTimesAgree() {
        RootTime hours = new RootTime(Unit.HOUR);
        assertThat(hours.of(4 * 3600)).isEqualTo(2);
        assertThat(hours.seconds(2)).isEqualTo(4 * 3600);
        assertThat(hours.of(-60)).isZero();
    }

    @Test
    void ticksAreRoundTimesThatDoNotTouch() {
        List<Double> times = TimeTicksAxis.times(-0.3, 22, 0.05);

        assertThat(times).contains(0.0, 100.0, 400.0).isSorted();
        for (int i = 1; i < times.size(); i++) {
            assertThat(Math.sqrt(times.get(i)) - Math.sqrt(times.get(i - 1))).isGreaterThanOrEqualTo(0.05 * 22.3);
        }
    }
}
