package loopwright.predict;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeSet;
import loopwright.assembly.AssemblyException;
import loopwright.circuit.Physics;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.OutputStage;
import loopwright.design.PartValue;
import loopwright.design.StagesAmplifier;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;
import loopwright.task.Progress;

/** Solves heat in a hookup: against ambient temperature, over the swing, and short-circuited. */
public final class HeatSolver {
  private static final double COLD = 0;
  private static final double HOT = 60;
  private static final int STEPS = 6;
  private static final String AMBIENT = "surroundings.ambient";
  private static final String HEATING = "surroundings.selfHeating";
  private static final String EMITTER = "amplifier.outputStage.emitterResistance";
  private static final double LEAST_RESISTOR = 0.1;
  private static final double MOST_RESISTOR = 470;

  private final Design design;
  private final String hookup;
  private final Progress progress;

  private HeatSolver(Design design, String hookup, Progress progress) {
    this.design = design;
    this.hookup = hookup;
    this.progress = progress;
  }

  /**
   * Solves.
   *
   * @param design a valid design of stages, every part it names among its own; ambients go from its
   *     tolerances' least to their greatest, else from 0 °C to 60 °C
   * @param hookup name of the hookup
   * @throws loopwright.task.CancelledException when the result is no longer wanted
   */
  public static HeatReport solve(Design design, String hookup, Progress progress) {
    return new HeatSolver(design, hookup, progress).report();
  }

  /**
   * Runaway at one ambient temperature.
   *
   * @param loop of dissipation and temperature; empty where the circuit finds no rest
   * @param reason why it does not, or empty
   * @param leastResistance as in {@link HeatReport}
   * @param resistanceSays as in {@link HeatReport}
   */
  public record Runaway(
      OptionalDouble loop, String reason, OptionalDouble leastResistance, String resistanceSays) {}

  /**
   * Whether heat runs away at an ambient temperature, and the emitter resistance that holds it.
   *
   * @param celsius ambient, °C
   * @throws loopwright.task.CancelledException when the result is no longer wanted
   */
  public static Runaway runaway(Design design, String hookup, double celsius, Progress progress) {
    HeatSolver solver = new HeatSolver(design, hookup, progress);
    AmbientHeat heat = solver.at(celsius, "out.upper");
    Least least = solver.leastResistance(celsius, heat);
    return new Runaway(heat.loop(), heat.reason(), least.ohms(), least.says());
  }

  private HeatReport report() {
    HookupFigures nominal = HookupFigures.of(design, hookup);
    String idle = idleDevice(nominal);
    List<AmbientHeat> ambients = new ArrayList<>();
    List<Double> temperatures = temperatures();
    for (double celsius : temperatures) {
      progress.check();
      progress.report((double) ambients.size() / (temperatures.size() + 2), "ambient");
      ambients.add(at(celsius, idle));
    }
    double hottest = temperatures.get(temperatures.size() - 1);
    List<RunawayEstimate> estimates = estimates(hottest);
    progress.check();
    Outcome<List<SwingHeat>> swing = Outcome.of(() -> HeatOverSwing.of(nominal.solution()));
    progress.check();
    Outcome<String> shorted = Outcome.of(() -> nominal.solution().shortCircuit().says());
    Least least = leastResistance(hottest, ambients.get(ambients.size() - 1));
    return new HeatReport(
        hookup,
        idle,
        ambients,
        estimates,
        least.ohms(),
        least.says(),
        swing.isPresent() ? swing.value() : List.of(),
        swing.reason(),
        shorted.isPresent() ? shorted.value() : "not known: " + shorted.reason());
  }

  private List<Double> temperatures() {
    double low = design.tolerances().ambient().map(range -> range.minimum().value()).orElse(COLD);
    double high = design.tolerances().ambient().map(range -> range.maximum().value()).orElse(HOT);
    TreeSet<Double> temperatures = new TreeSet<>();
    for (int k = 0; k <= STEPS; k++) {
      temperatures.add(low + (high - low) * k / STEPS);
    }
    temperatures.add(design.surroundings().ambient().value());
    return List.copyOf(temperatures);
  }

  private static String idleDevice(HookupFigures figures) {
    Map<String, DeviceState> devices = figures.devices();
    return devices.keySet().stream()
        .filter(role -> role.equals("out.upper") || role.equals("out.lower"))
        .min(Comparator.comparingDouble(role -> collectorCurrent(devices.get(role))))
        .orElse("gain.q1");
  }

  private static double collectorCurrent(DeviceState device) {
    return device instanceof DeviceState.TransistorState transistor
        ? transistor.collectorCurrent()
        : Double.NaN;
  }

  private Design warmed(Design base, double celsius, boolean selfHeating) {
    return DesignPath.set(
        DesignPath.set(base, AMBIENT, Quantity.of(celsius)), HEATING, selfHeating);
  }

  private AmbientHeat at(double celsius, String idle) {
    HookupFigures unheated = HookupFigures.of(warmed(design, celsius, false), hookup);
    HookupFigures heated = HookupFigures.of(warmed(design, celsius, true), hookup);
    Outcome<ThermalLoop> loop = Outcome.of(() -> ThermalLoop.of(heated.solution().rest()));
    Optional<Map.Entry<String, DeviceState>> hottest =
        heated.devices().entrySet().stream()
            .filter(entry -> entry.getValue().junctionTemperature().isPresent())
            .max(
                Comparator.comparingDouble(
                    entry -> entry.getValue().junctionTemperature().getAsDouble()));
    return new AmbientHeat(
        celsius,
        current(heated, idle),
        current(unheated, idle),
        hottest.map(Map.Entry::getKey).orElse(""),
        hottest.map(entry -> entry.getValue().junctionTemperature()).orElse(OptionalDouble.empty()),
        loop.isPresent() ? OptionalDouble.of(loop.value().loop()) : OptionalDouble.empty(),
        heated.failure().orElse(loop.reason()));
  }

