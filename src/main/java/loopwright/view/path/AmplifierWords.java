package loopwright.view.path;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import loopwright.design.FiguresAmplifier;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;

/** An amplifier known by its figures, in words; what is at its default is left out. */
final class AmplifierWords {
  private AmplifierWords() {}

  static List<String> says(FiguresAmplifier amplifier) {
    List<String> says = new ArrayList<>();
    add(says, "offset ", amplifier.inputOffset(), Unit.VOLT);
    add(says, "dead zone \u00B1", amplifier.deadZone(), Unit.VOLT);
    if (!amplifier.poles().isEmpty()) {
      says.add(
          amplifier.poles().stream()
              .map(pole -> EngineeringFormat.format(pole.value(), Unit.HERTZ))
              .collect(Collectors.joining(", ", "poles ", "")));
    }
    add(says, "input ", amplifier.inputResistance(), Unit.OHM);
    add(says, "input ", amplifier.inputCapacitance(), Unit.FARAD);
    add(says, "bias ", amplifier.inputBiasCurrent(), Unit.AMPERE);
    add(says, "CMRR ", amplifier.commonModeRejection(), Unit.ONE);
    add(says, "output ", amplifier.outputResistance(), Unit.OHM);
    amplifier.outputHigh().ifPresent(high -> says.add("up to " + text(high, Unit.VOLT)));
    amplifier.outputLow().ifPresent(low -> says.add("down to " + text(low, Unit.VOLT)));
    add(says, "slews ", amplifier.slewRate(), Unit.VOLT_PER_SECOND);
    if (says.isEmpty()) {
      says.add("known by its gain alone");
    }
    return says;
  }

  /** A figure that is neither nothing nor without limit. */
  private static void add(List<String> says, String what, Quantity figure, Unit unit) {
    if (figure.value() != 0 && Double.isFinite(figure.value())) {
      says.add(what + text(figure, unit));
    }
  }

  private static String text(Quantity figure, Unit unit) {
    return EngineeringFormat.format(figure.value(), unit);
  }
}
