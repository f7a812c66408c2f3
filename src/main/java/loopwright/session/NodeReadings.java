package loopwright.session;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.stream.IntStream;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.Reading;
import loopwright.quantity.Quantity;

/** The direct voltages that a meter showed at nodes, as readings of the design's bench. */
public final class NodeReadings {
  private static final String QUANTITY = "nodeVoltage";

  private NodeReadings() {}

  /** The newest reading at a node of a hookup: the last one on the list. */
  public static Optional<Reading> newest(Design design, String hookup, String node) {
    OptionalInt index = index(design, hookup, node);
    return index.isPresent()
        ? Optional.of(design.bench().readings().get(index.getAsInt()))
        : Optional.empty();
  }

  /**
   * The edit that puts a value in the place of the newest reading at a node, or adds it where there
   * is none.
   *
   * @param value V; empty to take the newest reading away
   * @param instrument by which it was read; empty where that is not said
   */
  public static Edit edit(
      Design design,
      String hookup,
      String node,
      Optional<Quantity> value,
      Optional<String> instrument) {
    List<Reading> readings = new ArrayList<>(design.bench().readings());
    OptionalInt index = index(design, hookup, node);
    if (value.isEmpty()) {
      index.ifPresent(readings::remove);
    } else {
      Reading reading = reading(hookup, node, value.get(), instrument);
      if (index.isPresent()) {
        readings.set(index.getAsInt(), reading);
      } else {
        readings.add(reading);
      }
    }
    String what = value.map(volts -> "Read " + volts.spelling()).orElse("Clear the reading");
    return Edit.of(
        what + " at " + node, DesignPath.set(design, "bench.readings", List.copyOf(readings)));
  }

  private static Reading reading(
      String hookup, String node, Quantity value, Optional<String> instrument) {
    return new Reading(
        Optional.of(hookup),
        QUANTITY,
        value,
        Optional.of(node),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        instrument,
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty());
  }

  /** Alternating amplitudes, which say how they are expressed, are other readings. */
  private static OptionalInt index(Design design, String hookup, String node) {
    List<Reading> readings = design.bench().readings();
    return IntStream.range(0, readings.size())
        .filter(i -> readings.get(i).quantity().equals(QUANTITY))
        .filter(i -> readings.get(i).hookup().equals(Optional.of(hookup)))
        .filter(i -> readings.get(i).node().equals(Optional.of(node)))
        .filter(i -> readings.get(i).expression().isEmpty())
        .max();
  }
}
