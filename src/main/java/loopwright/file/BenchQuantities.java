package loopwright.file;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import loopwright.quantity.Unit;

/** What a reading may be of, and the unit of each: quantities of the bench, and every figure. */
final class BenchQuantities {
  private final Map<String, Unit> figures;
  private final Map<String, Unit> all;

  /**
   * @param figures units of the figures by their keys
   */
  BenchQuantities(Map<String, Unit> figures) {
    this.figures = new LinkedHashMap<>(figures);
    this.all = new LinkedHashMap<>();
    all.put("nodeVoltage", Unit.VOLT);
    all.put("collectorCurrent", Unit.AMPERE);
    all.put("baseEmitterVoltage", Unit.VOLT);
    all.put("supplyCurrent", Unit.AMPERE);
    all.put("gain", Unit.ONE);
    all.put("phase", Unit.DEGREE);
    all.put("oscillationFrequency", Unit.HERTZ);
    all.put("temperature", Unit.CELSIUS);
    all.put("resistance", Unit.OHM);
    all.put("capacitance", Unit.FARAD);
    all.put("beta", Unit.ONE);
    all.putAll(figures);
  }

  /** The unit of a figure. */
  Optional<Unit> ofFigure(String key) {
    return Optional.ofNullable(figures.get(key));
  }

  /** The unit of anything that may be read. */
  Optional<Unit> ofReading(String quantity) {
    return Optional.ofNullable(all.get(quantity));
  }

  KnownWords figures() {
    return new KnownWords(figures.keySet().stream().toList());
  }

  KnownWords readings() {
    return new KnownWords(all.keySet().stream().toList());
  }
}
