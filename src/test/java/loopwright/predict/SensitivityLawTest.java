package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import loopwright.circuit.Parameter;
import loopwright.design.Design;
import loopwright.design.RandomDesigns;
import loopwright.predict.PartSensitivity.Method;
import loopwright.predict.VariableParts.VariablePart;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

/**
 * The adjoint sensitivities of random designs against differences of whole solutions: every part
 * and device of the stage library, every linear figure.
 */
class SensitivityLawTest {
  /** Small, so that the third derivative counts little even for a junction. */
  private static final double STEP = 4e-3;

  private static final double VOLTAGE_STEP = 0.2e-3;

  /** What rounding leaves of a ratio made of terms of order one. */
  private static final double ROUNDING_OF_ONE = 1e-15;

  /** What the extrapolation may still be off by, in bends. */
  private static final double MOST_BENDS = 5;

  /**
   * What rounding leaves of a figure, as a share; the larger ones are small differences of large.
   */
  private static final Map<String, Double> ROUNDING =
      Map.ofEntries(
          Map.entry("idealGain", 1e-12),
          Map.entry("noiseGain", 1e-12),
          Map.entry("outputOffset", 1e-8),
          Map.entry("inputOffset", 1e-8),
          Map.entry("supplyPower", 1e-10),
          Map.entry("openLoopGain", 1e-8),
          Map.entry("openLoopGainHigh", 1e-8),
          Map.entry("openLoopGainLow", 1e-8),
          Map.entry("openLoopGainAtRest", 1e-8),
          Map.entry("commonModeRejection", 1e-7),
          Map.entry("closedLoopGainAtRest", 1e-9),
          Map.entry("loopGainDc", 1e-8),
          Map.entry("inputResistance", 5e-7),
          Map.entry("outputResistance", 1e-8),
          Map.entry("supplyRejectionPositive", 5e-7),
          Map.entry("supplyRejectionNegative", 5e-7),
          Map.entry("unityFrequency", 1e-9),
          Map.entry("phaseMargin", 1e-9),
          Map.entry("bandwidth", 1e-8),
          Map.entry("lowCorner", 1e-8));

  /** Beyond this a rejection is the rounding of an exact symmetry. */
  private static final double SYMMETRIC = 1e6;

  @Test
  void linearFiguresHaveTheSensitivitiesThatDifferencesShow() {
    Map<String, Integer> compared = new HashMap<>();
    RandomDesigns.of(25)
        .filter(design -> !design.surroundings().selfHeating() && isAlive(design))
        .forEach(design -> compare(design, 2, ROUNDING, compared));
    for (String key : ROUNDING.keySet()) {
      assertThat(compared.getOrDefault(key, 0)).as(key).isGreaterThan(30);
    }
  }

  /** Natural frequencies by their left and right vectors, at the level that is worst. */
  @Test
  void figuresOverTheSwingHaveTheSensitivitiesThatDifferencesShow() {
    Map<String, Double> rounding =
        Map.of("worstGrowth", 1e-6, "oscillationFrequency", 1e-6, "worstPhaseMargin", 1e-7);
    Map<String, Integer> compared = new HashMap<>();
    for (long seed : new long[] {3, 7}) {
      compare(RandomDesigns.of(seed), 5, rounding, compared);
    }
    for (String key : rounding.keySet()) {
      assertThat(compared.getOrDefault(key, 0)).as(key).isGreaterThan(8);
    }
  }

  private static void compare(
      Design design, int every, Map<String, Double> rounding, Map<String, Integer> compared) {

    List<String> keys = List.copyOf(rounding.keySet());
    String hookup = design.hookups().get(0).name();
    List<FigureSensitivity> found = Sensitivities.of(design, hookup, keys, Progress.none());
    HookupFigures nominal = HookupFigures.of(design, hookup);
    found.forEach(figure -> nominal.solved(figure.figure()));
    List<VariablePart> parts = VariableParts.of(nominal, nominal.solution().assembled());
    for (int i = 0; i < parts.size(); i += every) {
      VariablePart part = parts.get(i);
      double step = part.parameter() == Parameter.JUNCTION_VOLTAGE ? VOLTAGE_STEP : STEP;
      HookupFigures[] moved = new HookupFigures[4];
      double[] shares = {1, -1, 0.5, -0.5};
      for (int k = 0; k < 4; k++) {
        moved[k] = nominal.of(part.build(design, shares[k] * step));
      }
      for (FigureSensitivity sensitivity : found) {
        Figure figure = sensitivity.figure();
        double value = sensitivity.value().number().orElse(Double.NaN);
        OptionalDouble coarse = quotient(figure, moved[0], moved[1], step);
        OptionalDouble fine = quotient(figure, moved[2], moved[3], step / 2);
        boolean isSymmetric = figure.key().equals("commonModeRejection") && value > SYMMETRIC;
        if (Double.isNaN(value) || coarse.isEmpty() || fine.isEmpty() || isSymmetric) {
          continue;
        }
        double slope = (4 * fine.getAsDouble() - coarse.getAsDouble()) / 3;
        double bend = Math.abs(slope - fine.getAsDouble());
        PartSensitivity exact = sensitivity.parts().get(i);
        assertThat(exact.name()).isEqualTo(part.name());
        assertThat(exact.method())
            .as("%s, %s", design.name(), figure.key())
            .isEqualTo(Method.ADJOINT);
        double allowed =
            MOST_BENDS * bend
                + 1e-5 * Math.abs(slope)
                + (rounding.get(figure.key()) * Math.abs(value) + ROUNDING_OF_ONE) / step;
        assertThat(Math.abs(exact.slope().orElseThrow() - slope))
            .as(
                "%s, %s by %s of %s: %s, by differences %s",
                design.name(), figure.key(), part.parameter(), part.name(), exact.slope(), slope)
            .isLessThanOrEqualTo(allowed);
        compared.merge(figure.key(), 1, Integer::sum);
      }
    }
  }

  /** A dead amplifier's gain is what junctions leak, and differences of it are rounding. */
  private static boolean isAlive(Design design) {
    return HookupFigures.of(design, design.hookups().get(0).name())
            .solved(Catalogue.find("openLoopGainAtRest").orElseThrow())
            .number()
            .orElse(0)
        > 10;
  }

  private static OptionalDouble quotient(
      Figure figure, HookupFigures more, HookupFigures less, double step) {
    OptionalDouble above = more.solved(figure).number();
    OptionalDouble below = less.solved(figure).number();
    return above.isPresent() && below.isPresent()
        ? OptionalDouble.of((above.getAsDouble() - below.getAsDouble()) / (2 * step))
        : OptionalDouble.empty();
  }
}
