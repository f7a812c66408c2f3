package loopwright.numeric;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.OrdinaryDifferentialEquation;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class TrBdf2Test {
  /** x' = rate · x. */
  private static TestEquations decay(double rate, double tolerance) {
    return new TestEquations(tolerance, 1) {
      @Override
      void fill(double time) {
        plainCharges();
        f[0] = -rate * x[0];
        g[0] = -rate;
      }
    };
  }

  /**
   * One step of x' = z x from 1 is the method's stability function. R(z) = ((1 + (1 − γ)²) z + 2(2
   * − γ))/(z²(1 − γ)γ + z(γ² − 2) + 2(2 − γ)), γ = 2 − √2, worked out from the stage formulas of
   * Bank et al., IEEE Transactions on Computer-Aided Design 4, 1985; ten digits.
   */
  @ParameterizedTest
  @CsvSource({
    "-0.1, 0.9048004636",
    "-1, 0.3504402628",
    "-10, -0.2035522280",
    "-100, -0.0440587103"
  })
  void hasItsPublishedStabilityFunction(double z, double expected) {
    TestEquations equations = decay(z, 1e6);
    TrBdf2 integrator = new TrBdf2(equations, 0);
    integrator.start(0, 1);
    integrator.step(1, 1);

    assertThat(integrator.accepted()).isEqualTo(1);
    assertThat(equations.x[0]).isCloseTo(expected, within(5.1e-11));
  }

  /** Charging through a resistor: 1 − e^(−t/τ), ten digits. */
  @Test
  void chargesACapacitor() {
    double[] exact = {0.6321205588, 0.8646647168, 0.9502129316, 0.9932620531};
    double[] times = {1, 2, 3, 5};
    TestEquations equations =
        new TestEquations(1e-9, 0) {
          @Override
          void fill(double time) {
            plainCharges();
            f[0] = x[0] - 1;
            g[0] = 1;
          }
        };
    TrBdf2 integrator = new TrBdf2(equations, 1e-8);
    integrator.start(0, 1e-3);
    for (int i = 0; i < times.length; i++) {
      TestEquations.advance(integrator, times[i]);
      assertThat(integrator.time()).isEqualTo(times[i]);
      assertThat(equations.x[0]).isCloseTo(exact[i], within(1e-6));
    }
  }

  /**
   * Capacitor voltage of a series circuit of 1 mH, 1 µF and R after a unit step, from the closed
   * solutions; for 20 Ω 1 − e^(−αt)(cos ω_d t + (α/ω_d) sin ω_d t) with α = 1e4, ω_d = 3e4.
   */
  @ParameterizedTest
  @CsvSource({
    "20, 0.2532065359, 0.7554252876, 1.3468928365, 0.8826600075, 1.0036582019",
    "63.2455532, 0.1878219885, 0.4689547907, 0.8238140348, 0.9868761340, 0.9999977154",
    "200, 0.0968206505, 0.2053857618, 0.3852133793, 0.6319906925, 0.9210663859"
  })
  void ringsAsASeriesCircuitRings(
      double resistance, double at25, double at50, double at100, double at200, double at500) {
    double[] exact = {at25, at50, at100, at200, at500};
    double[] times = {25e-6, 50e-6, 100e-6, 200e-6, 500e-6};
    TestEquations equations = seriesCircuit(resistance);
    TrBdf2 integrator = new TrBdf2(equations, 1e-9);
    integrator.start(0, 1e-9);
    for (int i = 0; i < times.length; i++) {
      TestEquations.advance(integrator, times[i]);
      assertThat(equations.x[0]).isCloseTo(exact[i], within(2e-6));
    }
  }

  private static TestEquations seriesCircuit(double resistance) {
    return new TestEquations(1e-10, 0, 0) {
      @Override
      void fill(double time) {
        q[0] = 1e-6 * x[0];
        c[0] = 1e-6;
        f[0] = -x[1];
        g[1] = -1;
        q[1] = 1e-3 * x[1];
        c[3] = 1e-3;
        f[1] = resistance * x[1] + x[0] - 1;
        g[2] = 1;
        g[3] = resistance;
      }
    };
  }

  /** Halving a fixed step quarters the error: second order. */
  @Test
  void isOfSecondOrder() {
    double[] errors = new double[3];
    for (int k = 0; k < 3; k++) {
      int steps = 40 << k;
      TestEquations equations =
          new TestEquations(1e6, 1) {
            @Override
            void fill(double time) {
              plainCharges();
              f[0] = x[0] * x[0] - Math.cos(time);
              g[0] = 2 * x[0];
            }
          };
      TrBdf2 integrator = new TrBdf2(equations, 0);
      integrator.start(0, 2.0 / steps);
      for (int i = 1; i <= steps; i++) {
        integrator.step(2.0 * i / steps, 2.0 / steps);
      }
      assertThat(integrator.accepted()).isEqualTo(steps);
      errors[k] = equations.x[0] - reference();
    }
    assertThat(Math.log(errors[0] / errors[1]) / Math.log(2)).isCloseTo(2, within(0.05));
    assertThat(Math.log(errors[1] / errors[2]) / Math.log(2)).isCloseTo(2, within(0.05));
  }

  /** x' = cos t − x², x(0) = 1 at t = 2 by the eighth-order integrator of Hipparchus. */
  private static double reference() {
    return reference(1, new double[] {1}, 2, (t, y) -> new double[] {Math.cos(t) - y[0] * y[0]})[0];
  }

  private interface Slope {
    double[] of(double time, double[] state);
  }

  private static double[] reference(int size, double[] start, double end, Slope slope) {
    OrdinaryDifferentialEquation equation =
        new OrdinaryDifferentialEquation() {
          @Override
          public int getDimension() {
            return size;
          }

          @Override
          public double[] computeDerivatives(double t, double[] y) {
            return slope.of(t, y);
          }
        };
    return new DormandPrince853Integrator(1e-12, 1, 1e-13, 1e-13)
        .integrate(equation, new ODEState(0, start), end)
        .getPrimaryState();
  }

  /**
   * Robertson's reaction (in Numerical Analysis: An Introduction, 1966, 178–182): twelve decades of
   * time. At 1e11 the reference solution of the Bari test set; between, an implicit Runge–Kutta
   * solution at 1e-12.
   */
  @Test
  void followsRobertsonsReactionOverTwelveDecades() {
    TestEquations equations =
        new TestEquations(1e-13, 1, 0, 0) {
          @Override
          void fill(double time) {
            plainCharges();
            double slow = 0.04 * x[0];
            double back = 1e4 * x[1] * x[2];
            double fast = 3e7 * x[1] * x[1];
            f[0] = slow - back;
            f[1] = -slow + back + fast;
            f[2] = -fast;
            g[0] = 0.04;
            g[1] = -1e4 * x[2];
            g[2] = -1e4 * x[1];
            g[3] = -0.04;
            g[4] = 1e4 * x[2] + 6e7 * x[1];
            g[5] = 1e4 * x[1];
            g[7] = -6e7 * x[1];
          }
        };
    double[][] exact = {
      {0.4, 0.985172114, 3.38639538e-5, 0.0147940222},
      {40, 0.715827069, 9.18553476e-6, 0.284163746},
      {4e4, 0.0389833771, 1.62176832e-7, 0.961016461},
      {1e11, 0.2083340149701255e-7, 0.8333360770334713e-13, 0.9999999791665050}
    };
    TrBdf2 integrator = new TrBdf2(equations, 1e-7);
    integrator.start(0, 1e-6);
    for (double[] row : exact) {
      // What an unknown may be off follows from how far it moves; here that falls with time.
      for (double decade = 4; decade < row[0]; decade *= 10) {
        if (decade > integrator.time()) {
          TestEquations.advance(integrator, decade);
          integrator.start(decade, decade / 100);
        }
      }
      TestEquations.advance(integrator, row[0]);
      for (int i = 0; i < 3; i++) {
        assertThat(equations.x[i])
            .as("y%d at %s", i + 1, row[0])
            .isCloseTo(row[i + 1], within(1e-3 * row[i + 1]));
      }
      assertThat(equations.x[0] + equations.x[1] + equations.x[2]).isCloseTo(1, within(1e-9));
    }
  }

  private static TestEquations vanDerPol(double epsilon, double tolerance) {
    return new TestEquations(tolerance, 2, 0) {
      @Override
      void fill(double time) {
        plainCharges();
        f[0] = -x[1];
        g[1] = -1;
        f[1] = -((1 - x[0] * x[0]) * x[1] - x[0]) / epsilon;
        g[2] = (2 * x[0] * x[1] + 1) / epsilon;
        g[3] = -(1 - x[0] * x[0]) / epsilon;
      }
    };
  }

  /**
   * The stiff oscillator, ε = 1e-6, at t = 2: reference solution of Hairer and Wanner's and the
   * Bari test sets, of which copies agree to twelve digits.
   */
  @Test
  void followsTheStiffOscillator() {
    TestEquations equations = vanDerPol(1e-6, 1e-8);
    TrBdf2 integrator = equations.integrate(1e-7, 1e-7, 2);

    assertThat(equations.x[0]).isCloseTo(1.70616773217, within(1e-4));
    assertThat(equations.x[1]).isCloseTo(-0.892809701025, within(1e-4));
    assertThat(integrator.rejected()).isLessThan(integrator.accepted());
  }

  /** And the mild one, ε = 1, against the eighth-order integrator of Hipparchus. */
  @Test
  void agreesWithAnExplicitIntegratorWhereNothingIsStiff() {
    double[] expected =
        reference(
            2,
            new double[] {2, 0},
            20,
            (t, y) -> new double[] {y[1], (1 - y[0] * y[0]) * y[1] - y[0]});
    TestEquations equations = vanDerPol(1, 1e-9);
    equations.integrate(1e-8, 1e-4, 20);

    assertThat(equations.x[0]).isCloseTo(expected[0], within(1e-4));
    assertThat(equations.x[1]).isCloseTo(expected[1], within(1e-4));
  }

  /**
   * A capacitance that falls by the square root of its voltage, as a junction's does, pumped to and
   * fro by a current without a mean: after whole periods its charge is back where it was, however
   * long the steps were.
   */
  @Test
  void losesNoCharge() {
    TestEquations equations =
        new TestEquations(1e-3, 1) {
          @Override
          void fill(double time) {
            q[0] = 2 * Math.sqrt(1 + x[0]);
            c[0] = 1 / Math.sqrt(1 + x[0]);
            f[0] = -Math.cos(2 * Math.PI * time);
          }
        };
    TrBdf2 integrator = new TrBdf2(equations, 0);
    integrator.start(0, 0.05);
    for (int i = 1; i <= 20 * 100; i++) {
      integrator.step(i / 20.0, 0.05);
    }
    equations.evaluate(100);

    assertThat(integrator.accepted()).isEqualTo(2000);
    assertThat(equations.q[0]).isCloseTo(2 * Math.sqrt(2), within(1e-9));
  }

  /**
   * Charge crosses a jump of the source: the voltage of a capacitive divider jumps by its ratio.
   */
  @Test
  void keepsChargeOverAJump() {
    double[] source = {0};
    TestEquations equations =
        new TestEquations(1e-9, 0, 0, 0) {
          @Override
          void fill(double time) {
            // A source at node 0 with current x[2], 3 F from node 0 to node 1, 1 F to ground.
            q[0] = 3 * (x[0] - x[1]);
            q[1] = 3 * (x[1] - x[0]) + x[1];
            c[0] = 3;
            c[1] = -3;
            c[3] = -3;
            c[4] = 4;
            f[0] = -x[2];
            g[2] = -1;
            f[2] = x[0] - source[0];
            g[6] = 1;
          }

          @Override
          public double tolerance(int unknown) {
            return unknown == 2 ? Double.POSITIVE_INFINITY : 1e-9;
          }
        };
    TrBdf2 integrator = new TrBdf2(equations, 1e-9);
    integrator.start(0, 1e-3);
    source[0] = 8;
    integrator.jump(1e-9, 1e-3);

    assertThat(equations.x[0]).isCloseTo(8, within(1e-12));
    assertThat(equations.x[1]).isCloseTo(6, within(1e-12));
    assertThat(equations.x[2]).isCloseTo(0, within(1e-5));
    TestEquations.advance(integrator, 1);
    assertThat(equations.x[1]).isCloseTo(6, within(1e-12));
  }

  /** x' = x² from 1 leaves every bound at t = 1. */
  @Test
  void saysWhereItCannotGoOn() {
    TestEquations equations =
        new TestEquations(1e-6, 1) {
          @Override
          void fill(double time) {
            plainCharges();
            f[0] = -x[0] * x[0];
            g[0] = -2 * x[0];
          }
        };
    assertThatThrownBy(() -> equations.integrate(1e-6, 1e-3, 2))
        .isInstanceOf(ArithmeticException.class)
        .hasMessageContaining("time step at ");
  }
}
