package loopwright.design;

import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import loopwright.part.DiodeDatasheet;
import loopwright.part.DiodeModel;
import loopwright.part.DiodeRecord;
import loopwright.part.PartRecord;
import loopwright.part.Pin;
import loopwright.part.TransistorDatasheet;
import loopwright.part.TransistorModel;
import loopwright.part.TransistorRecord;
import loopwright.quantity.Quantity;

/** Part records: whether they say enough to be solved with, and nothing that contradicts itself. */
final class PartRecordCheck {
  private final Problems problems;

  private PartRecordCheck(Problems problems) {
    this.problems = problems;
  }

  static void check(Design design, Problems problems) {
    PartRecordCheck check = new PartRecordCheck(problems);
    design.parts().forEach((name, part) -> check.record(name, part));
  }

  private void record(String name, PartRecord part) {
    String path = "parts." + name;
    if (name.isBlank()) {
      problems.add("parts", "a part without a name", "a name such as the type number");
    }
    if (part instanceof TransistorRecord transistor) {
      transistor(path, transistor);
      pins(path, transistor.pins(), EnumSet.of(Pin.EMITTER, Pin.BASE, Pin.COLLECTOR));
    } else if (part instanceof DiodeRecord diode) {
      diode(path, diode);
      pins(path, diode.pins(), EnumSet.of(Pin.ANODE, Pin.CATHODE));
    }
  }

  private void transistor(String path, TransistorRecord record) {
    boolean current = record.model().flatMap(TransistorModel::saturationCurrent).isPresent();
    boolean beta = record.model().flatMap(TransistorModel::forwardBeta).isPresent();
    if (record.datasheet().isPresent()) {
      TransistorDatasheet datasheet = record.datasheet().get();
      need(path, "datasheet.beta", beta || !datasheet.beta().isEmpty(), "one beta at a current");
      need(
          path,
          "datasheet.baseEmitterVoltage",
          current || !datasheet.baseEmitterVoltage().isEmpty(),
          "one base-emitter voltage at a current");
      datasheet(path + ".datasheet", datasheet);
    } else if (record.model().isPresent()) {
      need(path, "model.saturationCurrent", current, "a saturation current, or a datasheet");
      need(path, "model.forwardBeta", beta, "a forward beta, or a datasheet");
    } else {
      problems.add(path, "neither model nor datasheet", "at least one of the two");
    }
  }

  private void datasheet(String path, TransistorDatasheet datasheet) {
    for (int i = 0; i < datasheet.beta().size(); i++) {
      TransistorDatasheet.Beta entry = datasheet.beta().get(i);
      figure(path + ".beta." + i, entry.minimum(), entry.typical(), entry.maximum());
    }
    for (int i = 0; i < datasheet.baseEmitterVoltage().size(); i++) {
      TransistorDatasheet.BaseEmitterVoltage entry = datasheet.baseEmitterVoltage().get(i);
      figure(path + ".baseEmitterVoltage." + i, entry.minimum(), entry.typical(), entry.maximum());
    }
    datasheet
        .transitionFrequency()
        .ifPresent(
            entry ->
                figure(
                    path + ".transitionFrequency",
                    entry.minimum(),
                    entry.typical(),
                    Optional.empty()));
    datasheet
        .outputCapacitance()
        .ifPresent(
            entry ->
                figure(
                    path + ".outputCapacitance",
                    Optional.empty(),
                    entry.typical(),
                    entry.maximum()));
    datasheet
        .inputCapacitance()
        .ifPresent(
            entry ->
                figure(
                    path + ".inputCapacitance",
                    Optional.empty(),
                    entry.typical(),
                    entry.maximum()));
    datasheet
        .outputConductance()
        .ifPresent(
            entry ->
                figure(
                    path + ".outputConductance",
                    entry.minimum(),
                    Optional.empty(),
                    entry.maximum()));
  }

  private void diode(String path, DiodeRecord record) {
    boolean current = record.model().flatMap(DiodeModel::saturationCurrent).isPresent();
    if (record.datasheet().isPresent()) {
      List<DiodeDatasheet.ForwardVoltage> voltages = record.datasheet().get().forwardVoltage();
      need(
          path,
          "datasheet.forwardVoltage",
          current || !voltages.isEmpty(),
          "one forward voltage at a current");
      for (int i = 0; i < voltages.size(); i++) {
        figure(
            path + ".datasheet.forwardVoltage." + i,
            Optional.empty(),
            voltages.get(i).typical(),
            voltages.get(i).maximum());
      }
    } else if (record.model().isPresent()) {
      need(path, "model.saturationCurrent", current, "a saturation current, or a datasheet");
    } else {
      problems.add(path, "neither model nor datasheet", "at least one of the two");
    }
  }

  private void need(String path, String field, boolean present, String expected) {
    if (!present) {
      problems.add(path + "." + field, "nothing", expected);
    }
  }

  private void figure(
      String path,
      Optional<Quantity> minimum,
      Optional<Quantity> typical,
      Optional<Quantity> maximum) {
    List<Quantity> given =
        List.of(minimum, typical, maximum).stream().flatMap(Optional::stream).toList();
    if (given.isEmpty()) {
      problems.add(path, "no figure", "a minimum, typical or maximum value");
    }
    for (int i = 1; i < given.size(); i++) {
      if (given.get(i - 1).value() > given.get(i).value()) {
        problems.add(
            path,
            given.get(i - 1).spelling() + " before " + given.get(i).spelling(),
            "minimum, typical and maximum in rising order");
      }
    }
  }

  private void pins(String path, List<Pin> pins, Set<Pin> expected) {
    boolean complete = pins.size() == expected.size() && Set.copyOf(pins).equals(expected);
    if (!pins.isEmpty() && !complete) {
      problems.add(path + ".pins", words(pins), "each of " + words(expected) + " once");
    }
  }

  private static String words(Iterable<Pin> pins) {
    StringBuilder words = new StringBuilder();
    for (Pin pin : pins) {
      words.append(words.isEmpty() ? "" : ", ").append(Field.word(pin));
    }
    return words.toString();
  }
}
