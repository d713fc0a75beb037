package soakline.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class UnitTest {

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "h|TIME|HOUR", "Hours|TIME|HOUR", "MIN|TIME|MINUTE", "week|TIME|WEEK", "MM|LENGTH|MILLIMETRE",
                "\u03bcm|LENGTH|MICROMETRE", "um|LENGTH|MICROMETRE", "in|LENGTH|INCH", "MG|MASS|MILLIGRAM",
                        "%|CONTENT|PERCENT",
                "wt %|CONTENT|PERCENT", "\u00baC|TEMPERATURE|CELSIUS", "' h\u00a0'|TIME|HOUR",
                        "m2/s|DIFFUSIVITY|SQUARE_METRE_PER_SECOND"
            })
    void findsSpellings(String spelling, Dimension dimension, Unit expected) {
        assertThat(Unit.find(spelling, dimension)).contains(expected);
    }

    @ParameterizedTest
    @CsvSource({"M,LENGTH", "h,LENGTH", "mm,TIME", "oz,MASS", "'',MASS", "k,TEMPERATURE", "G,MASS"})
    void refusesDoubtfulSpellings(String spelling, Dimension dimension) {
        assertThat(Unit.find(spelling, dimension)).isEmpty();
    }

    @ParameterizedTest
    @EnumSource(Unit.class)
    void goesToSiAndBack(Unit unit) {
        assertThat(unit.fromSi(unit.toSi(12.5))).isCloseTo(12.5, within(1e-12));
        assertThat(unit.differenceFromSi(unit.differenceToSi(0.5))).isCloseTo(0.5, within(1e-12));
        assertThat(Unit.find(unit.symbol(), unit.dimension())).contains(unit);
        assertThat(Unit.symbols(unit.dimension())).contains(unit.symbol());
    }

    @Test
    void knowsTheFactors() {
        assertThat(Unit.WEEK.toSi(1)).isEqualTo(7 * 24 * 3600);
        assertThat(Unit.MIL.toSi(1)).isEqualTo(25.4e-6);
        assertThat(Unit.CELSIUS.toSi(60)).isEqualTo(333.15);
        assertThat(Unit.CELSIUS.differenceToSi(2)).isEqualTo(2);
    }

    @Test
    void noSpellingNamesTwoUnitsOfOneDimension() {
        for (Unit unit : Unit.values()) {
            for (Unit other : Unit.values()) {
                if (unit != other && unit.dimension() == other.dimension()) {
                    assertThat(Unit.find(other.symbol(), unit.dimension())).contains(other);
                }
            }
        }
    }
}
