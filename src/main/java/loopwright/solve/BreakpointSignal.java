package loopwright.solve;

import java.util.Arrays;

/** Straight between breakpoints, held outside them; two breakpoints of one time are a jump. */
final class BreakpointSignal implements GeneratorSignal {
  private final double[] times;
  private final double[] volts;

  BreakpointSignal(double[] times, double[] volts) {
    if (times.length == 0 || times.length != volts.length) {
      throw new IllegalArgumentException("a waveform needs as many voltages as times");
    }
    for (int i = 1; i < times.length; i++) {
      if (!(times[i] >= times[i - 1])) {
        throw new IllegalArgumentException("the times of a waveform never fall");
      }
    }
    this.times = times.clone();
    this.volts = volts.clone();
  }

  @Override
  public double before(double time) {
    int next = firstAtOrAfter(time);
    if (next == 0) {
      return volts[0];
    }
    return next == times.length ? volts[next - 1] : between(next - 1, time);
  }

  @Override
  public double after(double time) {
    int next = firstAfter(time);
    if (next == 0) {
      return volts[0];
    }
    return next == times.length ? volts[next - 1] : between(next - 1, time);
  }

  @Override
  public double nextCorner(double time) {
    int next = firstAfter(time);
    return next == times.length ? Double.POSITIVE_INFINITY : times[next];
  }

  @Override
  public double longestStep() {
    return Double.POSITIVE_INFINITY;
  }

  private double between(int from, double time) {
    double share = (time - times[from]) / (times[from + 1] - times[from]);
    return volts[from] + share * (volts[from + 1] - volts[from]);
  }

  private int firstAtOrAfter(double time) {
    int at = Arrays.binarySearch(times, time);
    if (at < 0) {
      return -at - 1;
    }
    while (at > 0 && times[at - 1] == time) {
      at--;
    }
    return at;
  }

  private int firstAfter(double time) {
    int at = Arrays.binarySearch(times, time);
    if (at < 0) {
      return -at - 1;
    }
    while (at < times.length && times[at] == time) {
      at++;
    }
    return at;
  }
}
