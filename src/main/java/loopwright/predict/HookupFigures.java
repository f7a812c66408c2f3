package loopwright.predict;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Predicate;
import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Deviations;
import loopwright.assembly.DeviceModels;
import loopwright.assembly.Nodes;
import loopwright.circuit.Element;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.part.TransistorParameters;

/**
 * The figures of one hookup, each solved when it is asked for and then kept, with all that they
 * have in common. Serves one thread.
 */
public final class HookupFigures {
  private final DeviceModels models;
  private final HookupSolution solution;

  private HookupFigures(DeviceModels models, HookupSolution solution) {
    this.models = models;
    this.solution = solution;
  }

  /**
   * The figures of a hookup.
   *
   * @param design a valid design, every part it names among its own
   * @param hookup name of the hookup
   * @throws loopwright.assembly.AssemblyException when it is first solved, if the design names a
   *     node that the hookup lacks, or a part record that no model can be made of
   * @throws IllegalArgumentException when the design has no hookup of this name
   */
  public static HookupFigures of(Design design, String hookup) {
    DeviceModels models = new DeviceModels(design);
    return new HookupFigures(models, new HookupSolution(design, find(design, hookup), models));
  }

  /**
   * The same hookup of another build. Where it has the same nodes it is solved from this one's
   * solution, far quicker than from nothing.
   */
  public HookupFigures of(Build build) {
    Design design = build.design();
    DeviceModels others = models.of(design, build.deviations());
    Hookup hookup = find(design, solution.hookup().name());
    return new HookupFigures(
        others, new HookupSolution(design, hookup, others, Optional.of(solution)));
  }

  /**
   * A hookup of a design with the same part records, which takes nothing over but the fits of those
   * records. May serve another thread, where this one's circuit finds a rest or was asked for it.
   *
   * @throws IllegalArgumentException when the design has no hookup of this name
   */
  public HookupFigures apart(Design design, String hookup) {
    DeviceModels others = models.of(design, Deviations.NONE);
    return new HookupFigures(others, new HookupSolution(design, find(design, hookup), others));
  }

  /**
   * The resistors and capacitors of the circuit that a path of the design stands for: itself, or
   * where it stands for several its twins, each with what tells it apart behind an {@code @}. Empty
   * where this hookup has none, or the circuit finds no rest.
   */
  public List<String> elements(String path) {
    return failure().isPresent()
        ? List.of()
        : solution.assembled().circuit().elements().stream()
            .map(Element::name)
            .filter(name -> name.equals(path) || name.startsWith(path + "@"))
            .toList();
  }

  /** The design. */
  public Design design() {
    return solution.design();
  }

  /** The hookup. */
  public Hookup hookup() {
    return solution.hookup();
  }

  /** What the resistors around the amplifier alone decide. */
  public HookupGains gains() {
    return solution.gains();
  }

  /** The solved value of a figure, or why there is none. */
  public FigureValue solved(Figure figure) {
    return figure.solve(solution);
  }

  /** The hand formula's value of a figure, or why there is none. */
  public FigureValue formula(Figure figure) {
    return figure.estimate(solution);
  }

  /** Why the circuit finds no rest; empty when it does. */
  public Optional<String> failure() {
    Outcome<RestSolution> rest = solution.restOutcome();
    return rest.isPresent() ? Optional.empty() : Optional.of(rest.reason());
  }

  /** Voltage of a node at rest, V, or why there is none. */
  public FigureValue node(String name) {
    Outcome<FigureValue> voltage =
        Outcome.of(
            () ->
                solution.assembled().circuit().hasNode(name) && !Nodes.isInternal(name)
                    ? FigureValue.of(solution.rest().state().voltage(name))
                    : FigureValue.none("the circuit has no node " + name));
    return voltage.isPresent() ? voltage.value() : FigureValue.none(voltage.reason());
  }

  /** Voltages of all nodes with a name at rest, V; empty where the circuit finds no rest. */
  public Map<String, Double> nodes() {
    return solution.restOutcome().isPresent() ? solution.nodes() : Map.of();
  }

  /**
   * The nodes at which a probe can change something: one name for each node of the circuit, without
   * ground and those that an ideal source holds; empty where the circuit finds no rest.
   */
  public List<String> probedNodes() {
    Map<Integer, String> names = new LinkedHashMap<>();
    if (failure().isPresent()) {
      return List.of();
    }
    AssembledHookup assembled = solution.assembled();
    List<String> held =
        List.of(Nodes.GENERATOR, Nodes.IDEAL_POSITIVE, Nodes.IDEAL_NEGATIVE).stream()
            .filter(assembled.circuit()::hasNode)
            .toList();
    List<Integer> fed = held.stream().map(assembled.circuit()::node).toList();
    for (String name : solution.nodes().keySet()) {
      int node = assembled.circuit().node(name);
      if (node >= 0 && !fed.contains(node)) {
        names.putIfAbsent(node, name);
      }
    }
    return List.copyOf(names.values());
  }

