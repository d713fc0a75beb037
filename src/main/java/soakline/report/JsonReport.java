package soakline.report;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.core.util.Separators;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import soakline.estimate.Estimate;
import soakline.estimate.Parameter;
import soakline.inference.Assessment;
import soakline.inference.Check;
import soakline.inference.CombinedUncertainty;
import soakline.inference.CombinedUncertainty.Contribution;
import soakline.inference.Interval;
import soakline.inference.ParameterResult;
import soakline.problem.Finding;
import soakline.quantity.ResultUnit;
import soakline.wording.Wording;

/**
 * The machine-readable result: an array with an object for each coupon, in SI with contents in percent and in full precision.
 * What is not known, not finite or open is {@code null}.
 */
public final class JsonReport {

    private final JsonGenerator json;

    private JsonReport(JsonGenerator json) {
        this.json = json;
    }

    public static String write(List<Assessment> assessments) {
        StringWriter text = new StringWriter();
        DefaultIndenter indenter = new DefaultIndenter("  ", "\n");
        DefaultPrettyPrinter printer = new DefaultPrettyPrinter(
                Separators.createDefaultInstance().withObjectFieldValueSpacing(Separators.Spacing.AFTER));
        printer.indentArraysWith(indenter);
        printer.indentObjectsWith(indenter);
        try (JsonGenerator json = new JsonFactory().createGenerator(text)) {
            json.setPrettyPrinter(printer);
            JsonReport report = new JsonReport(json);
            json.writeStartArray();
            for (Assessment assessment : assessments) {
                report.coupon(assessment);
            }
            json.writeEndArray();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return text.append('\n').toString();
    }

    private void coupon(Assessment a) throws IOException {
        json.writeStartObject();
        json.writeStringField("specimen", a.run().name());
        json.writeStringField("model", a.estimate().model().name());
        json.writeStringField("direction", a.direction().code());
        json.writeArrayFieldStart("parameters");
        for (ParameterResult result : a.parameters()) {
            parameter(result);
        }
        json.writeEndArray();
        combined(a);
        fit(a);
        json.writeArrayFieldStart("checks");
        for (Check check : a.checks()) {
            check(check, a.determined());
        }
        json.writeEndArray();
        json.writeObjectFieldStart("fickian");
        json.writeStringField("verdict", a.fickian().code());
        json.writeStringField("text", Wording.sentence(a.fickianFinding()));
        json.writeEndObject();
        json.writeBooleanField("usable", a.usable());
        sentences("problems", a.problems());
        sentences("cautions", a.cautions());
        json.writeEndObject();
    }

    private void parameter(ParameterResult result) throws IOException {
        Parameter parameter = result.parameter();
        ResultUnit unit = parameter.unit();
        json.writeStartObject();
        json.writeStringField("name", parameter.name());
        json.writeStringField("unit", unit.code());
        number("value", result.value(), unit);
        number("standardError", result.standardError(), unit);
        json.writeBooleanField("fixed", result.fixed());
        Optional<Interval> interval = result.interval();
        if (interval.isPresent()) {
            json.writeObjectFieldStart("interval");
            number("level", interval.get().level());
            json.writeStringField("method", interval.get().method().code());
            number("low", interval.get().low(), unit);
            number("high", interval.get().high(), unit);
            json.writeEndObject();
        } else {
            json.writeNullField("interval");
        }
        json.writeEndObject();
    }

    private void combined(Assessment a) throws IOException {
        if (a.combined().isEmpty() || !a.determined()) {
            json.writeNullField("combined");
            return;
        }
        CombinedUncertainty combined = a.combined().get();
        json.writeObjectFieldStart("combined");
        json.writeObjectFieldStart("diffusivity");
        number("level", combined.level());
        number("standardUncertainty", combined.standardUncertainty());
        number("low", combined.low(), ResultUnit.SQUARE_METRE_PER_SECOND);
        number("high", combined.high(), ResultUnit.SQUARE_METRE_PER_SECOND);
        number("effectiveDegreesOfFreedom", combined.effectiveDegreesOfFreedom());
        json.writeArrayFieldStart("contributions");
        for (Contribution contribution : combined.contributions()) {
            json.writeStartObject();
            json.writeStringField("source", contribution.source());
            number("sensitivity", contribution.sensitivity());
            number("relativeUncertainty", contribution.relativeUncertainty());
            number("share", contribution.share());
            json.writeEndObject();
        }
        json.writeEndArray();
        json.writeEndObject();
        json.writeEndObject();
    }

    private void fit(Assessment a) throws IOException {
        Estimate estimate = a.estimate();
        json.writeObjectFieldStart("fit");
        json.writeNumberField("weighings", a.run().weighings().size());
        json.writeNumberField("used", estimate.task().data().size());
        json.writeNumberField("degreesOfFreedom", estimate.degreesOfFreedom());
        number("residualStandardDeviation", ResultUnit.PERCENT.fromSi(estimate.residualStandardDeviation()));
        json.writeBooleanField("converged", estimate.isOptimum());
        json.writeNumberField("evaluations", estimate.evaluations());
        json.writeEndObject();
    }

    private void check(Check check, boolean determined) throws IOException {
        json.writeStartObject();
        json.writeStringField("name", check.name().code());
        json.writeStringField("verdict", check.verdict().code());
        // a D that the data do not determine is not to be had from a check either
        ResultUnit unit = ResultUnit.SQUARE_METRE_PER_SECOND;
        number("diffusivity", determined ? check.diffusivity() : OptionalDouble.empty(), unit);
        number("low", determined ? check.low() : OptionalDouble.empty(), unit);
        number("high", determined ? check.high() : OptionalDouble.empty(), unit);
        number("ratioToFit", check.ratioToFit(), ResultUnit.NONE);
        number("pValue", check.pValue(), ResultUnit.NONE);
        for (Check.Figure figure : check.figures()) {
            number(figure.name(), CheckFigures.unit(figure).fromSi(figure.value()));
        }
        json.writeStringField("text", Wording.sentence(check.finding()));
        json.writeEndObject();
    }

    private void sentences(String name, List<Finding> findings) throws IOException {
        json.writeArrayFieldStart(name);
        for (Finding finding : findings) {
            json.writeString(Wording.sentence(finding));
        }
        json.writeEndArray();
    }

    private void number(String name, OptionalDouble si, ResultUnit unit) throws IOException {
        number(name, si.isPresent() ? unit.fromSi(si.getAsDouble()) : Double.NaN);
    }

    private void number(String name, double value) throws IOException {
        if (Double.isFinite(value)) {
            json.writeNumberField(name, value);
        } else {
            json.writeNullField(name);
        }
    }
}
