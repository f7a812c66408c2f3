package loopwright.predict;

import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Nodes;
import loopwright.circuit.Circuit;
import loopwright.circuit.CircuitState;
import loopwright.solve.GeneratorWalk;

/**
 * One period of the circuit without its capacitances: every node for the generator at dc +
 * amplitude · sin, 1024 points from the sine's zero upward. Without memory the output depends on
 * the generator's voltage alone, so each quarter is walked once and mirrored.
 */
final class StaticWaveform {
  static final int POINTS = 1024;
  static final int HARMONICS = 50;
  private static final int QUARTER = POINTS / 4;

  private final double amplitude;
  private final double[] generator = new double[POINTS];
  private final double[] out = new double[POINTS];
  private final double[] gainOut = new double[POINTS];
  private final double[] cosine = new double[HARMONICS + 1];
  private final double[] sine = new double[HARMONICS + 1];
  private final double[] error = new double[POINTS];

  /**
   * Walks the waveform.
   *
   * @param rest at rest, blocking capacitors held
   * @throws UnsolvedException when there is no amplitude, or the output jumps on the way
   */
  StaticWaveform(AssembledHookup hookup, CircuitState rest) {
    amplitude = hookup.hookup().source().amplitude().value();
    if (amplitude == 0) {
      throw new UnsolvedException("the source has no amplitude");
    }
    walkQuarter(hookup, rest, 1);
    walkQuarter(hookup, rest, -1);
    analyse();
  }

  private void walkQuarter(AssembledHookup hookup, CircuitState rest, int direction) {
    Circuit circuit = hookup.circuit();
    double centre = rest.generator();
    GeneratorWalk walk = new GeneratorWalk(hookup, rest, amplitude / 4);
    for (int k = 0; k <= QUARTER; k++) {
      double target =
          k == 0 ? centre : centre + direction * amplitude * Math.sin(2 * Math.PI * k / POINTS);
      if (!walk.advance(target)) {
        throw new UnsolvedException("jumps at " + Text.volts(walk.output()));
      }
      int rising = direction > 0 ? k : POINTS / 2 + k;
      int falling = direction > 0 ? POINTS / 2 - k : (POINTS - k) % POINTS;
      double output = walk.output();
      double driver = walk.state().voltage(circuit.node(Nodes.GAIN_OUT));
      for (int at : new int[] {rising, falling}) {
        generator[at] = target;
        out[at] = output;
        gainOut[at] = driver;
      }
    }
  }

  private void analyse() {
    for (int n = 0; n <= HARMONICS; n++) {
      double a = 0;
      double b = 0;
      for (int k = 0; k < POINTS; k++) {
        double angle = 2 * Math.PI * ((long) n * k % POINTS) / POINTS;
        a += out[k] * Math.cos(angle);
        b += out[k] * Math.sin(angle);
      }
      double weight = n == 0 ? 1.0 / POINTS : 2.0 / POINTS;
      cosine[n] = weight * a;
      sine[n] = weight * b;
    }
    for (int k = 0; k < POINTS; k++) {
      double angle = 2 * Math.PI * k / POINTS;
      error[k] = out[k] - cosine[0] - cosine[1] * Math.cos(angle) - sine[1] * Math.sin(angle);
    }
  }

  /** Mean of the output, V. */
  double mean() {
    return cosine[0];
  }

  /** Fundamental over amplitude, signed. */
  double gain() {
    return Math.copySign(harmonic(1), sine[1]) / amplitude;
  }

  /** Peak value of a harmonic, V; index 0 the mean. */
  double harmonic(int n) {
    return n == 0 ? cosine[0] : Math.hypot(cosine[n], sine[n]);
  }

  /** Root of the sum of squares of harmonics 2 to 50 over the fundamental. */
  double distortion() {
    double sum = 0;
    for (int n = 2; n <= HARMONICS; n++) {
      sum += cosine[n] * cosine[n] + sine[n] * sine[n];
    }
    return Math.sqrt(sum) / harmonic(1);
  }

  /** Half the peak-to-peak of the output less its mean and fundamental, V. */
  double residual() {
    return halfRange(error);
  }

  /** Half the range of v(gainOut) − v(out), V. */
  double deadZone() {
    double[] difference = new double[POINTS];
    for (int k = 0; k < POINTS; k++) {
      difference[k] = gainOut[k] - out[k];
    }
    return halfRange(difference);
  }

  /** The waveform for views. */
  Waveform toWaveform() {
    return new Waveform(generator.clone(), out.clone(), gainOut.clone(), error.clone());
  }

  private static double halfRange(double[] values) {
    double low = Double.POSITIVE_INFINITY;
    double high = Double.NEGATIVE_INFINITY;
    for (double value : values) {
      low = Math.min(low, value);
      high = Math.max(high, value);
    }
    return (high - low) / 2;
  }
}
