package soakline.report;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import soakline.inference.Assessment;

class JsonReportTest {

    private static JsonNode coupon(Assessment assessment) throws Exception {
        JsonNode all = new ObjectMapper().readTree(JsonReport.write(List.of(assessment)));
        assertThat(all.isArray()).isTrue();
        return all.get(0);
    }

    private static List<String> keys(JsonNode node) {
        List<String> keys = new ArrayList<>();
        node.fieldNames().forEachRemaining(keys::add);
        return keys;
    }

    @Test
    void aCouponHasTheKeysOfTheContract() throws Exception {
        JsonNode coupon = coupon(InventedAssessments.usable());

        assertThat(keys(coupon))
                .containsExactly(
                        "specimen",
                        "model",
                        "direction",
                        "parameters",
                        "combined",
                        "fit",
                        "checks",
                        "fickian",
                        "usable",
                        "problems",
                        "cautions");
        assertThat(coupon.get("specimen").asText()).isEqualTo("P-07");
        assertThat(coupon.get("model").asText()).isEqualTo("fickian");
        assertThat(coupon.get("direction").asText()).isEqualTo("uptake");
        assertThat(coupon.get("usable").isBoolean()).isTrue();
        assertThat(coupon.get("problems")).isEmpty();
        assertThat(coupon.get("cautions").get(0).asText()).startsWith("The result holds for this temperature");
        assertThat(keys(coupon.get("fickian"))).containsExactly("verdict", "text");
    }

    @Test
    void parametersAreInFullPrecisionWithContentsInPercent() throws Exception {
        JsonNode parameters = coupon(InventedAssessments.usable()).get("parameters");

        JsonNode d = parameters.get(0);
        assertThat(keys(d)).containsExactly("name", "unit", "value", "standardError", "fixed", "interval");
        assertThat(d.get("name").asText()).isEqualTo("diffusivity");
        assertThat(d.get("unit").asText()).isEqualTo("m2/s");
        assertThat(d.get("value").asDouble()).isEqualTo(InventedAssessments.D);
        assertThat(keys(d.get("interval"))).containsExactly("level", "method", "low", "high");
        assertThat(d.get("interval").get("method").asText()).isEqualTo("profile");
        JsonNode level = parameters.get(1);
        assertThat(level.get("name").asText()).isEqualTo("equilibriumContent");
        assertThat(level.get("unit").asText()).isEqualTo("%");
        assertThat(level.get("value").asDouble()).isCloseTo(1.8, within(1e-14));
    }

    @Test
    void aFixedParameterHasNeitherErrorNorInterval() throws Exception {
        JsonNode start = coupon(InventedAssessments.usable()).get("parameters").get(2);

        assertThat(start.get("fixed").asBoolean()).isTrue();
        assertThat(start.get("value").asDouble()).isZero();
        assertThat(start.get("standardError").isNull()).isTrue();
        assertThat(start.get("interval").isNull()).isTrue();
    }

    @Test
    void anOpenSideIsNull() throws Exception {
        JsonNode interval = coupon(InventedAssessments.open(OptionalDouble.empty(), OptionalDouble.of(2e-12)))
                .get("parameters")
                .get(0)
                .get("interval");

        assertThat(interval.get("low").isNull()).isTrue();
        assertThat(interval.get("high").asDouble()).isEqualTo(2e-12);
    }

    @Test
    void theBudgetNamesItsSharesWhichSumToOne() throws Exception {
        JsonNode d = coupon(InventedAssessments.usable()).get("combined").get("diffusivity");

        assertThat(keys(d)).contains("standardUncertainty", "low", "high", "contributions");
        assertThat(keys(d.get("contributions").get(0))).contains("source", "share");
        double sum = 0;
        for (JsonNode contribution : d.get("contributions")) {
            sum += contribution.get("share").asDouble();
        }
        assertThat(sum).isEqualTo(1);
    }

    @Test
    void theFitCountsAllWeighingsAndThoseUsed() throws Exception {
        JsonNode fit = coupon(InventedAssessments.usable()).get("fit");

        assertThat(keys(fit))
                .containsExactly(
                        "weighings",
                        "used",
                        "degreesOfFreedom",
                        "residualStandardDeviation",
                        "converged",
                        "evaluations");
        assertThat(fit.get("weighings").asInt()).isEqualTo(20);
        assertThat(fit.get("used").asInt()).isEqualTo(19);
        assertThat(fit.get("residualStandardDeviation").asDouble()).isBetween(1e-4, 1e-2);
    }

    @Test
    void aCheckHasItsFiguresByNameAndNoNumberIsNoNumber() throws Exception {
        JsonNode check = coupon(InventedAssessments.usable()).get("checks").get(0);

        assertThat(keys(check))
                .containsExactly(
                        "name",
                        "verdict",
                        "diffusivity",
                        "low",
                        "high",
                        "ratioToFit",
                        "pValue",
                        "intercept",
                        "weighings",
                        "text");
        assertThat(check.get("name").asText()).isEqualTo("short-time-slope");
        assertThat(check.get("pValue").isNull()).isTrue();
        assertThat(check.get("intercept").asDouble()).isCloseTo(0.02, within(1e-15));
    }

    @Test
    void aTestStoppedEarlyHasNoDiffusivityAnywhere() throws Exception {
        String text = JsonReport.write(List.of(InventedAssessments.stoppedEarly()));
        JsonNode coupon = new ObjectMapper().readTree(text).get(0);

        assertThat(text).doesNotContain("1.23", "1.1111", "1.3579", "6.5E-14");
        assertThat(coupon.get("usable").asBoolean()).isFalse();
        assertThat(coupon.get("combined").isNull()).isTrue();
        for (int i : new int[] {0, 1}) {
            JsonNode parameter = coupon.get("parameters").get(i);
            assertThat(parameter.get("value").isNull()).isTrue();
            assertThat(parameter.get("standardError").isNull()).isTrue();
            assertThat(parameter.get("interval").isNull()).isTrue();
        }
        JsonNode slope = coupon.get("parameters").get(3);
        assertThat(slope.get("name").asText()).isEqualTo("initialSlope");
        assertThat(slope.get("unit").asText()).isEqualTo("%/s^0.5");
        assertThat(slope.get("value").asDouble()).isCloseTo(1.5e-3, within(1e-12));
        assertThat(slope.get("interval").isObject()).isTrue();
        assertThat(coupon.get("problems").get(0).asText()).startsWith("D is not determined");
    }

    @Test
    void anApparentDiffusivityIsCalledSo() throws Exception {
        JsonNode fickian = coupon(InventedAssessments.apparent()).get("fickian");

        assertThat(fickian.get("verdict").asText()).isEqualTo("fail");
        assertThat(fickian.get("text").asText()).contains("apparent D");
    }

    @Test
    void severalCouponsAreSeveralObjects() throws Exception {
        JsonNode all = new ObjectMapper()
                .readTree(JsonReport.write(
                        List.of(InventedAssessments.usable("A", 1e-12), InventedAssessments.usable("B", 2e-12))));

        assertThat(all).hasSize(2);
        assertThat(all.get(1).get("specimen").asText()).isEqualTo("B");
    }
}
