package loopwright.predict;

import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import loopwright.circuit.NoiseSource;
import loopwright.circuit.Transistor;
import loopwright.design.FiguresAmplifier;
import loopwright.solve.LinearNetwork;
import loopwright.solve.NaturalFrequencies.Pole;
import loopwright.solve.NoiseSolver;

/**
 * Noise of a hookup in its small-signal circuit at rest: thermal of every resistance, shot of every
 * junction's current, flicker where a corner is known.
 */
final class HookupNoise {
  /** Lower end of the band of the noise at the output, Hz. */
  static final double LOW = 10;

  /** Upper end, Hz. */
  static final double HIGH = 100e3;

  private final LinearNetwork network;
  private final List<Pole> poles;
  private final OptionalDouble idealGain;
  private final NoiseSolver solver;
  private final String remark;

  /**
   * @throws UnsolvedException when something grows: then there is no noise that stays the same
   */
  HookupNoise(HookupSolution solution) {
    this.network = solution.network();
    this.poles = solution.poles();
    if (poles.stream().anyMatch(Pole::grows)) {
      throw new UnsolvedException("something grows at rest");
    }
    this.idealGain = solution.gains().idealGain();
    this.solver = new NoiseSolver(network, solution.linearRest(), solution.assembled().out());
    this.remark = leftOut(solution);
  }

  /** What is left out, in words. */
  String remark() {
    return remark;
  }

  /**
   * Noise at a frequency.
   *
   * @param frequency Hz, above zero
   */
  NoiseDensity density(double frequency) {
    double[] powers = solver.densities(frequency);
    double output = Math.sqrt(Arrays.stream(powers).sum());
    double gain = idealGain.isPresent() ? Math.abs(idealGain.getAsDouble()) : solvedGain(frequency);
    return new NoiseDensity(frequency, output, output / gain, gain, ranked(powers));
  }

  /** Magnitude of the gain from generator to output that is solved at a frequency in Hz. */
  double solvedGain(double frequency) {
    double[] response = network.response(frequency);
    return Math.hypot(response[0], response[1]);
  }

  /** Noise from {@link #LOW} to {@link #HIGH}. */
  NoiseBand band() {
    double[] resonances =
        poles.stream()
            .filter(pole -> pole.im() > Math.abs(pole.re()))
            .mapToDouble(pole -> pole.im() / (2 * Math.PI))
            .toArray();
    double[] powers = solver.powers(LOW, HIGH, resonances);
    return new NoiseBand(LOW, HIGH, Math.sqrt(Arrays.stream(powers).sum()), ranked(powers));
  }

  private List<NoiseShare> ranked(double[] powers) {
    double total = Arrays.stream(powers).sum();
    return IntStream.range(0, powers.length)
        .mapToObj(
            i -> {
              NoiseSource source = solver.sources().get(i);
              return new NoiseShare(
                  source.element(),
                  words(source.cause()),
                  Math.sqrt(powers[i]),
                  total == 0 ? 0 : powers[i] / total);
            })
        .sorted(Comparator.comparingDouble(NoiseShare::share).reversed())
        .toList();
  }

  private static String words(NoiseSource.Cause cause) {
    return switch (cause) {
      case THERMAL -> "thermal";
      case COLLECTOR_SHOT -> "shot, collector current";
      case BASE_SHOT -> "shot, base current";
      case DIODE_SHOT -> "shot";
      case FLICKER -> "flicker, base current";
    };
  }

  private static String leftOut(HookupSolution solution) {
    if (solution.design().amplifier() instanceof FiguresAmplifier) {
      return "an amplifier known by its figures makes no noise here";
    }
    List<Transistor> transistors =
        solution.assembled().circuit().elements().stream()
            .filter(Transistor.class::isInstance)
            .map(Transistor.class::cast)
            .toList();
    List<String> unknown =
        transistors.stream()
            .filter(transistor -> !transistor.knowsFlicker())
            .map(Transistor::name)
            .toList();
    if (unknown.isEmpty()) {
      return "";
    }
    return unknown.size() == transistors.size()
        ? "flicker is left out: no corner is known"
        : "flicker is left out of " + String.join(", ", unknown) + ": no corner is known";
  }
}
