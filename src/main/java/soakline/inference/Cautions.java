package soakline.inference;

import java.util.ArrayList;
import java.util.List;
import soakline.problem.Code;
import soakline.problem.Finding;

/** The sentences on safety and use that go with a result. */
final class Cautions {

    private Cautions() {}

    static List<Finding> of(Direction direction) {
        List<Finding> cautions = new ArrayList<>();
        cautions.add(Finding.of(Code.CAUTION_APPARENT));
        if (direction == Direction.DRYING) {
            cautions.add(Finding.of(Code.CAUTION_OVEN));
            cautions.add(Finding.of(Code.CAUTION_DRYING_CHANGES));
            cautions.add(Finding.of(Code.CAUTION_TRAPPED_MOISTURE));
            cautions.add(Finding.of(Code.CAUTION_HYDROGEN));
        }
        return cautions;
    }
}
