package loopwright.propose;

import java.util.List;
import java.util.Optional;
import loopwright.check.Finding;
import loopwright.design.Design;

/**
 * A first design, or why there is none.
 *
 * @param design present only where every demand is met by its own full prediction, without a
 *     finding that says it fails
 * @param reasons of every choice, in the order in which they were made; what was changed after a
 *     prediction stands last
 * @param demands each wanted, predicted, met or not
 * @param findings risks and remarks of the offered design, or of the last one tried
 * @param says the outcome in a sentence
 */
public record FirstDesign(
    Optional<Design> design,
    List<Reason> reasons,
    List<Demand> demands,
    List<Finding> findings,
    String says) {
  /** Keeps its own copies. */
  public FirstDesign {
    reasons = List.copyOf(reasons);
    demands = List.copyOf(demands);
    findings = List.copyOf(findings);
  }
}
