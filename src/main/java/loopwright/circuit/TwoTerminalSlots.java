package loopwright.circuit;

/** The four places of a matrix that a two-terminal part touches. */
final class TwoTerminalSlots {
  private final int fromFrom;
  private final int fromTo;
  private final int toFrom;
  private final int toTo;

  TwoTerminalSlots(CircuitBuilder builder, int from, int to) {
    fromFrom = builder.slot(from, from);
    fromTo = builder.slot(from, to);
    toFrom = builder.slot(to, from);
    toTo = builder.slot(to, to);
  }

  void conductance(Stamps stamps, double value) {
    stamps.conductance(fromFrom, value);
    stamps.conductance(fromTo, -value);
    stamps.conductance(toFrom, -value);
    stamps.conductance(toTo, value);
  }

  void capacitance(Stamps stamps, double value) {
    stamps.capacitance(fromFrom, value);
    stamps.capacitance(fromTo, -value);
    stamps.capacitance(toFrom, -value);
    stamps.capacitance(toTo, value);
  }
}
