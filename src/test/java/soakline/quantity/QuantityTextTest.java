package soakline.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import soakline.quantity.QuantityFormatException.Reason;

class QuantityTextTest {

    @ParameterizedTest
    @ValueSource(
            strings = {
                "2.03 mm ± 0.01 mm",
                "2,03mm±0,01mm",
                "2.03 mm +/- 0.01",
                "2.03 ± 0.01 mm",
                "2.03\u00a0mm +- 10 um",
                " 2030 um ± 0.01 mm "
            })
    void readsValueAndUncertainty(String text) throws QuantityFormatException {
        Quantity q = QuantityText.parse(text, Dimension.LENGTH);
        assertThat(q.si()).isCloseTo(2.03e-3, within(1e-15));
        assertThat(q.standardUncertainty().orElseThrow()).isCloseTo(1e-5, within(1e-17));
    }

    @Test
    void anUncertaintyNotStatedIsNotZero() throws QuantityFormatException {
        assertThat(QuantityText.parse("2 mm", Dimension.LENGTH).standardUncertainty())
                .isEmpty();
        assertThat(QuantityText.parse("2 mm ± 0", Dimension.LENGTH).standardUncertainty())
                .hasValue(0);
    }

    @Test
    void aTemperatureUncertaintyHasNoOffset() throws QuantityFormatException {
        Quantity q = QuantityText.parse("60 °C ± 0.5 K", Dimension.TEMPERATURE);
        assertThat(q.si()).isEqualTo(333.15);
        assertThat(q.standardUncertainty()).hasValue(0.5);
        assertThat(q.toString()).isEqualTo("60 °C ± 0.5 °C");
    }

    @Test
    void readsAnExponentButLeavesAUnitThatBeginsWithE() throws QuantityFormatException {
        assertThat(QuantityText.parse("1e-12 m2/s", Dimension.DIFFUSIVITY).si()).isEqualTo(1e-12);
        assertThat(reason("2 e", Dimension.LENGTH)).isEqualTo(Reason.UNIT_UNKNOWN);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "''|EMPTY",
                "2.03|UNIT_MISSING",
                "2.03 ± 0.01|UNIT_MISSING",
                "2.03 furlong|UNIT_UNKNOWN",
                "2.03 g|UNIT_UNKNOWN",
                "mm|NOT_A_NUMBER",
                "1.2.3 mm|NOT_A_NUMBER",
                "1e999 mm|NOT_FINITE",
                "2 mm ± -1 mm|UNCERTAINTY_BAD",
                "2 mm ±|NOT_A_NUMBER",
                "2 mm ± 0.5 %|UNIT_UNKNOWN",
                "2 mm ± 1 ± 1|UNIT_UNKNOWN"
            })
    void saysWhatIsWrong(String text, Reason expected) {
        assertThat(reason(text, Dimension.LENGTH)).isEqualTo(expected);
    }

    @Test
    void aUnitThatCarriesTheNumberBeyondTheDoublesIsNotFinite() {
        assertThat(reason("1e308 week", Dimension.TIME)).isEqualTo(Reason.NOT_FINITE);
        assertThat(reason("1 week ± 1e308 week", Dimension.TIME)).isEqualTo(Reason.NOT_FINITE);
    }

    private static Reason reason(String text, Dimension dimension) {
        return catchThrowableOfType(QuantityFormatException.class, () -> QuantityText.parse(text, dimension))
                .reason();
    }
}
