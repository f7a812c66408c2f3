package loopwright.check;

import java.util.List;
import loopwright.design.Design;
import loopwright.predict.HookupPrediction;

/** What the solver has to say about how it got there. */
final class SolveNoteCheck implements Check {
  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    return prediction.notes().stream()
        .map(note -> new Finding(Finding.Severity.REMARK, note.where(), note.says(), ""))
        .toList();
  }
}
