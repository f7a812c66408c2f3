package loopwright.bench;

import loopwright.design.Reading;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.quantity.Unit;

/** The unit of a reading. */
public final class ReadingUnit {
  private ReadingUnit() {}

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
