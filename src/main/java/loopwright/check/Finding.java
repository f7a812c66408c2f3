package loopwright.check;

import java.util.List;
import loopwright.design.Change;

/**
 * What is wrong or risky.
 *
 * @param severity how bad
 * @param where path of the file, node, device role or hookup that it concerns
 * @param says what is wrong, why and how much, in a sentence
 * @param remedy what cures it, in a sentence with a number; empty when there is none
 * @param changes what the remedy changes, where it is values of the design
 */
public record Finding(
    Severity severity, String where, String says, String remedy, List<Change> changes) {
  /** How bad a finding is, worst first. */
  public enum Severity {
    FAILS,
    RISKY,
    REMARK
  }

  /** Keeps its own copy. */
  public Finding {
    changes = List.copyOf(changes);
  }

  /** A finding whose remedy, if there is one, is no value. */
  public Finding(Severity severity, String where, String says, String remedy) {
    this(severity, where, says, remedy, List.of());
  }
}
