package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.hipparchus.complex.Complex;
import org.hipparchus.transform.DftNormalization;
import org.hipparchus.transform.FastFourierTransformer;
import org.hipparchus.transform.TransformType;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The exact Fourier series of a dead zone driven by a sine, δ the zone's half-width over the peak:
 * b₁ = 1 − (2/π)(asin δ + δ√(1 − δ²)) (Gelb and Vander Velde, Multiple-Input Describing Functions,
 * 1968, from memory); b_n = −(2/(πn))[sin((n − 1)a)/(n − 1) + sin((n + 1)a)/(n + 1)] with a = asin
 * δ (worked out and checked by quadrature). A waveform of 1024 points comes within 5e-4 of the
 * exact series.
 */
class DeadZoneTest {
  private static final double POINTS = 5e-4;

  /** A gain of one and a dead zone, nothing fed back, 1 V peak. */
  private static Predicted zone(double halfWidth) {
    return Predicted.figures(
        "\"gain\": 1, \"deadZone\": " + halfWidth,
        "\"source\": {\"amplitude\": 1}, \"feedback\": {\"kind\": \"open\"}");
  }

  @ParameterizedTest
  @CsvSource({
    "0.01, 0.987267817, -0.00429822095, -0.00257824485, -0.00184086678",
    "0.05, 0.936364559, -0.0225778850, -0.0134564195, -0.00951544965",
    "0.1, 0.872888572, -0.0478941917, -0.0279702080, -0.0191740976",
    "0.2, 0.747060078, -0.106873536, -0.0572842155, -0.0341751034",
    "0.5, 0.391002219, -0.352510081, -0.0705020162, 0.0251792915"
  })
  void harmonicsFollowTheSeries(
      double delta, double fundamental, double third, double fifth, double seventh) {
    Predicted predicted = zone(delta);
    double b1 = sine(predicted, 1);
    assertThat(b1).isCloseTo(fundamental, within(POINTS * fundamental));
    assertThat(sine(predicted, 3) / b1).isCloseTo(third, within(POINTS * Math.abs(third)));
    assertThat(sine(predicted, 5) / b1).isCloseTo(fifth, within(POINTS * Math.abs(fifth)));
    assertThat(sine(predicted, 7) / b1).isCloseTo(seventh, within(POINTS * Math.abs(seventh)));
    for (int n : new int[] {1, 3, 5, 7}) {
      assertThat(predicted.hookup().harmonics().get(n))
          .isCloseTo(Math.abs(sine(predicted, n)), within(1e-12));
    }
    for (int n = 0; n <= 50; n += 2) {
      assertThat(predicted.hookup().harmonics().get(n)).isCloseTo(0, within(1e-12));
    }
  }

  /** The harmonics shown are those of a fast Fourier transform (Hipparchus) of the points shown. */
  @Test
  void harmonicsAreThoseOfAFastTransform() {
    Predicted predicted = zone(0.2);
    double[] out = predicted.hookup().waveform().orElseThrow().out();
    Complex[] lines =
        new FastFourierTransformer(DftNormalization.STANDARD).transform(out, TransformType.FORWARD);
    List<Double> harmonics = predicted.hookup().harmonics();
    assertThat(harmonics.get(0)).isCloseTo(lines[0].getReal() / out.length, within(1e-13));
    for (int n = 1; n <= 50; n++) {
      assertThat(harmonics.get(n)).isCloseTo(2 * lines[n].norm() / out.length, within(1e-13));
    }
  }

  /** Harmonics 2 to 50 over the fundamental. */
  @ParameterizedTest
  @CsvSource({"0.01, 0.0060889290", "0.1, 0.0626646212"})
  void distortionIsThatOfTheSeries(double delta, double distortion) {
    assertThat(zone(delta).solved("thd")).isCloseTo(distortion, within(POINTS * distortion));
  }

  /** In a loop it is a zone of half-width V_d/A at the input: A = 1000, B = 0.1, V_d = 0.6 V. */
  @Test
  void inALoopTheZoneIsDividedByTheGain() {
    Predicted loop =
        Predicted.figures(
            "\"gain\": 1000, \"deadZone\": 0.6",
            """
            "source": {"amplitude": 1},
            "feedback": {"kind": "nonInverting", "upper": "9k", "lower": "1k"}
            """);
    assertThat(loop.solved("closedLoopGain")).isCloseTo(9.89342630, within(POINTS * 9.9));
    assertThat(sine(loop, 3) / sine(loop, 1))
        .isCloseTo(-2.5484246e-4, within(POINTS * 2.5484246e-4));
    assertThat(loop.solved("thd")).isCloseTo(3.6159740e-4, within(POINTS * 3.6159740e-4));
    assertThat(loop.solved("deadZone")).isCloseTo(0.6, within(1e-9));
  }

  /** The same output of 9.89504950 V peak without the loop: 98.23 times the distortion. */
  @Test
  void withoutTheLoopTheDistortionIsAHundredfold() {
    Predicted open =
        Predicted.figures(
            "\"gain\": 1000, \"deadZone\": 0.6",
            """
            "source": {"amplitude": 0.0104950495},
            "feedback": {"kind": "open"}
            """);
    assertThat(open.solved("thd")).isCloseTo(3.5518989e-2, within(POINTS * 3.5518989e-2));
  }

  /** Amplitude of a harmonic's sine, signed, from the waveform's own points. */
  private static double sine(Predicted predicted, int n) {
    double[] out = predicted.hookup().waveform().orElseThrow().out();
    double sum = 0;
    for (int k = 0; k < out.length; k++) {
      sum += out[k] * Math.sin(2 * Math.PI * n * k / out.length);
    }
    return 2 * sum / out.length;
  }
}
