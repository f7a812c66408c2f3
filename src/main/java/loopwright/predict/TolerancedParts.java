package loopwright.predict;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.assembly.Deviations;
import loopwright.assembly.DeviceDeviation;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.DeviceRole;
import loopwright.design.DeviceRoles;
import loopwright.design.NamedPart;
import loopwright.design.PartValue;
import loopwright.design.Tolerances;
import loopwright.design.Tolerances.BetaSpread;
import loopwright.part.TransistorDatasheet;
import loopwright.part.TransistorMeasured;
import loopwright.part.TransistorRecord;
import loopwright.predict.DeviceState.TransistorState;
import loopwright.predict.TolerancedPart.Kind;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;

/**
 * Everything of a design that spreads, by its tolerances: resistors and capacitors by their own or
 * the general one, each transistor's V_BE and β, each rail, the ambient temperature. What was
 * measured does not spread. Where one path stands for two parts, such as the emitter resistors of a
 * pair, each spreads by itself.
 */
public final class TolerancedParts {
  private static final String TWIN = "@";

  private final Design design;
  private final HookupFigures nominal;
  private final List<TolerancedPart> parts = new ArrayList<>();

  private TolerancedParts(HookupFigures nominal) {
    this.design = nominal.design();
    this.nominal = nominal;
  }

  /**
   * Lists those of a design, the parts of all its hookups included.
   *
   * @param nominal some hookup of it: the currents of its devices decide which line of a datasheet
   *     holds
   */
  public static List<TolerancedPart> of(HookupFigures nominal) {
    Design design = nominal.design();
    TolerancedParts found = new TolerancedParts(nominal);
    DesignPath.parts(design).forEach(found::part);
    DeviceRoles.of(design).stream().filter(role -> !role.diode()).forEach(found::device);
    Tolerances tolerances = design.tolerances();
    tolerances.rails().ifPresent(found::rails);
    tolerances.ambient().ifPresent(found::ambient);
    return List.copyOf(found.parts);
  }

  /** Those of them that a hookup has: not the parts of other hookups. */
  public static List<TolerancedPart> in(List<TolerancedPart> parts, String hookup) {
    return parts.stream()
        .filter(
            part ->
                !part.name().startsWith("hookups.")
                    || part.name().startsWith("hookups." + hookup + "."))
        .toList();
  }

  /**
   * A build of the design.
   *
   * @param parts what deviates
   * @param deviations by how much, in the same order
   */
  public static Build build(Design design, List<TolerancedPart> parts, double[] deviations) {
    Map<String, Object> values = new HashMap<>();
    Map<String, DeviceDeviation> devices = new HashMap<>();
    Map<String, Double> twins = new HashMap<>();
    for (int i = 0; i < deviations.length; i++) {
      double by = deviations[i];
      TolerancedPart part = parts.get(i);
      String name = part.name();
      switch (part.kind()) {
        case RESISTOR, CAPACITOR -> {
          if (name.contains(TWIN)) {
            twins.put(name, 1 + by);
          } else {
            values.put(name, fitted(design, name, by));
          }
        }
        case BASE_EMITTER_VOLTAGE ->
            devices.merge(
                name,
                new DeviceDeviation(by, 1),
                (old, more) -> new DeviceDeviation(by, old.betaRatio()));
        case BETA ->
            devices.merge(
                name,
                new DeviceDeviation(0, Math.exp(by)),
                (old, more) -> new DeviceDeviation(old.baseEmitterVoltage(), more.betaRatio()));
        case RAIL -> values.put(name, Quantity.of(number(design, name) * (1 + by)));
        case AMBIENT -> values.put(name, Quantity.of(number(design, name) + by));
      }
    }
    return new Build(DesignPath.setAll(design, values), new Deviations(devices, twins));
  }

  private static PartValue fitted(Design design, String path, double by) {
    PartValue old = (PartValue) DesignPath.get(design, path);
    double value = old.effective() * (1 + by);
    return new PartValue(Quantity.of(value), old.tolerance(), Optional.empty());
  }

  private static double number(Design design, String path) {
    return ((Quantity) DesignPath.get(design, path)).value();
  }

  private void part(NamedPart named) {
    PartValue value = named.value();
    if (value.measured().isPresent() || named.path().startsWith("bench.")) {
      return;
    }
    boolean resistor = named.unit() == Unit.OHM;
    Tolerances tolerances = design.tolerances();
    value
        .tolerance()
        .or(resistor ? tolerances::resistor : tolerances::capacitor)
        .map(Quantity::value)
        .filter(fraction -> fraction > 0)
        .ifPresent(
            fraction ->
                elements(named.path())
                    .forEach(
                        element ->
                            add(
                                resistor ? Kind.RESISTOR : Kind.CAPACITOR,
                                element,
                                -fraction,
                                fraction)));
  }

