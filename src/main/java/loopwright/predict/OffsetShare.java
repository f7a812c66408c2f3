package loopwright.predict;

/**
 * One cause's share of the output offset.
 *
 * @param cause in words
 * @param output its share at {@code out}, V
 */
public record OffsetShare(String cause, double output) {}
