package loopwright.session;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Optional;
import loopwright.design.Design;
import org.junit.jupiter.api.Test;

/** Steps back and forth. */
class HistoryTest {
  private final Design opened = SampleDesigns.coilAmplifier();
  private final Design first = SampleDesigns.withGainLoad(opened, "10k");
  private final Design second = SampleDesigns.withGainLoad(opened, "12k");

  @Test
  void goesBackAndForthByName() {
    History history =
        History.of(opened).with(Edit.of("Load 10k", first)).with(Edit.of("Load 12k", second));
    assertThat(history.design()).isEqualTo(second);
    assertThat(history.undoable()).contains("Load 12k");
    assertThat(history.redoable()).isEmpty();

    History back = history.undone().undone();
    assertThat(back.design()).isEqualTo(opened);
    assertThat(back.undoable()).isEmpty();
    assertThat(back.redoable()).contains("Load 10k");
    assertThat(back.undone()).isSameAs(back);
    assertThat(back.redone().redone().design()).isEqualTo(second);
    assertThat(history.redone()).isSameAs(history);
  }

  @Test
  void aNewEditForgetsWhatWasUndone() {
    History history = History.of(opened).with(Edit.of("Load 10k", first)).undone();
    History other = history.with(Edit.of("Load 12k", second));
    assertThat(other.redoable()).isEmpty();
    assertThat(other.undone().design()).isEqualTo(opened);
  }

  @Test
  void editsOfOneGestureAreUndoneTogether() {
    Optional<String> stepping = Optional.of("amplifier.gainStage.load");
    History history =
        History.of(opened)
            .with(new Edit("Load 10k", first, stepping))
            .with(new Edit("Load 12k", second, stepping));
    assertThat(history.undoable()).contains("Load 12k");
    assertThat(history.undone().design()).isEqualTo(opened);
  }

  @Test
  void aGestureDoesNotReachAcrossAnotherEdit() {
    Optional<String> stepping = Optional.of("amplifier.gainStage.load");
    History history =
        History.of(opened)
            .with(new Edit("Load 10k", first, stepping))
            .with(Edit.of("Load 8k2", opened))
            .with(new Edit("Load 12k", second, stepping));
    assertThat(history.undone().design()).isEqualTo(opened);
    assertThat(history.undone().undone().design()).isEqualTo(first);
  }

  @Test
  void anEditSaysWhatWasDone() {
    assertThatThrownBy(() -> Edit.of(" ", opened)).isInstanceOf(IllegalArgumentException.class);
  }
}
