package loopwright.session;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.design.Design;
import loopwright.design.Reading;
import loopwright.file.DesignFile;
import loopwright.file.FileException;
import loopwright.part.Shelf;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;
import loopwright.task.Progress;
import loopwright.task.Receiver;
import loopwright.task.SameThreadRunner;
import loopwright.task.TaskRunner;
import loopwright.task.Work;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The open design, without a window. */
class SessionTest {
  @TempDir private Path folder;

  private final Design opened = SampleDesigns.coilAmplifier();
  private final Design edited = SampleDesigns.withGainLoad(opened, "10k");
  private final DesignFile files =
      new DesignFile(Shelf.empty(), Map.of("closedLoopGain", Unit.ONE));
  private final List<String> asked = new ArrayList<>();

  @Test
  void everyFigureIsOfThePresentEdit() {
    Session session = session();
    assertThat(session.snapshot().current()).isTrue();
    assertThat(gain(session)).isEqualTo(8.2);

    session.edit(Edit.of("Load 10k", edited));
    assertThat(session.snapshot().current()).isTrue();
    assertThat(session.snapshot().newest().orElseThrow().design()).isEqualTo(edited);
    assertThat(gain(session)).isEqualTo(10);
  }

  @Test
  void undoBringsBackTheDesignAndItsFigures() {
    Session session = session();
    session.edit(Edit.of("Load 10k", edited));
    assertThat(session.snapshot().undoable()).contains("Load 10k");
    session.undo();
    assertThat(session.snapshot().design()).isEqualTo(opened);
    assertThat(gain(session)).isEqualTo(8.2);
    session.redo();
    assertThat(gain(session)).isEqualTo(10);
  }

  @Test
  void anEditThatChangesNothingIsNone() {
    Session session = session();
    session.edit(Edit.of("Load 8k2", SampleDesigns.coilAmplifier()));
    assertThat(session.snapshot().undoable()).isEmpty();
    assertThat(asked).hasSize(1);
  }

  @Test
  void unsavedIsWhatTheFileDoesNotHold() {
    Path file = stored(opened);
    Session session = session();
    assertThat(session.snapshot().unsaved()).isTrue();
    session.open(file);
    assertThat(session.snapshot().unsaved()).isFalse();
    session.edit(Edit.of("Load 10k", edited));
    assertThat(session.snapshot().unsaved()).isTrue();
    session.undo();
    assertThat(session.snapshot().unsaved()).isFalse();
    session.redo();
    session.save(file);
    assertThat(session.snapshot().unsaved()).isFalse();
    assertThat(files.read(file).design()).isEqualTo(session.snapshot().design());
    session.undo();
    assertThat(session.snapshot().unsaved()).isTrue();
  }

  @Test
  void aFileThatCannotBeReadLeavesThePresentDesign() throws IOException {
    Session session = session();
    session.edit(Edit.of("Load 10k", edited));
    Path missing = folder.resolve("missing.json");
    assertThatThrownBy(() -> session.open(missing))
        .isInstanceOf(FileException.class)
        .hasMessageContaining("missing.json");
    Path broken = Files.writeString(folder.resolve("broken.json"), "{\"loopwright\": 1");
    assertThatThrownBy(() -> session.open(broken)).isInstanceOf(FileException.class);
    assertThat(session.snapshot().design()).isEqualTo(edited);
    assertThat(session.snapshot().path()).isEmpty();
  }

  @Test
  void openingForgetsTheHistoryAndTheOldResults() {
    Path file = stored(edited);
    Session session = session();
    session.choose("follower");
    session.open(file);
    assertThat(session.snapshot().undoable()).isEmpty();
    assertThat(session.snapshot().hookup()).isEqualTo("divider");
    assertThat(session.snapshot().solved()).containsOnlyKeys("divider");
    assertThat(gain(session)).isEqualTo(10);
  }

  @Test
  void eachHookupIsSolvedWhenItIsLookedAtAndNotAgain() {
    Session session = session();
    session.choose("follower");
    session.choose("divider");
    session.choose("follower");
    assertThat(asked).containsExactly("divider", "follower");
    session.edit(Edit.of("Load 10k", edited));
    session.choose("divider");
    assertThat(asked).containsExactly("divider", "follower", "follower", "divider");
    assertThatThrownBy(() -> session.choose("bridge")).hasMessageContaining("bridge");
  }

  @Test
  void aMeasuredValueBecomesAReadingAndCanBeUndone() {
    Session session = session();
    session.measure(Predictions.LOAD, Optional.of(Quantity.parse("9.8", Unit.ONE)));
    session.choose("follower");
    session.measure(Predictions.LOAD, Optional.of(Quantity.parse("0.99", Unit.ONE)));
    session.measure(Predictions.LOAD, Optional.of(Quantity.parse("1", Unit.ONE)));
    List<Reading> readings = session.snapshot().design().bench().readings();
    assertThat(readings).hasSize(2);
    assertThat(readings).extracting(Reading::quantity).containsOnly("closedLoopGain");
    assertThat(readings)
        .extracting(reading -> reading.hookup().orElseThrow())
        .containsExactly("divider", "follower");
    assertThat(readings).extracting(reading -> reading.value().value()).containsExactly(9.8, 1.0);
    assertThat(Readings.newest(session.snapshot().design(), "follower", "closedLoopGain"))
        .map(reading -> reading.value().spelling())
        .contains("1");

    session.measure(Predictions.LOAD, Optional.empty());
    assertThat(session.snapshot().design().bench().readings()).hasSize(1);
    assertThat(session.snapshot().undoable()).contains("Clear measured Closed-loop gain");
    session.undo();
    assertThat(session.snapshot().design().bench().readings()).hasSize(2);
  }

