package loopwright.session;

import java.util.List;
import loopwright.check.Finding;
import loopwright.predict.Prediction;

/**
 * What the program has to say about a design.
 *
 * @param prediction what it should show; holds the very design that was solved
 * @param findings what is wrong or risky, worst first
 */
public record Assessment(Prediction prediction, List<Finding> findings) {
  /** Keeps its own copy of the findings. */
  public Assessment {
    findings = List.copyOf(findings);
  }
}
