package loopwright.design;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.part.DiodeLimits;
import loopwright.part.DiodeModel;
import loopwright.part.DiodeRecord;
import loopwright.part.PartRecord;
import loopwright.part.Polarity;
import loopwright.part.TransistorLimits;
import loopwright.part.TransistorMeasured;
import loopwright.part.TransistorModel;
import loopwright.part.TransistorRecord;
import loopwright.quantity.Quantity;

/** Part records of random designs: small transistors of either polarity, and a diode. */
final class RandomParts {
  private final Dice dice;

  RandomParts(Dice dice) {
    this.dice = dice;
  }

  /** Names {@code n1}, {@code n2}, {@code p1}, {@code p2} and {@code d1}. */
  Map<String, PartRecord> records() {
    Map<String, PartRecord> parts = new LinkedHashMap<>();
    parts.put("n1", transistor(Polarity.NPN));
    parts.put("n2", transistor(Polarity.NPN));
    parts.put("p1", transistor(Polarity.PNP));
    parts.put("p2", transistor(Polarity.PNP));
    parts.put("d1", diode());
    return parts;
  }

  private TransistorRecord transistor(Polarity polarity) {
    boolean leaky = dice.chance(0.5);
    TransistorModel model =
        new TransistorModel(
            some(dice.spread(1e-15, 3e-14)),
            some(dice.spread(60, 400)),
            some(dice.spread(1, 6)),
            some(dice.chance(0.1) ? Double.POSITIVE_INFINITY : dice.spread(30, 150)),
            some(dice.chance(0.2) ? Double.POSITIVE_INFINITY : dice.spread(0.03, 0.5)),
            some(leaky ? dice.spread(1e-16, 1e-13) : 0),
            some(leaky ? dice.between(1.5, 2) : 2),
            some(orZero(0.7, 5, 200)),
            some(orZero(0.7, 0.1, 1)),
            some(orZero(0.5, 0.3, 5)),
            some(dice.spread(5e-12, 25e-12)),
            some(dice.spread(1.5e-12, 8e-12)),
            some(dice.spread(2e-10, 1.5e-9)),
            some(orZero(0.5, 1e-8, 1e-7)),
            Optional.empty());
    return new TransistorRecord(
        polarity,
        Optional.of(model),
        Optional.empty(),
        Optional.empty(),
        dice.maybe(0.8, this::limits),
        Optional.empty(),
        List.of());
  }

  private TransistorLimits limits() {
    return new TransistorLimits(
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        some(dice.spread(80, 250)),
        Optional.empty());
  }

  /** What a tester showed of a transistor. */
  TransistorMeasured measured() {
    return new TransistorMeasured(
        Optional.of(
            new TransistorMeasured.Beta(Quantity.of(2e-3), Quantity.of(dice.spread(60, 400)))),
        Optional.of(
            new TransistorMeasured.BaseEmitterVoltage(
                Quantity.of(2e-3), Quantity.of(dice.between(0.62, 0.7)), Quantity.of(23))));
  }

  private DiodeRecord diode() {
    DiodeModel model =
        new DiodeModel(
            some(dice.spread(1e-9, 5e-9)),
            some(dice.between(1.7, 1.9)),
            some(orZero(0.5, 0.2, 1)),
            some(dice.spread(1e-12, 5e-12)),
            some(dice.spread(1e-9, 1e-8)));
    return new DiodeRecord(
        Optional.of(model),
        Optional.empty(),
        dice.maybe(
            0.5,
            () -> new DiodeLimits(Optional.empty(), Optional.empty(), Optional.empty(), some(300))),
        Optional.empty(),
        List.of());
  }

  private double orZero(double probability, double low, double high) {
    return dice.chance(probability) ? dice.spread(low, high) : 0;
  }

  private static Optional<Quantity> some(double value) {
    return Optional.of(Quantity.of(value));
  }
}
