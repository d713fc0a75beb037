package soakline.wording;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.Locale;
import java.util.Properties;
import java.util.TreeSet;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import soakline.problem.Code;
import soakline.problem.Finding;
import soakline.problem.Place;

class WordingTest {

    private static final Pattern BRACE = Pattern.compile("[{}]");

    @Test
    void everyCodeHasASentenceAndEverySentenceACode() throws IOException {
        Properties sentences = new Properties();
        try (InputStream in = WordingTest.class.getResourceAsStream("/soakline/wording/sentences.properties")) {
            sentences.load(new InputStreamReader(in, StandardCharsets.UTF_8));
        }
        assertThat(new TreeSet<>(sentences.stringPropertyNames()))
                .containsExactlyElementsOf(new TreeSet<>(Arrays.stream(Code.values())
                        .map(c -> c.name().toLowerCase(Locale.ROOT))
                        .toList()));
    }

    @ParameterizedTest
    @EnumSource(Code.class)
    void placesForValuesAreNumberedFromZeroAndFilled(Code code) {
        String template = Wording.template(code);
        int count = 0;
        while (template.contains("{" + count + "}")) {
            count++;
        }
        Object[] values = new Object[count];
        Arrays.setAll(values, i -> "v" + i);

        String sentence = Wording.sentence(Finding.of(code, values));

        assertThat(BRACE.matcher(sentence).find()).as(sentence).isFalse();
        assertThat(sentence).isNotBlank().doesNotContain("  ");
        for (Object value : values) {
            assertThat(sentence).contains(value.toString());
        }
    }

    @Test
    void thePlaceStandsInFront() {
        Finding finding = Finding.of(Code.FILE_EMPTY);
        assertThat(Wording.withPlace(finding.at(Place.of("a.csv").line(4).column(2))))
                .startsWith("a.csv, line 4, column 2: The file holds no rows");
        assertThat(Wording.withPlace(finding)).startsWith("The file holds no rows");
    }
}
