package soakline.samples;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

class SampleRunsTest {

    @Test
    void theFilesAreWhatTheGeneratorMakes() throws IOException {
        Map<String, String> onDisk = new TreeMap<>();
        try (Stream<Path> files = Files.list(Path.of("sample-runs"))) {
            for (Path file : files.toList()) {
                onDisk.put(file.getFileName().toString(), Files.readString(file));
            }
        }
        assertThat(onDisk).isEqualTo(SampleGenerator.all());
    }
}
