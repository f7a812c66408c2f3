package loopwright.circuit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import java.util.function.DoubleUnaryOperator;
import loopwright.part.DiodeParameters;
import loopwright.part.TransistorParameters;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Every second derivative of a device, against the difference quotient of the first. */
class DeviceVariationsTest {
  private static final int POINTS = 200;
  private static final double KELVIN = 310;

  private record Point(double vbe, double vbc, TransistorParameters parameters) {
    /** Moved along one of the directions v_BE, v_BC, ln I_S, ln β. */
    Point moved(int direction, double by) {
      return switch (direction) {
        case 0 -> new Point(vbe + by, vbc, parameters);
        case 1 -> new Point(vbe, vbc + by, parameters);
        case 2 ->
            new Point(
                vbe,
                vbc,
                parameters.withSaturationCurrent(parameters.saturationCurrent() * Math.exp(by)));
        default ->
            new Point(
                vbe,
                vbc,
                parameters
                    .withForwardBeta(parameters.forwardBeta() * Math.exp(by))
                    .withRecombinationCurrent(parameters.recombinationCurrent() * Math.exp(-by)));
      };
    }

    double[] values() {
      TransistorEquations e = new TransistorEquations(parameters, KELVIN);
      e.evaluate(vbe, vbc);
      return new double[] {
        e.collectorCurrent(),
        e.baseCurrent(),
        e.collectorByBaseEmitter(),
        e.collectorByBaseCollector(),
        e.baseByBaseEmitter(),
        e.baseByBaseCollector(),
        e.baseEmitterChargeByBaseEmitter(),
        e.baseEmitterChargeByBaseCollector(),
        e.baseCollectorChargeByBaseCollector()
      };
    }

    double[] variation(int direction) {
      TransistorVariation v = new TransistorVariation(new TransistorEquations(parameters, KELVIN));
      v.vary(
          vbe,
          vbc,
          direction == 0 ? 1 : 0,
          direction == 1 ? 1 : 0,
          direction == 2 ? 1 : 0,
          direction == 3 ? 1 : 0);
      return new double[] {
        v.collectorCurrent,
        v.baseCurrent,
        v.collectorByBaseEmitter,
        v.collectorByBaseCollector,
        v.baseByBaseEmitter,
        v.baseByBaseCollector,
        v.baseEmitterChargeByBaseEmitter,
        v.baseEmitterChargeByBaseCollector,
        v.baseCollectorChargeByBaseCollector
      };
    }
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3})
  void aTransistorChangesAsItsDifferencesShow(long seed) {
    Random random = new Random(seed);
    for (int i = 0; i < POINTS; i++) {
      double vbe = -3 + 3.75 * random.nextDouble();
      double vbc = random.nextBoolean() ? -20 * random.nextDouble() : 0.7 * random.nextDouble();
      if (Math.abs(vbe - 0.42) < 1e-3 || Math.abs(vbc - 0.42) < 1e-3) {
        continue; // The capacitance law bends there.
      }
      Point point = new Point(vbe, vbc, parameters(random));
      double[] scale = point.values();
      for (int direction = 0; direction < 4; direction++) {
        double[] exact = point.variation(direction);
        for (int k = 0; k < exact.length; k++) {
          int which = k;
          int along = direction;
          double quotient = quotient(by -> point.moved(along, by).values()[which]);
          assertThat(exact[k])
              .as("value %d along %d at v_BE %s, v_BC %s", k, direction, vbe, vbc)
              .isCloseTo(
                  quotient, within(2e-7 * Math.abs(quotient) + 1e-10 * Math.abs(scale[k]) + 1e-24));
        }
      }
    }
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3})
  void aDiodeChangesAsItsDifferencesShow(long seed) {
    Random random = new Random(seed);
    for (int i = 0; i < POINTS; i++) {
      DiodeParameters parameters =
          new DiodeParameters(
              Math.pow(10, -15 + 7 * random.nextDouble()),
              1 + random.nextDouble(),
              0,
              10e-12 * random.nextDouble(),
              1e-8 * random.nextDouble());
      double voltage = -5 + 5.4 * random.nextDouble();
      DiodeEquations diode = new DiodeEquations(parameters, KELVIN);
      check(diode.conductanceSlope(voltage), by -> diode(parameters, voltage + by, 0)[1]);
      check(diode.capacitanceSlope(voltage), by -> diode(parameters, voltage + by, 0)[2]);
      check(diode.currentByForwardVoltage(voltage), by -> diode(parameters, voltage, by)[0]);
      check(diode.conductanceByForwardVoltage(voltage), by -> diode(parameters, voltage, by)[1]);
      check(diode.capacitanceByForwardVoltage(voltage), by -> diode(parameters, voltage, by)[2]);
    }
  }

  private static void check(double exact, DoubleUnaryOperator function) {
    double quotient = quotient(function);
    assertThat(exact)
        .isCloseTo(
            quotient,
            within(2e-7 * Math.abs(quotient) + 1e-10 * Math.abs(function.applyAsDouble(0))));
  }

  /** Current, conductance and capacitance of a diode that needs so much more forward voltage. */
  private static double[] diode(DiodeParameters p, double voltage, double forward) {
    double factor =
        Math.exp(-forward / (p.ideality() * Physics.thermalVoltage(Physics.NOMINAL_TEMPERATURE)));
    DiodeEquations diode =
        new DiodeEquations(
            new DiodeParameters(
                p.saturationCurrent() * factor,
                p.ideality(),
                p.seriesResistance(),
                p.capacitance(),
                p.transitTime()),
            KELVIN);
    diode.evaluate(voltage);
    return new double[] {diode.current(), diode.conductance(), diode.chargeByVoltage()};
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

  /** Central difference of fourth order at 0. */
  private static double quotient(DoubleUnaryOperator function) {
    double h = 1e-4;
    double near = function.applyAsDouble(h) - function.applyAsDouble(-h);
    double far = function.applyAsDouble(2 * h) - function.applyAsDouble(-2 * h);
    return (8 * near - far) / (12 * h);
  }
}
