package loopwright.predict;

/**
 * A natural frequency.
 *
 * @param re growth, 1/s
 * @param im angular frequency, rad/s, zero or more
 */
public record Root(double re, double im) {}
