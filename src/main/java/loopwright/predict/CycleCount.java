package loopwright.predict;

import java.util.Arrays;
import loopwright.circuit.CircuitState;

/**
 * Counts the cycles of an output: each begins where it passes its middle on its way up. Of every
 * cycle it knows begin, lowest and highest.
 */
final class CycleCount {
  /** So many cycles have to be alike before it has settled. */
  private static final int ALIKE = 6;

  /** And alike they are within this share. */
  private static final double BAND = 2e-3;

  private final int out;
  private final boolean fixed;
  private double[] begins = new double[1024];
  private double[] lows = new double[1024];
  private double[] highs = new double[1024];
  private int begun;
  private double middle;
  private double low = Double.POSITIVE_INFINITY;
  private double high = Double.NEGATIVE_INFINITY;
  private double lastTime;
  private double last = Double.NaN;
  private boolean wasLow;

  /** About the middle of the cycle before, wherever that moves. */
  CycleCount(int out) {
    this.out = out;
    this.middle = Double.NaN;
    this.fixed = false;
  }

  /** About a level that stays, V: a cycle that grows fast has no other middle. */
  CycleCount(int out, double level) {
    this.out = out;
    this.middle = level;
    this.fixed = true;
  }

  void point(double time, CircuitState state) {
    double volts = state.voltage(out);
    if (Double.isNaN(middle)) {
      middle = volts;
    } else if (wasLow && last < middle && volts >= middle) {
      begin(lastTime + (middle - last) / (volts - last) * (time - lastTime));
    }
    low = Math.min(low, volts);
    high = Math.max(high, volts);
    // A cycle counts only when it went clearly below its middle: ripple at the crossing does not.
    wasLow |= volts < middle - (begun > 0 ? (highs[begun - 1] - lows[begun - 1]) / 8 : 0);
    lastTime = time;
    last = volts;
  }

  private void begin(double time) {
    if (begun == begins.length) {
      begins = Arrays.copyOf(begins, 2 * begun);
      lows = Arrays.copyOf(lows, 2 * begun);
      highs = Arrays.copyOf(highs, 2 * begun);
    }
    begins[begun] = time;
    lows[begun] = low;
    highs[begun] = high;
    begun++;
    middle = begun > 1 && !fixed ? (low + high) / 2 : middle;
    low = Double.POSITIVE_INFINITY;
    high = Double.NEGATIVE_INFINITY;
    wasLow = false;
  }

  /** Whole cycles so far. */
  int count() {
    return Math.max(0, begun - 1);
  }

  /** Mean frequency of the cycles, Hz; NaN without one. */
  double frequency() {
    return begun < 2 ? Double.NaN : (begun - 1) / (begins[begun - 1] - begins[0]);
  }

  /**
   * Growth of peak to peak by a line through its logarithm, 1/s; NaN with fewer than two cycles.
   */
  double growth() {
    double n = 0;
    double sumT = 0;
    double sumL = 0;
    double sumTt = 0;
    double sumTl = 0;
    for (int k = 1; k < begun; k++) {
      double t = (begins[k - 1] + begins[k]) / 2;
      double l = Math.log(highs[k] - lows[k]);
      n++;
      sumT += t;
      sumL += l;
      sumTt += t * t;
      sumTl += t * l;
    }
    return n < 2 ? Double.NaN : (n * sumTl - sumT * sumL) / (n * sumTt - sumT * sumT);
  }

  /** Whether the last cycles are alike in period and in peak to peak. */
  boolean isSettled() {
    if (count() < 2 * ALIKE) {
      return false;
    }
    double period = begins[begun - 1] - begins[begun - 2];
    double range = highs[begun - 1] - lows[begun - 1];
    for (int k = begun - ALIKE; k < begun; k++) {
      if (Math.abs(begins[k] - begins[k - 1] - period) > BAND * period
          || Math.abs(highs[k] - lows[k] - range) > BAND * range) {
        return false;
      }
    }
    return true;
  }

  /** What it has settled to. */
  Oscillation.Settled settled(int cycles) {
    int k = begun - 1;
    return new Oscillation.Settled(
        ALIKE / (begins[k] - begins[k - ALIKE]),
        (highs[k] - lows[k]) / 2,
        lows[k],
        highs[k],
        cycles);
  }
}
