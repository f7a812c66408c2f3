package loopwright.predict;

import loopwright.assembly.Deviations;
import loopwright.design.Design;

/**
 * One build of a design: its own values, its own transistors.
 *
 * @param design the design with the values of this build
 * @param deviations what the design has no place for
 */
public record Build(Design design, Deviations deviations) {
  /** A build with every part as the design says. */
  public static Build nominal(Design design) {
    return new Build(design, Deviations.NONE);
  }
}
