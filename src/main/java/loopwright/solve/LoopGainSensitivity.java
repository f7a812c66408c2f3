package loopwright.solve;

import loopwright.circuit.ElementSensitivities;
import loopwright.circuit.Lead;
import loopwright.numeric.Complex;

/**
 * How the loop gain T of a double injection changes with the parts and with frequency, at the
 * frequency at which the network stands. See {@link LoopGain} for T.
 */
public final class LoopGainSensitivity {
  private final NetworkSensitivity network;
  private final Lead lead;
  private final double[] series;
  private final double[] shunt;

  /** The loop gain in a lead of a network that stands at a frequency. */
  public LoopGainSensitivity(NetworkSensitivity network, Lead lead) {
    this.network = network;
    this.lead = lead;
    this.series = network.solve(lead.branch());
    this.shunt = network.solve(lead.to());
  }

  /** T. */
  public Complex value() {
    double[] value = LoopGain.combine(lead, series, shunt);
    return new Complex(value[0], value[1]);
  }

  /**
   * Adds the derivatives of Re(weight · ln T): those of ln |T| for 1, those of arg T in rad for −j.
   */
  public void add(Complex weight, ElementSensitivities sums) {
    double[] seriesWeights = network.weights();
    double[] shuntWeights = network.weights();
    weigh(weight, seriesWeights, shuntWeights);
    network.add(series, seriesWeights, sums);
    network.add(shunt, shuntWeights, sums);
  }

  /** Derivative of Re(weight · ln T) by angular frequency, per rad/s. */
  public double slope(Complex weight) {
    double[] seriesWeights = network.weights();
    double[] shuntWeights = network.weights();
    weigh(weight, seriesWeights, shuntWeights);
    return network.slope(series, seriesWeights, Complex.I)
        + network.slope(shunt, shuntWeights, Complex.I);
  }

  /** d ln T = d(top)/top − d(bottom)/bottom by the three unknowns that T is made of. */
  private void weigh(Complex weight, double[] seriesWeights, double[] shuntWeights) {
    Complex voltageTop = Complex.at(series, lead.from()).times(-1);
    Complex voltage = Complex.at(series, lead.to());
    Complex currentTop = Complex.at(shunt, lead.branch()).times(-1);
    Complex current = Complex.ONE.minus(currentTop);
    Complex top = voltageTop.times(currentTop).minus(voltage.times(current));
    Complex bottom =
        voltageTop
            .times(current)
            .plus(currentTop.times(voltage))
            .plus(voltage.times(current).times(2));
    Complex byVoltageTop = currentTop.over(top).minus(current.over(bottom));
    Complex byVoltage =
        current.times(-1).over(top).minus(currentTop.plus(current.times(2)).over(bottom));
    Complex sum = voltageTop.plus(voltage);
    Complex byCurrentTop = sum.over(top).plus(sum.over(bottom));
    byVoltageTop.times(weight).times(-1).addTo(seriesWeights, lead.from());
    byVoltage.times(weight).addTo(seriesWeights, lead.to());
    byCurrentTop.times(weight).times(-1).addTo(shuntWeights, lead.branch());
  }
}
