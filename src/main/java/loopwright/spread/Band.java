package loopwright.spread;

import java.util.List;
import java.util.OptionalDouble;

/**
 * Where a node or a figure lies for these tolerances.
 *
 * @param nominal value with every part as the design says; empty where there is none
 * @param low lower end of the 95 % interval; empty without samples
 * @param high upper end of the 95 % interval; empty without samples
 * @param samples number of builds that it rests on: those that have the figure
 * @param reason why there is no interval, or why fewer builds have it than were sampled; may be
 *     empty
 * @param matters the parts whose spread matters, most first
 * @param values the samples that it rests on, in the order in which they were drawn
 */
public record Band(
    OptionalDouble nominal,
    OptionalDouble low,
    OptionalDouble high,
    int samples,
    String reason,
    List<Matter> matters,
    List<Double> values) {
  /**
   * A part and its share.
   *
   * @param part what spreads, see {@link loopwright.predict.TolerancedPart#says()}
   * @param share of the variance, 0 to 1: the squared correlation of its deviation with the figure
   */
  public record Matter(String part, double share) {}

  /** Keeps its own copies. */
  public Band {
    matters = List.copyOf(matters);
    values = List.copyOf(values);
  }
}
