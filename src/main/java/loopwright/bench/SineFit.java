package loopwright.bench;

import java.util.Arrays;
import loopwright.numeric.LeastSquaresFit;
import loopwright.numeric.LinearFit;

/**
 * A sine laid through samples by least squares (IEEE Std 1057, three- and four-parameter fit):
 * offset + amplitude · cos(2πf(t − middle) + phase).
 *
 * @param frequency Hz
 * @param frequencyStandard its standard uncertainty, Hz; 0 where it was given
 * @param amplitude peak, in the unit of the samples
 * @param amplitudeStandard its standard uncertainty
 * @param phase at the middle, rad
 * @param phaseStandard its standard uncertainty, rad
 * @param offset mean level
 * @param offsetStandard its standard uncertainty
 * @param middle time that the phase is told at, s
 * @param deviation standard deviation of what the sine leaves
 */
public record SineFit(
    double frequency,
    double frequencyStandard,
    double amplitude,
    double amplitudeStandard,
    double phase,
    double phaseStandard,
    double offset,
    double offsetStandard,
    double middle,
    double deviation) {
  /** Least share of a period that a frequency can be told from. */
  private static final double LEAST_CYCLES = 0.8;

  private static final int MOST_STEPS = 60;
  private static final int SCAN = 8;

  /**
   * Three-parameter fit: the frequency is known.
   *
   * @param times s, ascending; not modified
   * @param values as many; not modified
   * @param frequency Hz
   * @throws ArithmeticException when the samples do not tell a sine of that frequency
   */
  public static SineFit ofThree(double[] times, double[] values, double frequency) {
    double middle = middle(times);
    LinearFit fit = LinearFit.of(functions(times, middle, frequency), values);
    return of(fit, fit.covariance(), frequency, 0, middle);
  }

  /**
   * Four-parameter fit: the frequency is fitted too.
   *
   * @param times s, ascending; not modified
   * @param values as many; not modified
   * @throws ArithmeticException when the samples hold no whole period, or the fit does not settle
   */
  public static SineFit ofFour(double[] times, double[] values) {
    double length = times[times.length - 1] - times[0];
    double cycles = Periods.of(values);
    if (!(cycles >= LEAST_CYCLES) || values.length < SCAN) {
      throw new ArithmeticException("the samples hold less than one period");
    }
    double best = cycles / length;
    double least = Double.POSITIVE_INFINITY;
    for (int step = -SCAN; step <= SCAN; step++) {
      double tried = (cycles + step * 0.25 / SCAN * Math.min(4, cycles)) / length;
      double left = ofThree(times, values, tried).deviation();
      if (left < least) {
        least = left;
        best = tried;
      }
    }
    return ofFour(times, values, best);
  }

  /**
   * Four-parameter fit from a first guess.
   *
   * @param guess Hz, within a quarter of a period over the whole record
   * @throws ArithmeticException when the fit does not settle
   */
  public static SineFit ofFour(double[] times, double[] values, double guess) {
    double middle = middle(times);
    double length = times[times.length - 1] - times[0];
    SineFit first = ofThree(times, values, guess);
    if (first.deviation() == 0) {
      return first;
    }
    double[] start = {
      first.amplitude() * Math.cos(first.phase()),
      -first.amplitude() * Math.sin(first.phase()),
      first.offset(),
      0
    };
    LeastSquaresFit.Fit fit =
        LeastSquaresFit.of(
            p -> {
              double[][] rows = functions(times, middle, guess + p[3] / length);
              double[] residuals = new double[values.length];
              for (int i = 0; i < residuals.length; i++) {
                residuals[i] =
                    values[i] - p[0] * rows[i][0] - p[1] * rows[i][1] - p[2] * rows[i][2];
              }
              return residuals;
            },
            start,
            new double[] {first.amplitude(), first.amplitude(), first.amplitude(), 1},
            MOST_STEPS);
    if (Math.abs(guess * length + fit.values()[3]) < LEAST_CYCLES) {
      throw new ArithmeticException("the samples hold less than one period");
    }
    if (!fit.converged()) {
      throw new ArithmeticException("the fit of a sine did not settle: " + fit.reason());
    }
    LinearFit linear =
        new LinearFit(fit.values(), fit.covariance(), new double[0], fit.deviation());
    return of(
        linear,
        fit.covariance(),
        guess + fit.values()[3] / length,
        fit.standard(3) / length,
        middle);
  }

  private static SineFit of(
      LinearFit fit,
      double[][] covariance,
      double frequency,
      double frequencyStandard,
      double middle) {
    double a = fit.weights()[0];
    double b = fit.weights()[1];
    double amplitude = Math.hypot(a, b);
    double along = amplitude == 0 ? 1 : a / amplitude;
    double across = amplitude == 0 ? 0 : b / amplitude;
    double aa = covariance[0][0];
    double bb = covariance[1][1];
    double ab = covariance[0][1];
    double amplitudeVariance = along * along * aa + across * across * bb + 2 * along * across * ab;
    double phaseVariance = across * across * aa + along * along * bb - 2 * along * across * ab;
    return new SineFit(
        frequency,
        frequencyStandard,
        amplitude,
        Math.sqrt(Math.max(0, amplitudeVariance)),
        Math.atan2(-b, a),
        Math.sqrt(Math.max(0, phaseVariance)) / amplitude,
        fit.weights()[2],
        Math.sqrt(covariance[2][2]),
        middle,
        fit.deviation());
  }

  /** The sine at a time. */
  public double at(double time) {
    return offset + amplitude * Math.cos(2 * Math.PI * frequency * (time - middle) + phase);
  }

  private static double[][] functions(double[] times, double middle, double frequency) {
    return Arrays.stream(times)
        .map(time -> 2 * Math.PI * frequency * (time - middle))
        .mapToObj(angle -> new double[] {Math.cos(angle), Math.sin(angle), 1})
        .toArray(double[][]::new);
  }

  private static double middle(double[] times) {
    return (times[0] + times[times.length - 1]) / 2;
  }
}
