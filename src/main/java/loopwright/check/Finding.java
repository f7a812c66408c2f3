package loopwright.check;

/**
 * What is wrong or risky.
 *
 * @param severity how bad
 * @param where path of the file, node, device role or hookup that it concerns
 * @param says what is wrong, why and how much, in a sentence
 * @param remedy what cures it, in a sentence with a number; empty when there is none
 */
public record Finding(Severity severity, String where, String says, String remedy) {
  /** How bad a finding is, worst first. */
  public enum Severity {
    FAILS,
    RISKY,
    REMARK
  }
}
