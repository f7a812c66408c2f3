package loopwright.predict;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Assembler;
import loopwright.assembly.DeviceModels;
import loopwright.assembly.Temperatures;
import loopwright.circuit.CircuitState;
import loopwright.circuit.DeviceTerminals;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.solve.OperatingPoint;
import loopwright.solve.OperatingPointSolver;

/**
 * The circuit at rest; with self-heating, every junction at the temperature that its own
 * dissipation gives it.
 *
 * @param hookup the circuit
 * @param state at rest, blocking capacitors open
 * @param remark how it was reached, or empty
 * @param kelvins junction temperatures by role that it was solved at; empty when at ambient
 */
record RestSolution(
    AssembledHookup hookup, CircuitState state, String remark, Map<String, Double> kelvins) {
  private static final int MOST_ROUNDS = 300;
  private static final double SETTLED = 1e-8;

  /** A round that leaves more than this share of the change before it makes little progress. */
  private static final double LITTLE_PROGRESS = 0.95;

  private static final double LEAST_WEIGHT = 0.05;

  private static final double HOTTEST = 1000;

  /**
   * Solves a hookup at rest.
   *
   * @param near the same hookup solved in surroundings that differ little, to start from
   * @throws UnsolvedException with the reason when there is no operating point
   */
  static RestSolution of(
      Design design, Hookup hookup, DeviceModels models, Optional<RestSolution> near) {
    JunctionHeat heat = new JunctionHeat(design);
    Solver solver = new Solver(design, hookup, models, heat);
    if (!design.surroundings().selfHeating()) {
      return solver.at(Map.of(), near);
    }
    RestSolution solution =
        solver.at(near.map(other -> other.kelvinsIn(design)).orElse(Map.of()), near);
    double weight = 1;
    double before = Double.POSITIVE_INFINITY;
    for (int round = 0; round < MOST_ROUNDS; round++) {
      Map<String, Double> next = solution.heated(heat);
      double change = change(solution.kelvins(), next);
      if (change < SETTLED) {
        return solution;
      }
      if (change > LITTLE_PROGRESS * before) {
        // Temperatures that swing to and fro settle when each round goes only part of the way.
        weight = Math.max(LEAST_WEIGHT, weight / 2);
      }
      before = change;
      next = between(solution.kelvins(), next, weight);
      next.forEach(
          (role, kelvin) -> {
            if (!(kelvin < HOTTEST)) {
              throw new UnsolvedException(
                  "thermal runaway: the junction of " + role + " finds no rest");
            }
          });
      solution = solver.heated(next, solution);
    }
    throw new UnsolvedException("the junction temperatures do not settle");
  }

  /** Solves one hookup at given junction temperatures. */
  private record Solver(Design design, Hookup hookup, DeviceModels models, JunctionHeat heat) {
    /** The same circuit with its junctions at other temperatures; what it was is given up. */
    RestSolution heated(Map<String, Double> kelvins, RestSolution before) {
      CircuitState state = before.state().copy();
      RestSolution.heat(before.hookup(), heat.temperatures(kelvins));
      return OperatingPointSolver.solvedNear(state)
          ? new RestSolution(before.hookup(), state, before.remark(), kelvins)
          : at(kelvins, Optional.of(before));
    }

    RestSolution at(Map<String, Double> kelvins, Optional<RestSolution> near) {
      AssembledHookup assembled =
          Assembler.assemble(
              design, hookup, models, heat.temperatures(kelvins), near.map(RestSolution::hookup));
      OperatingPoint point =
          near.map(start -> OperatingPointSolver.solveNear(assembled.circuit(), start.state()))
              .orElseGet(() -> OperatingPointSolver.solve(assembled.circuit()));
      if (point instanceof OperatingPoint.Found found) {
        String remark = near.map(RestSolution::remark).orElse(found.remark());
        return new RestSolution(assembled, found.state(), remark, kelvins);
      }
      throw new UnsolvedException(((OperatingPoint.NotFound) point).reason());
    }
  }

  private static void heat(AssembledHookup hookup, Temperatures temperatures) {
    for (DeviceTerminals device : hookup.circuit().devices()) {
      hookup.circuit().heat(device.role(), temperatures.kelvin(device.role()));
    }
  }

  /** Its junction temperatures, moved by as much as a design's ambient differs. */
  private Map<String, Double> kelvinsIn(Design design) {
    double warmer =
        design.surroundings().ambient().value() - hookup.design().surroundings().ambient().value();
    Map<String, Double> moved = new HashMap<>();
    kelvins.forEach((role, kelvin) -> moved.put(role, kelvin + warmer));
    return moved;
  }

  private Map<String, Double> heated(JunctionHeat heat) {
    DeviceReadout readout = new DeviceReadout(hookup);
    Map<String, Double> powers = new HashMap<>();
    readout.read(state, Map.of()).forEach((role, device) -> powers.put(role, device.power()));
    return heat.kelvins(powers, readout.thermalResistances());
  }

  private static Map<String, Double> between(
      Map<String, Double> from, Map<String, Double> to, double weight) {
    Map<String, Double> between = new HashMap<>();
    to.forEach(
        (role, kelvin) -> {
          double start = from.getOrDefault(role, kelvin);
          between.put(role, start + weight * (kelvin - start));
        });
    return between;
  }

  private static double change(Map<String, Double> before, Map<String, Double> after) {
    double most = 0;
    for (Map.Entry<String, Double> entry : after.entrySet()) {
      Double old = before.get(entry.getKey());
      most =
          Math.max(most, old == null ? Double.POSITIVE_INFINITY : Math.abs(entry.getValue() - old));
    }
    return most;
  }
}
