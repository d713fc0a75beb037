package soakline.problem;

import java.util.List;

/**
 * Something to tell the user: what (a code), where, and with which numbers. {@code wording} turns it into a sentence.
 *
 * @param values texts, whole numbers, doubles and quantities, in the order in which the sentence names them
 */
public record Finding(Code code, Place place, List<Object> values) {

    public Finding {
        values = List.copyOf(values);
    }

    public static Finding of(Code code, Object... values) {
        return new Finding(code, Place.NONE, List.of(values));
    }

    public Finding at(Place where) {
        return new Finding(code, where, values);
    }
}
