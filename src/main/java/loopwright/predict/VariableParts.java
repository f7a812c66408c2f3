package loopwright.predict;

import java.util.ArrayList;
import java.util.List;
import loopwright.assembly.AssembledHookup;
import loopwright.circuit.DeviceTerminals;
import loopwright.circuit.ElementSensitivities;
import loopwright.circuit.Parameter;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.NamedPart;
import loopwright.quantity.Unit;

/** Everything of a hookup that may differ from build to build, whatever its tolerance. */
final class VariableParts {
  private VariableParts() {}

  /**
   * One of them.
   *
   * @param parameter what changes
   * @param name path of the design, or role of a device
   * @param elements the circuit's elements that change together
   */
  record VariablePart(Parameter parameter, String name, List<String> elements) {
    /** The derivative by this part. */
    double of(ElementSensitivities sums) {
      return elements.stream().mapToDouble(element -> sums.get(element, parameter)).sum();
    }

    /**
     * A build in which it alone deviates.
     *
     * @param by natural logarithm of the ratio, or V of a junction voltage
     */
    Build build(Design design, double by) {
      TolerancedPart.Kind kind =
          switch (parameter) {
            case RESISTANCE -> TolerancedPart.Kind.RESISTOR;
            case CAPACITANCE -> TolerancedPart.Kind.CAPACITOR;
            case SUPPLY -> TolerancedPart.Kind.RAIL;
            case JUNCTION_VOLTAGE -> TolerancedPart.Kind.BASE_EMITTER_VOLTAGE;
            case CURRENT_GAIN -> TolerancedPart.Kind.BETA;
          };
      boolean isShare =
          parameter == Parameter.RESISTANCE
              || parameter == Parameter.CAPACITANCE
              || parameter == Parameter.SUPPLY;
      double deviation = isShare ? Math.expm1(by) : by;
      TolerancedPart part = new TolerancedPart(kind, name, 0, 0);
      return TolerancedParts.build(design, List.of(part), new double[] {deviation});
    }
  }

  /** Those of a hookup: parts in the order of the file, devices, rails. */
  static List<VariablePart> of(HookupFigures figures, AssembledHookup hookup) {
    Design design = figures.design();
    List<VariablePart> parts = new ArrayList<>();
    for (NamedPart part : DesignPath.parts(design)) {
      List<String> elements = figures.elements(part.path());
      if (!elements.isEmpty()) {
        parts.add(
            new VariablePart(
                part.unit() == Unit.OHM ? Parameter.RESISTANCE : Parameter.CAPACITANCE,
                part.path(),
                elements));
      }
    }
    for (DeviceTerminals device : hookup.circuit().devices()) {
      List<String> self = List.of(device.role());
      parts.add(new VariablePart(Parameter.JUNCTION_VOLTAGE, device.role(), self));
      if (device instanceof DeviceTerminals.TransistorTerminals) {
        parts.add(new VariablePart(Parameter.CURRENT_GAIN, device.role(), self));
      }
    }
    addRail(parts, "positive", design.rails().positive().value());
    addRail(parts, "negative", design.rails().negative().value());
    return parts;
  }

  private static void addRail(List<VariablePart> parts, String rail, double volts) {
    if (volts != 0) {
      parts.add(new VariablePart(Parameter.SUPPLY, "rails." + rail, List.of("supply." + rail)));
    }
  }
}