  /** The path itself where this hookup has no part of it: another may. */
  private List<String> elements(String path) {
    List<String> elements = nominal.elements(path);
    return elements.isEmpty() ? List.of(path) : elements;
  }

  private void device(DeviceRole role) {
    Tolerances tolerances = design.tolerances();
    Optional<TransistorMeasured> measured =
        role.measured().or(() -> record(role).flatMap(TransistorRecord::measured));
    if (measured.flatMap(TransistorMeasured::baseEmitterVoltage).isEmpty()) {
      tolerances
          .baseEmitterVoltage()
          .map(Quantity::value)
          .filter(volts -> volts > 0)
          .ifPresent(volts -> add(Kind.BASE_EMITTER_VOLTAGE, role.role(), -volts, volts));
    }
    if (measured.flatMap(TransistorMeasured::beta).isEmpty()) {
      tolerances.beta().ifPresent(spread -> beta(role, spread));
    }
  }

  private void beta(DeviceRole role, BetaSpread spread) {
    if (spread instanceof BetaSpread.ByFraction fraction) {
      double by = fraction.fraction().value();
      add(Kind.BETA, role.role(), Math.log(1 - by), Math.log(1 + by));
      return;
    }
    record(role)
        .flatMap(TransistorRecord::datasheet)
        .map(TransistorDatasheet::beta)
        .flatMap(lines -> nearest(lines, current(role)))
        .ifPresent(line -> fromDatasheet(role, line));
  }

  /**
   * A limit that is not printed is as far from the typical value as the one that is, in ratio: a
   * typical value stands for the middle, and a minimum alone for 1/1.5 of it.
   */
  private void fromDatasheet(DeviceRole role, TransistorDatasheet.Beta line) {
    OptionalDouble minimum = number(line.minimum());
    OptionalDouble maximum = number(line.maximum());
    if (minimum.isEmpty() && maximum.isEmpty()) {
      return;
    }
    double typical =
        line.typical()
            .map(Quantity::value)
            .orElseGet(
                () ->
                    minimum.isPresent() && maximum.isPresent()
                        ? Math.sqrt(minimum.getAsDouble() * maximum.getAsDouble())
                        : minimum.isPresent()
                            ? 1.5 * minimum.getAsDouble()
                            : maximum.getAsDouble() / 1.5);
    double low =
        Math.log(minimum.orElseGet(() -> typical * typical / maximum.getAsDouble()) / typical);
    double high =
        Math.log(maximum.orElseGet(() -> typical * typical / minimum.getAsDouble()) / typical);
    add(Kind.BETA, role.role(), low, high);
  }

  private static OptionalDouble number(Optional<Quantity> quantity) {
    return quantity.map(value -> OptionalDouble.of(value.value())).orElse(OptionalDouble.empty());
  }

  private static Optional<TransistorDatasheet.Beta> nearest(
      List<TransistorDatasheet.Beta> lines, OptionalDouble current) {
    return lines.stream()
        .filter(line -> line.minimum().isPresent() || line.maximum().isPresent())
        .min(
            Comparator.comparingDouble(
                line ->
                    current.isPresent()
                        ? Math.abs(Math.log(line.current().value() / current.getAsDouble()))
                        : 0));
  }

  private OptionalDouble current(DeviceRole role) {
    return nominal.devices().get(role.role()) instanceof TransistorState state
            && state.collectorCurrent() > 0
        ? OptionalDouble.of(state.collectorCurrent())
        : OptionalDouble.empty();
  }

  private Optional<TransistorRecord> record(DeviceRole role) {
    return design.parts().get(role.part()) instanceof TransistorRecord record
        ? Optional.of(record)
        : Optional.empty();
  }

  private void rails(Quantity fraction) {
    if (fraction.value() > 0) {
      add(Kind.RAIL, "rails.positive", -fraction.value(), fraction.value());
      if (design.rails().negative().value() != 0) {
        add(Kind.RAIL, "rails.negative", -fraction.value(), fraction.value());
      }
    }
  }

  private void ambient(Tolerances.AmbientRange range) {
    double nominal = design.surroundings().ambient().value();
    add(
        Kind.AMBIENT,
        "surroundings.ambient",
        range.minimum().value() - nominal,
        range.maximum().value() - nominal);
  }

  private void add(Kind kind, String name, double low, double high) {
    parts.add(new TolerancedPart(kind, name, low, high));
  }
}
