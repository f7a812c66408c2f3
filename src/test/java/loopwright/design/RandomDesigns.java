package loopwright.design;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import loopwright.part.PartRecord;
import loopwright.part.Polarity;

/**
 * Random designs over the whole stage library: every stage, load, current source, bias and driver,
 * every kind of hookup and what hangs on it, on two rails and on one. The same seed makes the same
 * design.
 */
public final class RandomDesigns {
  private RandomDesigns() {}

  /** Designs of the seeds 1 to some number. */
  public static Stream<Design> of(int count) {
    return LongStream.rangeClosed(1, count).mapToObj(RandomDesigns::of);
  }

  /** One design of three stages with the one hookup {@code main}. */
  public static Design of(long seed) {
    return of(new Dice(seed), "random design " + seed, CurrentRange.ORDINARY);
  }

  /** One design of three stages with the one hookup {@code main}, from dice already thrown. */
  static Design of(Dice dice, String name, CurrentRange currents) {
    Rails rails = rails(dice);
    Polarity pair = dice.one(Polarity.NPN, Polarity.PNP);
    RandomParts parts = new RandomParts(dice);
    Map<String, PartRecord> records = parts.records();
    StagesAmplifier amplifier = new RandomAmplifiers(dice, rails, pair, currents).amplifier();
    return new Design(
        Design.VERSION,
        name,
        Optional.empty(),
        rails,
        surroundings(dice),
        records,
        amplifier,
        devices(dice, parts, pair),
        extras(dice),
        List.of(new RandomHookups(dice, rails).hookup()),
        SampleDesigns.defaults(Tolerances.class),
        List.of(),
        SampleDesigns.defaults(Drawer.class),
        SampleDesigns.defaults(Bench.class));
  }

  private static Rails rails(Dice dice) {
    boolean single = dice.chance(0.2);
    double volts = dice.spread(5, 18);
    double upper = dice.spread(2.2e3, 47e3);
    return new Rails(
        dice.quantity(single ? 2 * volts : volts),
        dice.quantity(single ? 0 : -volts),
        dice.partOrZero(0.3, 0.1, 10),
        dice.quantity(dice.chance(0.2) ? dice.spread(10e-9, 1e-6) : 0),
        dice.maybe(
            0.4,
            () ->
                new Rails.Decoupling(
                    dice.part(dice.spread(10e-9, 100e-6)), dice.partOrZero(0.5, 0.05, 1))),
        single || dice.chance(0.1)
            ? Optional.of(
                new Rails.MidRail(
                    dice.part(upper), dice.part(upper), dice.partOrZero(0.7, 1e-6, 100e-6)))
            : Optional.empty());
  }

  private static Surroundings surroundings(Dice dice) {
    return new Surroundings(
        dice.quantity(dice.one(25.0, 25.0, 0.0, 40.0, 85.0)),
        dice.quantity(dice.chance(0.7) ? dice.spread(0.5e-12, 5e-12) : 0),
        dice.chance(0.15),
        dice.quantity(dice.chance(0.3) ? dice.between(0, 1) : 0));
  }

  private static Map<String, DeviceChoice> devices(Dice dice, RandomParts parts, Polarity pair) {
    Map<String, DeviceChoice> devices = new LinkedHashMap<>();
    if (dice.chance(0.2)) {
      devices.put("pair.q2", new DeviceChoice(Optional.empty(), Optional.of(parts.measured())));
    }
    if (dice.chance(0.2)) {
      String name = pair == Polarity.NPN ? "p1" : "n1";
      devices.put("gain.q1", new DeviceChoice(Optional.of(name), Optional.empty()));
    }
    return devices;
  }

  private static List<Extra> extras(Dice dice) {
    List<Extra> extras = new ArrayList<>();
    if (dice.chance(0.15)) {
      extras.add(
          new Extra.ExtraCapacitor(
              "lag", "pairOut", dice.one("positive", "negative"), dice.part(22e-12)));
    }
    if (dice.chance(0.15)) {
      extras.add(
          new Extra.ExtraResistor(
              "bleeder", "gainOut", "ground", dice.part(dice.spread(22e3, 1e6))));
    }
    return extras;
  }

  /**
   * How often each variant of a sealed family, enum or choice appears, for a test of the variety.
   */
  static Map<Class<?>, Integer> count(Stream<Design> designs) {
    Map<Class<?>, Integer> counts = new HashMap<>();
    designs.forEach(
        design -> {
          StagesAmplifier stages = (StagesAmplifier) design.amplifier();
          OutputStage output = stages.outputStage();
          List<Object> variants =
              new ArrayList<>(
                  List.of(
                      stages.inputPair().tail(),
                      stages.inputPair().load(),
                      stages.gainStage().load(),
                      output,
                      design.hookups().get(0).feedback()));
          if (output instanceof OutputStage.PushPull pushPull) {
            variants.add(pushPull.bias());
            pushPull.drivers().ifPresent(variants::add);
          }
          stages.gainStage().buffer().ifPresent(variants::add);
          stages.gainStage().compensation().ifPresent(variants::add);
          variants.forEach(variant -> counts.merge(variant.getClass(), 1, Integer::sum));
        });
    return counts;
  }
}
