package loopwright.predict;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import loopwright.assembly.AssembledHookup;
import loopwright.circuit.CircuitState;
import loopwright.circuit.ElementSensitivities;
import loopwright.circuit.Parameter;
import loopwright.circuit.VoltageSource;
import loopwright.numeric.Complex;
import loopwright.solve.LinearNetwork;
import loopwright.solve.LoopGainSensitivity;
import loopwright.solve.NaturalFrequencies;
import loopwright.solve.NetworkSensitivity;
import loopwright.solve.StateSensitivity;

/**
 * The figures whose derivatives by all parts come from adjoint solutions. Any other figure goes by
 * differences, so that a new entry of the catalogue needs nothing here.
 */
final class AdjointFigures {
  /** A road to a figure's derivatives. */
  @FunctionalInterface
  interface Road {
    /** Adds the derivatives. */
    void add(SolutionSensitivity sensitivity, ElementSensitivities sums);
  }

  private static final Map<String, Road> ROADS = roads();

  private AdjointFigures() {}

  /** The road of a figure; empty where it goes by differences. */
  static Optional<Road> find(String key, HookupSolution solution) {
    boolean bySine =
        key.equals("closedLoopGain") && solution.hookup().source().amplitude().value() > 0;
    return bySine ? Optional.empty() : Optional.ofNullable(ROADS.get(key));
  }

  private static Map<String, Road> roads() {
    Map<String, Road> roads = new LinkedHashMap<>();
    roads.put("idealGain", (s, sums) -> s.gains().add(g -> number(g.idealGain()), 1, sums));
    roads.put("noiseGain", (s, sums) -> s.gains().add(g -> number(g.noiseGain()), 1, sums));
    roads.put("outputOffset", AdjointFigures::addOutputOffset);
    roads.put("inputOffset", AdjointFigures::addInputOffset);
    roads.put("supplyPower", AdjointFigures::addSupplyPower);
    roads.put("openLoopGain", AdjointFigures::addOpenLoopGain);
    roads.put("openLoopGainHigh", openLoopGain(SolutionSensitivity::midbandHigh));
    roads.put("openLoopGainLow", openLoopGain(SolutionSensitivity::midbandLow));
    roads.put("openLoopGainAtRest", openLoopGain(SolutionSensitivity::midbandRest));
    roads.put("commonModeRejection", AdjointFigures::addCommonModeRejection);
    roads.put(
        "closedLoopGain",
        (s, sums) -> {
          midband(s, s.midbandHigh()).addGain(0.5, sums);
          midband(s, s.midbandLow()).addGain(0.5, sums);
        });
    roads.put("closedLoopGainAtRest", (s, sums) -> midband(s, s.midbandRest()).addGain(1, sums));
    roads.put("loopGainDc", (s, sums) -> midband(s, s.midbandRest()).addLoopGain(sums));
    roads.put(
        "inputResistance",
        (s, sums) -> {
          midband(s, s.midbandHigh()).addInputResistance(0.5, sums);
          midband(s, s.midbandLow()).addInputResistance(0.5, sums);
        });
    roads.put(
        "outputResistance",
        (s, sums) -> {
          midband(s, s.midbandHigh()).addOutputResistance(0.5, sums);
          midband(s, s.midbandLow()).addOutputResistance(0.5, sums);
        });
    roads.put("supplyRejectionPositive", rejection(AssembledHookup::positiveSupply));
    roads.put("supplyRejectionNegative", rejection(AssembledHookup::negativeSupply));
    roads.put(
        "unityFrequency",
        (s, sums) -> CrossingSensitivity.addUnityFrequency(loopAtCrossing(s), sums));
    roads.put(
        "phaseMargin", (s, sums) -> CrossingSensitivity.addPhaseMargin(loopAtCrossing(s), sums));
    roads.put("bandwidth", corner(solution -> number(solution.closedLoop().bandwidth())));
    roads.put("lowCorner", corner(solution -> number(solution.closedLoop().lowCorner())));
    roads.put("worstPhaseMargin", AdjointFigures::addWorstPhaseMargin);
    roads.put("worstGrowth", (s, sums) -> addWorstRoot(s, Complex.ONE, sums));
    roads.put(
        "oscillationFrequency",
        (s, sums) -> addWorstRoot(s, new Complex(0, -1 / (2 * Math.PI)), sums));
    return Map.copyOf(roads);
  }

  private static void addOutputOffset(SolutionSensitivity s, ElementSensitivities sums) {
    s.rest().add(s.hookup().out(), 1, sums);
    s.addReference(-1, sums);
  }

  private static void addInputOffset(SolutionSensitivity s, ElementSensitivities sums) {
    for (StateSensitivity state : new StateSensitivity[] {s.high(), s.low()}) {
      state.add(s.hookup().inPlus(), 0.5, sums);
      state.add(s.hookup().feedbackLead().to(), -0.5, sums);
    }
  }

  private static void addSupplyPower(SolutionSensitivity s, ElementSensitivities sums) {
    CircuitState state = s.solution().rest().state();
    for (VoltageSource supply :
        new VoltageSource[] {s.hookup().positiveSupply(), s.hookup().negativeSupply()}) {
      double volts = supply.nominal(state);
      s.rest().add(supply.branch(), volts, sums);
      sums.add(supply.name(), Parameter.SUPPLY, volts * supply.current(state));
    }
  }

