package loopwright.session;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.design.Design;
import loopwright.design.Reading;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;
import loopwright.task.Receiver;
import loopwright.task.SameThreadRunner;
import loopwright.task.TaskRunner;
import loopwright.task.Work;
import org.junit.jupiter.api.Test;

/** The open design, without a window. */
class SessionTest {
  private static final Path FILE = Path.of("coil.json");

  private final Design opened = SampleDesigns.coilAmplifier();
  private final Design edited = SampleDesigns.withGainLoad(opened, "10k");
  private final MemoryStore store = new MemoryStore();
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
  void unsavedIsWhatTheFileDoesNotHold() throws IOException {
    store.files.put(FILE, opened);
    Session session = session();
    assertThat(session.snapshot().unsaved()).isTrue();
    session.open(FILE);
    assertThat(session.snapshot().unsaved()).isFalse();
    session.edit(Edit.of("Load 10k", edited));
    assertThat(session.snapshot().unsaved()).isTrue();
    session.undo();
    assertThat(session.snapshot().unsaved()).isFalse();
    session.redo();
    session.save(FILE);
    assertThat(session.snapshot().unsaved()).isFalse();
    assertThat(store.files).containsEntry(FILE, edited);
    session.undo();
    assertThat(session.snapshot().unsaved()).isTrue();
  }

  @Test
  void aFileThatCannotBeReadLeavesThePresentDesign() {
    Session session = session();
    session.edit(Edit.of("Load 10k", edited));
    assertThatThrownBy(() -> session.open(FILE)).hasMessage("coil.json: not there");
    assertThat(session.snapshot().design()).isEqualTo(edited);
    assertThat(session.snapshot().path()).isEmpty();
  }

  @Test
  void openingForgetsTheHistoryAndTheOldResults() throws IOException {
    store.files.put(FILE, edited);
    Session session = session();
    session.choose("follower");
    session.open(FILE);
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
            store,
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
    assertThat(failed.current()).isFalse();
    assertThat(failed.solving()).isFalse();
    session.undo();
    assertThat(session.snapshot().failure()).isEmpty();
    assertThat(session.snapshot().current()).isTrue();
  }

  @Test
  void whileItSolvesTheOldFiguresAreKnownToBeOld() {
    WaitingRunner runner = new WaitingRunner();
    Session session =
        new Session(
            store,
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

  private Session session() {
    return new Session(
        store,
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

  /** Files in memory. */
  private static final class MemoryStore implements DesignStore {
    private final Map<Path, Design> files = new HashMap<>();

    @Override
    public Stored open(Path path) throws IOException {
      if (!files.containsKey(path)) {
        throw new IOException(path + ": not there");
      }
      return new MemoryDesign(files.get(path));
    }

    @Override
    public Stored create(Path path, Design design) {
      files.put(path, design);
      return new MemoryDesign(design);
    }

    private final class MemoryDesign implements Stored {
      private final Design design;

      MemoryDesign(Design design) {
        this.design = design;
      }

      @Override
      public Design design() {
        return design;
      }

      @Override
      public Stored save(Path path, Design changed) {
        return create(path, changed);
      }
    }
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
