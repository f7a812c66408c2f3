package loopwright.predict;

import java.util.Map;

/**
 * One period of the static waveform, from the sine's zero upward; all arrays of one length, V. The
 * arrays belong to the waveform and are not to be changed.
 *
 * @param generator generator
 * @param out amplifier output
 * @param gainOut gain-stage output
 * @param error output less its mean and fundamental
 * @param atCrest devices by role with the generator at its highest
 * @param atTrough devices by role with the generator at its lowest
 */
public record Waveform(
    double[] generator,
    double[] out,
    double[] gainOut,
    double[] error,
    Map<String, DeviceState> atCrest,
    Map<String, DeviceState> atTrough) {
  /** Keeps its own copies of the maps. */
  public Waveform {
    atCrest = Map.copyOf(atCrest);
    atTrough = Map.copyOf(atTrough);
  }
}
