package loopwright.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import loopwright.design.Design;
import loopwright.design.Instrument;
import loopwright.design.InstrumentKind;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** What at the bench, not in the amplifier, may explain readings that do not agree. */
final class Suspects {
  private static final Set<String> GAINS =
      Set.of("gain", "closedLoopGain", "closedLoopGainAtRest", "openLoopGain");

  /** How near a ratio must be to 2 or 1/2, as a share of it. */
  private static final double NEAR = 0.1;

  private Suspects() {}

  static List<String> of(Design design, List<ReadingVerdict> verdicts) {
    List<String> suspects = new ArrayList<>();
    for (ReadingVerdict verdict : verdicts) {
      if (verdict.agrees().orElse(true) || verdict.predicted().number().isEmpty()) {
        continue;
      }
      double ratio = verdict.measured() / verdict.predicted().number().getAsDouble();
      String what = verdict.reading().quantity();
      String where = verdict.reading().hookup().map(name -> " in hookup " + name).orElse("");
      if (GAINS.contains(what)) {
        generator(design, what + where, ratio, suspects);
      }
      probe(what + where, ratio, suspects);
    }
    return suspects;
  }

  /**
   * A generator's display means its voltage into 50 Ω; a high impedance receives twice as much
   * (common practice, no source).
   */
  private static void generator(
      Design design, String reading, double ratio, List<String> suspects) {
    boolean twice = Math.abs(ratio / 2 - 1) < NEAR;
    boolean half = Math.abs(2 * ratio - 1) < NEAR;
    if (!twice && !half) {
      return;
    }
    boolean matched =
        design.bench().instruments().values().stream()
            .filter(instrument -> instrument.kind() == InstrumentKind.GENERATOR)
            .anyMatch(Suspects::isMatched);
    suspects.add(
        "The reading of "
            + reading
            + " is "
            + EngineeringFormat.format(ratio, Unit.ONE, 3)
            + " times the prediction, near "
            + (twice ? "two" : "one half")
            + ": "
            + (twice
                ? "a generator whose display is set for 50 Ω gives a high impedance twice what it"
                    + " shows"
                : "a generator whose display is set for a high impedance gives 50 Ω half of what it"
                    + " shows")
            + (matched ? ", and the one on this bench is set for 50 Ω" : "")
            + "; measure the input itself.");
  }

  private static boolean isMatched(Instrument generator) {
    return generator.displayLoad().filter(load -> Double.isFinite(load.value())).isPresent();
  }

  /** A ×10 probe whose factor is not applied, or applied twice (common practice, no source). */
  private static void probe(String reading, double ratio, List<String> suspects) {
    if (Math.abs(ratio / 10 - 1) < NEAR || Math.abs(ratio * 10 - 1) < NEAR) {
      suspects.add(
          "The reading of "
              + reading
              + " is "
              + EngineeringFormat.format(ratio, Unit.ONE, 3)
              + " times the prediction, near "
              + (ratio > 1 ? "ten" : "a tenth")
              + ": look at the probe's factor.");
    }
  }
}
