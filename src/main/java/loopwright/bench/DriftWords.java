package loopwright.bench;

import java.util.OptionalDouble;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.PartValue;
import loopwright.predict.TolerancedPart;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;

/** A drifted part in words and as a value. */
final class DriftWords {
  private DriftWords() {}

  /** The value that the part has, in its own unit: Ω, F, V or °C; for β the ratio to nominal. */
  static OptionalDouble value(Design design, TolerancedPart part, double deviation) {
    return OptionalDouble.of(
        switch (part.kind()) {
          case RESISTOR, CAPACITOR -> nominal(design, part) * (1 + deviation);
          case RAIL -> nominal(design, part) * (1 + deviation);
          case AMBIENT -> nominal(design, part) + deviation;
          case BASE_EMITTER_VOLTAGE -> deviation;
          case BETA -> Math.exp(deviation);
        });
  }

  static String of(Design design, TolerancedPart part, double deviation) {
    double value = value(design, part, deviation).orElseThrow();
    return switch (part.kind()) {
      case RESISTOR -> drifted(design, part, value, Unit.OHM);
      case CAPACITOR -> drifted(design, part, value, Unit.FARAD);
      case RAIL -> drifted(design, part, value, Unit.VOLT);
      case AMBIENT -> drifted(design, part, value, Unit.CELSIUS);
      case BASE_EMITTER_VOLTAGE ->
          part.name()
              + ": V_BE "
              + EngineeringFormat.format(Math.abs(value), Unit.VOLT, 3)
              + (value < 0 ? " lower" : " higher")
              + " than its record says";
      case BETA ->
          part.name()
              + ": β "
              + EngineeringFormat.format(value, Unit.ONE, 3)
              + " times what its record says";
    };
  }

  private static String drifted(Design design, TolerancedPart part, double value, Unit unit) {
    return part.name()
        + ": "
        + EngineeringFormat.format(value, unit, 3)
        + " instead of "
        + EngineeringFormat.format(nominal(design, part), unit, 3);
  }

  private static double nominal(Design design, TolerancedPart part) {
    int twin = part.name().indexOf('@');
    String path = twin < 0 ? part.name() : part.name().substring(0, twin);
    Object value = DesignPath.get(design, path);
    return value instanceof PartValue partValue
        ? partValue.effective()
        : ((Quantity) value).value();
  }
}
