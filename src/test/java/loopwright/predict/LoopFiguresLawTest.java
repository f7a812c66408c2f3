package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.DoubleStream;
import loopwright.assembly.DeviceModels;
import loopwright.design.Design;
import loopwright.design.RandomDesigns;
import loopwright.solve.LinearNetwork;
import org.junit.jupiter.api.Test;

/** Margins, bandwidth and peaking of random designs, by their definitions on a plain sweep. */
class LoopFiguresLawTest {
  private static final int DESIGNS = 40;

  private static HookupSolution solution(Design design) {
    return new HookupSolution(design, design.hookups().get(0), new DeviceModels(design));
  }

  /** Frequencies from one to another, 12 a decade, Hz. */
  private static DoubleStream sweep(double from, double to) {
    return DoubleStream.iterate(from, f -> f < to, f -> f * Math.pow(10, 1.0 / 12));
  }

  @Test
  void theLoopGainIsOneAtTheUnityFrequencyAndLessBeyond() {
    int crossing = 0;
    for (Design design : RandomDesigns.of(DESIGNS).toList()) {
      HookupSolution solution = solution(design);
      if (solution.assembled().isOpen()) {
        continue;
      }
      LinearNetwork network = solution.network();
      LoopMargins margins = solution.margins();
      double unity = margins.unity().map(UnityCrossing::frequency).orElse(1e-2);
      if (margins.unity().isPresent()) {
        double[] loopGain = network.loopGain(unity);
        assertThat(Math.hypot(loopGain[0], loopGain[1]))
            .as(design.name())
            .isCloseTo(1, within(1e-6));
        double angle = 180 + Math.toDegrees(Math.atan2(loopGain[1], loopGain[0]));
        assertThat(Math.IEEEremainder(margins.crossing().phaseMargin() - angle, 360))
            .as(design.name())
            .isCloseTo(0, within(1e-4));
        crossing++;
      }
      assertThat(
              sweep(1.001 * unity, 1e11)
                  .map(f -> magnitude(network.loopGain(f)))
                  .max()
                  .orElseThrow())
          .as(design.name())
          .isLessThan(1);
    }
    assertThat(crossing).isGreaterThan(DESIGNS / 2);
  }

  @Test
  void theResponseHasFallenByThreeDecibelsAtTheBandwidth() {
    int limited = 0;
    for (Design design : RandomDesigns.of(DESIGNS).toList()) {
      HookupSolution solution = solution(design);
      if (solution.assembled().isOpen()
          || solution.poles().stream().anyMatch(pole -> pole.grows())) {
        continue;
      }
      LinearNetwork network = solution.network();
      ClosedLoop loop = solution.closedLoop();
      double midband = Math.abs(solution.midbandRest().gain());
      double within = Math.min(loop.bandwidth().orElse(1e3), 1e3);
      for (double corner :
          DoubleStream.concat(loop.bandwidth().stream(), loop.lowCorner().stream()).toArray()) {
        assertThat(magnitude(network.response(corner)) / midband)
            .as("%s at %s Hz", design.name(), corner)
            .isCloseTo(Math.sqrt(0.5), within(1e-6));
        limited++;
      }
      double highest =
          sweep(within, 1e11).map(f -> magnitude(network.response(f))).max().orElseThrow();
      assertThat(20 * Math.log10(highest / midband))
          .as("%s: no point of a sweep is above the peaking", design.name())
          .isLessThanOrEqualTo(loop.peaking() + 1e-6);
    }
    assertThat(limited).isGreaterThan(DESIGNS / 3);
  }

  private static double magnitude(double[] value) {
    return Math.hypot(value[0], value[1]);
  }
}
