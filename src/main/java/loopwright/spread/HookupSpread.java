package loopwright.spread;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.OptionalDouble;

/**
 * How one hookup spreads.
 *
 * @param name its name
 * @param nodes bands of the node voltages at rest, V
 * @param figures bands of the figures by key, in the catalogue's order
 * @param yield share of the builds that meet every limit of this hookup, 0 to 1; empty without
 *     limits
 * @param yieldSays what the yield rests on, or why there is none
 * @param unsolved number of builds that find no rest
 */
public record HookupSpread(
    String name,
    Map<String, Band> nodes,
    Map<String, Band> figures,
    OptionalDouble yield,
    String yieldSays,
    int unsolved) {
  /** Keeps its own copies. */
  public HookupSpread {
    nodes = Collections.unmodifiableMap(new LinkedHashMap<>(nodes));
    figures = Collections.unmodifiableMap(new LinkedHashMap<>(figures));
  }
}
