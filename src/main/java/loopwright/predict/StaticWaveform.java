package loopwright.predict;

import java.util.Map;
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
  static final int HARMONICS = Harmonics.HIGHEST;
  private static final int QUARTER = POINTS / 4;

  private final double amplitude;
  private final double[] generator = new double[POINTS];
  private final double[] out = new double[POINTS];
  private final double[] gainOut = new double[POINTS];
  private final Harmonics harmonics;
  private Map<String, DeviceState> atCrest = Map.of();
  private Map<String, DeviceState> atTrough = Map.of();

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
    harmonics = new Harmonics(out);
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
    Map<String, DeviceState> devices = new DeviceReadout(hookup).read(walk.state(), Map.of());
    if (direction > 0) {
      atCrest = devices;
    } else {
      atTrough = devices;
    }
  }

  /** Mean of the output, V. */
  double mean() {
    return harmonics.mean();
  }

  /** Fundamental over amplitude, signed. */
  double gain() {
    return Math.copySign(harmonic(1), harmonics.inPhase()) / amplitude;
  }

  /** Peak value of a harmonic, V; index 0 the mean. */
  double harmonic(int n) {
    return harmonics.peak(n);
  }

  /** Root of the sum of squares of harmonics 2 to 50 over the fundamental. */
  double distortion() {
    return harmonics.distortion();
  }

  /** Half the peak-to-peak of the output less its mean and fundamental, V. */
  double residual() {
    return halfRange(harmonics.residual());
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
    return new Waveform(
        generator.clone(),
        out.clone(),
        gainOut.clone(),
        harmonics.residual().clone(),
        atCrest,
        atTrough);
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
