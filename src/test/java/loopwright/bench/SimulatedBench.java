package loopwright.bench;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import loopwright.assembly.Deviations;
import loopwright.assembly.DeviceFault;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.Instrument;
import loopwright.design.Reading;
import loopwright.predict.Build;
import loopwright.predict.HookupFigures;
import loopwright.predict.TolerancedPart;
import loopwright.predict.TolerancedParts;
import loopwright.quantity.Quantity;

/**
 * A bench at which builds with known faults are read: each value is solved in the full circuit of
 * that build, wrong by as much as its instrument may be, and rounded as the instrument shows it.
 */
final class SimulatedBench {
  /** What a person reads off a screen, significant digits. */
  private static final int DIGITS = 3;

  private final Design plan;
  private final List<ReadingGroup> groups;
  private final List<HookupFigures> nominal;
  private final HookupFigures unprobed;

  /** A bench that reads what a design's readings ask for; their values do not matter. */
  SimulatedBench(Design plan) {
    this.plan = plan;
    this.groups = ReadingGroup.of(plan);
    this.unprobed = HookupFigures.of(plan, groups.get(0).hookup());
    this.nominal = ReadingGroup.nominal(groups, unprobed);
  }

  /** What spreads. */
  List<TolerancedPart> parts() {
    return TolerancedParts.of(unprobed);
  }

  /** All faults that are searched for. */
  List<Candidate> faults() {
    return FaultCatalogue.of(unprobed);
  }

  /**
   * The design with what its instruments show of a build.
   *
   * @param fault what is wrong
   * @param deviations of the parts that spread
   * @param random draws the errors of the instruments; empty for instruments without error
   * @return empty where the circuit finds no rest
   */
  Optional<Design> read(Optional<Candidate> fault, double[] deviations, Optional<Random> random) {
    List<Reading> readings = new ArrayList<>(plan.bench().readings());
    for (int i = 0; i < groups.size(); i++) {
      Build build = TolerancedParts.build(groups.get(i).circuit(), parts(), deviations);
      HookupFigures figures =
          nominal.get(i).of(fault.map(each -> together(build, each)).orElse(build));
      for (int reading : groups.get(i).readings()) {
        Reading asked = readings.get(reading);
        double exact = new Expectation(asked).of(figures).number().orElse(Double.NaN);
        if (!Double.isFinite(exact)) {
          return Optional.empty();
        }
        double shown = fault.map(each -> each.shown(asked, exact)).orElse(exact);
        readings.set(reading, with(asked, rounded(asked, shown + error(asked, shown, random))));
      }
    }
    return Optional.of(DesignPath.set(plan, "bench.readings", readings));
  }

  /** A build with a fault on top of its tolerances. */
  private static Build together(Build build, Candidate fault) {
    Build broken = fault.build(build.design());
    Map<String, Double> parts = new HashMap<>(build.deviations().parts());
    broken.deviations().parts().forEach((name, ratio) -> parts.merge(name, ratio, (a, b) -> a * b));
    Map<String, DeviceFault> faults = new HashMap<>(broken.deviations().faults());
    Set<String> shorted = new HashSet<>(broken.deviations().shorted());
    return new Build(
        broken.design(), new Deviations(build.deviations().devices(), parts, faults, shorted));
  }

  private double error(Reading reading, double shown, Optional<Random> random) {
    if (random.isEmpty()) {
      return 0;
    }
    double sum = 0;
    for (Contribution each :
        MeasuredValue.of(plan, with(reading, shown)).uncertainty().contributions()) {
      double unit =
          each.rectangular()
              ? Math.sqrt(3) * (2 * random.get().nextDouble() - 1)
              : random.get().nextGaussian();
      sum += each.standard() * unit;
    }
    return sum;
  }

  private double rounded(Reading reading, double value) {
    Optional<Quantity> step =
        reading.instrument().map(plan.bench().instruments()::get).flatMap(Instrument::resolution);
    if (step.isEmpty()) {
      return new BigDecimal(value).round(new MathContext(DIGITS)).doubleValue();
    }
    BigDecimal unit = BigDecimal.valueOf(step.get().value());
    return new BigDecimal(value)
        .divide(unit, 0, RoundingMode.HALF_EVEN)
        .multiply(unit)
        .doubleValue();
  }

  private static Reading with(Reading reading, double value) {
    return new Reading(
        reading.hookup(),
        reading.quantity(),
        Quantity.of(value),
        reading.node(),
        reading.device(),
        reading.part(),
        reading.rail(),
        reading.frequency(),
        reading.amplitude(),
        reading.instrument(),
        reading.uncertainty(),
        reading.expression(),
        reading.note(),
        reading.when());
  }
}
