package loopwright.predict;

import loopwright.circuit.ElementSensitivities;
import loopwright.numeric.Complex;
import loopwright.solve.LoopGainSensitivity;
import loopwright.solve.NetworkSensitivity;

/**
 * How frequencies change that are defined by a level: with ln |T(ω, p)| held, dω/dp = −(∂ln
 * |T|/∂p)/(∂ln |T|/∂ω), and what is read there changes along.
 */
final class CrossingSensitivity {
  private static final Complex MAGNITUDE = Complex.ONE;
  private static final Complex ARGUMENT = Complex.I.times(-1);

  private CrossingSensitivity() {}

  /** Adds the derivatives of the frequency in Hz where the loop gain passes 1. */
  static void addUnityFrequency(LoopGainSensitivity loop, ElementSensitivities sums) {
    loop.add(new Complex(-1 / (2 * Math.PI * loop.slope(MAGNITUDE)), 0), sums);
  }

  /** Adds the derivatives of the phase margin there, degrees. */
  static void addPhaseMargin(LoopGainSensitivity loop, ElementSensitivities sums) {
    double along = loop.slope(ARGUMENT) / loop.slope(MAGNITUDE);
    loop.add(ARGUMENT.minus(MAGNITUDE.times(along)).times(Math.toDegrees(1)), sums);
  }

  /**
   * Adds the derivatives of the frequency in Hz where the response stands at a fixed share of the
   * midband gain.
   *
   * @param network stands at that frequency
   * @param midband the network at signal frequency at the same operating point
   */
  static void addCorner(
      NetworkSensitivity network,
      MidbandSensitivity midband,
      int row,
      int out,
      ElementSensitivities sums) {
    double[] response = network.solve(row);
    Complex value = Complex.at(response, out);
    double[] magnitude = network.weights();
    Complex.ONE.over(value).addTo(magnitude, out);
    double factor = -1 / (2 * Math.PI * network.slope(response, magnitude, Complex.I));
    double[] weights = network.weights();
    Complex.ONE.over(value).times(factor).addTo(weights, out);
    network.add(response, weights, sums);
    midband.addGain(-factor / midband.gain(), sums);
  }
}
