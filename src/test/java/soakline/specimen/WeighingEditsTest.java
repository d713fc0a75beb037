package soakline.specimen;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class WeighingEditsTest {

    private final Weighings three = new Weighings.Builder()
            .add(0, 10, 5)
            .addSetAside(60, 11, 6, "drop on the pan")
            .add(120, 12, 7)
            .build();

    private static List<String> rows(Weighings weighings) {
        List<String> rows = new ArrayList<>();
        for (int i = 0; i < weighings.size(); i++) {
            rows.add(weighings.time(i) + " " + weighings.value(i) + " " + weighings.line(i)
                    + weighings.reason(i).map(r -> " " + r).orElse(""));
        }
        return rows;
    }

    @Test
    void aCorrectedWeighingMovesToItsPlaceWithItsReason() {
        assertThat(rows(three.correcting(1, 180, 11.5)))
                .containsExactly("0.0 10.0 5", "120.0 12.0 7", "180.0 11.5 6 drop on the pan");
        assertThat(rows(three.correcting(2, 0, 9)))
                .containsExactly("0.0 10.0 5", "0.0 9.0 7", "60.0 11.0 6 drop on the pan");
        assertThat(three.correcting(0, 0, 10)).isSameAs(three);
    }

    @Test
    void anAddedWeighingStandsBehindThoseOfItsTime() {
        assertThat(rows(three.adding(60, 13)))
                .containsExactly("0.0 10.0 5", "60.0 11.0 6 drop on the pan", "60.0 13.0 0", "120.0 12.0 7");
    }

    @Test
    void aRemovedWeighingTakesItsReasonAlong() {
        assertThat(rows(three.removing(0))).containsExactly("60.0 11.0 6 drop on the pan", "120.0 12.0 7");
        assertThat(rows(three.removing(1))).containsExactly("0.0 10.0 5", "120.0 12.0 7");
    }
}
