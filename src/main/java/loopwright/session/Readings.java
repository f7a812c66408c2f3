package loopwright.session;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.stream.IntStream;
import loopwright.design.Bench;
import loopwright.design.Design;
import loopwright.design.Reading;
import loopwright.quantity.Quantity;

/** The measured values of figures, as readings of the design's bench. */
public final class Readings {
  private Readings() {}

  /** The newest reading of a figure in a hookup: the last one on the list. */
  public static Optional<Reading> newest(Design design, String hookup, String key) {
    OptionalInt index = indexOfNewest(design.bench().readings(), hookup, key);
    return index.isPresent()
        ? Optional.of(design.bench().readings().get(index.getAsInt()))
        : Optional.empty();
  }

  /**
   * The design with another value in the newest reading of that figure, or with a new reading where
   * there was none. Instrument and uncertainty stay; the time of the old reading does not.
   */
  static Design with(Design design, String hookup, String key, Quantity value) {
    List<Reading> readings = new ArrayList<>(design.bench().readings());
    OptionalInt index = indexOfNewest(readings, hookup, key);
    if (index.isPresent()) {
      readings.set(index.getAsInt(), revalued(readings.get(index.getAsInt()), value));
    } else {
      readings.add(fresh(hookup, key, value));
    }
    return with(design, readings);
  }

  /** The design without the newest reading of that figure. */
  static Design without(Design design, String hookup, String key) {
    List<Reading> readings = new ArrayList<>(design.bench().readings());
    indexOfNewest(readings, hookup, key).ifPresent(index -> readings.remove(index));
    return with(design, readings);
  }

  private static OptionalInt indexOfNewest(List<Reading> readings, String hookup, String key) {
    return IntStream.range(0, readings.size())
        .filter(
            i ->
                readings.get(i).quantity().equals(key)
                    && readings.get(i).hookup().equals(Optional.of(hookup)))
        .max();
  }

  private static Reading fresh(String hookup, String key, Quantity value) {
    return new Reading(
        Optional.of(hookup),
        key,
        value,
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty());
  }

  private static Reading revalued(Reading old, Quantity value) {
    return new Reading(
        old.hookup(),
        old.quantity(),
        value,
        old.node(),
        old.device(),
        old.part(),
        old.rail(),
        old.frequency(),
        old.amplitude(),
        old.instrument(),
        old.uncertainty(),
        old.expression(),
        old.note(),
        Optional.empty());
  }

  private static Design with(Design design, List<Reading> readings) {
    Bench bench = design.bench();
    return new Design(
        design.loopwright(),
        design.name(),
        design.notes(),
        design.rails(),
        design.surroundings(),
        design.parts(),
        design.amplifier(),
        design.devices(),
        design.extras(),
        design.hookups(),
        design.tolerances(),
        design.limits(),
        design.drawer(),
        new Bench(bench.instruments(), readings, bench.curves(), bench.record()));
  }
}
