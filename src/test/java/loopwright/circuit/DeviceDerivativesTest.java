package loopwright.circuit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import java.util.function.DoubleUnaryOperator;
import loopwright.part.DiodeParameters;
import loopwright.part.TransistorParameters;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Every derivative that a device stamps, against the difference quotient of what it derives. */
class DeviceDerivativesTest {
  private static final int POINTS = 200;

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3})
  void transistorDerivativesAreThoseOfItsCurrentsAndCharges(long seed) {
    Random random = new Random(seed);
    for (int i = 0; i < POINTS; i++) {
      TransistorEquations at =
          new TransistorEquations(parameters(random), 270 + 90 * random.nextDouble());
      double vbe = -3 + 3.8 * random.nextDouble();
      double vbc = random.nextBoolean() ? -20 * random.nextDouble() : 0.75 * random.nextDouble();

      at.evaluate(vbe, vbc);
      double[] expected = {
        at.collectorByBaseEmitter(),
        at.collectorByBaseCollector(),
        at.baseByBaseEmitter(),
        at.baseByBaseCollector(),
        at.baseEmitterChargeByBaseEmitter(),
        at.baseEmitterChargeByBaseCollector(),
        at.baseCollectorChargeByBaseCollector()
      };
      double current = Math.abs(at.collectorCurrent()) + Math.abs(at.baseCurrent());
      double charge = Math.abs(at.baseEmitterCharge()) + Math.abs(at.baseCollectorCharge());
      double[] quotients = {
        quotient(vbe, v -> evaluated(at, v, vbc).collectorCurrent()),
        quotient(vbc, v -> evaluated(at, vbe, v).collectorCurrent()),
        quotient(vbe, v -> evaluated(at, v, vbc).baseCurrent()),
        quotient(vbc, v -> evaluated(at, vbe, v).baseCurrent()),
        quotient(vbe, v -> evaluated(at, v, vbc).baseEmitterCharge()),
        quotient(vbc, v -> evaluated(at, vbe, v).baseEmitterCharge()),
        quotient(vbc, v -> evaluated(at, vbe, v).baseCollectorCharge())
      };
      for (int k = 0; k < expected.length; k++) {
        // What rounding of the function itself leaves in its difference quotient.
        double rounding = 1e-10 * (k < 4 ? current : charge);
        assertThat(quotients[k])
            .as("derivative %d at v_BE %s, v_BC %s, point %d", k, vbe, vbc, i)
            .isCloseTo(expected[k], within(1e-7 * Math.abs(expected[k]) + rounding));
      }
      at.evaluate(vbe, vbc);
      assertThat(quotient(vbe, v -> evaluated(at, v, vbc).baseCollectorCharge())).isZero();
    }
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3})
  void diodeDerivativesAreThoseOfItsCurrentAndCharge(long seed) {
    Random random = new Random(seed);
    for (int i = 0; i < POINTS; i++) {
      DiodeEquations at =
          new DiodeEquations(
              new DiodeParameters(
                  Math.pow(10, -15 + 7 * random.nextDouble()),
                  1 + random.nextDouble(),
                  0,
                  10e-12 * random.nextDouble(),
                  1e-8 * random.nextDouble()),
              270 + 90 * random.nextDouble());
      double voltage = -5 + 5.8 * random.nextDouble();
      at.evaluate(voltage);
      double conductance = at.conductance();
      double capacitance = at.chargeByVoltage();
      double current = Math.abs(at.current());
      double charge = Math.abs(at.charge());
      assertThat(quotient(voltage, v -> evaluated(at, v).current()))
          .isCloseTo(conductance, within(1e-7 * conductance + 1e-10 * current));
      assertThat(quotient(voltage, v -> evaluated(at, v).charge()))
          .isCloseTo(capacitance, within(1e-7 * capacitance + 1e-10 * charge));
    }
  }

  private static TransistorParameters parameters(Random random) {
    return new TransistorParameters(
        Math.pow(10, -16 + 3 * random.nextDouble()),
        20 + 500 * random.nextDouble(),
        1 + 5 * random.nextDouble(),
        random.nextInt(4) == 0 ? Double.POSITIVE_INFINITY : 20 + 100 * random.nextDouble(),
        random.nextInt(4) == 0 ? Double.POSITIVE_INFINITY : 0.01 + random.nextDouble(),
        random.nextInt(4) == 0 ? 0 : Math.pow(10, -14 + 2 * random.nextDouble()),
        1.5 + random.nextDouble(),
        0,
        0,
        0,
        20e-12 * random.nextDouble(),
        10e-12 * random.nextDouble(),
        1e-9 * random.nextDouble(),
        1e-7 * random.nextDouble(),
        0);
  }

  private static TransistorEquations evaluated(TransistorEquations at, double vbe, double vbc) {
    at.evaluate(vbe, vbc);
    return at;
  }

  private static DiodeEquations evaluated(DiodeEquations at, double voltage) {
    at.evaluate(voltage);
    return at;
  }

  /** Central difference of fourth order. */
  private static double quotient(double at, DoubleUnaryOperator function) {
    double h = 1e-4;
    double near = function.applyAsDouble(at + h) - function.applyAsDouble(at - h);
    double far = function.applyAsDouble(at + 2 * h) - function.applyAsDouble(at - 2 * h);
    return (8 * near - far) / (12 * h);
  }
}
