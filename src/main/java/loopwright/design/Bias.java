package loopwright.design;

import loopwright.quantity.Kind;
import loopwright.quantity.Measure;
import loopwright.quantity.Otherwise;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/** What holds the bases of the push-pull follower apart. */
public sealed interface Bias permits Bias.Joined, Bias.Diodes, Bias.VbeMultiplier {
  /** Nothing: both drive nodes are one. */
  @Kind("joined")
  record Joined() implements Bias {}

  /** A chain of diodes. */
  @Kind("diodes")
  record Diodes(String diode, @Otherwise("2") int count) implements Bias {}

  /** A transistor that multiplies its own base-emitter voltage. */
  @Kind("vbeMultiplier")
  record VbeMultiplier(
      String transistor,
      @Measure(unit = Unit.OHM, range = Range.POSITIVE) PartValue upper,
      @Measure(unit = Unit.OHM, range = Range.POSITIVE) PartValue lower)
      implements Bias {}
}
