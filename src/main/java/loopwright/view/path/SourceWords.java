package loopwright.view.path;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.design.CurrentSource;
import loopwright.design.FeedFrom;
import loopwright.part.Polarity;

/** Current sources that hang from a stage, in words. */
final class SourceWords {
  private SourceWords() {}

  /**
   * A current source.
   *
   * @param name what it is to its stage
   * @param pair polarity of the pair, which decides the rail; empty when not known
   * @param rail the rail in words; empty when not known
   * @param current what it carries at rest
   */
  static Block block(
      String id,
      String name,
      CurrentSource source,
      Optional<Polarity> pair,
      String rail,
      OptionalDouble current) {
    boolean feeds = pair.equals(Optional.of(Polarity.PNP));
    String toward = rail.isEmpty() ? "" : (feeds ? " from " : " to ") + rail;
    return new Block(
        id,
        look(source, feeds),
        name,
        List.of(kind(source) + toward, parts(source)),
        RestWords.says(current));
  }

  private static Block.Kind look(CurrentSource source, boolean feeds) {
    if (source instanceof CurrentSource.Resistor) {
      return Block.Kind.RESISTOR;
    }
    return feeds ? Block.Kind.CURRENT_SOURCE : Block.Kind.CURRENT_SINK;
  }

  private static String kind(CurrentSource source) {
    if (source instanceof CurrentSource.Resistor resistor) {
      return PartWords.ohms(resistor.resistance());
    }
    if (source instanceof CurrentSource.Ideal) {
      return "ideal source";
    }
    if (source instanceof CurrentSource.Mirror mirror) {
      return "mirror " + mirror.transistor();
    }
    return source instanceof CurrentSource.DiodeBiased biased
        ? biased.transistor() + " on " + biased.count() + " diodes"
        : "two " + ((CurrentSource.TwoTransistor) source).transistor();
  }

  /** The resistors that set the current, that in the emitter last. */
  private static String parts(CurrentSource source) {
    if (source instanceof CurrentSource.Mirror mirror) {
      return "set by "
          + PartWords.ohms(mirror.setResistance())
          + from(mirror.feedFrom())
          + (mirror.emitterResistance().effective() == 0
              ? ""
              : ", " + PartWords.ohms(mirror.emitterResistance()));
    }
    if (source instanceof CurrentSource.DiodeBiased biased) {
      return biased.diode()
          + ", "
          + PartWords.ohms(biased.feedResistance())
          + from(biased.feedFrom())
          + ", "
          + PartWords.ohms(biased.emitterResistance());
    }
    return source instanceof CurrentSource.TwoTransistor two
        ? "fed by "
            + PartWords.ohms(two.feedResistance())
            + from(two.feedFrom())
            + ", "
            + PartWords.ohms(two.senseResistance())
        : "";
  }

  /** Where the feed comes from, where that is not the usual place. */
  private static String from(Optional<FeedFrom> feedFrom) {
    return feedFrom
        .map(
            place ->
                switch (place) {
                  case GROUND -> " from ground";
                  case MID_RAIL -> " from mid-rail";
                  case OPPOSITE_RAIL -> " from far rail";
                })
        .orElse("");
  }
}
