package loopwright.bench;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Random;
import java.util.function.DoubleUnaryOperator;
import loopwright.bench.MeasuredCurve.Column;
import loopwright.quantity.Unit;
import org.junit.jupiter.api.Test;

/** Curves made of known laws, so that what they measure is known exactly. */
class CurveMeasuresTest {
  private static final int COUNT = 2000;
  private static final double LENGTH = 4.3e-3;
  private static final double TURN = 2 * Math.PI * 1000;

  private static double[] times() {
    double[] times = new double[COUNT];
    Arrays.setAll(times, i -> -1e-3 + i * LENGTH / (COUNT - 1));
    return times;
  }

  private static Column volts(String node, DoubleUnaryOperator law) {
    return new Column(node, Unit.VOLT, Arrays.stream(times()).map(law).toArray());
  }

  private static MeasuredCurve waveform(Column... columns) {
    List<Column> all = new ArrayList<>();
    all.add(new Column("time", Unit.SECOND, times()));
    all.addAll(List.of(columns));
    return new MeasuredCurve(all);
  }

  private static CurveFigure figure(CurveMeasures measures, String key) {
    return measures.figures().stream()
        .filter(figure -> figure.key().equals(key))
        .findFirst()
        .orElseThrow(() -> new AssertionError(key + " not in " + measures));
  }

  private static boolean has(CurveMeasures measures, String key) {
    return measures.figures().stream().anyMatch(figure -> figure.key().equals(key));
  }

  private static void near(CurveMeasures measures, String key, double value) {
    CurveFigure figure = figure(measures, key);
    assertThat(figure.standard()).isPositive();
    assertThat(figure.value()).as(key).isCloseTo(value, within(4 * figure.standard()));
  }

  @Test
  void gainPhaseOffsetAndDistortionOfANoisyPair() {
    Random random = new Random(11);
    CurveMeasures measures =
        CurveMeasures.of(
            waveform(
                volts("generator", t -> 0.1 * Math.sin(TURN * t) + 1e-3 * random.nextGaussian()),
                volts(
                    "out",
                    t ->
                        0.05
                            + 1.1 * Math.sin(TURN * t - Math.toRadians(12))
                            + 0.011 * Math.sin(3 * TURN * t)
                            + 1e-3 * random.nextGaussian())),
            OptionalDouble.of(1000));
    near(measures, "gain", 11);
    near(measures, "phase", -12);
    near(measures, "outputMean", 0.05);
    near(measures, "thd", 0.01);
    assertThat(figure(measures, "thd").standard()).isLessThan(1e-4);
    assertThat(figure(measures, "gain").frequency().orElseThrow())
        .isCloseTo(1000, withinPercentage(0.1));
    assertThat(figure(measures, "gain").amplitude().orElseThrow()).isCloseTo(0.1, within(1e-3));
    assertThat(has(measures, "clipHigh")).isFalse();
    assertThat(has(measures, "oscillationFrequency")).isFalse();
    assertThat(measures.remarks()).isEmpty();
  }

  @Test
  void theDistortionOfASymmetricalSquareRootedSeriesIsExact() {
    // Harmonics of 3 % and 4 % of the fundamental: root of the sum of squares 5 %.
    CurveMeasures measures =
        CurveMeasures.of(
            waveform(
                volts(
                    "out",
                    t ->
                        2 * Math.sin(TURN * t)
                            + 0.06 * Math.cos(2 * TURN * t)
                            + 0.08 * Math.sin(3 * TURN * t))),
            OptionalDouble.of(1000));
    assertThat(figure(measures, "thd").value()).isCloseTo(0.05, within(1e-6));
    assertThat(has(measures, "gain")).isFalse();
  }

  @Test
  void theDeadZoneIsHalfTheStepThatTheLoopMakes() {
    DoubleUnaryOperator out = t -> 3 * Math.sin(TURN * t);
    CurveMeasures measures =
        CurveMeasures.of(
            waveform(
                volts("out", out),
                volts(
                    "gainOut", t -> out.applyAsDouble(t) + 0.65 * Math.signum(Math.sin(TURN * t)))),
            OptionalDouble.of(1000));
    assertThat(figure(measures, "deadZone").value()).isCloseTo(0.65, within(1e-9));
  }

