package loopwright.solve;

import java.util.List;
import loopwright.solve.NaturalFrequencies.Pole;

/**
 * The answer of a linear network to a unit step from its natural frequencies and their residues:
 * H(0) + Σ (r_k/p_k) e^(p_k t). A residue is the mean of (s − p) H(s) over a circle about its pole.
 */
final class StepResponse {
  private static final int POINTS = 64;

  private final double rest;
  private final List<Pole> poles;
  private final double[][] weights;

  StepResponse(SmallSignalCircuit network, int row, int unknown) {
    this.rest = network.responseAt(0, 0, row, unknown)[0];
    this.poles = new NaturalFrequencies(network).of(network);
    this.weights = new double[poles.size()][];
    for (int k = 0; k < weights.length; k++) {
      weights[k] = weight(network, row, unknown, poles.get(k));
    }
  }

  private double[] weight(SmallSignalCircuit network, int row, int unknown, Pole pole) {
    double radius = distance(pole) / 4;
    double re = 0;
    double im = 0;
    for (int i = 0; i < POINTS; i++) {
      double angle = 2 * Math.PI * (i + 0.5) / POINTS;
      double dx = radius * Math.cos(angle);
      double dy = radius * Math.sin(angle);
      double[] h = network.responseAt(pole.re() + dx, pole.im() + dy, row, unknown);
      re += (h[0] * dx - h[1] * dy) / POINTS;
      im += (h[0] * dy + h[1] * dx) / POINTS;
    }
    double square = pole.re() * pole.re() + pole.im() * pole.im();
    return new double[] {
      (re * pole.re() + im * pole.im()) / square, (im * pole.re() - re * pole.im()) / square
    };
  }

  private double distance(Pole pole) {
    double least = pole.magnitude();
    if (pole.im() != 0) {
      least = Math.min(least, 2 * pole.im());
    }
    for (Pole other : poles) {
      if (other != pole) {
        least = Math.min(least, Math.hypot(other.re() - pole.re(), other.im() - pole.im()));
      }
    }
    return least;
  }

  /** Natural frequencies, one of each conjugate pair. */
  List<Pole> poles() {
    return poles;
  }

  /** Answer at a time in s. */
  double at(double time) {
    double sum = rest;
    for (int k = 0; k < weights.length; k++) {
      Pole pole = poles.get(k);
      double decay = Math.exp(pole.re() * time);
      double cosine = decay * Math.cos(pole.im() * time);
      double sine = decay * Math.sin(pole.im() * time);
      double value = weights[k][0] * cosine - weights[k][1] * sine;
      sum += pole.im() == 0 ? value : 2 * value;
    }
    return sum;
  }
}
