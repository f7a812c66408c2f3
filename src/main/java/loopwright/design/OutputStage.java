package loopwright.design;

import java.util.Optional;
import loopwright.quantity.Kind;
import loopwright.quantity.Measure;
import loopwright.quantity.Otherwise;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/** What stands between the gain stage and the output. */
public sealed interface OutputStage permits OutputStage.None, OutputStage.PushPull {
  /** Nothing: the output is the gain stage's collector. */
  @Kind("none")
  record None() implements OutputStage {}

  /** A push-pull follower. */
  @Kind("pushPull")
  record PushPull(
      String upper,
      String lower,
      Bias bias,
      @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) @Otherwise("0")
          PartValue emitterResistance,
      Optional<Drivers> drivers)
      implements OutputStage {}

  /** Transistors that drive the bases of the output transistors. */
  record Drivers(
      String upper,
      String lower,
      @Measure(unit = Unit.OHM, range = Range.POSITIVE) PartValue resistance) {}
}