  private static OptionalDouble current(HookupFigures figures, String role) {
    DeviceState device = figures.devices().get(role);
    return device instanceof DeviceState.TransistorState transistor
        ? OptionalDouble.of(transistor.collectorCurrent())
        : OptionalDouble.empty();
  }

  /** By hand, where the circuit finds a rest at the hottest ambient: heated, else unheated. */
  private List<RunawayEstimate> estimates(double celsius) {
    HookupFigures heated = HookupFigures.of(warmed(design, celsius, true), hookup);
    HookupFigures figures =
        heated.failure().isEmpty()
            ? heated
            : HookupFigures.of(warmed(design, celsius, false), hookup);
    Outcome<ThermalLoop> loop = Outcome.of(() -> ThermalLoop.of(figures.solution().rest()));
    List<RunawayEstimate> estimates = new ArrayList<>();
    for (String role : List.of("out.upper", "out.lower")) {
      if (figures.devices().containsKey(role)) {
        estimate(figures.solution(), role, loop).ifPresent(estimates::add);
      }
    }
    return estimates;
  }

  private Optional<RunawayEstimate> estimate(
      HookupSolution solution, String role, Outcome<ThermalLoop> loop) {
    OptionalDouble resistance =
        new DeviceReadout(solution.assembled()).thermalResistances().get(role);
    HandTransistor device = HandTransistor.of(solution, role);
    if (resistance.isEmpty() || !device.conducts()) {
      return Optional.empty();
    }
    double coupling = design.surroundings().biasCoupling().value();
    double kappa =
        RunawayFormula.kappa(device.state().baseEmitterVoltage(), device.kelvin()) * (1 - coupling);
    double emitter =
        stage().emitterResistance().effective()
            + device.parameters().emitterResistance()
            + device.parameters().baseResistance() / device.beta();
    double volts = device.state().collectorEmitterVoltage();
    double current = device.collectorCurrent();
    return Optional.of(
        new RunawayEstimate(
            role,
            RunawayFormula.loop(
                volts,
                resistance.getAsDouble(),
                kappa,
                emitter,
                Physics.thermalVoltage(device.kelvin()),
                current),
            loop.isPresent()
                ? OptionalDouble.of(loop.value().own().get(role))
                : OptionalDouble.empty(),
            kappa,
            current,
            volts,
            RunawayFormula.leastResistance(
                volts,
                resistance.getAsDouble(),
                kappa,
                RunawayFormula.WANTED,
                Physics.thermalVoltage(device.kelvin()),
                current)));
  }

  private OutputStage.PushPull stage() {
    return (OutputStage.PushPull) ((StagesAmplifier) design.amplifier()).outputStage();
  }

  private record Least(OptionalDouble ohms, String says) {}

  /** The smallest preferred value that holds half a loop in the full circuit. */
  private Least leastResistance(double celsius, AmbientHeat present) {
    if (!(design.amplifier() instanceof StagesAmplifier stages)
        || !(stages.outputStage() instanceof OutputStage.PushPull)) {
      return new Least(OptionalDouble.empty(), "there is no push-pull stage");
    }
    if (present.loop().isEmpty() && present.reason().startsWith("no part")) {
      return new Least(OptionalDouble.empty(), present.reason());
    }
    String warm = EngineeringFormat.format(celsius, Unit.CELSIUS);
    for (double ohms : candidates()) {
      progress.check();
      Outcome<ThermalLoop> loop = Outcome.of(() -> with(ohms, celsius));
      if (loop.isPresent() && loop.value().loop() <= RunawayFormula.WANTED) {
        return new Least(
            OptionalDouble.of(ohms),
            ohms == 0
                ? "none is needed up to " + warm
                : EngineeringFormat.format(ohms, Unit.OHM)
                    + " in each emitter keeps the loop at "
                    + HeatReport.loop(loop.value().loop())
                    + " at "
                    + warm);
      }
    }
    return new Least(
        OptionalDouble.empty(),
        "no value up to "
            + EngineeringFormat.format(MOST_RESISTOR, Unit.OHM)
            + " keeps the loop at a half at "
            + warm);
  }

  private static List<Double> candidates() {
    List<Double> candidates = new ArrayList<>(List.of(0.0));
    candidates.addAll(PreferredValues.E12.between(LEAST_RESISTOR, MOST_RESISTOR));
    return candidates;
  }

  private ThermalLoop with(double ohms, double celsius) {
    Design changed = DesignPath.set(design, EMITTER, PartValue.of(ohms));
    try {
      return ThermalLoop.of(
          HookupFigures.of(warmed(changed, celsius, true), hookup).solution().rest());
    } catch (AssemblyException impossible) {
      throw new UnsolvedException(impossible.getMessage());
    }
  }

  /** The change that fits the least resistance; empty where the design has it or none is known. */
  public static List<Change> changes(Design design, OptionalDouble least) {
    return least.isPresent()
            && design.amplifier() instanceof StagesAmplifier stages
            && stages.outputStage() instanceof OutputStage.PushPull stage
            && stage.emitterResistance().effective() < least.getAsDouble()
        ? List.of(new Change(EMITTER, EngineeringFormat.spelling(least.getAsDouble(), Unit.OHM)))
        : List.of();
  }
}
