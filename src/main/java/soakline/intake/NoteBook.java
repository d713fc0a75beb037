package soakline.intake;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import soakline.problem.Code;
import soakline.problem.Finding;
import soakline.problem.Place;

/** Collects what there is to say about one coupon, the first few of each kind in full and the rest as a count. */
final class NoteBook {

    static final int MOST_OF_A_KIND = 20;

    private final Place source;
    private final Map<Code, List<Finding>> kept = new EnumMap<>(Code.class);
    private final Map<Code, Integer> left = new EnumMap<>(Code.class);

    NoteBook(Place source) {
        this.source = source;
    }

    /** A note at a cell; line or column is 0 when it is about none. */
    void add(Code code, int line, int column, Object... values) {
        List<Finding> same = kept.computeIfAbsent(code, c -> new ArrayList<>());
        if (same.size() < MOST_OF_A_KIND) {
            same.add(Finding.of(code, values).at(source.line(line).column(column)));
        } else {
            left.merge(code, 1, Integer::sum);
        }
    }

    void addAll(NoteBook other) {
        other.kept.forEach((code, findings) ->
                kept.computeIfAbsent(code, c -> new ArrayList<>()).addAll(findings));
        other.left.forEach((code, count) -> left.merge(code, count, Integer::sum));
    }

    boolean holdsAnyOf(Set<Code> codes) {
        return kept.keySet().stream().anyMatch(codes::contains);
    }

    /** All notes, those of a kind together. */
    List<Finding> notes() {
        List<Finding> notes = new ArrayList<>();
        kept.forEach((code, findings) -> {
            notes.addAll(findings);
            if (left.containsKey(code)) {
                notes.add(Finding.of(Code.MORE_NOTES, left.get(code)).at(source));
            }
        });
        return notes;
    }
}
