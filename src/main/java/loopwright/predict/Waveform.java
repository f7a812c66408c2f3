package loopwright.predict;

/**
 * One period of the static waveform, from the sine's zero upward; all arrays of one length, V. The
 * arrays belong to the waveform and are not to be changed.
 *
 * @param generator generator
 * @param out amplifier output
 * @param gainOut gain-stage output
 * @param error output less its mean and fundamental
 */
public record Waveform(double[] generator, double[] out, double[] gainOut, double[] error) {}
