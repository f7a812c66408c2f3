package loopwright.design;

import java.util.Optional;
import loopwright.part.Polarity;

/** Stages of random designs, biased as a first hand calculation would bias them. */
final class RandomAmplifiers {
  /** Base-emitter drop of a first hand calculation, V. */
  private static final double DROP = 0.65;

  private final Dice dice;
  private final Rails rails;
  private final Polarity pair;
  private final CurrentRange currents;
  private final double half;

  /**
   * @param pair polarity of the pair
   * @param currents of tail and gain stage
   */
  RandomAmplifiers(Dice dice, Rails rails, Polarity pair, CurrentRange currents) {
    this.dice = dice;
    this.rails = rails;
    this.pair = pair;
    this.currents = currents;
    this.half = (rails.positive().value() - rails.negative().value()) / 2;
  }

  StagesAmplifier amplifier() {
    double tailCurrent = dice.spread(currents.leastTail(), currents.mostTail());
    double gainCurrent = dice.spread(currents.leastGain(), currents.mostGain());
    boolean buffered = dice.chance(0.25);
    double degeneration = dice.chance(0.6) ? dice.spread(20, 0.8 / gainCurrent) : 0;
    double drop = (buffered ? 2 : 1) * DROP + gainCurrent * degeneration;
    return new StagesAmplifier(
        new InputPair(
            own(1),
            source(tailCurrent),
            load(tailCurrent, drop),
            dice.partOrZero(0.5, 22, 220),
            dice.partOrZero(0.4, 47, 1000),
            dice.quantity(dice.chance(0.5) ? dice.between(-8e-3, 8e-3) : 0)),
        new GainStage(
            other(2),
            source(gainCurrent),
            dice.part(degeneration),
            degeneration > 0 ? dice.maybePart(0.3, 10e-6, 470e-6) : Optional.empty(),
            buffered
                ? Optional.of(new GainStage.Buffer(other(1), dice.part(dice.spread(1500, 10e3))))
                : Optional.empty(),
            dice.maybe(
                0.7,
                () ->
                    new GainStage.Compensation(
                        dice.part(dice.spread(10e-12, 220e-12)), dice.partOrZero(0.4, 47, 500)))),
        output(gainCurrent));
  }

  private PairLoad load(double tailCurrent, double drop) {
    if (dice.chance(0.45)) {
      return new PairLoad.Mirror(other(1), dice.partOrZero(0.5, 22, 220));
    }
    double output = dice.about(2 * drop / tailCurrent);
    return new PairLoad.Resistors(dice.part(output), dice.part(dice.chance(0.5) ? output : 0));
  }

  private OutputStage output(double gainCurrent) {
    if (dice.chance(0.2)) {
      return new OutputStage.None();
    }
    boolean driven = dice.chance(0.25);
    Optional<OutputStage.Drivers> drivers =
        driven
            ? Optional.of(new OutputStage.Drivers("n1", "p1", dice.part(dice.spread(150, 1500))))
            : Optional.empty();
    return new OutputStage.PushPull(
        "n2", "p2", bias(driven, gainCurrent), dice.partOrZero(0.5, 2, 47), drivers);
  }

  private Bias bias(boolean driven, double gainCurrent) {
    return switch (dice.whole(0, 2)) {
      case 0 -> new Bias.Joined();
      case 1 -> new Bias.Diodes("d1", dice.whole(1, driven ? 4 : 2));
      default -> {
        double lower = dice.spread(1.5, 5) * DROP / gainCurrent;
        double ratio = (driven ? 3 : 1) * dice.between(0.8, 1.02);
        yield new Bias.VbeMultiplier("n1", dice.part(ratio * lower), dice.part(lower));
      }
    };
  }

  /** Any current source that gives about a current. */
  private CurrentSource source(double current) {
    String transistor = own(dice.whole(1, 2));
    Optional<FeedFrom> feed = feed();
    double volts = feedVolts(feed);
    return switch (dice.whole(0, 9)) {
      case 0, 1 -> new CurrentSource.Resistor(dice.part(dice.about((half - DROP) / current)));
      case 2 -> new CurrentSource.Ideal(dice.quantity(current));
      case 3, 4 ->
          new CurrentSource.Mirror(
              transistor,
              dice.part(dice.about((volts - DROP) / current)),
              dice.partOrZero(0.5, 0.03 / current, 0.3 / current),
              feed);
      case 5, 6, 7 -> {
        int count = dice.chance(0.1) ? 1 : dice.whole(2, 3);
        double across = Math.max(0.05, count * 0.62 - DROP);
        yield new CurrentSource.DiodeBiased(
            transistor,
            "d1",
            count,
            dice.part(dice.about((volts - count * 0.62) / dice.spread(0.3e-3, 2e-3))),
            dice.part(dice.about(across / current)),
            feed);
      }
      default ->
          new CurrentSource.TwoTransistor(
              transistor,
              dice.part(dice.about((volts - 2 * DROP) / dice.spread(0.2e-3, 1e-3))),
              dice.part(dice.about(DROP / current)),
              feed);
    };
  }

  private Optional<FeedFrom> feed() {
    int choice = dice.whole(0, 3);
    if (choice == 0) {
      return Optional.empty();
    }
    if (choice == 1 && rails.midRail().isPresent()) {
      return Optional.of(FeedFrom.MID_RAIL);
    }
    return Optional.of(choice == 2 && !tailRailIsZero() ? FeedFrom.GROUND : FeedFrom.OPPOSITE_RAIL);
  }

  /** Voltage between feed and tail rail, V. */
  private double feedVolts(Optional<FeedFrom> feed) {
    FeedFrom standard = tailRailIsZero() ? FeedFrom.OPPOSITE_RAIL : FeedFrom.GROUND;
    return switch (feed.orElse(standard)) {
      case GROUND -> Math.abs(tailRail());
      case MID_RAIL -> half;
      case OPPOSITE_RAIL -> 2 * half;
    };
  }

  private boolean tailRailIsZero() {
    return tailRail() == 0;
  }

  private double tailRail() {
    return pair == Polarity.NPN ? rails.negative().value() : rails.positive().value();
  }

  private String own(int number) {
    return (pair == Polarity.NPN ? "n" : "p") + number;
  }

  private String other(int number) {
    return (pair == Polarity.NPN ? "p" : "n") + number;
  }
}
