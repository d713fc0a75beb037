package soakline.inference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import soakline.Samples;
import soakline.problem.Code;
import soakline.quantity.Quantity;
import soakline.quantity.Unit;
import soakline.specimen.Faces;
import soakline.specimen.Facts;
import soakline.specimen.Run;
import soakline.specimen.ValueKind;
import soakline.specimen.Weighings;

class VerdictsTest {

    /**
     * An 84-lead moulded package at 85 °C and 85 % RH, hours and grams: Tang et al., Six Sigma: Advanced Tools for Black Belts and
     * Master Black Belts (2006), table 15.3. Its authors needed more than a Fickian sheet.
     */
    private static Run mouldedPackage() {
        double[] hours = {0, 4, 8, 24, 48, 72, 96, 120, 144, 168};
        double[] grams = {
            123.63045, 123.72235, 123.7578, 123.8459, 123.91545, 123.95055, 123.97355, 123.986, 123.99685, 124.00425
        };
        Weighings.Builder weighings = new Weighings.Builder();
        for (int i = 0; i < hours.length; i++) {
            weighings.add(hours[i] * 3600, grams[i] / 1000, i + 1);
        }
        // D/h² is what counts: any thickness does
        Facts facts = Facts.of("package")
                .withThickness(Quantity.of(1e-3, Unit.METRE))
                .withFaces(Faces.BOTH)
                .withDryMass(Quantity.of(0.12363045, Unit.KILOGRAM));
        return new Run("", facts, ValueKind.MASS, weighings.build(), List.of());
    }

    @Test
    void thePublishedPackageIsNotFickian() {
        Assessment free = Assessor.assess(mouldedPackage(), AssessmentOptions.usual());
        Assessment held =
                Assessor.assess(mouldedPackage(), AssessmentOptions.usual().withFixed(Map.of("startContent", 0.0)));

        assertThat(free.fickian()).isEqualTo(Verdict.FAIL);
        assertThat(held.fickian()).isEqualTo(Verdict.FAIL);
        assertThat(held.isApparent()).isTrue();
        // the fit itself, made with SciPy: M∞ 0.3001 %, D/h² 2.68e-3 per hour, residual sd 0.0040 %
        assertThat(held.parameter("equilibriumContent").orElseThrow().value().getAsDouble())
                .isCloseTo(0.003001, within(5e-7));
        assertThat(held.estimate().diffusivity() / 1e-6 * 3600).isCloseTo(2.68e-3, within(5e-6));
        // (over 7 degrees of freedom there, 8 here)
        assertThat(held.estimate().residualStandardDeviation() * Math.sqrt(8.0 / 7))
                .isCloseTo(4.0e-5, within(5e-7));
    }

    @Test
    void theTwoStageSampleIsNotFickianAndThePlainOnesAre() {
        assertThat(Samples.assessment("07-two-stages.csv").fickian()).isEqualTo(Verdict.FAIL);
        for (String name :
                new String[] {"01-both-faces.csv", "02-drying.csv", "03-one-face-dates.csv", "05-bare-edges.csv"}) {
            assertThat(Samples.assessment(name).fickian()).as(name).isEqualTo(Verdict.PASS);
        }
    }

    /** Stopped at τ = 0.25 a test knows no D; at least 97 of 100 must be refused, and none that ran to 1.2. */
    @Test
    void shortTestsAreRefusedAndLongOnesAreNot() {
        Random random = new Random(31);
        int refused = 0;
        int refusedLong = 0;
        for (int k = 0; k < 400; k++) {
            refused += isRefused(0.25, random) ? 1 : 0;
            refusedLong += isRefused(1.2, random) ? 1 : 0;
        }
        assertThat(refused).isGreaterThanOrEqualTo(388);
        assertThat(refusedLong).isZero();
    }

    private static boolean isRefused(double tau, Random random) {
        return !Assessor.assess(Simulated.run(40, tau, 0, random), AssessmentOptions.usual())
                .determined();
    }

    @Test
    void aTestThatStoppedEarlyHasASlopeAndNoDiffusivity() {
        Assessment a = Samples.assessment("04-stopped-early.csv");

        assertThat(a.usable()).isFalse();
        assertThat(a.combined()).isEmpty();
        for (String name : new String[] {"diffusivity", "equilibriumContent"}) {
            ParameterResult result = a.parameter(name).orElseThrow();
            assertThat(result.value()).isEmpty();
            assertThat(result.standardError()).isEmpty();
            assertThat(result.interval()).isEmpty();
        }
        assertThat(a.checks()).allSatisfy(c -> assertThat(c.diffusivity()).isEmpty());
        ParameterResult slope = a.parameter("initialSlope").orElseThrow();
        // what the generator put in: 2 (M∞ − M0) √(D/π)/L with D = 4.4e-13 m²/s and M∞ = 1.62 %
        double truth = 2 * 0.0162 * Math.sqrt(4.4e-13 / Math.PI) / 1.55e-3;
        Interval interval = slope.interval().orElseThrow();
        assertThat(truth)
                .isBetween(interval.low().getAsDouble(), interval.high().getAsDouble());
        Interval start = a.parameter("startContent").orElseThrow().interval().orElseThrow();
        assertThat(start.isOpen()).isFalse();
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-3, 1e3})
    void aThicknessAThousandTimesOffIsWarnedOf(double factor) {
        Run run = Samples.run("01-both-faces.csv");
        Facts facts = run.facts().withThickness(Quantity.of(2.03e-3 * factor, Unit.METRE));

        Assessment a = Assessor.assess(run.withFacts(facts), AssessmentOptions.usual());

        assertThat(a.problems()).anySatisfy(p -> assertThat(p.code().kind()).isEqualTo(Code.Kind.WARNING));
    }

    @Test
    void massBelowTheDryMassIsWarnedOf() {
        Run run = Samples.run("01-both-faces.csv");
        Facts facts = run.facts().withDryMass(Quantity.of(31.5e-3, Unit.KILOGRAM));

        Assessment a = Assessor.assess(run.withFacts(facts), AssessmentOptions.usual());

        assertThat(a.problems()).anySatisfy(p -> assertThat(p.code()).isEqualTo(Code.BELOW_DRY_MASS));
    }

    @Test
    void dryingCarriesTheCautionsOfOvensAndOfTrappedMoisture() {
        Assessment drying = Samples.assessment("02-drying.csv");
        Assessment uptake = Samples.assessment("01-both-faces.csv");

        assertThat(drying.direction()).isEqualTo(Direction.DRYING);
        assertThat(drying.cautions().size()).isGreaterThan(uptake.cautions().size());
        assertThat(uptake.cautions()).isNotEmpty();
    }
}
