package loopwright.predict;

/** What a figure costs to solve, cheapest first. */
public enum CostClass {
  /** Arithmetic on the design alone. */
  DESIGN,
  /** Operating points and linear solves. */
  LINEAR,
  /** Operating points along a waveform or sweep. */
  WAVEFORM,
  /** Solutions in time. */
  TIME
}
