package loopwright.design;

import java.util.LinkedHashMap;
import java.util.Map;
import loopwright.part.PartRecord;
import loopwright.part.TransistorModel;
import loopwright.part.TransistorRecord;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;

/**
 * The designs of the campaigns, over the whole stage library; a seed means the same design for
 * ever, so that a table can be repeated. Neither generator may change: a new one gets a new name.
 */
public final class FrozenDesigns {
  private static final double LEAST_OHMS = 0.1;
  private static final double MOST_OHMS = 100e6;

  private FrozenDesigns() {}

  /**
   * A design that someone could mean: currents of 50 µA to 20 mA, and values that bias every stage
   * within its rails.
   */
  public static Design plausible(long seed) {
    return RandomDesigns.of(new Dice(seed), "plausible design " + seed, CurrentRange.WIDE);
  }

  /**
   * A design that nobody could mean: every resistor between 0.1 Ω and 100 MΩ whatever it stands
   * for, rails of 1 V to 100 V, ideal sources of 1 µA to 1 A, transistors with a current gain of 5
   * to 1000, half of the outputs without a load.
   */
  public static Design absurd(long seed) {
    Dice dice = new Dice(seed);
    Design plausible = RandomDesigns.of(dice, "absurd design " + seed, CurrentRange.WIDE);
    Map<String, Object> values = new LinkedHashMap<>();
    for (NamedPart part : DesignPath.parts(plausible)) {
      if (part.unit() == Unit.OHM) {
        values.put(part.path(), dice.part(dice.spread(LEAST_OHMS, MOST_OHMS)));
      }
    }
    values.put("rails.positive", dice.quantity(dice.spread(1, 100)));
    if (plausible.rails().negative().value() != 0) {
      values.put("rails.negative", dice.quantity(-dice.spread(1, 100)));
    }
    StagesAmplifier stages = (StagesAmplifier) plausible.amplifier();
    if (stages.inputPair().tail() instanceof CurrentSource.Ideal) {
      values.put("amplifier.inputPair.tail.current", dice.quantity(dice.spread(1e-6, 1)));
    }
    if (stages.gainStage().load() instanceof CurrentSource.Ideal) {
      values.put("amplifier.gainStage.load.current", dice.quantity(dice.spread(1e-6, 1)));
    }
    plausible.parts().forEach((name, record) -> currentGain(dice, name, record, values));
    Design absurd = DesignPath.setAll(plausible, values);
    return dice.chance(0.5) && DesignPath.find(absurd, "hookups.main.load.resistance").isPresent()
        ? DesignPath.set(absurd, "hookups.main.load.resistance", null)
        : absurd;
  }

  private static void currentGain(
      Dice dice, String name, PartRecord record, Map<String, Object> values) {
    if (record instanceof TransistorRecord transistor) {
      TransistorModel model = transistor.model().orElseThrow();
      values.put(
          "parts." + name + ".model.forwardBeta",
          Quantity.of(Math.max(dice.spread(5, 1000), model.reverseBeta().orElseThrow().value())));
    }
  }
}
