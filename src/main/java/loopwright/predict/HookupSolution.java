package loopwright.predict;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Predicate;
import loopwright.assembly.AssembledHookup;
import loopwright.assembly.DeviceModels;
import loopwright.assembly.Nodes;
import loopwright.circuit.CircuitState;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.solve.LinearNetwork;
import loopwright.solve.MidbandNetwork;
import loopwright.solve.NaturalFrequencies;
import loopwright.solve.NaturalFrequencies.Pole;
import loopwright.task.Progress;

/**
 * Everything that is solved of one hookup, each piece when it is first asked for. The entries of
 * the catalogue read their values from here.
 */
final class HookupSolution {
  private final Design design;
  private final Hookup hookup;
  private final HookupGains gains;
  private final Lazy<RestSolution> rest;
  private final Lazy<CircuitState> linearRest;
  private final Lazy<Levels> levels;
  private final Lazy<MidbandNetwork> midbandHigh;
  private final Lazy<MidbandNetwork> midbandLow;
  private final Lazy<MidbandNetwork> midbandRest;
  private final Lazy<StaticWaveform> waveform;
  private final Lazy<LinearNetwork> network;
  private final Lazy<List<Pole>> poles;
  private final Lazy<LoopMargins> margins;
  private final Lazy<UnityCrossing> crossing;
  private final Lazy<UnityCrossing> crossingHigh;
  private final Lazy<UnityCrossing> crossingLow;
  private final Lazy<ClosedLoop> closedLoop;
  private final Lazy<HookupNoise> noise;
  private final Lazy<SwingStability> swing;
  private final Lazy<ClipLevel> clipHigh;
  private final Lazy<ClipLevel> clipLow;
  private final Lazy<Map<String, DeviceState>> devices;
  private final LargeSignal largeSignal;

  HookupSolution(Design design, Hookup hookup, DeviceModels models) {
    this(design, hookup, models, Optional.empty(), Progress.none());
  }

  /**
   * @param near the same hookup with values that differ little; what was solved of it is started
   *     from
   */
  HookupSolution(Design design, Hookup hookup, DeviceModels models, Optional<HookupSolution> near) {
    this(design, hookup, models, near, Progress.none());
  }

  /**
   * @param near the same hookup with values that differ little; what was solved of it is started
   *     from
   * @param progress asked by what takes long whether it is still wanted
   */
  HookupSolution(
      Design design,
      Hookup hookup,
      DeviceModels models,
      Optional<HookupSolution> near,
      Progress progress) {
    this.design = design;
    this.hookup = hookup;
    this.gains = new HookupGains(hookup);
    this.rest =
        new Lazy<>(
            () ->
                RestSolution.of(
                    design, hookup, models, near.flatMap(other -> other.rest.ifSolved())));
    this.linearRest = new Lazy<>(() -> Levels.linearRest(assembled(), gains, heldRest()));
    this.levels =
        new Lazy<>(
            () ->
                near.flatMap(other -> other.levels.ifSolved())
                    .flatMap(levels -> Levels.near(assembled(), gains, heldRest(), levels))
                    .orElseGet(() -> Levels.find(assembled(), gains, heldRest())));
    this.midbandHigh = new Lazy<>(() -> midband(levels().high()));
    this.midbandLow = new Lazy<>(() -> midband(levels().low()));
    this.midbandRest = new Lazy<>(() -> midband(linearRest()));
    this.waveform = new Lazy<>(() -> new StaticWaveform(assembled(), heldRest()));
    this.network = new Lazy<>(this::networkAtRest);
    this.poles = new Lazy<>(() -> new NaturalFrequencies(network.get()).of(network.get()));
    this.margins = new Lazy<>(this::marginsAtRest);
    this.crossing =
        new Lazy<>(
            () -> {
              needLoop();
              return near.flatMap(other -> other.crossing.ifSolved())
                  .flatMap(before -> UnityCrossing.near(network(), before))
                  .orElseGet(() -> margins().crossing());
            });
    this.crossingHigh =
        new Lazy<>(() -> crossingAt(levels().high(), near.flatMap(o -> o.crossingHigh.ifSolved())));
    this.crossingLow =
        new Lazy<>(() -> crossingAt(levels().low(), near.flatMap(o -> o.crossingLow.ifSolved())));
    this.closedLoop = new Lazy<>(this::closedLoopAtRest);
    this.noise = new Lazy<>(() -> new HookupNoise(this));
    this.swing = new Lazy<>(() -> new SwingStability(assembled(), heldRest()));
    this.clipHigh = new Lazy<>(() -> ClipLevel.outward(assembled(), gains, levels().high(), 1));
    this.clipLow = new Lazy<>(() -> ClipLevel.outward(assembled(), gains, levels().low(), -1));
    this.devices =
        new Lazy<>(
            () -> new DeviceReadout(assembled()).read(rest.get().state(), rest.get().kelvins()));
    this.largeSignal = new LargeSignal(this, progress);
  }

