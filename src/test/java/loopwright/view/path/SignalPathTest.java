package loopwright.view.path;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import loopwright.design.Amplifier;
import loopwright.design.Hookup;
import loopwright.view.SampleDesigns;
import loopwright.view.path.SignalPath.Direction;
import org.junit.jupiter.api.Test;

/** Where the arrow keys lead. */
class SignalPathTest {
  private static SignalPath path(Amplifier amplifier) {
    Hookup hookup = SampleDesigns.divider(0.2);
    return PathReader.read(SampleDesigns.design(amplifier, hookup), hookup, Optional.empty());
  }

  private static List<String> walk(SignalPath path, String from, Direction direction) {
    List<String> reached = new ArrayList<>();
    String at = from;
    String next = path.next(at, direction);
    while (!next.equals(at)) {
      reached.add(next);
      at = next;
      next = path.next(at, direction);
    }
    return reached;
  }

  @Test
  void onwardReachesEveryBlockInTheOrderOfTheSignal() {
    assertThat(walk(path(SampleDesigns.npn()), "source", Direction.ONWARD))
        .containsExactly(
            "amplifier.inputPair",
            "amplifier.inputPair.tail",
            "amplifier.gainStage",
            "amplifier.gainStage.load",
            "amplifier.outputStage",
            "load",
            "feedback");
  }

  @Test
  void backIsTheSameWay() {
    assertThat(walk(path(SampleDesigns.figures()), "feedback", Direction.BACK))
        .containsExactly("load", "amplifier", "source");
  }

  @Test
  void downLeadsToWhatHangsAndThenToTheFeedback() {
    SignalPath path = path(SampleDesigns.npn());
    assertThat(walk(path, "amplifier.gainStage", Direction.DOWN))
        .containsExactly("amplifier.gainStage.load", "feedback");
    assertThat(path.next("load", Direction.DOWN)).isEqualTo("feedback");
  }

  @Test
  void upLeadsBackToTheStage() {
    SignalPath path = path(SampleDesigns.npn());
    assertThat(path.next("amplifier.inputPair.tail", Direction.UP))
        .isEqualTo("amplifier.inputPair");
    assertThat(path.next("feedback", Direction.UP)).isEqualTo("amplifier.inputPair");
    assertThat(path.next("source", Direction.UP)).isEqualTo("source");
  }

  @Test
  void fromNowhereEveryKeyLeadsToAnEnd() {
    SignalPath path = path(SampleDesigns.npn());
    for (Direction direction : Direction.values()) {
      assertThat(path.next("", direction))
          .isEqualTo(direction == Direction.LAST ? "feedback" : "source");
    }
  }

  @Test
  void theEndsAreReachedAtOnce() {
    SignalPath path = path(SampleDesigns.npn());
    assertThat(path.next("amplifier.gainStage", Direction.FIRST)).isEqualTo("source");
    assertThat(path.next("amplifier.gainStage", Direction.LAST)).isEqualTo("feedback");
  }
}
