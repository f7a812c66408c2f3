package loopwright.characterise;

import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import loopwright.part.TransistorParameters;

/**
 * Current gain against collector current: β_F alone from one current; from two β_F and I_rec where
 * β is lower at the lower current, else β_F and I_K; all three by least squares of ln β from more.
 * Parameters that something else decides are left as they are.
 */
final class BetaFit {
  /** What this fit may move. */
  enum Unknown {
    FORWARD_BETA,
    RECOMBINATION_CURRENT,
    KNEE_CURRENT
  }

  /** Largest departure in ln β that still counts as coming back. */
  private static final double COMES_BACK = 1e-8;

  private static final double LOWEST_BETA = 1e-3;
  private static final double HIGHEST_BETA = 1e5;
  private static final double[] STARTS = {0, 0.3, 3};

  private final List<PrintedFigure<TransistorParameters>> figures;
  private final EnumSet<Unknown> unknowns;
  private final EnumSet<Unknown> spare;

  /**
   * @param figures current gains; at least one
   * @param free what may be moved
   */
  BetaFit(List<PrintedFigure<TransistorParameters>> figures, Set<Unknown> free) {
    this.figures = List.copyOf(figures);
    this.unknowns = asked(figures);
    this.unknowns.retainAll(free);
    this.spare = EnumSet.noneOf(Unknown.class);
    if (mustComeBack() && figures.size() == 2) {
      this.spare.addAll(free);
      this.spare.removeAll(unknowns);
    }
  }

  /** Whether there is anything to move. */
  boolean isNeeded() {
    return !unknowns.isEmpty();
  }

  /** The highest of the gains: a first guess at the forward beta. */
  double highestGain() {
    return figures.stream().mapToDouble(PrintedFigure::wanted).max().orElseThrow();
  }

  /** Whether these gains come back from the parameters. */
  boolean comesBack(TransistorParameters parameters) {
    return departure(parameters) < COMES_BACK;
  }

  /** Up to two figures that have a parameter each must come back; more are least squares. */
  private boolean mustComeBack() {
    return figures.size() <= 2 && figures.size() <= unknowns.size();
  }

  /**
   * Moves the unknowns so that the figures come back.
   *
   * @param from complete but for the unknowns, whose values serve as a start
   * @param anew whether the start is a mere guess, so that others are to be tried too
   * @throws FitException when the figures cannot come back though they must
   */
  TransistorParameters fit(TransistorParameters from, boolean anew) {
    TransistorParameters found = new Search(from, unknowns).best(anew);
    if (!mustComeBack() || comesBack(found)) {
      return found;
    }
    // The rule looks at the printed gains; with unlike test voltages the Early effect can turn the
    // order round, and then it is the other parameter that makes the difference.
    for (Unknown other : spare) {
      TransistorParameters second =
          new Search(from, EnumSet.of(Unknown.FORWARD_BETA, other)).best(true);
      if (comesBack(second)) {
        return second;
      }
    }
    throw new FitException(
        figures.size() == 1
            ? "No forward beta gives the "
                + figures.get(0).saysValue()
                + ", beside the other parameters."
            : "The "
                + figures.get(0).saysValue()
                + ", and the "
                + figures.get(1).saysValue()
                + ", lie further apart than recombination and knee current can bring them:"
                + " a typical value is needed in place of one of them.");
  }

  /** The largest departure of a gain from what is wanted, in ln β. */
  private double departure(TransistorParameters parameters) {
    double most = 0;
    for (PrintedFigure<TransistorParameters> figure : figures) {
      most = Math.max(most, Math.abs(Math.log(figure.returned(parameters) / figure.wanted())));
    }
    return most;
  }

