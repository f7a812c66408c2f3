package loopwright.predict;

import static loopwright.quantity.Unit.VOLT;
import static loopwright.quantity.Unit.VOLT_PER_ROOT_HERTZ;

import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** Noise at input and output. */
final class NoiseFigures {
  /** A solved gain further from the ideal one than this, as a ratio, is worth a remark. */
  private static final double WORTH_SAYING = 1.05;

  private NoiseFigures() {}

  static List<Figure> entries() {
    return List.of(
        new Figure(
            "inputNoise",
            "Input noise",
            VOLT_PER_ROOT_HERTZ,
            "Noise density at signal frequency, referred to the generator through the ideal gain; with"
                + " an open hookup through the gain solved at that frequency.",
            "at rest",
            "root of 2·4kT(r_B + R_E + 1/(2g_m)) + 4kT R₊ + 4kT(upper ∥ lower)"
                + " + 2q I_B (R₊² + (upper ∥ lower)²)",
            CostClass.LINEAR,
            NoiseFigures::inputNoise,
            SwingFormulas::inputNoise),
        new Figure(
            "outputNoise",
            "Output noise",
            VOLT,
            "Noise at the output from 10 Hz to 100 kHz, rms.",
            "at rest",
            "",
            CostClass.LINEAR,
            NoiseFigures::outputNoise,
            NoFormula.ROAD));
  }

  private static FigureValue inputNoise(HookupSolution solution) {
    HookupNoise noise = solution.noise();
    NoiseDensity density = noise.density(solution.hookup().source().frequency().value());
    if (!solution.assembled().isOpen() && !(noise.solvedGain(density.frequency()) > 0)) {
      return FigureValue.none("at rest the output follows nothing: it lies in the dead zone");
    }
    return FigureValue.of(
        density.input(),
        sentence(loudest(density.shares()), referred(solution, density), noise.remark()));
  }

  private static FigureValue outputNoise(HookupSolution solution) {
    NoiseBand band = solution.noise().band();
    return FigureValue.of(
        band.output(),
        sentence(
            "from " + Text.hertz(HookupNoise.LOW) + " to " + Text.hertz(HookupNoise.HIGH),
            loudest(band.shares()),
            openAt(solution),
            solution.noise().remark()));
  }

  private static String loudest(List<NoiseShare> shares) {
    if (shares.isEmpty()) {
      return "nothing makes noise";
    }
    NoiseShare first = shares.get(0);
    return Math.round(100 * first.share())
        + " % of its power from "
        + first.name()
        + " ("
        + first.cause()
        + ")";
  }

  private static String referred(HookupSolution solution, NoiseDensity density) {
    if (solution.assembled().isOpen()) {
      return "referred through the solved gain of "
          + Text.ratio(density.gain())
          + ", "
          + openAt(solution);
    }
    double solved = solution.noise().solvedGain(density.frequency());
    double apart = Math.max(solved / density.gain(), density.gain() / solved);
    return apart < WORTH_SAYING
        ? ""
        : "through the solved gain of "
            + Text.ratio(solved)
            + " it would be "
            + Text.of(density.output() / solved, VOLT_PER_ROOT_HERTZ);
  }

  private static String openAt(HookupSolution solution) {
    return solution.assembled().isOpen()
        ? "generator at " + Text.volts(solution.linearRest().generator())
        : "";
  }

  private static String sentence(String... parts) {
    return Stream.of(parts).filter(part -> !part.isEmpty()).collect(Collectors.joining("; "));
  }
}
