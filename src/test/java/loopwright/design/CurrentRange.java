package loopwright.design;

/** Between which the currents of a random design lie, A: of the tail and of the gain stage. */
record CurrentRange(double leastTail, double mostTail, double leastGain, double mostGain) {
  /** What a first hand calculation for small transistors would choose. */
  static final CurrentRange ORDINARY = new CurrentRange(0.2e-3, 3e-3, 0.7e-3, 8e-3);

  /** From micropower to what a small package just stands. */
  static final CurrentRange WIDE = new CurrentRange(50e-6, 20e-3, 50e-6, 20e-3);
}
