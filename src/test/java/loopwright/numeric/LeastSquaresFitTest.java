package loopwright.numeric;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Held against the certified values of the NIST Statistical Reference Datasets, nonlinear
 * regression: Misra1a and Thurber (lower and higher difficulty), MGH17 (average), BoxBOD and
 * Eckerle4 (higher). They are printed to eleven digits.
 */
class LeastSquaresFitTest {
  private static final Path DATA = Path.of("src/test/resources/loopwright/numeric");

  private static double model(String set, double[] b, double x) {
    return switch (set) {
      case "misra1a", "boxbod" -> b[0] * (1 - Math.exp(-b[1] * x));
      case "mgh17" -> b[0] + b[1] * Math.exp(-x * b[3]) + b[2] * Math.exp(-x * b[4]);
      case "eckerle4" -> b[0] / b[1] * Math.exp(-0.5 * Math.pow((x - b[2]) / b[1], 2));
      case "thurber" ->
          (b[0] + x * (b[1] + x * (b[2] + x * b[3]))) / (1 + x * (b[4] + x * (b[5] + x * b[6])));
      default -> throw new IllegalArgumentException(set);
    };
  }

  private static List<String[]> rows(String file) throws Exception {
    return Files.readAllLines(DATA.resolve(file)).stream()
        .skip(1)
        .map(line -> line.split(",", -1))
        .toList();
  }

  private static List<String[]> parameters(String set) throws Exception {
    return rows("nist-" + set + "-certified.csv").stream()
        .filter(row -> row[0].startsWith("b"))
        .toList();
  }

  private static double certified(String set, String name) throws Exception {
    return rows("nist-" + set + "-certified.csv").stream()
        .filter(row -> row[0].equals(name))
        .mapToDouble(row -> Double.parseDouble(row[3]))
        .findFirst()
        .orElseThrow();
  }

  private static LeastSquaresFit.Fit fit(String set, int start) throws Exception {
    return fit(
        set, parameters(set).stream().mapToDouble(row -> Double.parseDouble(row[start])).toArray());
  }

  private static LeastSquaresFit.Fit fit(String set, double[] first) throws Exception {
    List<String[]> data = rows("nist-" + set + ".csv");
    return LeastSquaresFit.of(
        b ->
            data.stream()
                .mapToDouble(
                    row -> Double.parseDouble(row[0]) - model(set, b, Double.parseDouble(row[1])))
                .toArray(),
        first);
  }

  @ParameterizedTest
  @CsvSource({
    "misra1a,1", "misra1a,2", "boxbod,1", "boxbod,2", "mgh17,1",
    "mgh17,2", "eckerle4,1", "eckerle4,2", "thurber,1", "thurber,2"
  })
  void theCertifiedValuesAreFound(String set, int start) throws Exception {
    LeastSquaresFit.Fit fit = fit(set, start);
    assertThat(fit.reason()).isEmpty();
    assertThat(fit.converged()).isTrue();
    List<String[]> parameters = parameters(set);
    for (int i = 0; i < parameters.size(); i++) {
      double value = Double.parseDouble(parameters.get(i)[3]);
      double deviation = Double.parseDouble(parameters.get(i)[4]);
      // The sum of squares is flat at its least: half the digits of a double are sure, 1e-8.
      assertThat(fit.values()[i]).isCloseTo(value, within(1e-8 * Math.abs(value)));
      assertThat(fit.standard(i)).isCloseTo(deviation, within(1e-7 * deviation));
    }
    assertThat(fit.sumOfSquares()).isCloseTo(certified(set, "rss"), withinPercentage(1e-8));
    assertThat(fit.deviation()).isCloseTo(certified(set, "rsd"), withinPercentage(1e-8));
    assertThat(fit.degreesOfFreedom()).isEqualTo((int) certified(set, "dof"));
    assertThat(fit.evaluations()).isPositive();
  }

  @Test
  void aStartFromWhichItFailsIsReportedAsSuch() throws Exception {
    // So far out on BoxBOD that the exponential is 0 at every point: nothing leads back.
    LeastSquaresFit.Fit fit = fit("boxbod", new double[] {1, 1000});
    assertThat(fit.converged()).isFalse();
    assertThat(fit.reason()).isEqualTo("unknown 2 has no effect where it ended");
    assertThat(fit.standard(1)).isNaN();
    assertThat(fit.evaluations()).isPositive();
  }

  @Test
  void unknownsThatCannotBeToldApartAreNamed() {
    LeastSquaresFit.Fit fit =
        LeastSquaresFit.of(
            p -> new double[] {p[0] + p[1] - 1, p[0] + p[1] - 2, p[0] + p[1] - 4}, 0.5, 0.25);
    assertThat(fit.converged()).isFalse();
    assertThat(fit.reason()).contains("unknown 2 cannot be told from those before it");
    assertThat(fit.standard(0)).isNaN();
  }

  @Test
  void aStraightLineHasTheTextbookUncertainty() {
    // GUM (JCGM 100:2008) H.3: calibration of a thermometer, b = y1 + y2 (t - 20 °C).
    double[] t = {
      21.521, 22.012, 22.512, 23.003, 23.507, 23.999, 24.513, 25.002, 25.503, 26.010, 26.511
    };
    double[] b = {
      -0.171, -0.169, -0.166, -0.159, -0.164, -0.165, -0.156, -0.157, -0.159, -0.161, -0.160
    };
    LeastSquaresFit.Fit fit =
        LeastSquaresFit.of(
            p -> {
              double[] r = new double[t.length];
              for (int i = 0; i < r.length; i++) {
                r[i] = b[i] - p[0] - p[1] * (t[i] - 20);
              }
              return r;
            },
            0,
            0);
    assertThat(fit.converged()).isTrue();
    assertThat(fit.values()[0]).isCloseTo(-0.1712, within(5e-5));
    assertThat(fit.standard(0)).isCloseTo(0.0029, within(5e-5));
    assertThat(fit.values()[1]).isCloseTo(0.00218, within(5e-6));
    assertThat(fit.standard(1)).isCloseTo(0.00067, within(5e-6));
    assertThat(fit.deviation()).isCloseTo(0.0035, within(5e-5));
  }

  @Test
  void aStartOutOfReachIsRefusedInWords() {
    LeastSquaresFit.Fit fit = LeastSquaresFit.of(p -> new double[] {Math.log(p[0]), 1}, -1);
    assertThat(fit.converged()).isFalse();
    assertThat(fit.reason()).isEqualTo("the residuals have no value at the start");
  }

  @Test
  void asManyUnknownsAsResidualsAreNoFit() {
    assertThatThrownBy(() -> LeastSquaresFit.of(p -> new double[] {p[0]}, 1))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
