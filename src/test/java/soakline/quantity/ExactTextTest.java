package soakline.quantity;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class ExactTextTest {

    @ParameterizedTest
    @CsvSource({
        "31.2041,GRAM,31.2041",
        "0.28,HOUR,0.28",
        "420,HOUR,420",
        "-12.5,MINUTE,-12.5",
        "0.001,PERCENT,0.001",
        "60,CELSIUS,60",
        "-273.1,CELSIUS,-273.1",
        "1e-12,SQUARE_METRE_PER_SECOND,1E-12",
        "2e20,SECOND,2E+20",
        "0.0000001,METRE,0.0000001",
        "0,GRAM,0",
        "-0.0,GRAM,-0",
        "1234567.000001,SECOND,1234567.000001"
    })
    void writesWhatAPersonTyped(double typed, Unit unit, String expected) {
        assertThat(ExactText.of(unit.toSi(typed), unit)).contains(expected);
    }

    @ParameterizedTest
    @EnumSource(Unit.class)
    void whateverWasReadInAUnitIsWrittenInItBitForBit(Unit unit) {
        Random random = new Random(11);
        for (int i = 0; i < 20_000; i++) {
            double typed = random.nextInt(3) == 0
                    ? (random.nextDouble() - 0.3) * Math.pow(10, random.nextInt(40) - 20)
                    : random.nextInt(10_000_000) / Math.pow(10, random.nextInt(8));
            double si = unit.toSi(typed);
            String text = ExactText.of(si, unit).orElseThrow();
            assertSame(unit.toSi(Numbers.parse(text, '.').orElseThrow()), si, text);
            assertThat(ExactText.exists(si, unit)).isTrue();
        }
    }

    @ParameterizedTest
    @EnumSource(
            value = Unit.class,
            names = {"SECOND", "METRE", "KILOGRAM", "FRACTION", "KELVIN", "SQUARE_METRE_PER_SECOND"})
    void everyDoubleCanBeHadInItsSiUnit(Unit unit) {
        Random random = new Random(12);
        for (int i = 0; i < 20_000; i++) {
            double si = Double.longBitsToDouble(random.nextLong());
            if (Double.isFinite(si)) {
                String text = ExactText.of(si, unit).orElseThrow();
                assertSame(Numbers.parse(text, '.').orElseThrow(), si, text);
            }
        }
        assertThat(ExactText.of(Double.MIN_VALUE)).isEqualTo("4.94065645841247E-324");
    }

    /** By brute force over the neighbours: a product with 3600 passes over some doubles. */
    @Test
    void saysWhenAUnitCannotHoldAValue() {
        Random random = new Random(13);
        int without = 0;
        for (int i = 0; i < 20_000; i++) {
            double si = 3600 + 500 * random.nextDouble();
            double hours = si / 3600;
            boolean found = false;
            double x = hours;
            for (int k = 0; k < 20; k++) {
                x = Math.nextDown(x);
            }
            for (int k = 0; k < 40; k++) {
                found |= x * 3600 == si;
                x = Math.nextUp(x);
            }
            assertThat(ExactText.exists(si, Unit.HOUR)).isEqualTo(found);
            Optional<String> text = ExactText.of(si, Unit.HOUR);
            assertThat(text.isPresent()).isEqualTo(found);
            without += found ? 0 : 1;
        }
        assertThat(without).isBetween(1_000, 15_000);
    }

    /** No text with fewer digits reads back: each of the two decimals next to the value, one digit shorter, does not. */
    @Test
    void noShorterTextWouldDo() {
        Random random = new Random(14);
        for (int i = 0; i < 5_000; i++) {
            double si = random.nextInt(4) == 0
                    ? random.nextDouble()
                    : Unit.GRAM.toSi(random.nextInt(1_000_000) / Math.pow(10, random.nextInt(6)));
            String text = ExactText.of(si, Unit.KILOGRAM).orElseThrow();
            BigDecimal written = new BigDecimal(text).stripTrailingZeros();
            if (written.precision() > 1) {
                BigDecimal shorter = written.setScale(written.scale() - 1, RoundingMode.DOWN);
                assertThat(shorter.doubleValue()).as(text).isNotEqualTo(si);
                assertThat(shorter.add(shorter.ulp()).doubleValue()).as(text).isNotEqualTo(si);
            }
        }
    }

    @Test
    void anUncertaintyHasNoOffset() {
        assertThat(ExactText.ofDifference(0.5, Unit.CELSIUS)).contains("0.5");
        assertThat(ExactText.ofDifference(Unit.MILLIMETRE.differenceToSi(0.01), Unit.MILLIMETRE))
                .contains("0.01");
    }

    private static void assertSame(double actual, double expected, String text) {
        if (Double.doubleToRawLongBits(actual) != Double.doubleToRawLongBits(expected)) {
            assertThat(actual).as(text).isEqualTo(expected);
        }
    }
}
