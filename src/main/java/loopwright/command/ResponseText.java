package loopwright.command;

import static loopwright.quantity.EngineeringFormat.format;

import java.util.List;
import java.util.Locale;
import loopwright.predict.ComplexPoint;
import loopwright.predict.HookupPrediction;
import loopwright.quantity.Unit;

/** Response and loop gain at the frequencies that were asked for. */
final class ResponseText {
  private ResponseText() {}

  static void print(HookupPrediction hookup, TextPage page) {
    if (hookup.response().isEmpty()) {
      return;
    }
    boolean loop = !hookup.loopGain().isEmpty();
    TextTable table =
        loop
            ? new TextTable().row("Frequency", "gain", "dB", "phase", "loop gain", "dB", "phase")
            : new TextTable().row("Frequency", "gain", "dB", "phase");
    for (int i = 0; i < hookup.response().size(); i++) {
      ComplexPoint response = hookup.response().get(i);
      String frequency = format(response.frequency(), Unit.HERTZ);
      if (loop) {
        ComplexPoint loopGain = hookup.loopGain().get(i);
        table.row(
            frequency,
            gain(response),
            decibel(response),
            phase(response),
            gain(loopGain),
            decibel(loopGain),
            phase(loopGain));
      } else {
        table.row(frequency, gain(response), decibel(response), phase(response));
      }
    }
    page.heading("Response, out over generator, at rest").table(table);
  }

  static void print(List<Double> harmonics, TextPage page) {
    if (harmonics.size() < 2) {
      return;
    }
    page.heading("Waveform at out, harmonics as peak values");
    TextTable table = new TextTable().row("mean", format(harmonics.get(0), Unit.VOLT));
    for (int order = 1; order < Math.min(harmonics.size(), 10); order++) {
      table.row(
          order == 1 ? "fundamental" : "harmonic " + order,
          format(harmonics.get(order), Unit.VOLT));
    }
    page.columns(table.lines());
  }

  private static String gain(ComplexPoint point) {
    return format(point.magnitude(), Unit.ONE);
  }

  private static String decibel(ComplexPoint point) {
    return fixed("%.2f", 20 * Math.log10(point.magnitude()));
  }

  private static String phase(ComplexPoint point) {
    return fixed("%.1f°", point.degrees());
  }

  /** Always so many decimals, so that a column can be read downward. */
  private static String fixed(String pattern, double value) {
    return String.format(Locale.ROOT, pattern, value).replace('-', '−');
  }
}
