package loopwright.sizing;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import loopwright.design.DesignException;

/**
 * Every divider that the stock can make near a wanted gain, ranked by hand estimates: the few best
 * of them are worth solving.
 */
final class DividerScreen {
  /** Ratios further off than this share are not looked at, unless there are no nearer ones. */
  private static final double[] WINDOWS = {0.12, 0.5, 10};

  /** With less than this many times its resistance the source would set the gain. */
  private static final double ABOVE_SOURCE = 10;

  /** A ratio this near to 1 is a follower's. */
  private static final double FOLLOWER = 1e-3;

  /** Of two parts there are many ways to come near. */
  private static final int MOST_NEAR = 6;

  private final AmplifierFacts facts;
  private final ResistorStock stock;
  private final double wanted;
  private final double tolerance;

  /**
   * @param wanted gain, generator to output
   * @param tolerance of a resistor, a fraction
   */
  DividerScreen(AmplifierFacts facts, ResistorStock stock, double wanted, double tolerance) {
    this.facts = facts;
    this.stock = stock;
    this.wanted = wanted;
    this.tolerance = tolerance;
  }

  /** A divider with its score by hand. */
  record Ranked(DividerCandidate divider, DividerScore score) {}

  /**
   * The best of them.
   *
   * @param count how many at the most
   * @param path of the feedback, for the message
   * @throws DesignException when no divider gives this gain in this hookup
   */
  List<Ranked> best(int count, String path) {
    return all(path).stream()
        .sorted(Comparator.comparingDouble(ranked -> ranked.score().sum()))
        .limit(count)
        .toList();
  }

  /** All that come near the gain. */
  List<Ranked> all(String path) {
    double ratio = wanted / facts.ratio();
    if (!facts.inverting() && ratio < 1 - FOLLOWER) {
      throw new DesignException(
          path,
          "found a wanted gain below what the source network leaves of the generator, expected "
              + facts.ratio()
              + " or more with non-inverting feedback");
    }
    List<Ranked> ranked = new ArrayList<>();
    if (!facts.inverting() && ratio <= 1 + FOLLOWER) {
      ranked.add(rank(DividerCandidate.wire()));
      return ranked;
    }
    double wantedRatio = facts.inverting() ? Math.abs(ratio) : ratio - 1;
    for (double window : WINDOWS) {
      collect(ranked, wantedRatio, window);
      if (!ranked.isEmpty()) {
        return ranked;
      }
    }
    throw new DesignException(
        path, "found no two resistors of " + stock.says() + " near the wanted gain");
  }

  /** With two parts allowed, one of the two resistors is made of them, not both. */
  private void collect(List<Ranked> ranked, double wantedRatio, double window) {
    Set<List<Double>> seen = new HashSet<>();
    for (double single : stock.singles()) {
      if (facts.inverting() && single < ABOVE_SOURCE * facts.sourceResistance()) {
        continue;
      }
      ResistorChoice one = ResistorChoice.single(single);
      double foot = facts.inverting() ? single + facts.sourceResistance() : single;
      for (ResistorChoice upper : near(wantedRatio * foot, window)) {
        add(ranked, seen, DividerCandidate.of(upper, one));
      }
      double lowerWanted =
          single / wantedRatio - (facts.inverting() ? facts.sourceResistance() : 0);
      for (ResistorChoice lower : near(lowerWanted, window)) {
        if (lower.parts().size() > 1) {
          add(ranked, seen, DividerCandidate.of(one, lower));
        }
      }
    }
  }

  /** The same two resistances made of more parts are no other divider. */
  private void add(List<Ranked> ranked, Set<List<Double>> seen, DividerCandidate divider) {
    if (seen.add(List.of(divider.upper().value(), divider.lowerOhms()))) {
      ranked.add(rank(divider));
    }
  }

  private Ranked rank(DividerCandidate divider) {
    double noiseGain = 1 + divider.upper().value() / divider.lowerOhms();
    double share = facts.inverting() ? 1 : (noiseGain - 1) / noiseGain;
    double halfBand = 2 * tolerance * share * Math.sqrt(2.0 / 3);
    return new Ranked(divider, DividerScore.byHand(facts, divider, wanted, halfBand));
  }

  /** Choices within some per cent of a value; only the nearest few where there are many. */
  private List<ResistorChoice> near(double value, double window) {
    List<ResistorChoice> near = new ArrayList<>();
    if (!(value > 0)) {
      return near;
    }
    for (int i = stock.firstNotBelow(value / (1 + window)); i < stock.choices().size(); i++) {
      ResistorChoice choice = stock.choices().get(i);
      if (choice.value() > value * (1 + window)) {
        break;
      }
      near.add(choice);
    }
    if (near.size() > MOST_NEAR) {
      near.sort(Comparator.comparingDouble(choice -> Math.abs(choice.value() - value)));
      return near.subList(0, MOST_NEAR);
    }
    return near;
  }
}
