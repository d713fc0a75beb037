package soakline.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.Reader;
import java.io.StringWriter;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.TimeZone;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import soakline.specimen.Run;

/** The same table in every encoding, and under another locale and zone. */
class EncodingTest {

    private static final String TEXT =
            "# thickness: 2030 µm ± 10 µm\r\n# temperature: 60 °C\r\n# medium: Öl\r\ntime [h];mass [g]\r\n0;31,5\r\n1;32\r\n";

    @TempDir
    Path folder;

    @ParameterizedTest
    @CsvSource({
        "UTF-8,false",
        "UTF-8,true",
        "UTF-16LE,true",
        "UTF-16BE,true",
        "UTF-16LE,false",
        "UTF-16BE,false",
        "ISO-8859-1,false",
        "windows-1252,false"
    })
    void isFoundOut(String charset, boolean marked) throws IOException {
        byte[] bytes = ((marked ? "\ufeff" : "") + TEXT).getBytes(Charset.forName(charset));
        Path file = Files.write(folder.resolve("run.csv"), bytes);
        Run run = RunFileReader.read(file, ReadOptions.of(), Progress.NONE).get(0);
        assertThat(run.facts().thickness().orElseThrow().si()).isCloseTo(2.03e-3, within(1e-15));
        assertThat(run.facts().temperature().orElseThrow().si()).isEqualTo(333.15);
        assertThat(run.facts().medium()).contains("Öl");
        assertThat(Reading.values(run)).containsExactly(new double[] {0.0315, 0.032}, within(1e-12));
        assertThat(run.source()).isEqualTo("run.csv");
    }

    @Test
    void bytesThatAreNoUtf8AreTakenOneByOne() throws IOException {
        byte[] bytes = {
            'a', (byte) 0xb5, (byte) 0xe4, (byte) 0x80, 'b', (byte) 0xc2, (byte) 0xb5, (byte) 0xf0, (byte) 0x9f
        };
        assertThat(text(bytes, 1)).isEqualTo("aµä€bµðŸ");
        assertThat(text(bytes, 100)).isEqualTo("aµä€bµðŸ");
    }

    @Test
    void aLongTextSurvivesTheEdgesOfTheBuffers() throws IOException {
        String text = "x°µ±€\ud83d\ude00yz".repeat(20_000);
        assertThat(text(text.getBytes(StandardCharsets.UTF_8), 777)).isEqualTo(text);
        String latin = "x°µ±yz".repeat(20_000);
        assertThat(text(latin.getBytes(StandardCharsets.ISO_8859_1), 777)).isEqualTo(latin);
    }

    private static String text(byte[] bytes, int chunk) throws IOException {
        StringWriter all = new StringWriter();
        try (Reader reader = new Utf8OrLatinReader(new ByteArrayInputStream(bytes))) {
            char[] chars = new char[chunk];
            for (int n = reader.read(chars, 0, chunk); n >= 0; n = reader.read(chars, 0, chunk)) {
                all.write(chars, 0, n);
            }
        }
        return all.toString();
    }

    @Test
    void localeAndZoneOfTheMachineChangeNothing() {
        String text = "date,MASS [g]\n2026-03-29 01:30,31.5\n2026-03-29 03:30,32.25\n";
        String named = "TIME [MIN],WEIGHT [MG]\n0,1.5\n1,2.5\n";
        ReadOptions months = ReadOptions.of().withDatePattern("d MMM yyyy");
        String worded = "date,mass [g]\n1 May 2026,1\n2 May 2026,2\n";
        Locale locale = Locale.getDefault();
        TimeZone zone = TimeZone.getDefault();
        try {
            for (String tag : List.of("de-DE", "tr-TR", "ar-EG")) {
                Locale.setDefault(Locale.forLanguageTag(tag));
                TimeZone.setDefault(TimeZone.getTimeZone("Europe/Berlin"));
                assertThat(Reading.times(Reading.one(text))).containsExactly(0, 7200);
                assertThat(Reading.values(Reading.one(text)))
                        .containsExactly(new double[] {0.0315, 0.03225}, within(1e-12));
                assertThat(Reading.times(Reading.one(named))).containsExactly(0, 60);
                assertThat(Reading.times(Reading.one(worded, months))).containsExactly(0, 86_400);
            }
        } finally {
            Locale.setDefault(locale);
            TimeZone.setDefault(zone);
        }
    }
}
