package loopwright.design;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Hookups of random designs, each of every kind, whose output has a rest between the rails. */
final class RandomHookups {
  private final Dice dice;
  private final Rails rails;
  private final boolean single;

  RandomHookups(Dice dice, Rails rails) {
    this.dice = dice;
    this.rails = rails;
    this.single = rails.positive().value() == 0 || rails.negative().value() == 0;
  }

  Hookup hookup() {
    Feedback feedback =
        switch (dice.whole(0, 9)) {
          case 0, 1 -> wire();
          case 2, 3, 4, 5, 6 -> divider();
          case 7, 8 -> inverting();
          default -> new Feedback.Open(dice.partOrZero(0.5, 100, 1000));
        };
    Load load = load();
    return new Hookup("main", source(feedback), feedback, load, probes());
  }

  private ReturnNode toMiddle() {
    return single && rails.midRail().isPresent() ? ReturnNode.MID_RAIL : ReturnNode.GROUND;
  }

  private Feedback wire() {
    return new Feedback.NonInverting(
        dice.part(0),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        ReturnNode.GROUND,
        TakenFrom.OUT);
  }

  private Feedback divider() {
    double lower = dice.spread(220, 4700);
    boolean blocked = single || dice.chance(0.25);
    return new Feedback.NonInverting(
        dice.part(lower * dice.spread(1, 60)),
        Optional.of(dice.part(lower)),
        blocked ? Optional.of(dice.part(dice.spread(10e-6, 470e-6))) : Optional.empty(),
        dice.maybePart(0.3, 2e-12, 47e-12),
        blocked ? dice.one(ReturnNode.GROUND, toMiddle()) : toMiddle(),
        TakenFrom.OUT);
  }

  private Feedback inverting() {
    double input = dice.spread(1e3, 10e3);
    return new Feedback.Inverting(
        dice.part(input * dice.spread(1, 40)),
        dice.part(input),
        dice.maybePart(0.3, 2e-12, 47e-12),
        dice.partOrZero(0.7, 470, 10e3),
        toMiddle(),
        dice.chance(0.2) ? TakenFrom.LOAD : TakenFrom.OUT);
  }

  private Source source(Feedback feedback) {
    boolean coupled = single || dice.chance(0.2);
    boolean inverting = feedback instanceof Feedback.Inverting;
    double swing =
        (rails.positive().value() - rails.negative().value()) / 2 * dice.spread(0.02, 0.3);
    double gain = feedback instanceof Feedback.Open ? 100 : HookupGain.of(feedback);
    boolean attenuated = dice.chance(feedback instanceof Feedback.Open ? 0.8 : 0.15);
    double series = dice.spread(1e3, 10e3);
    double shunt = dice.spread(47, 1e3);
    return new Source(
        dice.part(dice.one(0.0, 50.0, 600.0, 4700.0)),
        dice.quantity(coupled || dice.chance(0.8) ? 0 : swing / gain * dice.between(-0.3, 0.3)),
        dice.quantity(swing / gain * (attenuated ? (series + shunt) / shunt : 1)),
        dice.quantity(1000),
        attenuated
            ? Optional.of(new Source.Attenuator(dice.part(series), dice.part(shunt)))
            : Optional.empty(),
        coupled ? Optional.of(dice.part(dice.spread(1e-6, 47e-6))) : Optional.empty(),
        coupled && !inverting
            ? Optional.of(dice.part(dice.spread(10e3, 100e3)))
            : dice.maybePart(0.1, 10e3, 100e3),
        toMiddle());
  }

  private Load load() {
    return new Load(
        dice.maybePart(0.8, 300, 30e3),
        dice.maybePart(0.6, 10e-12, 2e-9),
        dice.partOrZero(0.3, 10, 100),
        dice.maybePart(single ? 0.8 : 0.15, 10e-6, 470e-6),
        dice.maybe(
            0.2,
            () ->
                new Load.Snubber(
                    dice.part(dice.spread(4.7, 47)), dice.part(dice.spread(1e-9, 1e-7)))));
  }

  private List<Probe> probes() {
    List<Probe> probes = new ArrayList<>();
    for (String node : List.of("out", "pairOut", "in-", "gainOut")) {
      if (dice.chance(0.1)) {
        probes.add(new Probe(node, Optional.of(dice.part(10e6)), Optional.of(dice.part(12e-12))));
      }
    }
    return probes;
  }

  /** Closed-loop gain of the resistors alone. */
  private static final class HookupGain {
    static double of(Feedback feedback) {
      if (feedback instanceof Feedback.NonInverting divider) {
        return divider.lower().isEmpty()
            ? 1
            : 1 + divider.upper().effective() / divider.lower().get().effective();
      }
      Feedback.Inverting inverting = (Feedback.Inverting) feedback;
      return inverting.upper().effective() / inverting.inputResistor().effective();
    }
  }
}
