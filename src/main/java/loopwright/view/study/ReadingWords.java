package loopwright.view.study;

import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import loopwright.design.Reading;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;

/** A reading in a few words. */
final class ReadingWords {
  private ReadingWords() {}

  static String of(Reading reading) {
    return Stream.of(
            Optional.of(quantity(reading.quantity())),
            reading.node(),
            reading.device(),
            reading.part(),
            reading.rail().map(rail -> rail.name().toLowerCase(Locale.ROOT)),
            reading.hookup().map(hookup -> "· " + hookup))
        .flatMap(Optional::stream)
        .collect(Collectors.joining(" "));
  }

  /** A quantity as a person says it. */
  static String quantity(String key) {
    return switch (key) {
      case "nodeVoltage" -> "Node voltage";
      case "collectorCurrent" -> "Collector current";
      case "baseEmitterVoltage" -> "Base-emitter voltage";
      case "supplyCurrent" -> "Supply current";
      case "gain" -> "Gain";
      case "phase" -> "Phase";
      case "temperature" -> "Temperature";
      case "resistance" -> "Resistance of a loose part";
      case "capacitance" -> "Capacitance of a loose part";
      case "beta" -> "β of a loose part";
      default -> Catalogue.find(key).map(Figure::label).orElse(key);
    };
  }
}
