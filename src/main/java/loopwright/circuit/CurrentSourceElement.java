package loopwright.circuit;

/**
 * An independent current source: it takes its current out of one node and puts it into another.
 *
 * <p>While the sources are stepped up it follows the supplies late: before the devices around it
 * conduct, nothing but leakage would carry its current, and its node would run away.
 */
public final class CurrentSourceElement implements Element {
  /** The current rises as this power of the source scale. */
  private static final int LATE = 20;

  private final String name;
  private final int from;
  private final int to;
  private final double current;

  CurrentSourceElement(String name, int from, int to, double current) {
    this.name = name;
    this.from = from;
    this.to = to;
    this.current = current;
  }

  /** Index of the node that the current leaves. */
  public int from() {
    return from;
  }

  /** Index of the node that it enters. */
  public int to() {
    return to;
  }

  @Override
  public String name() {
    return name;
  }

  @Override
  public void stamp(CircuitState state) {
    double scaled = current * Math.pow(state.sourceScale(), LATE);
    state.stamps().current(from, scaled, 0);
    state.stamps().current(to, -scaled, 0);
  }

  @Override
  public void exciteSources(CircuitState state, double[] rightHandSide) {
    double slope = current * LATE * Math.pow(state.sourceScale(), LATE - 1);
    if (from >= 0) {
      rightHandSide[from] -= slope;
    }
    if (to >= 0) {
      rightHandSide[to] += slope;
    }
  }
}
