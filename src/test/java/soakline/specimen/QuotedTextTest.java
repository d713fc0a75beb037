package soakline.specimen;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class QuotedTextTest {

    /** The signs that could break a line, a cell, an escape or a spreadsheet. */
    private static final String LETTERS =
            "aZ9 ,;\t\n\r\"'\\=+-@#:.[]()<>&|_/u0n\u0000\u0007\u00a0\u2028\ufeff\u00e9\u03bc\u00b1\ud83d\ude00\ud800\udc00";

    static String randomText(Random random, int longest) {
        StringBuilder text = new StringBuilder();
        for (int k = random.nextInt(longest + 1); k > 0; k--) {
            text.append(LETTERS.charAt(random.nextInt(LETTERS.length())));
        }
        return text.toString();
    }

    @Test
    void anyTextComesBack() {
        Random random = new Random(21);
        for (int i = 0; i < 100_000; i++) {
            String text = randomText(random, 8);
            for (String written : new String[] {
                QuotedText.fact(text), QuotedText.name(text), QuotedText.cell(text), QuotedText.quoted(text)
            }) {
                assertThat(QuotedText.read(written)).isEqualTo(text);
                assertThat(written.lines().count()).isEqualTo(1);
                assertThat(new String(written.getBytes(StandardCharsets.UTF_8), StandardCharsets.UTF_8))
                        .isEqualTo(written);
            }
        }
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"wet", "air at 85 % RH", "say \"hi\"", "2 mm off", "Öl, warm; not hot", "(a)", "\ud83d\ude00"})
    void plainTextStaysAsItIs(String text) {
        assertThat(QuotedText.fact(text)).isEqualTo(text);
        assertThat(QuotedText.cell(text)).isEqualTo(text);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "'a,=1+1'|'\"a\\u002c=1+1\"'",
                "'a; \"-2'|'\"a\\u003b \\\"-2\"'",
                "' a'|'\" a\"'",
                "''|'\"\"'",
                "'\"a\"'|'\"\\\"a\\\"\"'"
            })
    void whatWouldBreakIsQuoted(String text, String expected) {
        assertThat(QuotedText.fact(text)).isEqualTo(expected);
    }

    @ParameterizedTest
    @ValueSource(strings = {"=1+1", "+1", "-a", "@x", "'a", "#a", "3,5", "3.5", "1e3"})
    void noCellIsAFormulaOrANumber(String text) {
        assertThat(QuotedText.cell(text)).isEqualTo("\"" + text + "\"");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                "\"",
                "a\"b\"",
                "\"a\" and \"b\"",
                "\"C:\\data\"",
                "\"a\\\"",
                "\"\\u12\"",
                "\"\\u00+1\"",
                "\"\\\uff10\"",
                "\"open"
            })
    void whatIsNotWhollyQuotedIsTakenAsItStands(String text) {
        assertThat(QuotedText.read(text)).isEqualTo(text);
    }

    /** Escapes as in RFC 8259, section 7. */
    @Test
    void readsTheEscapesOfJson() {
        assertThat(QuotedText.read("\"\\\"\\\\\\/\\b\\f\\n\\r\\t\\u00B5\\u00b5\""))
                .isEqualTo("\"\\/\b\f\n\r\t\u00b5\u00b5");
    }
}
