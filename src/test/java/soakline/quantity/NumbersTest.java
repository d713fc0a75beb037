package soakline.quantity;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Locale;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class NumbersTest {

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "0|0",
                "1.5|1.5",
                "1,5|1.5",
                "+2|2",
                "-0.25|-0.25",
                ".5|0.5",
                "7.|7",
                "1e-12|1e-12",
                "1,5E3|1500",
                "\u22123|-3",
                "'  31.2041\u00a0'|31.2041",
                "000000000000000000001.5|1.5"
            })
    void readsDecimals(String text, double expected) {
        assertThat(Numbers.parse(text)).hasValue(expected);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "", " ", "-", ".", ",", "+.", "1.2.3", "1,2,3", "1,234.5", "1.234,5", "1 000", "1f", "1d", "0x10",
                "0x1p3", "1e", "e5", "--1", "1-", "abc", "12:30", "1e5.5", "\u0661"
            })
    void refusesEverythingElse(String text) {
        assertThat(Numbers.parse(text)).isEmpty();
    }

    @ParameterizedTest
    @ValueSource(strings = {"NaN", "nan", "Infinity", "-inf", "INF", "1e999", "-1e400"})
    void handsBackWhatIsNotFinite(String text) {
        assertThat(Numbers.parse(text)).isPresent();
        assertThat(Numbers.parse(text).getAsDouble()).isNotFinite();
    }

    @Test
    void aKnownDecimalSignMakesTheOtherNoNumber() {
        assertThat(Numbers.parse("0,5", ',')).hasValue(0.5);
        assertThat(Numbers.parse("0,5", '.')).isEmpty();
        assertThat(Numbers.parse("0.5", ',')).isEmpty();
        assertThat(Numbers.parse("1.5e3", ',')).isEmpty();
        assertThat(Numbers.parse("1,5e3", ',')).hasValue(1500);
    }

    @Test
    void theFastPathGivesTheSameBitsAsTheSlowOne() {
        Random random = new Random(20260301);
        for (int i = 0; i < 200_000; i++) {
            int digits = 1 + random.nextInt(18);
            StringBuilder text = new StringBuilder(random.nextBoolean() ? "-" : "");
            int point = random.nextInt(digits + 1);
            for (int k = 0; k < digits; k++) {
                text.append(k == point ? "." : "").append((char) ('0' + random.nextInt(10)));
            }
            text.insert(text.charAt(0) == '-' ? 1 : 0, "0".repeat(random.nextInt(3)));
            double expected = Double.parseDouble(text.toString());
            assertThat(Double.doubleToRawLongBits(Numbers.parse(text.toString()).orElseThrow()))
                    .as(text.toString())
                    .isEqualTo(Double.doubleToRawLongBits(expected));
        }
        String tiny = "0.0000000000000000000000123456789012345";
        assertThat(Numbers.parse(tiny)).hasValue(Double.parseDouble(tiny));
        assertThat(Numbers.parse("-0").orElseThrow()).isEqualTo(-0.0);
    }

    @Test
    void aLongCellCostsNoMoreThanItsLength() {
        String digits = "1".repeat(100_000);
        assertThat(Numbers.parse(digits + "x")).isEmpty();
        assertThat(Numbers.parse("0." + digits)).hasValue(1 / 9.0);
    }

    @Test
    void writesTheSameInEveryLocale() {
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.GERMANY);
            assertThat(Numbers.significant(1.23456e-7, 3)).isEqualTo("1.23e-07");
            assertThat(Numbers.significant(0.001234, 2)).isEqualTo("0.0012");
            assertThat(Numbers.significant(123_456, 3)).isEqualTo("123000");
            assertThat(Numbers.shortest(0.1 + 0.2)).isEqualTo("0.3");
        } finally {
            Locale.setDefault(before);
        }
    }

    @Test
    void roundsToTheUncertainty() {
        assertThat(Numbers.toUncertainty(1.23456, 0.034)).isEqualTo("1.235");
        assertThat(Numbers.toUncertainty(1.23456e-12, 3.4e-14)).isEqualTo("1.235e-12");
        assertThat(Numbers.toUncertainty(1.23456, 0)).isEqualTo("1.23456");
    }

    @Test
    void hasWordsForWhatIsNotFinite() {
        assertThat(Numbers.shortest(Double.NaN)).isEqualTo("NaN");
        assertThat(Numbers.significant(Double.POSITIVE_INFINITY, 3)).isEqualTo("Infinity");
        assertThat(Numbers.significant(0, 3)).isEqualTo("0");
    }
}
