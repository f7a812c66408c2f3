package loopwright.view.form;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import loopwright.part.DiodeRecord;
import loopwright.part.PartRecord;
import loopwright.part.TransistorDatasheet;
import loopwright.part.TransistorLimits;
import loopwright.part.TransistorRecord;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;

/** The key data of a part in a line: what it is, β, V_BE, f_T, limits. */
final class PartData {
  private PartData() {}

  static String of(Optional<PartRecord> record) {
    if (record.isEmpty()) {
      return "no record";
    }
    return record.get() instanceof TransistorRecord transistor
        ? of(transistor)
        : diode((DiodeRecord) record.get());
  }

  private static String of(TransistorRecord record) {
    List<String> data = new ArrayList<>();
    data.add(record.kind().name().toLowerCase(Locale.ROOT));
    record
        .datasheet()
        .flatMap(sheet -> sheet.beta().stream().reduce((one, other) -> middle(one, other)))
        .ifPresent(beta -> data.add("β " + beta(beta)));
    record
        .model()
        .flatMap(model -> model.forwardBeta())
        .ifPresent(beta -> data.add("β " + text(beta, Unit.ONE)));
    record
        .datasheet()
        .flatMap(TransistorDatasheet::transitionFrequency)
        .flatMap(frequency -> frequency.typical().or(frequency::minimum))
        .ifPresent(frequency -> data.add("f_T " + text(frequency, Unit.HERTZ)));
    record
        .limits()
        .flatMap(TransistorLimits::collectorEmitterVoltage)
        .ifPresent(volts -> data.add(text(volts, Unit.VOLT)));
    record
        .limits()
        .flatMap(TransistorLimits::collectorCurrent)
        .ifPresent(current -> data.add(text(current, Unit.AMPERE)));
    record
        .limits()
        .flatMap(TransistorLimits::power)
        .ifPresent(power -> data.add(text(power, Unit.WATT)));
    return String.join(", ", data);
  }

  /** Of two lines the one that says more. */
  private static TransistorDatasheet.Beta middle(
      TransistorDatasheet.Beta one, TransistorDatasheet.Beta other) {
    return one.typical().isPresent() || other.typical().isEmpty() ? one : other;
  }

  private static String beta(TransistorDatasheet.Beta line) {
    String low = line.minimum().map(value -> text(value, Unit.ONE)).orElse("");
    String high = line.maximum().map(value -> text(value, Unit.ONE)).orElse("");
    return line.typical()
        .map(value -> text(value, Unit.ONE))
        .orElse(high.isEmpty() ? "≥ " + low : low + " to " + high);
  }

  private static String diode(DiodeRecord record) {
    return record
        .limits()
        .flatMap(limits -> limits.reverseVoltage())
        .map(volts -> "diode, " + text(volts, Unit.VOLT))
        .orElse("diode");
  }

  private static String text(Quantity value, Unit unit) {
    return EngineeringFormat.format(value.value(), unit, 3);
  }
}
