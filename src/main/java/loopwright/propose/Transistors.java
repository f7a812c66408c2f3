package loopwright.propose;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.characterise.DiodeFit;
import loopwright.characterise.FitException;
import loopwright.characterise.TransistorFigures;
import loopwright.characterise.TransistorFit;
import loopwright.part.DiodeParameters;
import loopwright.part.DiodeRecord;
import loopwright.part.PartRecord;
import loopwright.part.Polarity;
import loopwright.part.Shelf;
import loopwright.part.TransistorLimits;
import loopwright.part.TransistorParameters;
import loopwright.part.TransistorRecord;
import loopwright.quantity.Quantity;

/** The transistors and diodes at hand, and which of them stands what is asked. */
final class Transistors {
  /** Voltage over what is needed; common practice, no source. */
  private static final double VOLTAGE_RESERVE = 1.1;

  /** Peak current over what is needed; common practice, no source. */
  private static final double CURRENT_RESERVE = 1.5;

  /** A junction is wanted no hotter, °C; common practice, no source. */
  static final double HOT = 125;

  /** Nor at any level of a slow swing, °C: close below the usual limit of 150 °C. */
  static final double HOTTEST = 140;

  private static final double AMBIENT = 25;
  private static final double COLLECTOR_EMITTER = 5;

  private final Map<String, PartRecord> records = new java.util.LinkedHashMap<>();
  private final Map<String, Optional<TransistorParameters>> fits = new HashMap<>();

  Transistors(List<String> names, Shelf shelf) {
    (names.isEmpty() ? shelf.names() : names)
        .forEach(name -> shelf.find(name).ifPresent(found -> records.put(name, found)));
  }

  /** Names of what is at hand. */
  List<String> names() {
    return List.copyOf(records.keySet());
  }

  /**
   * The part of a polarity with the highest β f_T at a current that stands what is asked.
   *
   * @param power on the average, W
   * @param instant at the worst level of the swing, W: a slow signal heats by it
   */
  Optional<String> best(
      Polarity polarity, double current, double voltage, double power, double instant) {
    String best = null;
    double highest = 0;
    for (Map.Entry<String, PartRecord> entry : records.entrySet()) {
      if (entry.getValue() instanceof TransistorRecord record
          && record.kind() == polarity
          && stands(record, current, voltage, power, instant)) {
        double beta = beta(entry.getKey(), current) * transition(entry.getKey(), current);
        if (beta > highest) {
          highest = beta;
          best = entry.getKey();
        }
      }
    }
    return Optional.ofNullable(best);
  }

  private static boolean stands(
      TransistorRecord record, double current, double voltage, double power, double instant) {
    if (record.limits().isEmpty()) {
      return true;
    }
    TransistorLimits limits = record.limits().get();
    return below(VOLTAGE_RESERVE * voltage, limits.collectorEmitterVoltage())
        && below(CURRENT_RESERVE * current, limits.collectorCurrent())
        && below(power / 0.8, limits.power())
        && AMBIENT + power * number(limits.thermalResistance(), 0) <= HOT
        && AMBIENT + instant * number(limits.thermalResistance(), 0) <= HOTTEST;
  }

  private static boolean below(double value, Optional<Quantity> limit) {
    return limit.isEmpty() || value <= limit.get().value();
  }

  private static double number(Optional<Quantity> value, double otherwise) {
    return value.map(Quantity::value).orElse(otherwise);
  }

  /** I_C/I_B at a current and 5 V; 0 where the part cannot carry it. */
  double beta(String name, double current) {
    try {
      return parameters(name)
          .map(fitted -> new TransistorFigures(fitted).beta(current, COLLECTOR_EMITTER))
          .orElse(0.0);
    } catch (FitException e) {
      return 0;
    }
  }

  /** f_T at a current and 5 V, Hz; 0 where the part cannot carry it. */
  private double transition(String name, double current) {
    try {
      double found =
          parameters(name)
              .map(
                  fitted ->
                      new TransistorFigures(fitted).transitionFrequency(current, COLLECTOR_EMITTER))
              .orElse(0.0);
      return Double.isFinite(found) ? Math.min(found, 1e9) : 1e9;
    } catch (FitException e) {
      return 0;
    }
  }

  /** V_BE at a current and 5 V, V. */
  double baseEmitter(String name, double current) {
    try {
      return parameters(name)
          .map(fitted -> new TransistorFigures(fitted).baseEmitterVoltage(current, 5))
          .orElse(0.7);
    } catch (FitException e) {
      return 0.9;
    }
  }

  /** Its parameters, where its record makes any. */
  Optional<TransistorParameters> parameters(String name) {
    return fits.computeIfAbsent(
        name,
        key -> {
          try {
            return Optional.of(
                TransistorFit.fit((TransistorRecord) records.get(key), Optional.empty())
                    .parameters());
          } catch (FitException e) {
            return Optional.empty();
          }
        });
  }

  /** Junction to ambient, K/W; 200 where the record says nothing. */
  double thermalResistance(String name) {
    return ((TransistorRecord) records.get(name))
        .limits()
        .flatMap(TransistorLimits::thermalResistance)
        .map(Quantity::value)
        .orElse(200.0);
  }

  /** The first diode at hand. */
  Optional<String> diode() {
    return records.entrySet().stream()
        .filter(entry -> entry.getValue() instanceof DiodeRecord)
        .map(Map.Entry::getKey)
        .findFirst();
  }

  /** Forward voltage of a diode at a current, V. */
  double forward(String diode, double current) {
    DiodeParameters fitted = DiodeFit.fit((DiodeRecord) records.get(diode)).parameters();
    return fitted.ideality()
            * HandFormulas.THERMAL_VOLTAGE
            * Math.log(current / fitted.saturationCurrent() + 1)
        + current * fitted.seriesResistance();
  }
}