  @Test
  void aFailureIsOfItsEditAlone() {
    Session session =
        new Session(
            files,
            (design, hookups, progress) -> {
              if (design.equals(edited)) {
                throw new IllegalArgumentException("the gain stage has no path to its rail");
              }
              return Predictions.assess(design, hookups);
            },
            new SameThreadRunner(),
            opened);
    session.edit(Edit.of("Load 10k", edited));
    Snapshot failed = session.snapshot();
    assertThat(failed.failure().map(Failure::says))
        .contains("the gain stage has no path to its rail");
    assertThat(failed.unsolved()).contains("the gain stage has no path to its rail");
    assertThat(failed.current()).isFalse();
    assertThat(failed.solving()).isFalse();
    session.undo();
    assertThat(session.snapshot().failure()).isEmpty();
    assertThat(session.snapshot().unsolved()).isEmpty();
    assertThat(session.snapshot().current()).isTrue();
  }

  @Test
  void whileItSolvesTheOldFiguresAreKnownToBeOld() {
    WaitingRunner runner = new WaitingRunner();
    Session session =
        new Session(
            files,
            (design, hookups, progress) -> Predictions.assess(design, hookups),
            runner,
            opened);
    assertThat(session.snapshot().solving()).isTrue();
    assertThat(session.snapshot().prediction()).isEmpty();
    runner.finish();
    session.edit(Edit.of("Load 10k", edited));
    assertThat(session.snapshot().solving()).isTrue();
    assertThat(session.snapshot().current()).isFalse();
    assertThat(gain(session)).isEqualTo(8.2);
    runner.finish();
    assertThat(session.snapshot().solving()).isFalse();
    assertThat(session.snapshot().current()).isTrue();
    assertThat(gain(session)).isEqualTo(10);
  }

  @Test
  void listenersHearOfEveryChange() {
    Session session = session();
    List<Boolean> heard = new ArrayList<>();
    session.onChange(snapshot -> heard.add(snapshot.current()));
    session.edit(Edit.of("Load 10k", edited));
    assertThat(heard).isNotEmpty();
    assertThat(heard.get(heard.size() - 1)).isTrue();
  }

  private Path stored(Design design) {
    Path file = folder.resolve("coil.json");
    files.save(file, design, Optional.empty());
    return file;
  }

  /** What takes long comes after what was shown first, also when another hookup came between. */
  @Test
  void fillsInWhatWasLeftOut() {
    List<Assessment> completed = new ArrayList<>();
    PredictionSource source =
        new PredictionSource() {
          @Override
          public Assessment assess(Design design, List<String> hookups, Progress progress) {
            return Predictions.assess(design, hookups);
          }

          @Override
          public boolean leavesOut(Assessment first) {
            return !completed.contains(first);
          }

          @Override
          public Assessment complete(Assessment first, Progress progress) {
            Assessment whole =
                Predictions.assess(
                    first.prediction().design(),
                    List.of(first.prediction().hookups().get(0).hookup().name()),
                    solved -> solved + 1);
            completed.add(whole);
            return whole;
          }
        };
    Session session = new Session(files, source, new SameThreadRunner(), opened);
    assertThat(completed).hasSize(1);
    assertThat(session.snapshot().current()).isTrue();
    assertThat(session.snapshot().newest().orElseThrow().assessment()).isSameAs(completed.get(0));
    session.edit(Edit.of("Load 10k", edited));
    assertThat(completed).hasSize(2);
    assertThat(session.snapshot().newest().orElseThrow().assessment()).isSameAs(completed.get(1));
    session.undo();
    assertThat(completed).hasSize(3);
  }

  private Session session() {
    return new Session(
        files,
        (design, hookups, progress) -> {
          asked.addAll(hookups);
          return Predictions.assess(design, hookups);
        },
        new SameThreadRunner(),
        opened);
  }

  private static double gain(Session session) {
    return session
        .snapshot()
        .prediction()
        .orElseThrow()
        .figures()
        .get("closedLoopGain")
        .solved()
        .number()
        .orElseThrow();
  }

  /** Keeps the newest request until the test wants it done. */
  private static final class WaitingRunner implements TaskRunner {
    private final SameThreadRunner later = new SameThreadRunner();
    private Runnable newest = () -> {};

    @Override
    public <T> void run(Work<T> work, Receiver<T> receiver) {
      newest = () -> later.run(work, receiver);
    }

    void finish() {
      newest.run();
    }

    @Override
    public void cancel() {
      newest = () -> {};
    }

    @Override
    public void close() {
      cancel();
    }
  }
}
