package loopwright.sizing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import loopwright.design.Design;
import loopwright.file.DesignText;
import loopwright.predict.HookupFigures;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The screen against a search that tries every pair and works its score out anew, from the figures
 * of the amplifier and the formulas that the page on the file format states.
 */
class DividerScreenTest {
  private static final double BIAS = 1e-6;
  private static final double CAPACITANCE = 10e-12;
  private static final double POLE = 10e3;
  private static final double OUTPUT_RESISTANCE = 100;
  private static final double RAIL = 12;
  private static final double AMPLITUDE = 0.1;
  private static final double SOURCE = 50;

  private static Design design(double gain) {
    return DesignText.read(
        """
        {"loopwright": 1, "name": "bench", "rails": {"positive": %s, "negative": -12},
         "drawer": {"resistors": ["1k", "2k2", "10k", "22k", "100k", 470, 33, "4k7"]},
         "amplifier": {"kind": "figures", "gain": %s, "inputBiasCurrent": %s,
                       "inputCapacitance": %s, "poles": [%s], "outputResistance": %s},
         "hookups": [
          {"name": "plain", "source": {"resistance": %s, "amplitude": %s},
           "feedback": {"kind": "nonInverting", "upper": 0}},
          {"name": "inverting", "source": {"resistance": %s, "amplitude": %s},
           "feedback": {"kind": "inverting", "upper": "10k", "inputResistor": "1k"}}]}
        """
            .formatted(
                RAIL,
                gain,
                BIAS,
                CAPACITANCE,
                POLE,
                OUTPUT_RESISTANCE,
                SOURCE,
                AMPLITUDE,
                SOURCE,
                AMPLITUDE));
  }

  private static HookupFigures around(Design design, String hookup, double wanted) {
    return FirstDivider.around(design, DividerPaths.of(design, hookup), wanted);
  }

  @ParameterizedTest
  @CsvSource({
    "plain, 500, 2, E12",
    "plain, 500, 11, E24",
    "plain, 500, 11, E96",
    "plain, 500, 30, drawer",
    "plain, 50, 11, E24",
    "plain, 50, 30, E96",
    "plain, 50, 4.7, drawer",
    "inverting, 500, -10, E24",
    "inverting, 50, -10, E96",
    "inverting, 500, -2.2, drawer"
  })
  void theBestOfEveryPairIsFound(String hookup, double openLoop, double wanted, String series) {
    Design design = design(openLoop);
    AmplifierFacts facts = AmplifierFacts.of(around(design, hookup, wanted), wanted);
    ResistorStock stock = ResistorStock.of(design, series, false);
    List<Double> scores = new ArrayList<>();
    for (double upper : stock.singles()) {
      for (double lower : stock.singles()) {
        score(facts, upper, lower, wanted).ifPresent(scores::add);
      }
    }
    scores.sort(null);
    List<DividerScreen.Ranked> best = new DividerScreen(facts, stock, wanted, 0.05).best(24, "x");
    for (int i = 0; i < best.size(); i++) {
      assertThat(best.get(i).score().sum())
          .as("place %s", i)
          .isEqualTo(scores.get(i), within(1e-9 * scores.get(i)));
    }
    assertThat(best).hasSizeGreaterThan(2);
  }

  @ParameterizedTest
  @CsvSource({"plain, 11, drawer", "plain, 4.7, E12", "inverting, -10, drawer"})
  void theBestOfTwoPartsIsFound(String hookup, double wanted, String series) {
    Design design = design(500);
    AmplifierFacts facts = AmplifierFacts.of(around(design, hookup, wanted), wanted);
    ResistorStock stock = ResistorStock.of(design, series, true);
    List<Double> singles = stock.singles();
    double least = Double.MAX_VALUE;
    for (double first : singles) {
      for (double second : singles) {
        for (double two : new double[] {first + second, first * second / (first + second)}) {
          for (double one : singles) {
            least = Math.min(least, 0.1 + score(facts, two, one, wanted).orElse(least));
            least = Math.min(least, 0.1 + score(facts, one, two, wanted).orElse(least));
          }
        }
        least = Math.min(least, score(facts, first, second, wanted).orElse(least));
      }
    }
    DividerScreen.Ranked best = new DividerScreen(facts, stock, wanted, 0.05).best(1, "x").get(0);
    // Two parts side by side are rounded to six digits, which moves a gain error of 1 % by 1e-4.
    assertThat(best.score().sum()).isEqualTo(least, within(1e-3));
  }

  /** Each term anew; only A, the share s and the margin are taken over, since they are solved. */
  private static OptionalDouble score(
      AmplifierFacts facts, double upper, double lower, double wanted) {
    boolean inverting = wanted < 0;
    if (inverting && lower < 10 * SOURCE) {
      return OptionalDouble.empty();
    }
    double foot = inverting ? lower + SOURCE : lower;
    double n = (upper + foot) / foot;
    double a = facts.loop().openLoop();
    double gain = facts.loop().share() * (inverting ? -upper / foot : n) / (1 + n / a);
    double peak = AMPLITUDE * Math.abs(wanted);
    double spread = inverting ? 1 : upper / (upper + lower);
    double band = 2 * 0.05 * Math.sqrt(2) / Math.sqrt(3) * spread;
    if (Math.abs(gain / wanted - 1) > 0.5) {
      return OptionalDouble.empty();
    }
    double taken = peak / (inverting ? upper : upper + lower);
    double both = upper * foot / (upper + foot);
    double offset = BIAS * (upper - (inverting ? 0 : SOURCE * n)) / (1 + n / a);
    double thermal = 4 * 1.380649e-23 * 298.15;
    double own = thermal * (1000 + SOURCE);
    double added = thermal * both + 2 * 1.602176634e-19 * BIAS * both * both;
    double unity = facts.gainBandwidth() / n;
    double pole = 1 / (2 * Math.PI * both * CAPACITANCE);
    double margin = facts.margin() - Math.toDegrees(Math.atan(unity / pole));
    return OptionalDouble.of(
        Math.abs(gain / wanted - 1) / 0.01
            + band / 0.03
            + taken / Math.min(10e-3, RAIL / OUTPUT_RESISTANCE) / 0.1
            + Math.abs(offset) / peak / 0.01
            + (Math.sqrt((own + added) / own) - 1) / 0.1
            + Math.max(0, 60 - margin) / 5);
  }

  /** A, s and the unity frequency of the loop by Black (1934) and for one pole: A f_p. */
  @ParameterizedTest
  @CsvSource({"plain, 11", "inverting, -10"})
  void whatIsTakenOverIsWhatTheAmplifierStates(String hookup, double wanted) {
    Design design = design(500);
    AmplifierFacts facts = AmplifierFacts.of(around(design, hookup, wanted), wanted);
    // 100 Ω of output resistance into a divider of about 10 kΩ takes a per cent of the gain.
    assertThat(facts.loop().openLoop()).isEqualTo(500 / 1.01, within(3.0));
    assertThat(facts.loop().share()).isEqualTo(1, within(2e-3));
    assertThat(facts.gainBandwidth()).isEqualTo(500 * POLE, within(0.05 * 500 * POLE));
    // One pole alone leaves 90°.
    assertThat(facts.margin()).isEqualTo(90, within(2.0));
  }
}
