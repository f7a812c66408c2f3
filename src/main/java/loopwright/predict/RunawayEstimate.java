package loopwright.predict;

import java.util.OptionalDouble;

/**
 * Thermal runaway of one output device by hand beside what the circuit says of it, at the hottest
 * ambient.
 *
 * @param role of the device
 * @param formula the loop by hand: V_CE R_θ κ/(R_E + V_T/I_C)
 * @param solved what the device does to itself in the full circuit: R_θ ∂P/∂T
 * @param kappa what the formula took for −dV_BE/dT, less what the bias follows, V/K
 * @param collectorCurrent I_C, A
 * @param collectorEmitter V_CE, V
 * @param leastResistance by hand, for half a loop, Ω in series with the emitter
 */
public record RunawayEstimate(
    String role,
    double formula,
    OptionalDouble solved,
    double kappa,
    double collectorCurrent,
    double collectorEmitter,
    double leastResistance) {}
