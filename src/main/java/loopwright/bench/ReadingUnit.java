package loopwright.bench;

import java.util.List;
import java.util.stream.Stream;
import loopwright.design.Reading;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.quantity.Unit;

/** The unit of a reading. */
public final class ReadingUnit {
  private static final List<String> OF_THE_BENCH =
      List.of(
          "nodeVoltage",
          "gain",
          "phase",
          "supplyCurrent",
          "collectorCurrent",
          "baseEmitterVoltage",
          "temperature",
          "resistance",
          "capacitance",
          "beta");

  private ReadingUnit() {}

  /** Everything that may be read: quantities of the bench, then every figure by its key. */
  public static List<String> quantities() {
    return Stream.concat(OF_THE_BENCH.stream(), Catalogue.figures().stream().map(Figure::key))
        .toList();
  }

  /** The unit of what was read. */
  public static Unit of(Reading reading) {
    return switch (reading.quantity()) {
      case "nodeVoltage", "baseEmitterVoltage" -> Unit.VOLT;
      case "collectorCurrent", "supplyCurrent" -> Unit.AMPERE;
      case "phase" -> Unit.DEGREE;
      case "temperature" -> Unit.CELSIUS;
      case "resistance" -> Unit.OHM;
      case "capacitance" -> Unit.FARAD;
      case "oscillationFrequency" -> Unit.HERTZ;
      default -> Catalogue.find(reading.quantity()).map(Figure::unit).orElse(Unit.ONE);
    };
  }
}
