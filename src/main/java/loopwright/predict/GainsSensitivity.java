package loopwright.predict;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.ToDoubleFunction;
import loopwright.circuit.ElementSensitivities;
import loopwright.circuit.Parameter;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.Hookup;
import loopwright.design.NamedPart;
import loopwright.design.PartValue;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;

/**
 * How what the resistors around the amplifier alone decide changes with them.
 *
 * <p>Any gain or resistance of a linear network is a quotient of two linear functions of one of its
 * resistors. Of such a quotient the harmonic mean of the difference quotients to either side is the
 * derivative itself, whatever the step, so that rounding is all that is left.
 */
final class GainsSensitivity {
  private static final double STEP = 0.5;

  private record Sides(HookupGains less, HookupGains more) {}

  private final HookupGains here;
  private final Map<String, Sides> sides = new LinkedHashMap<>();

  GainsSensitivity(Design design, Hookup hookup) {
    this.here = new HookupGains(hookup);
    String prefix = "hookups." + hookup.name() + ".";
    for (NamedPart part : DesignPath.parts(design)) {
      if (part.path().startsWith(prefix) && part.unit() == Unit.OHM) {
        sides.put(
            part.path(),
            new Sides(
                moved(design, hookup, part, 1 - STEP), moved(design, hookup, part, 1 + STEP)));
      }
    }
  }

  private static HookupGains moved(Design design, Hookup hookup, NamedPart part, double factor) {
    PartValue value = PartValue.of(Quantity.of(part.value().effective() * factor));
    Design moved = DesignPath.set(design, part.path(), value);
    return new HookupGains(moved.hookup(hookup.name()).orElseThrow());
  }

  /**
   * Adds the derivatives of a gain or resistance.
   *
   * @param function a quotient of two linear functions of every resistor
   * @param weight factor on them
   */
  void add(ToDoubleFunction<HookupGains> function, double weight, ElementSensitivities sums) {
    double middle = function.applyAsDouble(here);
    sides.forEach(
        (path, side) -> {
          double below = (middle - function.applyAsDouble(side.less())) / STEP;
          double above = (function.applyAsDouble(side.more()) - middle) / STEP;
          if (below != 0 && above != 0) {
            sums.add(path, Parameter.RESISTANCE, weight * 2 / (1 / below + 1 / above));
          }
        });
  }
}
