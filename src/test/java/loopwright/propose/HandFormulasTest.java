package loopwright.propose;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** Formulas that reasons quote, against published values or arithmetic of many digits. */
class HandFormulasTest {
  /**
   * A textbook's class-B stage on one supply of 30 V with 16 Ω, halves of 15 V: 5.7 W each at
   * worst; ±12 V into 8 Ω: V²/(π²R) = 1.823781306 W, and 1.649648293 W at a peak of 10 V, which is
   * past the worst. Here the worst level up to the peak counts.
   */
  @Test
  void classBDissipation() {
    assertThat(HandFormulas.classBDissipation(30, 30, 16)).isEqualTo(5.6993166, within(5e-8));
    assertThat(HandFormulas.classBDissipation(12, 10, 8)).isEqualTo(1.823781306, within(5e-10));
    double low = HandFormulas.classBDissipation(12, 5, 8);
    assertThat(low).isEqualTo(12 * 5 / (Math.PI * 8) - 25.0 / 32, within(1e-12));
  }

  /**
   * 12 V, 200 K/W, 2 mV/K, 10 mA: 1.868244 without a resistor, 2.230742 Ω needed, 0.381884 at 10 Ω.
   */
  @Test
  void runaway() {
    assertThat(HandFormulas.runaway(12, 200, 0, 10e-3)).isEqualTo(1.868244, within(5e-7));
    assertThat(HandFormulas.leastEmitterResistance(12, 200, 10e-3, 1))
        .isEqualTo(2.230742, within(5e-7));
    assertThat(HandFormulas.runaway(12, 200, 10, 10e-3)).isEqualTo(0.381884, within(5e-7));
  }

  /**
   * A tail of 1 mA and 47 pF (Solomon 1974): gain-bandwidth 65.8998727 MHz with a mirror, half with
   * a resistor; slew 21.2765957 and 10.6382979 V/µs; with 100 Ω in each emitter 22.3686088 MHz and
   * 151.3851582 mV.
   */
  @Test
  void dominantPoleAndSlew() {
    double mirror = HandFormulas.pairTransconductance(1e-3, 0, true);
    assertThat(HandFormulas.compensation(mirror, 65.8998727e6, 1)).isEqualTo(47e-12, within(1e-19));
    double resistor = HandFormulas.pairTransconductance(1e-3, 0, false);
    assertThat(HandFormulas.compensation(resistor, 32.9499363e6, 1))
        .isEqualTo(47e-12, within(1e-19));
    double degenerated = HandFormulas.pairTransconductance(1e-3, 100, true);
    assertThat(HandFormulas.compensation(degenerated, 22.3686088e6, 1))
        .isEqualTo(47e-12, within(1e-19));
    assertThat(HandFormulas.slewRate(1e-3, 47e-12, true)).isEqualTo(21.2765957e6, within(0.05));
    assertThat(HandFormulas.slewRate(1e-3, 47e-12, false)).isEqualTo(10.6382979e6, within(0.05));
    assertThat(HandFormulas.slewVoltage(1e-3, 100)).isEqualTo(151.3851582e-3, within(5e-11));
  }

  /**
   * A pair at 0.5 mA with r_B 50 Ω: 1.578812999 nV/√Hz (Gray and Meyer's formula); 10 kΩ alone
   * 12.83184319 nV/√Hz.
   */
  @Test
  void noise() {
    assertThat(HandFormulas.inputNoise(0.5e-3, 1e12, 50, 0, 0, 0))
        .isEqualTo(1.578812999e-9, within(5e-17));
    assertThat(HandFormulas.inputNoise(1e6, 1e30, 0, 0, 10e3, 0))
        .isEqualTo(12.83184319e-9, within(5e-15));
  }

  /** The noise of source and current is least, e_n/i_n = R, where I_C = V_T √β/R. */
  @Test
  void quietCurrentIsTheLeast() {
    double best = HandFormulas.quietCurrent(200, 10e3);
    double least = half(best);
    assertThat(half(best * 1.02)).isGreaterThan(least);
    assertThat(half(best / 1.02)).isGreaterThan(least);
  }

  /** Of one transistor alone: the pair's second base sees no source. */
  private static double half(double current) {
    double pair = HandFormulas.inputNoise(current, 200, 0, 0, 10e3, 0);
    double one = HandFormulas.inputNoise(current, 1e12, 0, 0, 0, 0);
    return pair * pair - one * one / 2;
  }
}
