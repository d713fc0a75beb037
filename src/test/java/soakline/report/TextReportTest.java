package soakline.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import soakline.inference.Assessment;
import soakline.specimen.Facts;

class TextReportTest {

    private static String text(Assessment... assessments) {
        return TextReport.write(List.of(assessments));
    }

    @Test
    void theVerdictComesBeforeTheNumbers() {
        String text = text(InventedAssessments.usable());

        assertThat(text).startsWith("P-07 (invented.csv)\n");
        assertThat(text.indexOf("Result: usable.")).isPositive().isLessThan(text.indexOf("D, diffusivity"));
    }

    @Test
    void valuesAreRoundedToTheirUncertainty() {
        String text = text(InventedAssessments.usable());

        assertThat(text)
                .contains("1.235e-12 m²/s", "6.5e-14 m²/s", "1.111e-12 to 1.358e-12", "95 % interval, profile")
                .contains("M∞, equilibrium content", "1.800 %", "held fixed")
                .contains("19 of 20 weighings used")
                .contains("thickness", "25 %")
                .contains("The edges are taken as sealed");
    }

    @Test
    void anOpenSideIsSaidInWords() {
        assertThat(text(InventedAssessments.open(OptionalDouble.of(1e-12), OptionalDouble.empty())))
                .contains("from 1.000e-12, no upper limit");
        assertThat(text(InventedAssessments.open(OptionalDouble.empty(), OptionalDouble.of(2e-12))))
                .contains("no lower limit, up to 2.000e-12");
        assertThat(text(InventedAssessments.open(OptionalDouble.empty(), OptionalDouble.empty())))
                .contains("no lower and no upper limit");
    }

    @Test
    void aTestStoppedEarlyHasNoDiffusivityAnywhere() {
        String text = text(InventedAssessments.stoppedEarly());

        assertThat(text).doesNotContain("1.23", "1.11e", "1.111", "1.358", "6.5e-14", "m²/s", "Combined");
        assertThat(text)
                .contains("Result: NOT USABLE. D is not determined.", "not determined", "initial slope", "%/√s");
    }

    @Test
    void anApparentDiffusivityIsCalledSo() {
        String text = text(InventedAssessments.apparent());

        assertThat(text).contains("value is an apparent D only", "apparent D  ", "uncertainty of apparent D");
        assertThat(text).doesNotContain("D, diffusivity");
    }

    @Test
    void noLineIsTooWideAndNoControlCharacterPasses() {
        Assessment a = InventedAssessments.usable("x".repeat(230) + "\u001b[31m\nred", InventedAssessments.D);

        assertThat(text(a, InventedAssessments.apparent(), InventedAssessments.stoppedEarly())
                        .lines())
                .allMatch(line -> line.length() <= 100 && line.chars().noneMatch(Character::isISOControl));
    }

    @Test
    void factsAreBrokenBetweenThemAndNotWithin() {
        TextLines lines = new TextLines().listed("  ", List.of("x".repeat(80), "length 100.000 mm"));

        assertThat(lines.toString()).isEqualTo("  " + "x".repeat(80) + ",\n  length 100.000 mm\n");
    }

    @Test
    void severalCouponsEndInMeanSpreadAndNumber() {
        String text = text(
                InventedAssessments.usable("A", 1e-12),
                InventedAssessments.usable("B", 2e-12),
                InventedAssessments.stoppedEarly());

        assertThat(text).contains("All 3 coupons", "standard deviation");
        String row = text.substring(text.indexOf("All 3 coupons"))
                .lines()
                .filter(l -> l.contains("D, diffusivity"))
                .findFirst()
                .orElseThrow();
        assertThat(row).contains("1.50e-12 m²/s", "7.1e-13 m²/s").endsWith(" 2");
        assertThat(text(InventedAssessments.usable())).doesNotContain("All 1 coupons");
    }

    @Test
    void noUsableCouponHasNoMean() {
        assertThat(text(InventedAssessments.stoppedEarly(), InventedAssessments.stoppedEarly()))
                .contains("No mean, as none of them has a usable result");
    }

    @Test
    void theLocaleChangesNothing() {
        Locale before = Locale.getDefault();
        List<String> texts = Stream.of(Locale.ROOT, Locale.GERMANY, Locale.forLanguageTag("ar-EG-u-nu-arab"))
                .map(locale -> {
                    Locale.setDefault(locale);
                    return text(InventedAssessments.usable())
                            + JsonReport.write(List.of(InventedAssessments.usable()))
                            + CsvReport.write(List.of(InventedAssessments.usable()));
                })
                .toList();
        Locale.setDefault(before);

        assertThat(texts).allMatch(texts.get(0)::equals);
    }

    @Test
    void anUnknownFactIsShown() {
        Assessment a = InventedAssessments.usable();
        Facts f = a.run().facts();
        Facts more = new Facts(
                f.specimen(),
                f.thickness(),
                f.width(),
                f.length(),
                f.faces(),
                f.edges(),
                f.temperature(),
                f.medium(),
                f.dryMass(),
                f.balance(),
                f.note(),
                List.of(new Facts.Other("batch", "17")));
        Assessment known = new Assessment(
                a.run().withFacts(more),
                a.estimate(),
                a.direction(),
                a.parameters(),
                a.combined(),
                a.checks(),
                a.shortTimeLine(),
                true,
                true,
                a.fickian(),
                a.fickianFinding(),
                a.problems(),
                a.notes(),
                a.cautions());

        assertThat(text(known)).contains("batch 17");
    }
}
