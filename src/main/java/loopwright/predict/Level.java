package loopwright.predict;

/** The output levels at which figures are taken. */
public enum Level {
  /** The generator at its rest. */
  REST,
  /** The output half the peak above its reference. */
  HIGH,
  /** The output half the peak below its reference. */
  LOW
}
