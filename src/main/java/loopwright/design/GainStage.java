package loopwright.design;

import java.util.Optional;
import loopwright.quantity.Measure;
import loopwright.quantity.Otherwise;
import loopwright.quantity.Range;
import loopwright.quantity.Unit;

/**
 * The common-emitter gain stage.
 *
 * @param transistor name of the part record, of the polarity that the pair's is not
 * @param load current source, or resistor, at the far drive node
 * @param emitterResistance degeneration, Ω
 * @param emitterBypass capacitor across it, F
 * @param buffer follower ahead of the base
 * @param compensation Miller capacitor with its series resistor
 */
public record GainStage(
    String transistor,
    CurrentSource load,
    @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) @Otherwise("0")
        PartValue emitterResistance,
    @Measure(unit = Unit.FARAD, range = Range.POSITIVE) Optional<PartValue> emitterBypass,
    Optional<Buffer> buffer,
    Optional<Compensation> compensation) {
  /** A follower between the pair and the gain transistor. */
  public record Buffer(
      String transistor,
      @Measure(unit = Unit.OHM, range = Range.POSITIVE) PartValue emitterResistance) {}

  /** Capacitor at the collector, resistor at the pair's collector, in series. */
  public record Compensation(
      @Measure(unit = Unit.FARAD, range = Range.POSITIVE) PartValue capacitance,
      @Measure(unit = Unit.OHM, range = Range.NOT_NEGATIVE) @Otherwise("0") PartValue resistance) {}
}
