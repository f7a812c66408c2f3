package loopwright.predict;

/**
 * What one source of noise makes of the noise at the output.
 *
 * @param name path of the part or role of the device; an ohmic resistance of a device has the
 *     device's role before its own name
 * @param cause in words
 * @param output what it alone would give at {@code out}: V/√Hz of a density, V of a band
 * @param share of the whole power, from 0 to 1
 */
public record NoiseShare(String name, String cause, double output, double share) {}
