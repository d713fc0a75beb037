package soakline.command;

import java.nio.file.Path;
import java.time.ZoneId;
import java.time.ZonedDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import soakline.inference.Assessment;
import soakline.inference.AssessmentOptions;
import soakline.inference.IntervalMethod;
import soakline.problem.Finding;
import soakline.quantity.Dimension;
import soakline.quantity.Quantity;
import soakline.report.FigureFile;
import soakline.report.FigureType;
import soakline.report.ReportFile;
import soakline.report.ReportInput;
import soakline.report.ReportType;
import soakline.report.ResultFormat;
import soakline.report.SourceFile;
import soakline.session.EstimateCoupons;
import soakline.session.EstimateRequest;
import soakline.session.ReportSources;
import soakline.session.RunReader;
import soakline.specimen.Edges;
import soakline.specimen.Faces;
import soakline.specimen.Facts;
import soakline.workspace.OutputFile;

/** The command {@code estimate}: everything is worked out before anything is written. */
final class EstimateCommand {

    private final EstimateRequest request;
    private final ResultFormat format;
    private final Optional<Path> figure;
    private final Optional<Path> report;

    private EstimateCommand(
            EstimateRequest request, ResultFormat format, Optional<Path> figure, Optional<Path> report) {
        this.request = request;
        this.format = format;
        this.figure = figure;
        this.report = report;
    }

    /** Files as they stand, as text. */
    static EstimateCommand of(Path file) {
        return new EstimateCommand(
                EstimateRequest.of(List.of(file)), ResultFormat.TEXT, Optional.empty(), Optional.empty());
    }

    /**
     * From the words of the command line.
     *
     * @throws soakline.problem.Fault when they make no sense, or the figure or the report could not be written
     */
    static EstimateCommand of(Words words) {
        List<Path> files = new ArrayList<>();
        for (String name : words.files()) {
            files.add(OptionValues.path(name));
        }
        EstimateRequest request =
                EstimateRequest.of(files).withOverrides(facts(words)).withOptions(options(words));
        Optional<String> columns = words.value(EstimateOptions.COLUMNS);
        if (columns.isPresent()) {
            request = request.withColumns(columns.get());
        }
        Optional<String> datePattern = words.value(EstimateOptions.DATE_PATTERN);
        if (datePattern.isPresent()) {
            request = request.withDatePattern(datePattern.get());
        }
        return new EstimateCommand(
                request,
                choice(
                                words,
                                EstimateOptions.FORMAT,
                                List.of(ResultFormat.TEXT.code(), ResultFormat.JSON.code(), ResultFormat.CSV.code()),
                                List.of(ResultFormat.TEXT, ResultFormat.JSON, ResultFormat.CSV))
                        .orElse(ResultFormat.TEXT),
                figure(words),
                report(words));
    }

    int run(RunReader reader, Console console) {
        List<SourceFile> sources = report.isPresent() ? ReportSources.of(request.files()) : List.of();
        EstimateCoupons.Outcome outcome = new EstimateCoupons(reader).run(request, EstimateCoupons.UNWATCHED);
        int status = ExitStatus.DONE;
        for (Finding failure : outcome.failures()) {
            console.tell(failure);
            status = Math.max(status, ExitStatus.of(failure.code()));
        }
        if (status != ExitStatus.DONE) {
            return status;
        }
        List<Assessment> assessments = outcome.assessments();
        String result = format.write(assessments);
        figure.ifPresent(file -> FigureFile.write(file, assessments));
        if (report.isPresent()) {
            ReportSources.requireUnchanged(request.files(), sources);
            ReportFile.write(
                    report.get(), new ReportInput(assessments, sources, ZonedDateTime.now(ZoneId.systemDefault())));
        }
        for (Assessment assessment : assessments) {
            String name = assessment.run().name();
            assessment.notes().forEach(note -> console.tell(note, name));
            assessment.problems().forEach(problem -> console.tell(problem, name));
            if (!assessment.usable()) {
                status = ExitStatus.NOT_USABLE;
            }
        }
        console.result(result);
        return status;
    }

    private static Facts facts(Words words) {
        Facts none = Facts.of("");
        return new Facts(
                none.specimen(),
                length(words, EstimateOptions.THICKNESS, "2.03 mm"),
                length(words, EstimateOptions.WIDTH, "100 mm"),
                length(words, EstimateOptions.LENGTH, "100 mm"),
                choice(words, EstimateOptions.FACES, List.of("both", "one"), List.of(Faces.BOTH, Faces.ONE)),
                choice(words, EstimateOptions.EDGES, List.of("bare", "sealed"), List.of(Edges.BARE, Edges.SEALED)),
                none.temperature(),
                none.medium(),
                words.value(EstimateOptions.DRY_MASS)
                        .map(t -> OptionValues.positive(EstimateOptions.DRY_MASS, t, Dimension.MASS, "31.2041 g")),
                none.balance(),
                none.note(),
                none.other());
    }

    private static AssessmentOptions options(Words words) {
        choice(words, EstimateOptions.MODEL, List.of("fickian"), List.of("fickian"));
        choice(words, EstimateOptions.NOISE, List.of("estimated"), List.of("estimated"));
        AssessmentOptions options = AssessmentOptions.usual()
                .withFixed(FixOptions.fixed(words.values(EstimateOptions.FIX), words.values(EstimateOptions.FREE)));
        Optional<IntervalMethod> method = choice(
                words,
                EstimateOptions.INTERVAL,
                List.of(IntervalMethod.PROFILE.code(), IntervalMethod.LINEARISED.code()),
                List.of(IntervalMethod.PROFILE, IntervalMethod.LINEARISED));
        Optional<String> level = words.value(EstimateOptions.LEVEL);
        if (level.isPresent()) {
            options = options.withLevel(OptionValues.level(EstimateOptions.LEVEL, level.get()));
        }
        return method.isPresent() ? options.withMethod(method.get()) : options;
    }

    /** Looked at before the long work: an ending that is not known and a folder that is not there are said at once. */
    private static Optional<Path> figure(Words words) {
        Optional<Path> figure = words.value(EstimateOptions.FIGURE).map(OptionValues::path);
        figure.ifPresent(file -> {
            FigureType.of(file);
            OutputFile.requireWritable(file);
        });
        return figure;
    }

    private static Optional<Path> report(Words words) {
        Optional<Path> report = words.value(EstimateOptions.REPORT).map(OptionValues::path);
        report.ifPresent(file -> {
            ReportType.of(file);
            OutputFile.requireWritable(file);
        });
        return report;
    }

    private static Optional<Quantity> length(Words words, String option, String example) {
        return words.value(option).map(t -> OptionValues.positive(option, t, Dimension.LENGTH, example));
    }

    private static <T> Optional<T> choice(Words words, String option, List<String> names, List<T> values) {
        return words.value(option).map(t -> OptionValues.oneOf(option, t, names, values));
    }
}
