package loopwright.predict;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.Hookup;
import loopwright.quantity.Quantity;
import loopwright.task.Progress;

/**
 * Distortion of a hookup in a steady state at its own level and frequency, and around them.
 *
 * @param present at the hookup's amplitude and frequency
 * @param byAmplitude at its frequency, upward to its amplitude and a little beyond; empty without
 *     an amplitude
 * @param byFrequency at its amplitude, upward; empty without an amplitude
 * @param crossover the dead zone divided by 1 + loop gain, V, by hand formula, or why there is none
 */
public record DistortionSweep(
    SteadyDistortion present,
    List<SteadyDistortion> byAmplitude,
    List<SteadyDistortion> byFrequency,
    FigureValue crossover) {
  private static final double[] AMPLITUDES = {0.03, 0.1, 0.2, 0.4, 0.7, 1, 1.3};
  private static final double[] FREQUENCIES = {20, 100, 300, 1e3, 3e3, 10e3, 20e3};

  /** Keeps its own copies. */
  public DistortionSweep {
    byAmplitude = List.copyOf(byAmplitude);
    byFrequency = List.copyOf(byFrequency);
  }

  /**
   * Runs a hookup at one level and frequency after the other, on all cores.
   *
   * @param design a valid design, every part it names among its own
   * @param progress reported to, and asked whether the result is still wanted
   * @throws loopwright.task.CancelledException when it is not
   */
  public static DistortionSweep of(Design design, Hookup hookup, Progress progress) {
    SteadyDistortion present = SteadyDistortion.of(design, hookup, progress);
    FigureValue crossover =
        HookupFigures.of(design, hookup.name())
            .formula(Catalogue.find("crossoverError").orElseThrow());
    double amplitude = hookup.source().amplitude().value();
    if (amplitude == 0 || present.thd().isEmpty()) {
      return new DistortionSweep(present, List.of(), List.of(), crossover);
    }
    List<Design> variants = new ArrayList<>();
    String source = "hookups." + hookup.name() + ".source.";
    for (double share : AMPLITUDES) {
      variants.add(DesignPath.set(design, source + "amplitude", Quantity.of(share * amplitude)));
    }
    for (double hertz : FREQUENCIES) {
      variants.add(DesignPath.set(design, source + "frequency", Quantity.of(hertz)));
    }
    List<SteadyDistortion> results =
        IntStream.range(0, variants.size())
            .parallel()
            .mapToObj(
                k -> {
                  progress.check();
                  Design variant = variants.get(k);
                  return SteadyDistortion.of(
                      variant, variant.hookup(hookup.name()).orElseThrow(), progress);
                })
            .toList();
    return new DistortionSweep(
        present,
        results.subList(0, AMPLITUDES.length),
        results.subList(AMPLITUDES.length, results.size()),
        crossover);
  }
}
