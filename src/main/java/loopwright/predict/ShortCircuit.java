package loopwright.predict;

import java.util.Comparator;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Assembler;
import loopwright.circuit.CircuitState;
import loopwright.design.Design;
import loopwright.quantity.Unit;
import loopwright.solve.GeneratorWalk;
import loopwright.solve.OperatingPoint;
import loopwright.solve.OperatingPointSolver;

/**
 * What the output delivers when it is held at its reference, such as by a short circuit to ground,
 * while the generator asks for ± P. Junction temperatures are those at rest.
 *
 * @param sourced current out of the output with the generator where it would give + P, A
 * @param sunk current into the output where it would give − P, A
 * @param hottest role of the device that dissipates most in either case; empty without devices
 * @param power its dissipation, W
 */
record ShortCircuit(double sourced, double sunk, String hottest, double power) {
  /**
   * Solves both.
   *
   * @param held at rest, blocking capacitors held
   * @throws UnsolvedException when the held circuit finds no operating point
   */
  static ShortCircuit of(
      Design design,
      AssembledHookup free,
      HookupGains gains,
      RestSolution rest,
      CircuitState held) {
    AssembledHookup shorted =
        Assembler.assembleHeld(
            free,
            new JunctionHeat(design).temperatures(rest.kelvins()),
            Levels.reference(free, gains, held));
    OperatingPoint point = OperatingPointSolver.solve(shorted.circuit());
    if (!(point instanceof OperatingPoint.Found found)) {
      throw new UnsolvedException(
          "with the output held: " + ((OperatingPoint.NotFound) point).reason());
    }
    CircuitState start = found.state();
    start.holdBlockingCapacitorsAs(held);
    if (!OperatingPointSolver.solveAgain(start)) {
      throw new UnsolvedException("with the output held, the circuit finds no rest");
    }
    CircuitState high = at(shorted, start, Levels.generatorForPeak(free, gains, held, 1));
    CircuitState low = at(shorted, start, Levels.generatorForPeak(free, gains, held, -1));
    Optional<Map.Entry<String, DeviceState>> most = hottest(shorted, high, low);
    return new ShortCircuit(
        -shorted.holder().current(high),
        shorted.holder().current(low),
        most.map(Map.Entry::getKey).orElse(""),
        most.map(entry -> entry.getValue().power()).orElse(0.0));
  }

  /** The larger of both, A. */
  double current() {
    return Math.max(Math.abs(sourced), Math.abs(sunk));
  }

  /** Both, and what they do, in words. */
  String says() {
    String both =
        Text.of(sourced, Unit.AMPERE)
            + " out of the output, "
            + Text.of(sunk, Unit.AMPERE)
            + " into it";
    return hottest.isEmpty()
        ? both
        : both + "; " + hottest + " then dissipates " + Text.of(power, Unit.WATT);
  }

  private static CircuitState at(AssembledHookup shorted, CircuitState start, double generator) {
    double distance = Math.abs(generator - start.generator());
    GeneratorWalk walk = new GeneratorWalk(shorted, start, Math.max(distance / 8, 1e-6));
    if (walk.advance(generator)) {
      return walk.state();
    }
    // Beyond a fold the circuit jumps, and settles with the generator where it is to be.
    CircuitState state = walk.state();
    state.setGenerator(generator);
    if (!OperatingPointSolver.solveAgain(state)) {
      throw new UnsolvedException(
          "with the output held, the circuit finds no rest at a generator of "
              + Text.volts(generator));
    }
    return state;
  }

  private static Optional<Map.Entry<String, DeviceState>> hottest(
      AssembledHookup shorted, CircuitState high, CircuitState low) {
    DeviceReadout readout = new DeviceReadout(shorted);
    return Stream.of(high, low)
        .flatMap(state -> readout.read(state, Map.of()).entrySet().stream())
        .max(Comparator.comparingDouble(entry -> entry.getValue().power()));
  }
}
