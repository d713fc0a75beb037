package soakline.uptake;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;

/** Numbers of a table in {@code src/test/resources/outside}; each file says where they come from. */
final class ReferenceTable {

    private ReferenceTable() {}

    static List<double[]> rows(String file) {
        try (var in = ReferenceTable.class.getResourceAsStream("/outside/" + file)) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#"))
                    .skip(1)
                    .map(line -> Arrays.stream(line.split(","))
                            .mapToDouble(Double::parseDouble)
                            .toArray())
                    .toList();
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }
}
