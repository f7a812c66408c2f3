package loopwright.predict;

import java.util.HashMap;
import java.util.Map;
import java.util.OptionalDouble;
import loopwright.assembly.Temperatures;
import loopwright.circuit.Physics;
import loopwright.design.Design;

/** Junction temperatures from dissipation, thermal resistance and bias coupling. */
final class JunctionHeat {
  private final Design design;
  private final double ambient;

  JunctionHeat(Design design) {
    this.design = design;
    this.ambient = design.surroundings().ambient().value();
  }

  /**
   * Temperature of a junction by its own dissipation, °C; empty when the record states no thermal
   * resistance.
   */
  OptionalDouble celsius(double power, OptionalDouble thermalResistance) {
    return thermalResistance.isEmpty()
        ? OptionalDouble.empty()
        : OptionalDouble.of(ambient + power * thermalResistance.getAsDouble());
  }

  /**
   * Temperatures that devices have at the powers they dissipate; one without a stated thermal
   * resistance stays at ambient. The bias devices also see their share of the output devices' mean
   * rise.
   *
   * @param powers dissipation by role, W
   * @param resistances thermal resistance by role, K/W
   */
  Map<String, Double> kelvins(Map<String, Double> powers, Map<String, OptionalDouble> resistances) {
    Map<String, Double> rises = new HashMap<>();
    powers.forEach((role, power) -> rises.put(role, power * resistances.get(role).orElse(0)));
    double coupled =
        design.surroundings().biasCoupling().value()
            * (rises.getOrDefault("out.upper", 0.0) + rises.getOrDefault("out.lower", 0.0))
            / 2;
    Map<String, Double> kelvins = new HashMap<>();
    rises.forEach(
        (role, rise) ->
            kelvins.put(
                role,
                Physics.ZERO_CELSIUS + ambient + rise + (role.startsWith("bias.") ? coupled : 0)));
    return kelvins;
  }

  /** Temperatures by role, ambient where a role is not listed. */
  Temperatures temperatures(Map<String, Double> kelvins) {
    double other = Physics.ZERO_CELSIUS + ambient;
    return role -> kelvins.getOrDefault(role, other);
  }
}
