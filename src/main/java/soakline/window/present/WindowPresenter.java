package soakline.window.present;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Consumer;
import soakline.inference.Assessment;
import soakline.inference.AssessmentOptions;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.problem.Finding;
import soakline.session.BackgroundTasks;
import soakline.session.BackgroundTasks.Outcome;
import soakline.session.BackgroundTasks.Work;
import soakline.session.LatestTask;
import soakline.specimen.Run;
import soakline.specimen.Weighings;
import soakline.window.present.WindowState.Asking;
import soakline.window.present.WindowState.Content;
import soakline.window.present.WindowState.Result;
import soakline.window.present.WindowState.Sample;
import soakline.window.present.WindowState.Unusable;
import soakline.window.present.WindowState.Waiting;
import soakline.wording.Wording;

/** Decides what the window shows. Called from one thread; every change reaches the view as a whole new state. */
public final class WindowPresenter {

    private final CouponService service;
    private final LatestTask latest;
    private final Consumer<WindowState> view;
    private WindowState state;
    private List<Run> runs = List.of();
    private final Map<Integer, Assessment> assessed = new HashMap<>();

    public WindowPresenter(CouponService service, BackgroundTasks tasks, Consumer<WindowState> view) {
        this.service = service;
        this.latest = new LatestTask(tasks);
        this.view = view;
        this.state = WindowState.welcome(
                service.samples().stream().map(WindowPresenter::sample).toList());
    }

    /** Shows the first state. */
    public void start() {
        view.accept(state);
    }

    public WindowState state() {
        return state;
    }

    /** Opens a file; what is shown stays until it is read. */
    public void open(Path file) {
        Path name = file.getFileName();
        read(name == null ? file.toString() : name.toString(), progress -> service.read(file, progress));
    }

    /** Opens one of the sample runs. */
    public void openSample(String name) {
        read(name, progress -> service.readSample(name, progress));
    }

    /** Opens what was dropped on the window: one file. */
    public void drop(List<Path> files) {
        if (files.size() == 1) {
            open(files.get(0));
        } else if (!files.isEmpty()) {
            show(state.withMessage(Wording.text(Finding.of(Code.DROP_ONE_FILE, files.size()))));
        }
    }

    /** Shows another coupon of the file. */
    public void select(int coupon) {
        if (coupon >= 0 && coupon < runs.size() && coupon != state.selected()) {
            latest.drop();
            present(state.withSelected(coupon).withoutMessage().withoutWaiting());
        }
    }

    /**
     * Takes the facts that were missing.
     *
     * @return complaints by field; empty when the answer was taken
     */
    public Map<FactsAnswer.Field, String> answer(FactsAnswer answer) {
        if (!(state.content() instanceof Asking asking)) {
            return Map.of();
        }
        FactsAnswer.Reading reading = answer.read(asking.question());
        if (!reading.complaints().isEmpty()) {
            return reading.complaints();
        }
        List<Run> next = new ArrayList<>(runs);
        for (int i = 0; i < next.size(); i++) {
            Run run = next.get(i);
            if (i == state.selected()
                    || (answer.forAll() && !Question.about(run, false).isEmpty())) {
                // the file's own facts win: the answer only fills what it left open
                next.set(i, run.withFacts(reading.facts().overriddenBy(run.facts())));
            }
        }
        runs = List.copyOf(next);
        present(state.withoutMessage());
        return Map.of();
    }

    /** Stops the work in the background. */
    public void cancel() {
        latest.cancel();
    }

    public void closeMessage() {
        show(state.withoutMessage());
    }

    private void read(String name, Work<List<Run>> work) {
        run(Code.WAIT_READING, name, work, found -> {
            runs = List.copyOf(found);
            assessed.clear();
            List<String> names = runs.stream().map(Run::name).toList();
            present(state.withFile(name, names).withoutWaiting().withoutMessage());
        });
    }

    /** Shows the selected coupon: its result when there is one, a question when facts are missing, else estimates it. */
    private void present(WindowState from) {
        int coupon = from.selected();
        Run run = runs.get(coupon);
        Assessment known = assessed.get(coupon);
        Question question = Question.about(run, othersLackFacts(coupon));
        WindowState next = from.withStatus(status(run));
        if (known != null) {
            show(next.withContent(new Result(known, FindingsWriter.write(known))));
        } else if (!question.isEmpty()) {
            show(next.withContent(new Asking(question)));
        } else {
            show(next);
            estimate(coupon, run);
        }
    }

    private boolean othersLackFacts(int coupon) {
        for (int i = 0; i < runs.size(); i++) {
            if (i != coupon && !Question.about(runs.get(i), false).isEmpty()) {
                return true;
            }
        }
        return false;
    }

    private void estimate(int coupon, Run run) {
        Work<Assessment> work = progress -> service.assess(run, AssessmentOptions.usual());
        run(Code.WAIT_ESTIMATING, run.name(), work, assessment -> {
            assessed.put(coupon, assessment);
            show(state.withContent(new Result(assessment, FindingsWriter.write(assessment)))
                    .withoutWaiting());
        });
    }

    private <T> void run(Code waiting, String what, Work<T> work, Consumer<T> then) {
        boolean estimating = waiting == Code.WAIT_ESTIMATING;
        String sentence = Wording.sentence(Finding.of(waiting, what));
        show(state.withWaiting(new Waiting(sentence, OptionalDouble.empty())));
        latest.start(work, new Outcome<>() {
            @Override
            public void progress(double share) {
                show(state.withWaiting(new Waiting(sentence, OptionalDouble.of(share))));
            }

            @Override
            public void done(T result) {
                then.accept(result);
            }

            @Override
            public void failed(Exception reason) {
                String text = sentence(reason);
                show(afterNoResult(estimating, what, text).withMessage(text).withoutWaiting());
            }

            @Override
            public void cancelled() {
                String text = Wording.text(Finding.of(Code.WAIT_CANCELLED));
                show(afterNoResult(estimating, what, text).withMessage(text).withoutWaiting());
            }
        });
    }

    /** A file that cannot be read leaves what was shown; a coupon that cannot be estimated must not stand under another's result. */
    private WindowState afterNoResult(boolean estimating, String coupon, String text) {
        return estimating && !showsSelected() ? state.withContent(new Unusable(coupon, text)) : state;
    }

    private boolean showsSelected() {
        Content content = state.content();
        return content instanceof Result result && result.assessment().run().equals(runs.get(state.selected()));
    }

    private void show(WindowState next) {
        state = next;
        view.accept(next);
    }

    private static String sentence(Exception reason) {
        Finding finding = reason instanceof Fault fault
                ? fault.finding()
                : Finding.of(
                        Code.UNEXPECTED,
                        Optional.ofNullable(reason.getMessage())
                                .orElse(reason.getClass().getSimpleName()));
        return Wording.text(finding);
    }

    private static String status(Run run) {
        Weighings weighings = run.weighings();
        String count = String.format(Locale.ROOT, "%,d weighings", weighings.size());
        int aside = weighings.size() - weighings.used();
        return aside == 0 ? count : count + String.format(Locale.ROOT, ", %,d of them set aside", aside);
    }

    private static Sample sample(String file) {
        String words = file.replaceFirst("\\.[A-Za-z]+$", "")
                .replaceFirst("^\\d+[-_ ]*", "")
                .replace('-', ' ')
                .replace('_', ' ');
        return new Sample(
                file, words.isEmpty() ? file : words.substring(0, 1).toUpperCase(Locale.ROOT) + words.substring(1));
    }
}
