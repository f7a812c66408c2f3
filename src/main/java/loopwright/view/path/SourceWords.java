package loopwright.view.path;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.design.CurrentSource;
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
        id, look(source, feeds), name, List.of(kind(source) + toward), RestWords.says(current));
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
    if (source instanceof CurrentSource.Mirror) {
      return "mirror";
    }
    return source instanceof CurrentSource.DiodeBiased ? "diode-biased" : "two transistors";
  }
}
