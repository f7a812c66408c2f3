package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Assembler;
import loopwright.assembly.DeviceModels;
import loopwright.assembly.Temperatures;
import loopwright.design.Design;
import loopwright.design.RandomDesigns;
import loopwright.design.Surroundings;
import loopwright.quantity.Quantity;
import loopwright.solve.OperatingPoint;
import loopwright.solve.OperatingPointSolver;
import org.junit.jupiter.api.Test;

/**
 * With self-heating every junction is at ambient plus its power times its thermal resistance, the
 * bias devices warmer by their share of the output devices' mean rise; without, it is solved at
 * ambient and the same temperature is only reported.
 */
class SelfHeatingTest {
  private static final int DESIGNS = 25;

  private static Design heating(Design design, boolean selfHeating) {
    return design.withSurroundings(
        new Surroundings(
            design.surroundings().ambient(),
            design.surroundings().strayCapacitance(),
            selfHeating,
            Quantity.of(0.4)));
  }

  private static RestSolution rest(Design design) {
    return RestSolution.of(
        design, design.hookups().get(0), new DeviceModels(design), Optional.empty());
  }

  @Test
  void junctionsSettleWhereTheirHeatPutsThem() {
    int coupled = 0;
    for (Design design : RandomDesigns.of(DESIGNS).map(d -> heating(d, true)).toList()) {
      RestSolution rest = rest(design);
      double ambient = 273.15 + design.surroundings().ambient().value();
      DeviceReadout readout = new DeviceReadout(rest.hookup());
      Map<String, DeviceState> devices = readout.read(rest.state(), rest.kelvins());
      double output = 0;
      for (String role : List.of("out.upper", "out.lower")) {
        output += devices.containsKey(role) ? rise(readout, devices, role) / 2 : 0;
      }
      for (String role : devices.keySet()) {
        boolean bias = role.startsWith("bias.");
        double expected = ambient + rise(readout, devices, role) + (bias ? 0.4 * output : 0);
        assertThat(rest.kelvins().get(role))
            .as("%s, %s", design.name(), role)
            .isCloseTo(expected, within(1e-6));
        coupled += bias && output > 0.01 ? 1 : 0;
      }
    }
    assertThat(coupled).isPositive();
  }

  private static double rise(DeviceReadout readout, Map<String, DeviceState> devices, String role) {
    return devices.get(role).power() * readout.thermalResistances().get(role).orElse(0);
  }

  /** The circuit assembled at those temperatures has the same operating point. */
  @Test
  void theCircuitIsSolvedAtThoseTemperatures() {
    for (Design design : RandomDesigns.of(DESIGNS).map(d -> heating(d, true)).toList()) {
      RestSolution rest = rest(design);
      Temperatures temperatures = role -> rest.kelvins().get(role);
      AssembledHookup warm =
          Assembler.assemble(
              design,
              design.hookups().get(0),
              new DeviceModels(design),
              temperatures,
              Optional.empty());
      OperatingPoint point = OperatingPointSolver.solve(warm.circuit());
      assertThat(point).isInstanceOf(OperatingPoint.Found.class);
      for (String node : List.of("out", "pairOut", "gainOut")) {
        assertThat(((OperatingPoint.Found) point).state().voltage(node))
            .as("%s at %s", design.name(), node)
            .isCloseTo(rest.state().voltage(node), within(1e-6));
      }
    }
  }

  @Test
  void withoutSelfHeatingTheTemperatureIsOnlyReported() {
    for (Design design : RandomDesigns.of(DESIGNS).map(d -> heating(d, false)).toList()) {
      RestSolution rest = rest(design);
      assertThat(rest.kelvins()).isEmpty();
      DeviceReadout readout = new DeviceReadout(rest.hookup());
      readout
          .read(rest.state(), Map.of())
          .forEach(
              (role, device) -> {
                if (readout.thermalResistances().get(role).isPresent()) {
                  double resistance = readout.thermalResistances().get(role).getAsDouble();
                  assertThat(device.junctionTemperature().orElseThrow())
                      .isCloseTo(
                          design.surroundings().ambient().value() + device.power() * resistance,
                          within(1e-9));
                } else {
                  assertThat(device.junctionTemperature()).isEmpty();
                }
              });
    }
  }
}
