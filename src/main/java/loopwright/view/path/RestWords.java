package loopwright.view.path;

import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.predict.DeviceState;
import loopwright.predict.DeviceState.DiodeState;
import loopwright.predict.DeviceState.TransistorState;
import loopwright.predict.FigureResult;
import loopwright.predict.HookupPrediction;
import loopwright.predict.RestState;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** Voltages and currents at rest, in words; all empty where nothing is solved. */
final class RestWords {
  private static final int DIGITS = 4;

  /** Of voltages below 1 V, and of currents. */
  private static final int SMALL_DIGITS = 3;

  private final Optional<HookupPrediction> prediction;
  private final Optional<RestState> rest;

  RestWords(Optional<HookupPrediction> prediction) {
    this.prediction = prediction;
    this.rest = prediction.flatMap(HookupPrediction::rest);
  }

  /** Voltage of a node. */
  OptionalDouble volts(String node) {
    Double volts = rest.map(state -> state.nodes().get(node)).orElse(null);
    return volts == null ? OptionalDouble.empty() : OptionalDouble.of(volts);
  }

  /** Voltage of a node in words. */
  String voltsSay(String node) {
    OptionalDouble volts = volts(node);
    if (volts.isEmpty()) {
      return "";
    }
    double settled = settled(volts.getAsDouble());
    return EngineeringFormat.format(
        settled, Unit.VOLT, Math.abs(settled) < 1 ? SMALL_DIGITS : DIGITS);
  }

  /** Rounding noise of a node at ground is no voltage. */
  private static double settled(double volts) {
    return Math.abs(volts) < 1e-9 ? 0 : volts;
  }

  /** Collector current of a transistor, or a diode's current. */
  OptionalDouble current(String role) {
    DeviceState state = rest.map(found -> found.devices().get(role)).orElse(null);
    if (state instanceof TransistorState transistor) {
      return OptionalDouble.of(transistor.collectorCurrent());
    }
    return state instanceof DiodeState diode
        ? OptionalDouble.of(diode.current())
        : OptionalDouble.empty();
  }

  /** Current out of a transistor's emitter. */
  OptionalDouble emitterCurrent(String role) {
    DeviceState state = rest.map(found -> found.devices().get(role)).orElse(null);
    return state instanceof TransistorState transistor
        ? OptionalDouble.of(transistor.collectorCurrent() + transistor.baseCurrent())
        : OptionalDouble.empty();
  }

  /** The solved value of a figure. */
  OptionalDouble figure(String key) {
    FigureResult result = prediction.map(found -> found.figures().get(key)).orElse(null);
    return result == null ? OptionalDouble.empty() : result.solved().number();
  }

  /** A current in words, empty for none. */
  static String says(OptionalDouble amperes) {
    return amperes.isPresent()
        ? EngineeringFormat.format(amperes.getAsDouble(), Unit.AMPERE, SMALL_DIGITS)
        : "";
  }
}
