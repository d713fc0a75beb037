package soakline.window.present;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import soakline.problem.Code;
import soakline.problem.Finding;
import soakline.quantity.Dimension;
import soakline.quantity.Quantity;
import soakline.quantity.QuantityFormatException;
import soakline.quantity.QuantityText;
import soakline.quantity.Unit;
import soakline.specimen.Faces;
import soakline.specimen.Facts;
import soakline.wording.Wording;

/**
 * What the user typed where facts were missing.
 *
 * @param texts as typed
 * @param forAll whether it holds for every coupon of the file that lacks it
 */
public record FactsAnswer(Map<Field, String> texts, Optional<Faces> faces, boolean forAll) {

    /** The places to type or choose in. */
    public enum Field {
        THICKNESS("thickness", "2.03 mm ± 0.01 mm"),
        FACES("faces", "both"),
        WIDTH("width", "100 mm"),
        LENGTH("length", "100 mm");

        private final String words;
        private final String example;

        Field(String words, String example) {
            this.words = words;
            this.example = example;
        }

        public String words() {
            return words;
        }

        public String example() {
            return example;
        }
    }

    /**
     * An answer read.
     *
     * @param facts what was understood, to override those of the file
     * @param complaints a sentence for each field that was not
     */
    public record Reading(Facts facts, Map<Field, String> complaints) {
        public Reading {
            complaints = Map.copyOf(complaints);
        }
    }

    public FactsAnswer {
        texts = Map.copyOf(texts);
    }

    /** Reads the answer to a question. */
    public Reading read(Question question) {
        Map<Field, String> complaints = new EnumMap<>(Field.class);
        Facts facts = Facts.of("");
        if (question.thickness()) {
            Optional<Quantity> thickness = length(Field.THICKNESS, complaints);
            facts = thickness.isPresent() ? facts.withThickness(thickness.get()) : facts;
        }
        if (question.faces()) {
            if (faces.isEmpty()) {
                complaints.put(Field.FACES, Wording.text(Finding.of(Code.FACES_NOT_CHOSEN)));
            } else {
                facts = facts.withFaces(faces.get());
            }
        }
        if (question.size()) {
            Optional<Quantity> width = length(Field.WIDTH, complaints);
            Optional<Quantity> length = length(Field.LENGTH, complaints);
            if (width.isPresent() && length.isPresent()) {
                facts = facts.withWidthAndLength(width.get(), length.get());
            }
        }
        return new Reading(facts, complaints);
    }

    private Optional<Quantity> length(Field field, Map<Field, String> complaints) {
        String text = texts.getOrDefault(field, "").strip();
        try {
            Quantity quantity = QuantityText.parse(text, Dimension.LENGTH);
            if (quantity.si() > 0) {
                return Optional.of(quantity);
            }
            complaints.put(field, Wording.text(Finding.of(Code.FACT_NOT_POSITIVE, capital(field), text)));
        } catch (QuantityFormatException e) {
            complaints.put(field, Wording.text(complaint(field, text, e)));
        }
        return Optional.empty();
    }

    private static Finding complaint(Field field, String text, QuantityFormatException e) {
        return switch (e.reason()) {
            case EMPTY -> Finding.of(Code.FACT_EMPTY, capital(field), field.example());
            case UNIT_MISSING -> Finding.of(Code.FACT_UNIT_MISSING, capital(field), text, field.example());
            case UNIT_UNKNOWN ->
                Finding.of(Code.FACT_UNIT_UNKNOWN, capital(field), e.part(), Unit.symbols(Dimension.LENGTH));
            default -> Finding.of(Code.FACT_NOT_A_QUANTITY, capital(field), text, field.example());
        };
    }

    private static String capital(Field field) {
        return Character.toUpperCase(field.words().charAt(0)) + field.words().substring(1);
    }
}
