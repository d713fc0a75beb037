package soakline.report;

import java.util.List;
import soakline.problem.Code;
import soakline.problem.Finding;

/** What there is to say about several coupons together. */
final class ReplicateWords {

    private ReplicateWords() {}

    static Finding unlike(List<String> differences) {
        return Finding.of(Code.REPLICATES_UNLIKE, String.join(" and ", differences));
    }
}
