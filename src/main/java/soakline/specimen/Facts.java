package soakline.specimen;

import java.util.List;
import java.util.Optional;
import soakline.quantity.Quantity;

/**
 * What is known about a coupon beside its weighings. Nothing here is ever assumed: what the file or the user did not say is
 * empty.
 *
 * @param specimen name; empty text when there is none
 * @param temperature of the test, K
 * @param dryMass kg
 * @param balance standard uncertainty of one weighing, in kg (or as a fraction where contents were weighed out elsewhere)
 * @param other facts that take no part in an estimate, kept in their order: those this program does not know, and the calendar
 *     time of time zero ({@link RunFileWords#TIME_ZERO})
 */
public record Facts(
        String specimen,
        Optional<Quantity> thickness,
        Optional<Quantity> width,
        Optional<Quantity> length,
        Optional<Faces> faces,
        Optional<Edges> edges,
        Optional<Quantity> temperature,
        Optional<String> medium,
        Optional<Quantity> dryMass,
        Optional<Quantity> balance,
        Optional<String> note,
        List<Other> other) {

    /** A fact that takes no part in an estimate. */
    public record Other(String name, String value) {}

    public Facts {
        other = List.copyOf(other);
    }

    /** Facts of which only the specimen's name is known. */
    public static Facts of(String specimen) {
        return new Facts(
                specimen,
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                List.of());
    }

    /** These facts, with each of the other's stated facts in place of its own (options override a file). */
    public Facts overriddenBy(Facts by) {
        return new Facts(
                by.specimen.isEmpty() ? specimen : by.specimen,
                by.thickness.or(() -> thickness),
                by.width.or(() -> width),
                by.length.or(() -> length),
                by.faces.or(() -> faces),
                by.edges.or(() -> edges),
                by.temperature.or(() -> temperature),
                by.medium.or(() -> medium),
                by.dryMass.or(() -> dryMass),
                by.balance.or(() -> balance),
                by.note.or(() -> note),
                by.other.isEmpty() ? other : by.other);
    }

    public Facts withSpecimen(String value) {
        return new Facts(
                value, thickness, width, length, faces, edges, temperature, medium, dryMass, balance, note, other);
    }

    public Facts withThickness(Quantity value) {
        return new Facts(
                specimen,
                Optional.of(value),
                width,
                length,
                faces,
                edges,
                temperature,
                medium,
                dryMass,
                balance,
                note,
                other);
    }

    public Facts withWidthAndLength(Quantity newWidth, Quantity newLength) {
        return new Facts(
                specimen,
                thickness,
                Optional.of(newWidth),
                Optional.of(newLength),
                faces,
                edges,
                temperature,
                medium,
                dryMass,
                balance,
                note,
                other);
    }

    public Facts withFaces(Faces value) {
        return new Facts(
                specimen,
                thickness,
                width,
                length,
                Optional.of(value),
                edges,
                temperature,
                medium,
                dryMass,
                balance,
                note,
                other);
    }

    public Facts withEdges(Edges value) {
        return new Facts(
                specimen,
                thickness,
                width,
                length,
                faces,
                Optional.of(value),
                temperature,
                medium,
                dryMass,
                balance,
                note,
                other);
    }

    public Facts withDryMass(Quantity value) {
        return new Facts(
                specimen,
                thickness,
                width,
                length,
                faces,
                edges,
                temperature,
                medium,
                Optional.of(value),
                balance,
                note,
                other);
    }

    public Facts withOther(List<Other> value) {
        return new Facts(
                specimen, thickness, width, length, faces, edges, temperature, medium, dryMass, balance, note, value);
    }
}
