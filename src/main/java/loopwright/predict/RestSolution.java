package loopwright.predict;

import java.util.HashMap;
import java.util.Map;
import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Assembler;
import loopwright.assembly.DeviceModels;
import loopwright.circuit.CircuitState;
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
  private static final int MOST_ROUNDS = 200;
  private static final double SETTLED = 1e-8;
  private static final double HOTTEST = 1000;

  /**
   * Solves a hookup at rest.
   *
   * @throws UnsolvedException with the reason when there is no operating point
   */
  static RestSolution of(Design design, Hookup hookup, DeviceModels models) {
    JunctionHeat heat = new JunctionHeat(design);
    Map<String, Double> kelvins = Map.of();
    if (!design.surroundings().selfHeating()) {
      return at(design, hookup, models, heat, kelvins);
    }
    RestSolution solution = at(design, hookup, models, heat, kelvins);
    for (int round = 0; round < MOST_ROUNDS; round++) {
      Map<String, Double> next = solution.heated(heat);
      double change = change(solution.kelvins(), next);
      if (change < SETTLED) {
        return solution;
      }
      next.forEach(
          (role, kelvin) -> {
            if (!(kelvin < HOTTEST)) {
              throw new UnsolvedException(
                  "thermal runaway: the junction of " + role + " finds no rest");
            }
          });
      solution = at(design, hookup, models, heat, next);
    }
    throw new UnsolvedException("the junction temperatures do not settle");
  }

  private static RestSolution at(
      Design design,
      Hookup hookup,
      DeviceModels models,
      JunctionHeat heat,
      Map<String, Double> kelvins) {
    AssembledHookup assembled =
        Assembler.assemble(design, hookup, models, heat.temperatures(kelvins));
    OperatingPoint point = OperatingPointSolver.solve(assembled.circuit());
    if (point instanceof OperatingPoint.Found found) {
      return new RestSolution(assembled, found.state(), found.remark(), kelvins);
    }
    throw new UnsolvedException(((OperatingPoint.NotFound) point).reason());
  }

  private Map<String, Double> heated(JunctionHeat heat) {
    DeviceReadout readout = new DeviceReadout(hookup);
    Map<String, Double> powers = new HashMap<>();
    readout.read(state, Map.of()).forEach((role, device) -> powers.put(role, device.power()));
    return heat.kelvins(powers, readout.thermalResistances());
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