  /** 2/(1/A_high + 1/A_low). */
  private static void addOpenLoopGain(SolutionSensitivity s, ElementSensitivities sums) {
    MidbandSensitivity high = midband(s, s.midbandHigh());
    MidbandSensitivity low = midband(s, s.midbandLow());
    double gainHigh = mean(high);
    double gainLow = mean(low);
    double gain = 2 / (1 / gainHigh + 1 / gainLow);
    double byHigh = gain * gain / (2 * gainHigh * gainHigh);
    double byLow = gain * gain / (2 * gainLow * gainLow);
    high.addTwoInputGains(byHigh / 2, byHigh / 2, sums);
    low.addTwoInputGains(byLow / 2, byLow / 2, sums);
  }

  private static Road openLoopGain(Function<SolutionSensitivity, NetworkSensitivity> level) {
    return (s, sums) -> midband(s, level.apply(s)).addTwoInputGains(0.5, 0.5, sums);
  }

  /** 1/|c|, c the mean of 2(A₊ − A₋)/(A₊ + A₋). */
  private static void addCommonModeRejection(SolutionSensitivity s, ElementSensitivities sums) {
    double share = GainFigures.commonModeShare(s.solution());
    double weight = -Math.signum(share) / (share * share) / 2;
    for (NetworkSensitivity network : new NetworkSensitivity[] {s.midbandHigh(), s.midbandLow()}) {
      MidbandSensitivity midband = midband(s, network);
      double[] gains = midband.twoInputGains();
      double square = (gains[0] + gains[1]) * (gains[0] + gains[1]);
      midband.addTwoInputGains(
          weight * 4 * gains[1] / square, -weight * 4 * gains[0] / square, sums);
    }
  }

  /** NG over the output's change; the smaller of the two levels. */
  private static Road rejection(Function<AssembledHookup, VoltageSource> which) {
    return (s, sums) -> {
      VoltageSource supply = which.apply(s.hookup());
      MidbandSensitivity high = midband(s, s.midbandHigh());
      MidbandSensitivity low = midband(s, s.midbandLow());
      boolean isHigh = Math.abs(high.outputBySupply(supply)) > Math.abs(low.outputBySupply(supply));
      MidbandSensitivity worse = isHigh ? high : low;
      double change = worse.outputBySupply(supply);
      double noiseGain = number(s.solution().gains().noiseGain());
      s.gains().add(g -> number(g.noiseGain()), 1 / Math.abs(change), sums);
      worse.addOutputBySupply(supply, -noiseGain * Math.signum(change) / (change * change), sums);
    };
  }

  private static LoopGainSensitivity loopAtCrossing(SolutionSensitivity s) {
    return loop(s, s.network(), s.solution().crossing().frequency());
  }

  private static LoopGainSensitivity loop(
      SolutionSensitivity s, NetworkSensitivity network, double frequency) {
    network.at(0, 2 * Math.PI * frequency);
    return new LoopGainSensitivity(network, s.hookup().feedbackLead());
  }

  private static Road corner(Function<HookupSolution, Double> frequency) {
    return (s, sums) -> {
      NetworkSensitivity network = s.network();
      network.at(0, 2 * Math.PI * frequency.apply(s.solution()));
      CrossingSensitivity.addCorner(
          network,
          midband(s, s.midbandRest()),
          s.hookup().generator().branch(),
          s.hookup().out(),
          sums);
    };
  }

  /** At the worst level, whose generator voltage does not hang on the parts. */
  private static void addWorstPhaseMargin(SolutionSensitivity s, ElementSensitivities sums) {
    CircuitState state = s.solution().swing().worstByMargin().orElseThrow().state();
    LinearNetwork linear = new LinearNetwork(s.hookup());
    linear.linearise(state);
    double[] grid = LoopMargins.grid(new NaturalFrequencies(linear).of(linear));
    double frequency = LoopMargins.crossing(linear::loopGain, grid).orElseThrow().frequency();
    CrossingSensitivity.addPhaseMargin(loop(s, atGenerator(s, state), frequency), sums);
  }

  private static void addWorstRoot(
      SolutionSensitivity s, Complex weight, ElementSensitivities sums) {
    SwingStability.Solved worst = s.solution().swing().worstByGrowth().orElseThrow();
    Complex root =
        new Complex(
            worst.level().growth().getAsDouble(),
            2 * Math.PI * worst.level().frequency().getAsDouble());
    atGenerator(s, worst.state()).addRoot(root, weight, sums);
  }

  private static NetworkSensitivity atGenerator(SolutionSensitivity s, CircuitState state) {
    return NetworkSensitivity.of(state, StateSensitivity.atGenerator(s.hookup(), state, s.rest()));
  }

  private static MidbandSensitivity midband(SolutionSensitivity s, NetworkSensitivity network) {
    return new MidbandSensitivity(s.hookup(), network);
  }

  private static double mean(MidbandSensitivity midband) {
    double[] gains = midband.twoInputGains();
    return (gains[0] + gains[1]) / 2;
  }

  private static double number(OptionalDouble value) {
    return value.orElseThrow(() -> new UnsolvedException("there is no such figure here"));
  }
}
