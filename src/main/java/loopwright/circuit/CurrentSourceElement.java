package loopwright.circuit;

/** An independent current source: it takes its current out of one node and puts it into another. */
public final class CurrentSourceElement implements Element {
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

  @Override
  public String name() {
    return name;
  }

  @Override
  public void stamp(CircuitState state) {
    double scaled = current * state.sourceScale();
    state.stamps().current(from, scaled, 0);
    state.stamps().current(to, -scaled, 0);
  }

  @Override
  public void exciteSources(CircuitState state, double[] rightHandSide) {
    if (from >= 0) {
      rightHandSide[from] -= current;
    }
    if (to >= 0) {
      rightHandSide[to] += current;
    }
  }
}
