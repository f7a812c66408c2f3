package loopwright.check;

import java.util.LinkedHashMap;
import java.util.Map;
import loopwright.predict.DeviceState;
import loopwright.predict.HookupPrediction;
import loopwright.predict.RestState;
import loopwright.predict.Waveform;

/** Where the devices of a prediction are known: at rest, and at both ends of the signal. */
final class SwingDevices {
  private SwingDevices() {}

  /** Devices by role for each place, rest first; a place that was not solved is absent. */
  static Map<String, Map<String, DeviceState>> places(HookupPrediction prediction) {
    Map<String, Map<String, DeviceState>> places = new LinkedHashMap<>();
    prediction.rest().map(RestState::devices).ifPresent(devices -> places.put("at rest", devices));
    prediction
        .waveform()
        .ifPresent(
            waveform -> {
              places.put(at(waveform, true), waveform.atCrest());
              places.put(at(waveform, false), waveform.atTrough());
            });
    return places;
  }

  /** The end of the signal in words, with the output's voltage there. */
  private static String at(Waveform waveform, boolean crest) {
    int quarter = waveform.out().length / 4;
    return "with the output at " + Say.volts(waveform.out()[crest ? quarter : 3 * quarter]);
  }
}
