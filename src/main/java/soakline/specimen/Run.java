package soakline.specimen;

import java.util.List;
import java.util.Optional;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Finding;
import soakline.problem.Place;

/**
 * One coupon's test: what is known about it and its weighings, as read.
 *
 * @param source name of the file, empty when typed in
 * @param notes what the reader of the file has to say, each with its place
 */
public record Run(String source, Facts facts, ValueKind kind, Weighings weighings, List<Finding> notes) {

    /** Fewer usable weighings than this are refused: three parameters and one degree of freedom. */
    public static final int LEAST_WEIGHINGS = 4;

    public Run {
        notes = List.copyOf(notes);
    }

    public Run withFacts(Facts value) {
        return new Run(source, value, kind, weighings, notes);
    }

    public Run withWeighings(Weighings value) {
        return new Run(source, facts, kind, value, notes);
    }

    /** The specimen's name, or else the file's. */
    public String name() {
        return facts.specimen().isEmpty() ? source : facts.specimen();
    }

    /**
     * The geometry, once thickness and faces are known. Edges count as sealed when not stated.
     *
     * @throws Fault naming what is missing
     */
    public Sheet sheet() {
        Place place = Place.of(source);
        if (facts.thickness().isEmpty()) {
            throw Fault.of(Code.MISSING_THICKNESS, name()).at(place);
        }
        if (facts.faces().isEmpty()) {
            throw Fault.of(Code.MISSING_FACES, name()).at(place);
        }
        Edges edges = facts.edges().orElse(Edges.SEALED);
        if (edges == Edges.BARE && (facts.width().isEmpty() || facts.length().isEmpty())) {
            throw Fault.of(Code.MISSING_WIDTH_LENGTH, name()).at(place);
        }
        return new Sheet(facts.thickness().get(), facts.faces().get(), edges, facts.width(), facts.length());
    }

    /**
     * Contents over time of the weighings not set aside.
     *
     * @throws Fault when fewer than {@link #LEAST_WEIGHINGS} are usable, or times or values are all the same
     */
    public ContentSeries contents() {
        if (weighings.used() < LEAST_WEIGHINGS) {
            throw Fault.of(Code.TOO_FEW_WEIGHINGS, weighings.used(), LEAST_WEIGHINGS)
                    .at(Place.of(source));
        }
        return ContentSeries.of(this);
    }

    /** The dry mass, kg, where known. */
    public Optional<Double> dryMass() {
        return facts.dryMass().map(q -> q.si());
    }
}