  /** Devices at rest by role; empty where the circuit finds no rest. */
  public Map<String, DeviceState> devices() {
    return solution.restOutcome().isPresent() ? solution.devices() : Map.of();
  }

  /**
   * Parameters at 25 °C of a transistor, for hand estimates.
   *
   * @throws UnsolvedException with the reason when the circuit finds no rest
   * @throws IllegalArgumentException when no device has this role
   */
  public TransistorParameters transistor(String role) {
    return solution.assembled().models().transistor(role);
  }

  /** Gain from generator to output at a level, blocking capacitors held, or why there is none. */
  public FigureValue midbandGain(Level level) {
    Outcome<FigureValue> gain =
        Outcome.of(
            () ->
                FigureValue.of(
                    switch (level) {
                      case REST -> solution.midbandRest().gain();
                      case HIGH -> solution.midbandHigh().gain();
                      case LOW -> solution.midbandLow().gain();
                    }));
    return gain.isPresent() ? gain.value() : FigureValue.none(gain.reason());
  }

  /**
   * What the positive or negative supply delivers at rest, A, positive in normal operation, or why
   * there is none.
   */
  public FigureValue supplyCurrent(boolean positive) {
    Outcome<FigureValue> current =
        Outcome.of(
            () ->
                FigureValue.of(
                    positive
                        ? solution.assembled().positiveSupply().current(solution.rest().state())
                        : -solution.assembled().negativeSupply().current(solution.rest().state())));
    return current.isPresent() ? current.value() : FigureValue.none(current.reason());
  }

  /** Phase margin at a level, degrees, or why there is none. */
  public FigureValue phaseMargin(Level level) {
    Outcome<FigureValue> margin =
        Outcome.of(() -> FigureValue.of(solution.crossing(level).phaseMargin()));
    return margin.isPresent() ? margin.value() : FigureValue.none(margin.reason());
  }

  /**
   * The linear circuit at levels over the swing, see {@link SwingLevel}.
   *
   * @param count how many levels, odd; with amplitude 0 only the one at rest
   * @param goOn asked at each level; the search ends where it says no
   * @return in no particular order when the search ended early; empty where the circuit finds no
   *     rest
   */
  public List<SwingLevel> overSwing(int count, Predicate<SwingLevel> goOn) {
    Outcome<SwingStability> swing = Outcome.of(() -> solution.swing(count, goOn));
    return swing.isPresent()
        ? swing.value().levels().stream().map(SwingStability.Solved::level).toList()
        : List.of();
  }

  /**
   * Voltage of a node over that of the generator at a frequency, small signal at rest, every
   * capacitor in place.
   *
   * @param node name of the node
   * @param frequency Hz
   * @return real and imaginary part; empty where the circuit finds no rest or has no such node
   */
  public Optional<ComplexPoint> response(String node, double frequency) {
    if (!solution.networkOutcome().isPresent() || !solution.assembled().circuit().hasNode(node)) {
      return Optional.empty();
    }
    double[] value =
        solution
            .network()
            .response(
                frequency,
                solution.assembled().generator().branch(),
                solution.assembled().circuit().node(node));
    return Optional.of(new ComplexPoint(frequency, value[0], value[1]));
  }

  /**
   * Noise at a frequency, at rest, with who makes it.
   *
   * @param frequency Hz, above zero
   * @return empty where the figure {@code inputNoise} has a reason
   */
  public Optional<NoiseDensity> noiseDensity(double frequency) {
    return Optional.ofNullable(Outcome.of(() -> solution.noise().density(frequency)).value());
  }

  /**
   * Noise from 10 Hz to 100 kHz, at rest, with who makes it.
   *
   * @return empty where the figure {@code outputNoise} has a reason
   */
  public Optional<NoiseBand> noiseBand() {
    return Optional.ofNullable(Outcome.of(() -> solution.noise().band()).value());
  }

  HookupSolution solution() {
    return solution;
  }

  private static Hookup find(Design design, String name) {
    return design
        .hookup(name)
        .orElseThrow(() -> new IllegalArgumentException("no hookup is called " + name));
  }
}
