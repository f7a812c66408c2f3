package loopwright.propose;

/**
 * How one part trims a figure.
 *
 * @param path of the resistor
 * @param present Ω
 * @param perCent change of the figure for one per cent more of the part: V for the offset, a
 *     fraction of the gain for the gain
 * @param needed change of the part that brings the figure where it should be, to first order, a
 *     fraction; not finite where there is none
 * @param says which way and how much, in words
 */
public record Trim(String path, double present, double perCent, double needed, String says) {}