  Design design() {
    return design;
  }

  Hookup hookup() {
    return hookup;
  }

  HookupGains gains() {
    return gains;
  }

  Outcome<RestSolution> restOutcome() {
    return rest.outcome();
  }

  RestSolution rest() {
    return rest.get();
  }

  AssembledHookup assembled() {
    return rest.get().hookup();
  }

  /** Voltages at rest of the nodes that have a name outside a device, V. */
  Map<String, Double> nodes() {
    Map<String, Double> nodes = new LinkedHashMap<>();
    for (String name : assembled().circuit().nodeNames()) {
      if (!Nodes.isInternal(name)) {
        nodes.put(name, rest.get().state().voltage(name));
      }
    }
    return nodes;
  }

  /** Devices at rest by role. */
  Map<String, DeviceState> devices() {
    return devices.get();
  }

  /** What an ideal amplifier would put at the output at rest, V. */
  double reference() {
    return Levels.reference(assembled(), gains, rest.get().state());
  }

  /** Where linear figures at rest are taken, blocking capacitors held. */
  CircuitState linearRest() {
    return linearRest.get();
  }

  Levels levels() {
    return levels.get();
  }

  MidbandNetwork midbandHigh() {
    return midbandHigh.get();
  }

  MidbandNetwork midbandLow() {
    return midbandLow.get();
  }

  MidbandNetwork midbandRest() {
    return midbandRest.get();
  }

  StaticWaveform waveform() {
    return waveform.get();
  }

  Outcome<StaticWaveform> waveformOutcome() {
    return waveform.outcome();
  }

  /** The small-signal circuit at rest. */
  LinearNetwork network() {
    return network.get();
  }

  Outcome<LinearNetwork> networkOutcome() {
    return network.outcome();
  }

  /** Natural frequencies at rest. */
  List<Pole> poles() {
    return poles.get();
  }

  Outcome<List<Pole>> polesOutcome() {
    return poles.outcome();
  }

  LoopMargins margins() {
    return margins.get();
  }

  /** Where the loop gain passes 1 at rest. */
  UnityCrossing crossing() {
    return crossing.get();
  }

  /** Where the loop gain passes 1 at a level. */
  UnityCrossing crossing(Level level) {
    return switch (level) {
      case REST -> crossing.get();
      case HIGH -> crossingHigh.get();
      case LOW -> crossingLow.get();
    };
  }

  /** The linear circuit over the swing at so many levels, as long as each is one to go on from. */
  SwingStability swing(int count, Predicate<SwingLevel> goOn) {
    return new SwingStability(assembled(), heldRest(), count, goOn);
  }

  ClosedLoop closedLoop() {
    return closedLoop.get();
  }

  /** Noise at rest. */
  HookupNoise noise() {
    return noise.get();
  }

  SwingStability swing() {
    return swing.get();
  }

  Outcome<SwingStability> swingOutcome() {
    return swing.outcome();
  }

  ClipLevel clipHigh() {
    return clipHigh.get();
  }

  ClipLevel clipLow() {
    return clipLow.get();
  }

  /** The output short-circuited. */
  ShortCircuit shortCircuit() {
    return ShortCircuit.of(design, assembled(), gains, rest.get(), heldRest());
  }

  /** Steps and clipping in time. */
  LargeSignal largeSignal() {
    return largeSignal;
  }

  /** Throws the reason where there is no loop. */
  void needLoop() {
    if (assembled().isOpen()) {
      throw new UnsolvedException("the hookup is open: there is no loop");
    }
  }

  private MidbandNetwork midband(CircuitState state) {
    return new MidbandNetwork(assembled(), state);
  }

  /**
   * At rest with blocking capacitors held; it needs no level, so it holds even where those fail.
   */
  private CircuitState heldRest() {
    CircuitState held = rest.get().state().copy();
    held.holdBlockingCapacitors();
    return held;
  }

  private LinearNetwork networkAtRest() {
    LinearNetwork linear = new LinearNetwork(assembled());
    linear.linearise(linearRest());
    return linear;
  }

  private LoopMargins marginsAtRest() {
    needLoop();
    return LoopMargins.of(network(), poles());
  }

  private UnityCrossing crossingAt(CircuitState state, Optional<UnityCrossing> before) {
    needLoop();
    LinearNetwork linear = new LinearNetwork(assembled());
    linear.linearise(state);
    return before
        .flatMap(known -> UnityCrossing.near(linear, known))
        .orElseGet(
            () -> LoopMargins.of(linear, new NaturalFrequencies(linear).of(linear)).crossing());
  }

  private ClosedLoop closedLoopAtRest() {
    needLoop();
    if (poles().stream().anyMatch(Pole::grows)) {
      throw new UnsolvedException("something grows at rest");
    }
    return ClosedLoop.of(
        network(), poles(), midbandRest().gain(), hookup.source().frequency().value());
  }
}
