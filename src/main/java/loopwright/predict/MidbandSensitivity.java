package loopwright.predict;

import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Nodes;
import loopwright.circuit.ElementSensitivities;
import loopwright.circuit.Lead;
import loopwright.circuit.Parameter;
import loopwright.circuit.VoltageSource;
import loopwright.design.PartValue;
import loopwright.numeric.Complex;
import loopwright.solve.LoopGainSensitivity;
import loopwright.solve.NetworkSensitivity;

/**
 * How what {@link loopwright.solve.MidbandNetwork} gives at one operating point changes with the
 * parts. Each figure is a function of a few unknowns; its derivatives by them are the weights.
 */
final class MidbandSensitivity {
  private final AssembledHookup hookup;
  private final NetworkSensitivity network;
  private final double[] byGenerator;

  MidbandSensitivity(AssembledHookup hookup, NetworkSensitivity network) {
    this.hookup = hookup;
    this.network = network;
    this.byGenerator = network.solve(hookup.generator().branch());
  }

  /** Output over generator. */
  double gain() {
    return at(byGenerator, hookup.out());
  }

  /** Adds the derivatives of the gain. */
  void addGain(double weight, ElementSensitivities sums) {
    network.add(byGenerator, weights(hookup.out(), weight), sums);
  }

  /** Gains A₊ and A₋ from either input. */
  double[] twoInputGains() {
    return inputGains().values();
  }

  /**
   * Adds the derivatives of a function of both gains.
   *
   * @param byPlus its derivative by A₊
   * @param byMinus its derivative by A₋
   */
  void addTwoInputGains(double byPlus, double byMinus, ElementSensitivities sums) {
    InputGains gains = inputGains();
    for (int excitation = 0; excitation < gains.solutions().length; excitation++) {
      double[] weights = network.weights();
      for (int unknown = 0; unknown < 3; unknown++) {
        int k = 3 * excitation + unknown;
        double weight = byPlus * gains.plusBy()[k] + byMinus * gains.minusBy()[k];
        new Complex(weight, 0).addTo(weights, gains.unknowns()[unknown]);
      }
      network.add(gains.solutions()[excitation], weights, sums);
    }
  }

  /**
   * Both gains with their derivatives by output, in+ and in− under each excitation, three after
   * three.
   */
  private record InputGains(
      double[] values, int[] unknowns, double[][] solutions, double[] plusBy, double[] minusBy) {}

  private InputGains inputGains() {
    Lead lead = hookup.feedbackLead();
    int[] unknowns = {hookup.out(), hookup.inPlus(), lead.to()};
    double out1 = at(byGenerator, unknowns[0]);
    double plus1 = at(byGenerator, unknowns[1]);
    double minus1 = at(byGenerator, unknowns[2]);
    if (hookup.isOpen() || hookup.isInverting()) {
      double difference = plus1 - minus1;
      double gain = out1 / difference;
      double[] by = {1 / difference, -gain / difference, gain / difference};
      return new InputGains(
          new double[] {gain, gain}, unknowns, new double[][] {byGenerator}, by, by);
    }
    double[] second = network.solve(lead.branch());
    double out2 = at(second, unknowns[0]);
    double plus2 = at(second, unknowns[1]);
    double minus2 = at(second, unknowns[2]);
    double determinant = plus2 * minus1 - plus1 * minus2;
    double plus = (out2 * minus1 - out1 * minus2) / determinant;
    double minus = (out2 * plus1 - out1 * plus2) / determinant;
    double[] plusBy = {
      -minus2 / determinant,
      plus * minus2 / determinant,
      (out2 - plus * plus2) / determinant,
      minus1 / determinant,
      -plus * minus1 / determinant,
      (-out1 + plus * plus1) / determinant
    };
    double[] minusBy = {
      -plus2 / determinant,
      (out2 + minus * minus2) / determinant,
      -minus * plus2 / determinant,
      plus1 / determinant,
      (-out1 - minus * minus1) / determinant,
      minus * plus1 / determinant
    };
    return new InputGains(
        new double[] {plus, minus},
        unknowns,
        new double[][] {byGenerator, second},
        plusBy,
        minusBy);
  }

  /** Adds the derivatives of the loop gain. */
  void addLoopGain(ElementSensitivities sums) {
    LoopGainSensitivity loop = new LoopGainSensitivity(network, hookup.feedbackLead());
    loop.add(new Complex(loop.value().re(), 0), sums);
  }

  /** Adds the derivatives of the resistance into the driven terminal. */
  void addInputResistance(double weight, ElementSensitivities sums) {
    Lead lead = hookup.sourceLead();
    double current = at(byGenerator, lead.branch());
    double resistance = at(byGenerator, lead.to()) / current;
    double[] weights = network.weights();
    new Complex(weight / current, 0).addTo(weights, lead.to());
    new Complex(-weight * resistance / current, 0).addTo(weights, lead.branch());
    network.add(byGenerator, weights, sums);
  }

  /** Adds the derivatives of the resistance at the load with the load removed. */
  void addOutputResistance(double weight, ElementSensitivities sums) {
    int node = hookup.circuit().node(Nodes.LOAD);
    double[] solution = network.solve(node);
    double loaded = at(solution, node);
    double load =
        hookup.hookup().load().resistance().map(PartValue::effective).map(r -> 1 / r).orElse(0.0);
    double resistance = 1 / (1 / loaded - load);
    double square = resistance * resistance;
    network.add(solution, weights(node, weight * square / (loaded * loaded)), sums);
    sums.add(
        "hookups." + hookup.hookup().name() + ".load.resistance",
        Parameter.RESISTANCE,
        -weight * square * load);
  }

  /** Output change for one volt more of a supply behind its resistance. */
  double outputBySupply(VoltageSource supply) {
    return at(network.solve(supply.branch()), hookup.out());
  }

  /** Adds the derivatives of that. */
  void addOutputBySupply(VoltageSource supply, double weight, ElementSensitivities sums) {
    network.add(network.solve(supply.branch()), weights(hookup.out(), weight), sums);
  }

  private double[] weights(int unknown, double weight) {
    double[] weights = network.weights();
    new Complex(weight, 0).addTo(weights, unknown);
    return weights;
  }

  private static double at(double[] vector, int index) {
    return Complex.at(vector, index).re();
  }
}
