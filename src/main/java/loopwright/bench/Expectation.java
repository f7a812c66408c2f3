package loopwright.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.Hookup;
import loopwright.design.Instrument;
import loopwright.design.PartValue;
import loopwright.design.Probe;
import loopwright.design.Reading;
import loopwright.design.Source;
import loopwright.predict.Catalogue;
import loopwright.predict.ComplexPoint;
import loopwright.predict.DeviceState;
import loopwright.predict.FigureValue;
import loopwright.predict.HookupFigures;
import loopwright.quantity.Quantity;

/**
 * What a reading should show: the circuit that it was taken in, with what the instrument lays on
 * it, and which of its figures it is of.
 */
final class Expectation {
  private static final String OUT = "out";

  private final Reading reading;

  Expectation(Reading reading) {
    this.reading = reading;
  }

  /**
   * The design as the reading found it: its instrument on the node and, where its figure depends on
   * them, its amplitude and frequency at the generator.
   */
  Design circuit(Design design) {
    return circuit(design, probe(design));
  }

  /** The same without the instrument. */
  Design unloaded(Design design) {
    return circuit(design, Optional.empty());
  }

  private Design circuit(Design design, Optional<Probe> probe) {
    Optional<Hookup> hookup = reading.hookup().flatMap(design::hookup);
    if (hookup.isEmpty()) {
      return design;
    }
    Hookup old = hookup.get();
    List<Probe> probes = new ArrayList<>(old.probes());
    probe.ifPresent(probes::add);
    Source source = dependsOnSignal() ? source(old.source()) : old.source();
    Hookup loaded = new Hookup(old.name(), source, old.feedback(), old.load(), probes);
    return loaded.equals(old) ? design : DesignPath.set(design, "hookups." + old.name(), loaded);
  }

  /** Whether amplitude and frequency decide more than where its response is taken. */
  private boolean dependsOnSignal() {
    return switch (reading.quantity()) {
      case "nodeVoltage", "gain", "phase" -> false;
      default -> !onDevice();
    };
  }

  /**
   * What it should show.
   *
   * @param figures of the reading's hookup in that circuit
   */
  FigureValue of(HookupFigures figures) {
    return switch (reading.quantity()) {
      case "nodeVoltage" -> node(figures);
      case "collectorCurrent" ->
          device(figures).map(state -> FigureValue.of(current(state))).orElseGet(this::noDevice);
      case "baseEmitterVoltage" ->
          device(figures).map(state -> FigureValue.of(voltage(state))).orElseGet(this::noDevice);
      case "temperature" -> temperature(figures);
      case "supplyCurrent" ->
          figures.supplyCurrent(
              reading.rail().orElse(Reading.Rail.POSITIVE) == Reading.Rail.POSITIVE);
      case "gain" -> response(figures, OUT, false);
      case "phase" -> response(figures, OUT, true);
      default ->
          Catalogue.find(reading.quantity())
              .map(figures::solved)
              .orElseGet(
                  () -> FigureValue.none("nothing predicts a reading of " + reading.quantity()));
    };
  }

  private Source source(Source old) {
    return new Source(
        old.resistance(),
        old.dc(),
        reading.amplitude().orElse(old.amplitude()),
        reading.frequency().orElse(old.frequency()),
        old.attenuator(),
        old.couplingCapacitance(),
        old.biasResistance(),
        old.biasTo());
  }

  private Optional<Probe> probe(Design design) {
    Optional<Instrument> instrument =
        reading.instrument().map(name -> design.bench().instruments().get(name));
    boolean loads =
        instrument.isPresent()
            && (instrument.get().inputResistance().isPresent()
                || instrument.get().inputCapacitance().isPresent());
    if (!loads || onDevice()) {
      return Optional.empty();
    }
    return Optional.of(
        new Probe(
            reading.node().orElse(OUT),
            instrument.get().inputResistance().map(PartValue::of),
            instrument.get().inputCapacitance().map(PartValue::of)));
  }

  /** Readings that no voltmeter or oscilloscope between a node and ground takes. */
  private boolean onDevice() {
    return switch (reading.quantity()) {
      case "collectorCurrent", "baseEmitterVoltage", "supplyCurrent", "temperature" -> true;
      default -> false;
    };
  }

  private FigureValue node(HookupFigures figures) {
    String node = reading.node().orElse(OUT);
    if (reading.expression().isEmpty()) {
      return figures.node(node);
    }
    FigureValue gain = response(figures, node, false);
    Quantity amplitude = reading.amplitude().orElseGet(() -> figures.hookup().source().amplitude());
    return gain.number().isPresent()
        ? FigureValue.of(gain.number().getAsDouble() * amplitude.value())
        : gain;
  }

  private FigureValue response(HookupFigures figures, String node, boolean phase) {
    Quantity frequency = reading.frequency().orElseGet(() -> figures.hookup().source().frequency());
    Optional<ComplexPoint> point = figures.response(node, frequency.value());
    if (point.isEmpty()) {
      return FigureValue.none(figures.failure().orElse("the circuit has no node " + node));
    }
    double re = point.get().re();
    double im = point.get().im();
    return FigureValue.of(
        phase ? Math.toDegrees(Math.atan2(im, re)) : Math.hypot(re, im) * gainSign(figures));
  }

  /** A gain that a person writes with its sign is compared with one that has it. */
  private double gainSign(HookupFigures figures) {
    return reading.value().value() < 0 && figures.gains().direction() < 0 ? -1 : 1;
  }

  private Optional<DeviceState> device(HookupFigures figures) {
    Map<String, DeviceState> devices = figures.devices();
    return reading.device().map(devices::get);
  }

  private FigureValue noDevice() {
    return FigureValue.none(
        "the circuit finds no rest, or has no device " + reading.device().orElse(""));
  }

  private static double current(DeviceState state) {
    return state instanceof DeviceState.TransistorState transistor
        ? transistor.collectorCurrent()
        : ((DeviceState.DiodeState) state).current();
  }

  private static double voltage(DeviceState state) {
    return state instanceof DeviceState.TransistorState transistor
        ? transistor.baseEmitterVoltage()
        : ((DeviceState.DiodeState) state).voltage();
  }

  private FigureValue temperature(HookupFigures figures) {
    Optional<DeviceState> state = device(figures);
    if (state.isEmpty()) {
      return reading.device().isEmpty()
          ? FigureValue.of(figures.design().surroundings().ambient().value())
          : noDevice();
    }
    return state.get().junctionTemperature().isPresent()
        ? FigureValue.of(state.get().junctionTemperature().getAsDouble())
        : FigureValue.none("its part record states no thermal resistance");
  }
}
