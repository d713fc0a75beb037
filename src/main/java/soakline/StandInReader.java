package soakline;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.function.DoubleConsumer;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Place;
import soakline.quantity.Dimension;
import soakline.quantity.Quantity;
import soakline.quantity.QuantityFormatException;
import soakline.quantity.QuantityText;
import soakline.session.EstimateRequest;
import soakline.specimen.Faces;
import soakline.specimen.Facts;
import soakline.specimen.Run;
import soakline.specimen.ValueKind;
import soakline.specimen.Weighings;

/** Stand-in for the reader of run files until its room is built: hours and grams behind four facts. */
final class StandInReader {

    private StandInReader() {}

    static List<Run> read(Path file, EstimateRequest request, DoubleConsumer progress) {
        Place place = Place.of(String.valueOf(file.getFileName()));
        try {
            return readText(place.source(), Files.readString(file));
        } catch (IOException e) {
            throw Fault.of(Code.FILE_NOT_FOUND).at(place);
        }
    }

    static List<Run> readText(String name, String text) {
        Facts facts = Facts.of("");
        Weighings.Builder weighings = new Weighings.Builder();
        int number = 0;
        for (String line : text.lines().toList()) {
            number++;
            int colon = line.indexOf(':');
            int comma = line.indexOf(',');
            if (line.startsWith("#") && colon > 0) {
                facts = fact(facts, line.substring(1, colon).strip(), line.substring(colon + 1));
            } else if (!line.startsWith("time") && comma > 0) {
                double hours = Double.parseDouble(line.substring(0, comma));
                weighings.add(hours * 3600, Double.parseDouble(line.substring(comma + 1)) / 1000, number);
            }
        }
        return List.of(new Run(name, facts, ValueKind.MASS, weighings.build(), List.of()));
    }

    private static Facts fact(Facts facts, String name, String value) {
        return switch (name) {
            case "specimen" -> facts.withSpecimen(value.strip());
            case "thickness" -> facts.withThickness(quantity(value, Dimension.LENGTH));
            case "dry mass" -> facts.withDryMass(quantity(value, Dimension.MASS));
            case "faces" -> facts.withFaces(value.strip().equals("one") ? Faces.ONE : Faces.BOTH);
            default -> facts;
        };
    }

    private static Quantity quantity(String text, Dimension dimension) {
        try {
            return QuantityText.parse(text, dimension);
        } catch (QuantityFormatException e) {
            throw Fault.of(Code.FACT_NOT_A_QUANTITY, dimension, text, "2.03 mm");
        }
    }
}
