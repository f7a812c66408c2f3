package loopwright.bench;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import loopwright.numeric.StudentT;

/**
 * Contributions combined (JCGM 100:2008), all independent.
 *
 * @param contributions any number
 */
public record Uncertainty(List<Contribution> contributions) {
  private static final double USUAL_FACTOR = 2;

  /** 95 % of a rectangular distribution lie within 0.95 √3 of its standard deviation. */
  private static final double RECTANGULAR_FACTOR = 1.65;

  /** The others together count for little below this share of the largest (EA-4/02, S9.14). */
  private static final double DOMINATED = 0.3;

  private static final double COVERAGE = 0.9545;

  /** Above so many, Student's factor is 2 to within 3 %. */
  private static final double MANY = 50;

  /** Keeps its own copy. */
  public Uncertainty {
    contributions = List.copyOf(contributions);
  }

  /** Of these contributions. */
  public static Uncertainty of(Contribution... contributions) {
    return new Uncertainty(List.of(contributions));
  }

  /** Combined standard uncertainty: root of the sum of squares. */
  public double standard() {
    return Math.sqrt(contributions.stream().mapToDouble(c -> c.standard() * c.standard()).sum());
  }

  /** Effective degrees of freedom (Welch and Satterthwaite; JCGM 100:2008, G.4.1). */
  public double degreesOfFreedom() {
    double fourth = Math.pow(standard(), 4);
    double sum =
        contributions.stream()
            .mapToDouble(c -> Math.pow(c.standard(), 4) / c.degreesOfFreedom())
            .sum();
    return sum == 0 ? Double.POSITIVE_INFINITY : fourth / sum;
  }

  /**
   * Coverage factor for 95 %: 2; Student's factor where degrees of freedom are few; 1.65 where one
   * rectangular contribution dominates.
   */
  public double coverageFactor() {
    if (degreesOfFreedom() < MANY) {
      return StudentT.factor(COVERAGE, Math.max(1, degreesOfFreedom()));
    }
    return dominant().filter(Contribution::rectangular).isPresent()
        ? RECTANGULAR_FACTOR
        : USUAL_FACTOR;
  }

  /** Expanded uncertainty for 95 %. */
  public double expanded() {
    return coverageFactor() * standard();
  }

  /** The contribution beside which all others count for little, if there is one. */
  public Optional<Contribution> dominant() {
    return largest()
        .filter(
            most -> {
              double all = standard();
              double others = Math.sqrt(Math.max(0, all * all - most.standard() * most.standard()));
              return most.standard() > 0 && others <= DOMINATED * most.standard();
            });
  }

  /** The largest contribution. */
  public Optional<Contribution> largest() {
    return contributions.stream().max(Comparator.comparingDouble(Contribution::standard));
  }
}
