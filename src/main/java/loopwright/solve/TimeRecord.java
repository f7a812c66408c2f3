package loopwright.solve;

import java.util.Arrays;
import loopwright.circuit.CircuitState;

/**
 * Remembers voltages of a run in bounded memory: when it is full it forgets every second point and
 * from then on takes only so many of those that come.
 */
public final class TimeRecord implements Transient.Sink {
  private final int[] nodes;
  private final double[] times;
  private final double[][] volts;
  private int count;
  private long seen;
  private long stride = 1;

  /**
   * @param most points to be kept, 2 or more
   * @param nodes indices of the nodes to be remembered
   */
  public TimeRecord(int most, int... nodes) {
    if (most < 2) {
      throw new IllegalArgumentException("a record keeps at least two points");
    }
    this.nodes = nodes.clone();
    this.times = new double[most];
    this.volts = new double[nodes.length][most];
  }

  @Override
  public void point(double time, CircuitState state) {
    if (seen++ % stride != 0) {
      return;
    }
    if (count == times.length) {
      thin();
      if ((seen - 1) % stride != 0) {
        return;
      }
    }
    times[count] = time;
    for (int i = 0; i < nodes.length; i++) {
      volts[i][count] = state.voltage(nodes[i]);
    }
    count++;
  }

  private void thin() {
    stride *= 2;
    count = (count + 1) / 2;
    for (int k = 1; k < count; k++) {
      times[k] = times[2 * k];
      for (double[] channel : volts) {
        channel[k] = channel[2 * k];
      }
    }
  }

  /** Number of points that are kept. */
  public int count() {
    return count;
  }

  /** Times of the points, s. */
  public double[] times() {
    return Arrays.copyOf(times, count);
  }

  /** Voltages of a node at those times, V; nodes in the order in which they were named. */
  public double[] volts(int node) {
    return Arrays.copyOf(volts[node], count);
  }
}
