package loopwright.characterise;

import java.util.function.DoubleUnaryOperator;
import loopwright.circuit.TransistorEquations;
import loopwright.numeric.RootSearch;
import loopwright.part.TransistorParameters;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/**
 * Brings one transistor to a stated bias: from currents and collector-emitter voltage to the
 * voltages across the internal junctions. After a call the equations stand evaluated at that bias.
 *
 * <p>Every figure of a datasheet is stated at given currents, so the drops across the ohmic
 * resistances are known beforehand and the search runs on the junctions alone.
 */
final class TransistorBias {
  /** Beyond this no junction of any semiconductor conducts forward, V. */
  private static final double HIGHEST_JUNCTION = 5;

  private static final double STRIDE = 0.05;
  private static final double TOLERANCE = 1e-15;
  private static final int ROUNDS = 500;
  private static final int NEWTON_STEPS = 12;

  private final TransistorParameters parameters;
  private final TransistorEquations equations;
  private double baseEmitter;
  private double baseCollector;

  TransistorBias(TransistorParameters parameters, double kelvin) {
    this.parameters = parameters;
    this.equations = new TransistorEquations(parameters, kelvin);
  }

  /** The equations, evaluated at the bias that was asked for last. */
  TransistorEquations equations() {
    return equations;
  }

  /** Base-emitter voltage between the terminals at the bias that was asked for last, V. */
  double terminalBaseEmitter() {
    double base = equations.baseCurrent();
    return baseEmitter
        + base * parameters.baseResistance()
        + (equations.collectorCurrent() + base) * parameters.emitterResistance();
  }

  /** Biases the transistor at a collector current in A and a collector-emitter voltage in V. */
  void active(double collectorCurrent, double collectorEmitterVoltage) {
    double base = 0;
    for (int round = 0; round < ROUNDS; round++) {
      double drops =
          collectorCurrent * parameters.collectorResistance()
              + (collectorCurrent + base) * parameters.emitterResistance();
      double across = collectorEmitterVoltage - drops;
      if (!(across > 0)) {
        throw unreachable(
            collectorCurrent, collectorEmitterVoltage, "the resistances leave no voltage");
      }
      double found = rise(collectorCurrent, across);
      if (Double.isNaN(found)) {
        throw unreachable(
            collectorCurrent, collectorEmitterVoltage, "no base-emitter voltage gives it");
      }
      place(found, found - across);
      double next = equations.baseCurrent();
      if (Math.abs(next - base) * parameters.emitterResistance() <= TOLERANCE) {
        return;
      }
      base = next;
    }
    throw unreachable(
        collectorCurrent, collectorEmitterVoltage, "its base current does not settle");
  }

  /** Biases the transistor where collector and base carry these currents, in A. */
  void saturated(double collectorCurrent, double baseCurrent) {
    double low = rise(collectorCurrent, Double.NaN);
    if (Double.isNaN(low) || excess(low, collectorCurrent, baseCurrent) >= 0) {
      throw new FitException(
          "A current gain of "
              + EngineeringFormat.format(collectorCurrent / baseCurrent, Unit.ONE)
              + " does not saturate this transistor at "
              + EngineeringFormat.format(collectorCurrent, Unit.AMPERE)
              + ", where its own is no higher; a base-emitter voltage out of saturation is needed.");
    }
    double high = low;
    do {
      high += STRIDE;
    } while (excess(high, collectorCurrent, baseCurrent) < 0 && high < HIGHEST_JUNCTION);
    if (!(excess(high, collectorCurrent, baseCurrent) >= 0)) {
      throw unreachable(collectorCurrent, 0, "no base-emitter voltage gives the base current");
    }
    double found =
        RootSearch.find(
            voltage -> excess(voltage, collectorCurrent, baseCurrent), low, high, TOLERANCE);
    place(found, collectorHeld(found, collectorCurrent));
  }

  /** Evaluates the equations at given junction voltages, V. */
  void place(double baseEmitterVoltage, double baseCollectorVoltage) {
    baseEmitter = baseEmitterVoltage;
    baseCollector = baseCollectorVoltage;
    equations.evaluate(baseEmitterVoltage, baseCollectorVoltage);
  }

  /**
   * v_BE that gives the collector current at a fixed collector-emitter voltage across the
   * junctions, or at v_BC = 0 where that voltage is NaN; NaN where there is none.
   */
  private double rise(double collectorCurrent, double across) {
    double near = followed(collectorCurrent, across);
    return Double.isNaN(near) ? searched(collectorCurrent, across) : near;
  }

  /**
   * By Newton steps on ln I_C, which is nearly straight, from where the ideal transistor would be;
   * NaN where they do not settle.
   */
  private double followed(double collectorCurrent, double across) {
    double voltage =
        equations.thermalVoltage() * Math.log1p(collectorCurrent / equations.saturationCurrent());
    for (int step = 0; step < NEWTON_STEPS; step++) {
      double current = collector(voltage, across);
      double slope =
          equations.collectorByBaseEmitter()
              + (Double.isNaN(across) ? 0 : equations.collectorByBaseCollector());
      double change = Math.log(collectorCurrent / current) * current / slope;
      if (!(slope > 0) || !(Math.abs(change) < STRIDE)) {
        return Double.NaN;
      }
      voltage += change;
      if (Math.abs(change) <= 2 * Math.ulp(voltage)) {
        return voltage;
      }
    }
    return Double.NaN;
  }

  private double searched(double collectorCurrent, double across) {
    double high = 0;
    double low;
    do {
      low = high;
      high += STRIDE;
      if (high > HIGHEST_JUNCTION) {
        return Double.NaN;
      }
    } while (!(collector(high, across) >= collectorCurrent));
    if (collector(low, across) > collectorCurrent) {
      return Double.NaN;
    }
    return RootSearch.find(
        voltage -> collector(voltage, across) - collectorCurrent, low, high, TOLERANCE);
  }

  private double collector(double voltage, double across) {
    equations.evaluate(voltage, Double.isNaN(across) ? 0 : voltage - across);
    return equations.collectorCurrent();
  }

  /** Base current above the wanted one, with the collector current held through v_BC. */
  private double excess(double voltage, double collectorCurrent, double baseCurrent) {
    equations.evaluate(voltage, collectorHeld(voltage, collectorCurrent));
    return equations.baseCurrent() - baseCurrent;
  }

  /** v_BC that holds the collector current; zero where rounding leaves nothing to hold down. */
  private double collectorHeld(double voltage, double collectorCurrent) {
    DoubleUnaryOperator above =
        candidate -> {
          equations.evaluate(voltage, candidate);
          return equations.collectorCurrent() - collectorCurrent;
        };
    return above.applyAsDouble(0) <= 0 ? 0 : RootSearch.find(above, 0, voltage, TOLERANCE);
  }

  private static FitException unreachable(double current, double voltage, String why) {
    return new FitException(
        "A collector current of "
            + EngineeringFormat.format(current, Unit.AMPERE)
            + " at "
            + EngineeringFormat.format(voltage, Unit.VOLT)
            + " between collector and emitter is out of this transistor's reach: "
            + why
            + ".");
  }
}