  private static EnumSet<Unknown> asked(List<PrintedFigure<TransistorParameters>> figures) {
    List<Double> currents = figures.stream().map(PrintedFigure::at).distinct().sorted().toList();
    if (currents.size() == 1) {
      return EnumSet.of(Unknown.FORWARD_BETA);
    }
    if (currents.size() > 2) {
      return EnumSet.allOf(Unknown.class);
    }
    boolean lowerAtLower =
        logarithmAt(figures, currents.get(0)) < logarithmAt(figures, currents.get(1));
    return EnumSet.of(
        Unknown.FORWARD_BETA, lowerAtLower ? Unknown.RECOMBINATION_CURRENT : Unknown.KNEE_CURRENT);
  }

  private static double logarithmAt(
      List<PrintedFigure<TransistorParameters>> figures, double current) {
    return figures.stream()
        .filter(figure -> figure.at() == current)
        .mapToDouble(figure -> Math.log(figure.wanted()))
        .average()
        .orElseThrow();
  }

  /** One least-squares search; its unknowns are scaled to the middle of the printed currents. */
  private final class Search {
    private final TransistorParameters from;
    private final List<Unknown> moved;
    private final double recombinationScale;
    private final double kneeScale;

    Search(TransistorParameters from, Set<Unknown> moved) {
      this.from = from;
      this.moved = List.copyOf(moved);
      double lowest = figures.stream().mapToDouble(PrintedFigure::at).min().orElseThrow();
      double highest = figures.stream().mapToDouble(PrintedFigure::at).max().orElseThrow();
      double middle = Math.sqrt(lowest * highest);
      this.recombinationScale =
          middle
              / highestGain()
              * Math.pow(from.saturationCurrent() / middle, 1 / from.recombinationIdeality());
      this.kneeScale = highest;
    }

    TransistorParameters best(boolean anew) {
      double[] low = new double[moved.size()];
      double[] high = new double[moved.size()];
      for (int i = 0; i < low.length; i++) {
        boolean beta = moved.get(i) == Unknown.FORWARD_BETA;
        low[i] = beta ? Math.log(LOWEST_BETA) : 0;
        high[i] = beta ? Math.log(HIGHEST_BETA) : Double.MAX_VALUE;
      }
      BoundedLeastSquares squares = new BoundedLeastSquares(this::residuals, low, high);
      double[] best = squares.solve(start(-1));
      if (anew) {
        for (double value : STARTS) {
          double[] candidate = squares.solve(start(value));
          if (squares.cost(candidate) < squares.cost(best)) {
            best = candidate;
          }
        }
      }
      return parameters(best);
    }

    /** Where the search begins: at the parameters given, or at a value where none is set. */
    private double[] start(double value) {
      double[] start = new double[moved.size()];
      for (int i = 0; i < start.length; i++) {
        start[i] =
            switch (moved.get(i)) {
              case FORWARD_BETA -> Math.log(from.forwardBeta());
              case RECOMBINATION_CURRENT ->
                  value < 0 ? from.recombinationCurrent() / recombinationScale : value;
              case KNEE_CURRENT -> value < 0 ? kneeScale / from.kneeCurrent() : value;
            };
      }
      return start;
    }

    private double[] residuals(double[] at) {
      TransistorParameters tried = parameters(at);
      double[] residuals = new double[figures.size()];
      for (int k = 0; k < residuals.length; k++) {
        try {
          residuals[k] = Math.log(figures.get(k).returned(tried) / figures.get(k).wanted());
        } catch (FitException outOfReach) {
          residuals[k] = Double.NaN;
        }
      }
      return residuals;
    }

    private TransistorParameters parameters(double[] at) {
      TransistorParameters tried = from;
      for (int i = 0; i < at.length; i++) {
        tried =
            switch (moved.get(i)) {
              case FORWARD_BETA -> tried.withForwardBeta(Math.exp(at[i]));
              case RECOMBINATION_CURRENT ->
                  tried.withRecombinationCurrent(at[i] * recombinationScale);
              case KNEE_CURRENT -> tried.withKneeCurrent(kneeScale / at[i]);
            };
      }
      return tried;
    }
  }
}
