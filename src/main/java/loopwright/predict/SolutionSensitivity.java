package loopwright.predict;

import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Nodes;
import loopwright.circuit.ElementSensitivities;
import loopwright.solve.NetworkSensitivity;
import loopwright.solve.StateSensitivity;

/**
 * How the states of a solved hookup change with the parts: at rest, where linear figures at rest
 * are taken, and at the levels. Each piece when it is first asked for.
 */
final class SolutionSensitivity {
  private final HookupSolution solution;
  private final GainsSensitivity gains;
  private final Lazy<StateSensitivity> rest;
  private final Lazy<StateSensitivity> linearRest;
  private final Lazy<StateSensitivity> high;
  private final Lazy<StateSensitivity> low;

  SolutionSensitivity(HookupSolution solution) {
    this.solution = solution;
    this.gains = new GainsSensitivity(solution.design(), solution.hookup());
    this.rest =
        new Lazy<>(() -> StateSensitivity.atRest(solution.assembled(), solution.rest().state()));
    this.linearRest =
        new Lazy<>(
            () ->
                solution.assembled().isOpen()
                    ? StateSensitivity.atLevel(
                        solution.assembled(), solution.linearRest(), rest(), this::addReference)
                    : rest());
    this.high =
        new Lazy<>(
            () ->
                StateSensitivity.atLevel(
                    solution.assembled(),
                    solution.levels().high(),
                    rest(),
                    (weight, sums) -> addLevel(1, weight, sums)));
    this.low =
        new Lazy<>(
            () ->
                StateSensitivity.atLevel(
                    solution.assembled(),
                    solution.levels().low(),
                    rest(),
                    (weight, sums) -> addLevel(-1, weight, sums)));
  }

  HookupSolution solution() {
    return solution;
  }

  AssembledHookup hookup() {
    return solution.assembled();
  }

  /** What the resistors around the amplifier alone decide. */
  GainsSensitivity gains() {
    return gains;
  }

  StateSensitivity rest() {
    return rest.get();
  }

  /** Where linear figures at rest are taken. */
  StateSensitivity linearRest() {
    return linearRest.get();
  }

  StateSensitivity high() {
    return high.get();
  }

  StateSensitivity low() {
    return low.get();
  }

  /** The network at signal frequency at the high level. */
  NetworkSensitivity midbandHigh() {
    return NetworkSensitivity.midband(solution.levels().high(), high());
  }

  /** The same at the low level. */
  NetworkSensitivity midbandLow() {
    return NetworkSensitivity.midband(solution.levels().low(), low());
  }

  /** The same at rest. */
  NetworkSensitivity midbandRest() {
    return NetworkSensitivity.midband(solution.linearRest(), linearRest());
  }

  /** The network with every capacitor in place at rest. */
  NetworkSensitivity network() {
    return NetworkSensitivity.of(solution.linearRest(), linearRest());
  }

  /** Adds the derivatives of the reference. */
  void addReference(double weight, ElementSensitivities sums) {
    if (!hookup().circuit().hasNode(Nodes.MID_RAIL)) {
      gains.add(g -> g.reference(0), weight, sums);
      return;
    }
    double midRail = solution.rest().state().voltage(Nodes.MID_RAIL);
    gains.add(g -> g.reference(midRail), weight, sums);
    double share = solution.gains().reference(1) - solution.gains().reference(0);
    rest().add(hookup().circuit().node(Nodes.MID_RAIL), weight * share, sums);
  }

  /** Adds the derivatives of the reference plus or minus P/2. */
  private void addLevel(int side, double weight, ElementSensitivities sums) {
    addReference(weight, sums);
    double amplitude = solution.hookup().source().amplitude().value();
    if (amplitude > 0 && solution.gains().idealGain().isPresent()) {
      double ideal = solution.gains().idealGain().getAsDouble();
      double half = side * amplitude / 2 * Math.pow(0.5, solution.levels().halvings());
      gains.add(g -> g.idealGain().orElseThrow(), weight * half * Math.signum(ideal), sums);
    }
  }
}