  @Test
  void clippingIsSeenOnTheSideThatClips() {
    CurveMeasures measures =
        CurveMeasures.of(
            waveform(volts("out", t -> Math.min(2.5, 3 * Math.sin(TURN * t)))),
            OptionalDouble.of(1000));
    assertThat(figure(measures, "clipHigh").value()).isCloseTo(2.5, within(0.03));
    assertThat(has(measures, "clipLow")).isFalse();
  }

  @Test
  void anEdgeOfAnRcHasTheTextbookRiseTime() {
    // 10 % to 90 % of 1 − exp(−t/τ) is τ ln 9.
    double tau = 20e-6;
    CurveMeasures measures =
        CurveMeasures.of(
            waveform(volts("out", t -> t < 0 ? -1 : 1 - 2 * Math.exp(-t / tau))),
            OptionalDouble.empty());
    near(measures, "riseTime", tau * Math.log(9));
    near(measures, "slewRising", 0.8 * 2 / (tau * Math.log(9)));
    assertThat(has(measures, "thd")).isFalse();
    assertThat(has(measures, "slewFalling")).isFalse();
  }

  @Test
  void anOscillationAloneAndOneThatRidesOnTheSignal() {
    CurveMeasures alone =
        CurveMeasures.of(
            waveform(volts("out", t -> 0.4 * Math.sin(2 * Math.PI * 52_300 * t))),
            OptionalDouble.of(1000));
    assertThat(figure(alone, "oscillationFrequency").value())
        .isCloseTo(52_300, withinPercentage(1e-6));
    assertThat(has(alone, "thd")).isFalse();
    CurveMeasures riding =
        CurveMeasures.of(
            waveform(
                volts(
                    "out",
                    t -> 2 * Math.sin(TURN * t) + 0.05 * Math.sin(2 * Math.PI * 77_770 * t))),
            OptionalDouble.of(1000));
    assertThat(figure(riding, "oscillationFrequency").value())
        .isCloseTo(77_770, withinPercentage(0.01));
  }

  @Test
  void aSweepOfTwoPolesHasItsTextbookCornersAndPeak() {
    // ζ = 0.5: peak 1/(2ζ√(1 − ζ²)) = 1.1547 (1.249 dB), −3 dB at ω0 √(1 − 2ζ² + √(2 − 4ζ² + 4ζ⁴))
    // =
    // 1.2720 ω0; a first-order corner at 10 Hz below.
    int count = 400;
    double[] frequency = new double[count];
    double[] level = new double[count];
    double[] phase = new double[count];
    for (int i = 0; i < count; i++) {
      frequency[i] = Math.pow(10, 6.5 * i / (count - 1));
      double x = frequency[i] / 1e5;
      double low = 10 / frequency[i];
      level[i] =
          20 - 10 * Math.log10(Math.pow(1 - x * x, 2) + x * x) - 10 * Math.log10(1 + low * low);
      phase[i] = -Math.toDegrees(Math.atan2(x, 1 - x * x)) + Math.toDegrees(Math.atan(low));
    }
    CurveMeasures measures =
        CurveMeasures.of(
            new MeasuredCurve(
                List.of(
                    new Column("frequency", Unit.HERTZ, frequency),
                    new Column("gain", Unit.DECIBEL, level),
                    new Column("phase", Unit.DEGREE, phase))),
            OptionalDouble.of(1000));
    assertThat(figure(measures, "bandwidth").value()).isCloseTo(1.2720e5, withinPercentage(0.1));
    assertThat(figure(measures, "lowCorner").value()).isCloseTo(10, withinPercentage(0.3));
    assertThat(figure(measures, "peaking").value()).isCloseTo(1.249, within(0.005));
    assertThat(figure(measures, "gain").value()).isCloseTo(10, withinPercentage(0.02));
    assertThat(figure(measures, "phase").value())
        .isCloseTo(-Math.toDegrees(Math.atan(0.01) - Math.atan(0.01)), within(0.01));
  }

  @Test
  void aSweepThatEndsInTheBandSaysSo() {
    CurveMeasures measures =
        CurveMeasures.of(
            new MeasuredCurve(
                List.of(
                    new Column("frequency", Unit.HERTZ, new double[] {10, 100, 1000, 1e4, 1e5}),
                    new Column("gain", Unit.ONE, new double[] {10, 10, 10, 10, 9}))),
            OptionalDouble.empty());
    assertThat(has(measures, "bandwidth")).isFalse();
    assertThat(measures.remarks()).contains("The sweep ends before the gain has fallen by 3 dB.");
  }
}
