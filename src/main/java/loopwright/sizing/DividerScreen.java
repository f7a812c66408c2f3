package loopwright.sizing;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.PriorityQueue;
import java.util.Set;
import java.util.function.Function;
import loopwright.design.DesignException;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/**
 * Every divider that the stock can make for a wanted gain, ranked by hand estimates: the few best
 * of them are worth solving. The search is exact: a divider is left out only when its gain error
 * alone already speaks more against it than all terms together against those that are kept.
 */
final class DividerScreen {
  /** With less than this many times its resistance the source would set the gain. */
  private static final double ABOVE_SOURCE = 10;

  /** A ratio this near to 1 is a follower's. */
  private static final double FOLLOWER = 1e-3;

  /** A divider this far from the wanted gain is for another one, unless there is none nearer. */
  private static final double FAR = 0.5;

  private static final Comparator<Ranked> BY_PLACE = Comparator.comparingDouble(Ranked::place);

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
  record Ranked(DividerCandidate divider, DividerScore score) {
    private static final double BEHIND_ALL_NEAR = 1e9;

    /** By it they are ranked: its score, those far from the wanted gain behind all others. */
    private double place() {
      return score.sum() + (isFar() ? BEHIND_ALL_NEAR : 0);
    }

    private boolean isFar() {
      return score.error() > DividerScore.error(FAR);
    }
  }

  /** Whether a gain from the driven input to the output is a follower's. */
  static boolean isFollower(double ratio) {
    return Math.abs(ratio - 1) <= FOLLOWER;
  }

  /**
   * The best of them. Where two parts may make one resistance, the nearest of many that hardly
   * differ is enough: each single resistor then stands with its best partner only.
   *
   * @param count how many at the most
   * @param path of the feedback, for the message
   * @throws DesignException when no divider gives this gain in this hookup
   */
  List<Ranked> best(int count, String path) {
    double ratio = wanted / facts.loop().ratio();
    boolean inverting = facts.loop().inverting();
    if (!inverting && ratio < 1 - FOLLOWER) {
      throw new DesignException(
          path,
          "found a wanted gain below what the source network leaves of the generator, expected "
              + EngineeringFormat.format(facts.loop().ratio(), Unit.ONE)
              + " or more with non-inverting feedback");
    }
    double dividerRatio = facts.loop().dividerRatio(wanted);
    if (Double.isInfinite(dividerRatio)) {
      throw new DesignException(
          path,
          "found a wanted gain that feedback cannot leave, expected less than "
              + EngineeringFormat.format(facts.loop().mostGain(), Unit.ONE)
              + ", what generator to output has without any");
    }
    if (!inverting && (isFollower(ratio) || dividerRatio <= FOLLOWER)) {
      return List.of(rank(DividerCandidate.wire()));
    }
    List<Ranked> all = new Search(dividerRatio, count).all();
    if (all.isEmpty()) {
      throw new DesignException(
          path, "found no two resistors of " + stock.says() + " that could make the wanted gain");
    }
    all.sort(BY_PLACE);
    boolean near = !all.get(0).isFar();
    return all.stream().filter(one -> !near || !one.isFar()).limit(count).toList();
  }

  /** Two resistors of one tolerance, each uniform within it: ± 2 standard uncertainties. */
  private Ranked rank(DividerCandidate divider) {
    double noiseGain = facts.loop().noiseGain(divider.upper().value(), divider.lowerOhms());
    double share = facts.loop().inverting() ? 1 : (noiseGain - 1) / noiseGain;
    double halfBand = 2 * tolerance * share * Math.sqrt(2.0 / 3);
    return new Ranked(divider, DividerScore.byHand(facts, divider, wanted, halfBand));
  }

  /** What the source puts in series with the lower resistor, Ω. */
  private double inSeries() {
    return facts.loop().inverting() ? facts.loop().sourceResistance() : 0;
  }

  /** Goes through the stock, resistor by resistor. */
  private final class Search {
    private final double dividerRatio;
    private final int wantedCount;
    private final int eachCount;
    private final Set<List<Double>> seen = new HashSet<>();
    private final List<Ranked> all = new ArrayList<>();

    /** The scores of the best so far, the worst of them on top. */
    private final PriorityQueue<Double> leaders = new PriorityQueue<>(Comparator.reverseOrder());

    Search(double dividerRatio, int count) {
      this.dividerRatio = dividerRatio;
      this.wantedCount = count;
      this.eachCount = stock.hasTwoParts() ? 1 : count;
    }

    List<Ranked> all() {
      for (double single : stock.singles()) {
        ResistorChoice one = ResistorChoice.single(single);
        nearest(dividerRatio * (single + inSeries()), upper -> DividerCandidate.of(upper, one));
        if (stock.hasTwoParts()) {
          nearest(single / dividerRatio - inSeries(), lower -> DividerCandidate.of(one, lower));
        }
      }
      return all;
    }

    /** The best dividers with a resistance near a value, outward from it on both sides. */
    private void nearest(double value, Function<ResistorChoice, DividerCandidate> divider) {
      PriorityQueue<Ranked> kept = new PriorityQueue<>(BY_PLACE.reversed());
      int start = stock.firstNotBelow(value);
      int above = start;
      while (above < stock.choices().size()
          && mayImprove(kept, divider.apply(stock.choices().get(above)))) {
        above++;
      }
      int below = start - 1;
      while (below >= 0 && mayImprove(kept, divider.apply(stock.choices().get(below)))) {
        below--;
      }
      kept.forEach(this::take);
    }

    /** Tries one; whether one further out may still be better than what is kept. */
    private boolean mayImprove(PriorityQueue<Ranked> kept, DividerCandidate divider) {
      if (divider.lowerOhms() < ABOVE_SOURCE * inSeries()) {
        return true;
      }
      Ranked ranked = rank(divider);
      boolean full = kept.size() == eachCount;
      double own = full ? kept.peek().place() : Double.POSITIVE_INFINITY;
      double leading = leaders.size() == wantedCount ? leaders.peek() : Double.POSITIVE_INFINITY;
      if (ranked.score().error() >= Math.min(own, leading)) {
        return false;
      }
      if (ranked.place() < own) {
        if (full) {
          kept.poll();
        }
        kept.add(ranked);
      }
      return true;
    }

    /** The same two resistances made of more parts are no other divider. */
    private void take(Ranked ranked) {
      if (seen.add(List.of(ranked.divider().upper().value(), ranked.divider().lowerOhms()))) {
        all.add(ranked);
        leaders.add(ranked.place());
        if (leaders.size() > wantedCount) {
          leaders.poll();
        }
      }
    }
  }
}
