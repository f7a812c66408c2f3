package loopwright.predict;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;
import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Nodes;
import loopwright.circuit.Lead;
import loopwright.circuit.VoltageSource;
import loopwright.design.Design;
import loopwright.design.Load;
import loopwright.design.PartValue;
import loopwright.solve.LinearNetwork;
import loopwright.task.Progress;

/**
 * What a hookup at rest does against frequency beside its response: noise, and impedances.
 *
 * @param noise densities from 1 Hz to 1 MHz, upward; empty where the noise is not known
 * @param noiseReason why, or what is left out; empty when there is nothing to say
 * @param inputImpedance into the driven terminal with the source removed, Ω
 * @param outputImpedance at the output, or behind isolation and coupling at the load, with the load
 *     removed, Ω
 * @param impedanceReason why they are empty; empty otherwise
 * @param positiveRejection change of the positive supply over that of the output divided by the
 *     noise gain; empty with an open hookup
 * @param negativeRejection the same of the negative supply
 */
public record Spectra(
    List<NoiseDensity> noise,
    String noiseReason,
    List<ComplexPoint> inputImpedance,
    List<ComplexPoint> outputImpedance,
    String impedanceReason,
    List<ComplexPoint> positiveRejection,
    List<ComplexPoint> negativeRejection) {
  private static final double NOISE_LOWEST = 1;
  private static final double NOISE_HIGHEST = 1e6;
  private static final double LOWEST = 10;
  private static final double HIGHEST = 1e8;
  private static final int PER_DECADE = 12;

  /** Keeps its own copies. */
  public Spectra {
    noise = List.copyOf(noise);
    inputImpedance = List.copyOf(inputImpedance);
    outputImpedance = List.copyOf(outputImpedance);
    positiveRejection = List.copyOf(positiveRejection);
    negativeRejection = List.copyOf(negativeRejection);
  }

  /**
   * Solves.
   *
   * @param design a valid design, every part it names among its own
   * @param hookup name of the hookup
   * @throws loopwright.task.CancelledException when the result is no longer wanted
   */
  public static Spectra of(Design design, String hookup, Progress progress) {
    HookupFigures figures = HookupFigures.of(design, hookup);
    List<NoiseDensity> noise = new ArrayList<>();
    for (double hertz : grid(NOISE_LOWEST, NOISE_HIGHEST)) {
      progress.check();
      figures.noiseDensity(hertz).ifPresent(noise::add);
    }
    Outcome<LinearNetwork> network = figures.solution().networkOutcome();
    List<ComplexPoint> input = new ArrayList<>();
    List<ComplexPoint> output = new ArrayList<>();
    if (network.isPresent()) {
      for (double hertz : grid(LOWEST, HIGHEST)) {
        progress.check();
        input.add(inputImpedance(network.value(), hertz));
        output.add(outputImpedance(figures, network.value(), hertz));
      }
    }
    return new Spectra(
        noise,
        figures.solved(Catalogue.find("inputNoise").orElseThrow()).says(),
        input,
        output,
        network.reason(),
        rejection(figures, network, AssembledHookup::positiveSupply),
        rejection(figures, network, AssembledHookup::negativeSupply));
  }

  /** Voltage at the driven terminal over the current into it, with the generator driving. */
  private static ComplexPoint inputImpedance(LinearNetwork network, double hertz) {
    AssembledHookup hookup = network.hookup();
    Lead lead = hookup.sourceLead();
    double[] volts = network.response(hertz, hookup.generator().branch(), lead.to());
    double[] amperes = network.response(hertz, hookup.generator().branch(), lead.branch());
    return quotient(hertz, volts, amperes);
  }

  /** An ampere into the node, and the load's own admittance taken off. */
  private static ComplexPoint outputImpedance(
      HookupFigures figures, LinearNetwork network, double hertz) {
    int node = network.hookup().circuit().node(Nodes.LOAD);
    double[] loaded = network.response(hertz, node, node);
    Load load = figures.hookup().load();
    double conductance =
        load.resistance().map(PartValue::effective).map(ohms -> 1 / ohms).orElse(0.0);
    double susceptance =
        2 * Math.PI * hertz * load.capacitance().map(PartValue::effective).orElse(0.0);
    double size = loaded[0] * loaded[0] + loaded[1] * loaded[1];
    double[] admittance = {loaded[0] / size - conductance, -loaded[1] / size - susceptance};
    return quotient(hertz, new double[] {1, 0}, admittance);
  }

  /** The noise gain over what a volt more of the supply, behind its resistance, gives at out. */
  private static List<ComplexPoint> rejection(
      HookupFigures figures,
      Outcome<LinearNetwork> network,
      Function<AssembledHookup, VoltageSource> supply) {
    OptionalDouble noiseGain = figures.gains().noiseGain();
    List<ComplexPoint> points = new ArrayList<>();
    if (network.isPresent() && noiseGain.isPresent() && !network.value().hookup().isOpen()) {
      AssembledHookup hookup = network.value().hookup();
      for (double hertz : grid(LOWEST, HIGHEST)) {
        double[] out = network.value().response(hertz, supply.apply(hookup).branch(), hookup.out());
        points.add(quotient(hertz, new double[] {noiseGain.getAsDouble(), 0}, out));
      }
    }
    return points;
  }

  private static ComplexPoint quotient(double hertz, double[] a, double[] b) {
    double size = b[0] * b[0] + b[1] * b[1];
    return new ComplexPoint(
        hertz, (a[0] * b[0] + a[1] * b[1]) / size, (a[1] * b[0] - a[0] * b[1]) / size);
  }

  private static double[] grid(double lowest, double highest) {
    int count = (int) Math.round(Math.log10(highest / lowest) * PER_DECADE) + 1;
    double[] grid = new double[count];
    for (int k = 0; k < count; k++) {
      grid[k] = lowest * Math.pow(10, (double) k / PER_DECADE);
    }
    return grid;
  }
}
