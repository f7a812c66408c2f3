package loopwright.check;

import java.util.List;
import loopwright.design.Design;
import loopwright.predict.HookupPrediction;

/** Looks for one kind of trouble in one hookup's prediction. */
@FunctionalInterface
interface Check {
  /** What it finds, worst first; empty when all is well. */
  List<Finding> check(Design design, HookupPrediction prediction);
}
