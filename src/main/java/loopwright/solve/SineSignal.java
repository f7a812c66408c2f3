package loopwright.solve;

/** A sine from time 0 on, upward from its mean. */
record SineSignal(double mean, double amplitude, double frequency) implements GeneratorSignal {
  private static final int STEPS_PER_PERIOD = 64;

  SineSignal {
    if (!(frequency > 0)) {
      throw new IllegalArgumentException("a sine needs a frequency above 0 Hz");
    }
  }

  @Override
  public double before(double time) {
    return time <= 0 ? mean : mean + amplitude * Math.sin(2 * Math.PI * frequency * time);
  }

  @Override
  public double after(double time) {
    return before(time);
  }

  @Override
  public double nextCorner(double time) {
    return time < 0 ? 0 : Double.POSITIVE_INFINITY;
  }

  @Override
  public double longestStep() {
    return 1 / (STEPS_PER_PERIOD * frequency);
  }
}
