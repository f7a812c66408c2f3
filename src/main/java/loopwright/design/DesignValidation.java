package loopwright.design;

import java.util.List;

/**
 * What is wrong with a design as a whole, beyond what its single values say. Part records of the
 * shelf must have been brought in first, see {@link UsedParts#withPartsFrom}.
 */
public final class DesignValidation {
  private DesignValidation() {}

  /** Everything that is wrong, each with its place; empty for a design that can be solved. */
  public static List<Problem> check(Design design) {
    Problems problems = new Problems();
    ValueCheck.check(design, problems);
    RailsCheck.check(design, problems);
    PartRecordCheck.check(design, problems);
    DeviceCheck.check(design, problems);
    HookupCheck.check(design, problems);
    LimitCheck.check(design, problems);
    BenchCheck.check(design, problems);
    return problems.all();
  }

  /**
   * The design itself, when nothing is wrong with it.
   *
   * @throws DesignException with everything that is wrong
   */
  public static Design requireSound(Design design) {
    List<Problem> problems = check(design);
    if (!problems.isEmpty()) {
      throw new DesignException(problems);
    }
    return design;
  }
}
