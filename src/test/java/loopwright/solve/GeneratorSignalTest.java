package loopwright.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class GeneratorSignalTest {
  @Test
  void aStepHasTwoSides() {
    GeneratorSignal step = GeneratorSignal.step(-1, 2, 3);
    assertThat(step.before(3)).isEqualTo(-1);
    assertThat(step.after(3)).isEqualTo(2);
    assertThat(step.nextCorner(0)).isEqualTo(3);
    assertThat(step.nextCorner(3)).isInfinite();
    assertThat(step.before(0)).isEqualTo(-1);
    assertThat(step.before(4)).isEqualTo(2);
  }

  @Test
  void aPulseGoesUpStaysAndComesBack() {
    GeneratorSignal pulse = GeneratorSignal.pulse(0, 4, 1, 2, 3, 4);
    assertThat(pulse.before(2)).isEqualTo(2);
    assertThat(pulse.before(5)).isEqualTo(4);
    assertThat(pulse.before(9)).isEqualTo(1);
    assertThat(pulse.before(11)).isZero();
    assertThat(pulse.nextCorner(0)).isEqualTo(1);
    assertThat(pulse.nextCorner(1)).isEqualTo(3);
    assertThat(pulse.nextCorner(3)).isEqualTo(6);
    assertThat(pulse.nextCorner(6)).isEqualTo(10);
    assertThat(GeneratorSignal.pulse(0, 4, 1, 0, 3, 0).after(1)).isEqualTo(4);
  }

  @Test
  void aSineBeginsAtItsMeanAndUpward() {
    GeneratorSignal sine = GeneratorSignal.sine(1, 2, 50);
    assertThat(sine.before(-1)).isEqualTo(1);
    assertThat(sine.before(0)).isEqualTo(1);
    assertThat(sine.after(0.005)).isCloseTo(3, within(1e-12));
    assertThat(sine.longestStep()).isLessThan(0.02 / 32);
  }

  @Test
  void refusesAWaveformThatIsNone() {
    assertThatThrownBy(
            () -> GeneratorSignal.recorded(new double[] {0, 2, 1}, new double[] {0, 0, 0}))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("never fall");
    assertThatThrownBy(() -> GeneratorSignal.recorded(new double[] {0}, new double[] {}))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> GeneratorSignal.sine(0, 1, 0))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
