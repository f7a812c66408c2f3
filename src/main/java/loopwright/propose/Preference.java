package loopwright.propose;

/** What a builder would rather have where the demands leave room. */
public enum Preference {
  /** Little noise: more current in the pair for a low source resistance, no emitter resistors. */
  QUIET,
  /** Little heat: half the idle current. */
  COOL,
  /** Few parts: resistors in place of current sources and mirrors. */
  SIMPLE
}
