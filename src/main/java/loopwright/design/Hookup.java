package loopwright.design;

import java.util.List;
import loopwright.quantity.Otherwise;

/**
 * A test set-up around the amplifier.
 *
 * @param name unique, without dots
 * @param source what drives it
 * @param feedback how the output comes back
 * @param load what it drives
 * @param probes what hangs on its nodes
 */
public record Hookup(
    String name,
    @Otherwise("{}") Source source,
    Feedback feedback,
    @Otherwise("{}") Load load,
    List<Probe> probes) {
  /** Keeps its own copy of the probes. */
  public Hookup {
    probes = List.copyOf(probes);
  }
}
