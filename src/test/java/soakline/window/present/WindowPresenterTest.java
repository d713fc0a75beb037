package soakline.window.present;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import soakline.inference.Verdict;
import soakline.session.HeldTasks;
import soakline.specimen.Faces;
import soakline.window.present.FactsAnswer.Field;
import soakline.window.present.WindowState.Asking;
import soakline.window.present.WindowState.Result;
import soakline.window.present.WindowState.Unusable;
import soakline.window.present.WindowState.Welcome;

class WindowPresenterTest {

    private final List<WindowState> seen = new ArrayList<>();
    private final WindowPresenter presenter = presenter(HeldTasks.atOnce());

    @Test
    void beginsWithTheSamples() {
        presenter.start();

        assertThat(presenter.state().title()).isEqualTo("Soakline");
        assertThat(((Welcome) presenter.state().content()).samples())
                .extracting(WindowState.Sample::words)
                .containsExactly("Plateau", "Stopped early", "Second stage", "Several");
    }

    @Test
    void aFileIsReadEstimatedAndShown() {
        presenter.open(Path.of("01-plateau.csv"));

        assertThat(presenter.state().title()).isEqualTo("Soakline – 01-plateau.csv");
        assertThat(presenter.state().status()).isEqualTo("40 weighings, 2 of them set aside");
        assertThat(presenter.state().waiting()).isEmpty();
        Findings findings = findings();
        assertThat(findings.headline().verdict()).isEqualTo(Verdict.PASS);
        assertThat(findings.headline().large()).matches("D = \\d\\.\\d+×10⁻¹[²³] m²/s");
        assertThat(findings.parameters()).extracting(Findings.Row::name).contains("D, diffusivity", "D, combined");
        assertThat(findings.checks())
                .hasSizeGreaterThan(8)
                .allMatch(c -> !c.sentence().isEmpty());
        assertThat(seen).anyMatch(s -> s.waiting().isPresent());
    }

    @Test
    void notDeterminedShowsNoNumberForD() {
        presenter.openSample("02-stopped-early.csv");

        Findings findings = findings();
        assertThat(findings.headline().large()).isEqualTo("D not determined");
        assertThat(findings.parameters().get(0).value()).isEqualTo("not determined");
        assertThat(findings.checks()).allMatch(c -> c.detail().isEmpty());
        assertThat(findings.problems()).isNotEmpty();
    }

    @Test
    void notFickianIsCalledApparent() {
        presenter.openSample("03-second-stage.csv");

        assertThat(findings().headline().large()).startsWith("apparent D = ");
        assertThat(findings().headline().verdict()).isEqualTo(Verdict.FAIL);
        assertThat(findings().parameters().get(0).name()).isEqualTo("apparent D");
        assertThat(findings().checks()).noneMatch(c -> c.detail().startsWith("D "));
    }

    @Test
    void aFileThatCannotBeReadLeavesWhatWasShown() {
        presenter.open(Path.of("01-plateau.csv"));
        presenter.open(Path.of("broken.csv"));

        assertThat(presenter.state().message().orElseThrow())
                .startsWith("broken.csv, line 3, column 2: ")
                .contains("mass");
        assertThat(presenter.state().title()).isEqualTo("Soakline – 01-plateau.csv");
        assertThat(presenter.state().content()).isInstanceOf(Result.class);
        presenter.closeMessage();
        assertThat(presenter.state().message()).isEmpty();
    }

    @Test
    void couponsOfOneFileAreChosenAmong() {
        presenter.openSample("04-several.csv");
        assertThat(presenter.state().coupons()).hasSize(3);
        Result first = (Result) presenter.state().content();
        presenter.select(1);
        assertThat(findings().headline().large()).isEqualTo("D not determined");
        presenter.select(2);
        assertThat(presenter.state().content()).isInstanceOf(Unusable.class);
        assertThat(presenter.state().message().orElseThrow()).contains("usable weighings");
        presenter.select(0);
        assertThat(((Result) presenter.state().content()).assessment()).isSameAs(first.assessment());
    }

    @Test
    void missingFactsAreAskedForAndNeverAssumed() {
        presenter.open(Path.of("no-facts.csv"));
        Question question = ((Asking) presenter.state().content()).question();
        assertThat(question).isEqualTo(new Question("P-10", true, true, false, false));

        assertThat(presenter.answer(answer("2", Optional.empty(), false)))
                .containsOnlyKeys(Field.THICKNESS, Field.FACES)
                .hasEntrySatisfying(Field.THICKNESS, c -> assertThat(c).contains("has no unit"));
        assertThat(presenter.answer(answer("2 furlong", Optional.of(Faces.BOTH), false)))
                .containsOnlyKeys(Field.THICKNESS);
        assertThat(presenter.answer(answer("0 mm", Optional.of(Faces.BOTH), false)))
                .containsOnlyKeys(Field.THICKNESS);
        assertThat(presenter.answer(answer("2 mm", Optional.of(Faces.BOTH), false)))
                .isEmpty();
        assertThat(findings().headline().large()).startsWith("D = ");
    }

    @Test
    void anAnswerHoldsForAllOnlyWhenAskedTo() {
        presenter.open(Path.of("no-facts-several.csv"));
        presenter.answer(answer("2 mm", Optional.of(Faces.BOTH), false));
        presenter.select(1);
        assertThat(presenter.state().content()).isInstanceOf(Asking.class);

        presenter.open(Path.of("no-facts-several.csv"));
        presenter.answer(answer("2 mm", Optional.of(Faces.BOTH), true));
        presenter.select(1);
        assertThat(presenter.state().content()).isInstanceOf(Result.class);
    }

    @Test
    void workCanBeStoppedAndWhatWasShownStays() {
        HeldTasks held = HeldTasks.onDemand();
        WindowPresenter slow = presenter(held);
        slow.openSample("01-plateau.csv");
        assertThat(slow.state().waiting().orElseThrow().sentence()).isEqualTo("Reading 01-plateau.csv …");
        slow.cancel();
        held.runNext();

        assertThat(slow.state().waiting()).isEmpty();
        assertThat(slow.state().content()).isInstanceOf(Welcome.class);
        assertThat(slow.state().message()).isPresent();
    }

    @Test
    void theLaterOfTwoFilesWins() {
        HeldTasks held = HeldTasks.onDemand();
        WindowPresenter slow = presenter(held);
        slow.openSample("01-plateau.csv");
        slow.openSample("02-stopped-early.csv");
        while (held.waiting() > 0) {
            held.runNext();
        }

        assertThat(slow.state().file()).isEqualTo("02-stopped-early.csv");
        assertThat(slow.state().message()).isEmpty();
    }

    @Test
    void oneFileIsDroppedAtATime() {
        presenter.drop(List.of(Path.of("a.csv"), Path.of("b.csv")));
        assertThat(presenter.state().message().orElseThrow()).contains("one file at a time");
        presenter.drop(List.of(Path.of("01-plateau.csv")));
        assertThat(presenter.state().content()).isInstanceOf(Result.class);
    }

    private WindowPresenter presenter(HeldTasks tasks) {
        return new WindowPresenter(new InventedService(), tasks, seen::add);
    }

    private Findings findings() {
        return ((Result) presenter.state().content()).findings();
    }

    private static FactsAnswer answer(String thickness, Optional<Faces> faces, boolean forAll) {
        return new FactsAnswer(Map.of(Field.THICKNESS, thickness), faces, forAll);
    }
}
