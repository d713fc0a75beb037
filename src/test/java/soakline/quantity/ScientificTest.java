package soakline.quantity;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class ScientificTest {

    @Test
    void valueEndsAtTheSecondDigitOfItsUncertainty() {
        assertThat(Scientific.value(1.0234e-12, 2.3e-14)).isEqualTo("1.023×10⁻¹²");
        assertThat(Scientific.value(1.7933, 0.0061)).isEqualTo("1.7933");
        assertThat(Scientific.value(-0.21234, 0.0043)).isEqualTo("−0.2123");
        assertThat(Scientific.value(0, 0.004)).isEqualTo("0.0000");
        assertThat(Scientific.value(1.0234e-12, Double.NaN)).isEqualTo("1.023×10⁻¹²");
    }

    @Test
    void intervalHasThePowerOfItsValue() {
        assertThat(Scientific.interval(9.89e-13, OptionalDouble.of(9.62e-13), OptionalDouble.of(1.017e-12)))
                .isEqualTo("(9.62 … 10.17)×10⁻¹³");
        assertThat(Scientific.interval(1.79, OptionalDouble.of(1.7811), OptionalDouble.of(1.8062)))
                .isEqualTo("1.781 … 1.806");
    }

    @Test
    void openSidesAreSaidInWords() {
        assertThat(Scientific.interval(1, OptionalDouble.empty(), OptionalDouble.of(2.5e-12)))
                .isEqualTo("below 2.50×10⁻¹²");
        assertThat(Scientific.interval(1, OptionalDouble.of(2.5e-12), OptionalDouble.empty()))
                .isEqualTo("above 2.50×10⁻¹²");
        assertThat(Scientific.interval(1, OptionalDouble.empty(), OptionalDouble.empty()))
                .isEqualTo("open on both sides");
    }

    @Test
    void aValueLostInItsUncertaintyIsReadOnTheScaleOfTheUncertainty() {
        assertThat(Scientific.value(0.00052, 0.0035)).isEqualTo("0.0005");
        assertThat(Scientific.interval(0.00052, OptionalDouble.of(-0.0066), OptionalDouble.of(0.0076)))
                .isEqualTo("−0.0066 … 0.0076");
        assertThat(Scientific.value(2e-13, 1.1e-12)).isEqualTo("0.2×10⁻¹²");
    }

    @Test
    void whatWasTypedInKeepsItsDigits() {
        assertThat(Scientific.exact(0)).isEqualTo("0");
        assertThat(Scientific.exact(1.8)).isEqualTo("1.8");
        assertThat(Scientific.exact(-0.25)).isEqualTo("−0.25");
        assertThat(Scientific.exact(1.23456e-12)).isEqualTo("1.23456×10⁻¹²");
    }
}
