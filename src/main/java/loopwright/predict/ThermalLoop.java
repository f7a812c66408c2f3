package loopwright.predict;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import loopwright.assembly.AssembledHookup;
import loopwright.circuit.CircuitState;
import loopwright.circuit.Physics;
import loopwright.numeric.Eigenvalues;
import loopwright.solve.OperatingPointSolver;

/**
 * The loop of dissipation and junction temperature of all devices together, at rest: how much more
 * heat a first bit of heat brings. Each junction is warmed a little in the full circuit and every
 * dissipation read; the largest real eigenvalue of ∂(rises)/∂(temperatures) is the loop. Below 1
 * the temperatures settle, from 1 on they run away.
 *
 * @param loop largest real part of an eigenvalue; below 0 where heat calls for less heat
 * @param own by role, what a device does to itself alone: R_θ ∂P/∂T
 */
record ThermalLoop(double loop, Map<String, Double> own) {
  /** Warming for the differences, K: dissipation bends little over it. */
  private static final double WARMING = 0.05;

  /**
   * The loop at a solved rest.
   *
   * @throws UnsolvedException when no device states its thermal resistance
   */
  static ThermalLoop of(RestSolution rest) {
    AssembledHookup hookup = rest.hookup();
    DeviceReadout readout = new DeviceReadout(hookup);
    List<String> roles = new ArrayList<>();
    readout
        .thermalResistances()
        .forEach(
            (role, resistance) -> {
              if (resistance.isPresent()) {
                roles.add(role);
              }
            });
    if (roles.isEmpty()) {
      throw new UnsolvedException("no part states its thermal resistance");
    }
    int size = roles.size();
    double[] matrix = new double[size * size];
    for (int j = 0; j < size; j++) {
      Map<String, Double> warmer = powers(rest, readout, roles.get(j), WARMING);
      Map<String, Double> cooler = powers(rest, readout, roles.get(j), -WARMING);
      Map<String, Double> slope = new LinkedHashMap<>();
      warmer.forEach((role, p) -> slope.put(role, (p - cooler.get(role)) / (2 * WARMING)));
      for (int i = 0; i < size; i++) {
        matrix[i * size + j] = riseSlope(hookup, readout, slope, roles.get(i));
      }
    }
    Map<String, Double> own = new LinkedHashMap<>();
    for (int i = 0; i < size; i++) {
      own.put(roles.get(i), matrix[i * size + i]);
    }
    double[] values = Eigenvalues.of(matrix, size);
    double largest = Double.NEGATIVE_INFINITY;
    for (int i = 0; i < size; i++) {
      largest = Math.max(largest, values[2 * i]);
    }
    return new ThermalLoop(largest, own);
  }

  /** Rise of a junction, and of a bias device with its share of the output devices'. */
  private static double riseSlope(
      AssembledHookup hookup, DeviceReadout readout, Map<String, Double> slope, String role) {
    double rise = slope.get(role) * resistance(readout, role);
    if (role.startsWith("bias.")) {
      double coupling = hookup.design().surroundings().biasCoupling().value();
      for (String output : List.of("out.upper", "out.lower")) {
        rise += coupling / 2 * slope.getOrDefault(output, 0.0) * resistance(readout, output);
      }
    }
    return rise;
  }

  private static double resistance(DeviceReadout readout, String role) {
    return readout.thermalResistances().getOrDefault(role, OptionalDouble.empty()).orElse(0);
  }

  /** Dissipations with one junction warmer, W; the circuit is left as it was. */
  private static Map<String, Double> powers(
      RestSolution rest, DeviceReadout readout, String role, double warming) {
    AssembledHookup hookup = rest.hookup();
    double ambient = Physics.ZERO_CELSIUS + hookup.design().surroundings().ambient().value();
    double kelvin = rest.kelvins().getOrDefault(role, ambient);
    CircuitState state = rest.state().copy();
    hookup.circuit().heat(role, kelvin + warming);
    try {
      if (!OperatingPointSolver.solveAgain(state)) {
        throw new UnsolvedException(
            "with " + role + " a little warmer the circuit finds no operating point");
      }
      Map<String, Double> powers = new LinkedHashMap<>();
      readout.read(state, Map.of()).forEach((name, device) -> powers.put(name, device.power()));
      return powers;
    } finally {
      hookup.circuit().heat(role, kelvin);
    }
  }
}
