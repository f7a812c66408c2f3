package loopwright.sizing;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import loopwright.design.Change;
import loopwright.predict.FigureValue;

/**
 * A cure: changes that give the wanted margin at every level of the swing.
 *
 * @param kind which way it is
 * @param changes what to change
 * @param worstPhaseMargin smallest over the swing with every part as the design says, degrees;
 *     empty where the loop gain never passes 1
 * @param cornerPhaseMargin smallest over the swing with every part at the end of its tolerance that
 *     takes most from the margin; the former where nothing spreads
 * @param figures what it costs, by key of the catalogue
 * @param says what it gives and what it costs, in words
 * @param cost what it takes from slew rate, loop gain, noise and offset together; the least is best
 */
public record Cure(
    String kind,
    List<Change> changes,
    OptionalDouble worstPhaseMargin,
    OptionalDouble cornerPhaseMargin,
    Map<String, FigureValue> figures,
    String says,
    double cost) {
  /** Keeps its own copies. */
  public Cure {
    changes = List.copyOf(changes);
    figures = Collections.unmodifiableMap(new LinkedHashMap<>(figures));
  }
}
