package loopwright.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** From a frequency sweep: gain in midband, the −3 dB corners, peaking, gain at the signal. */
final class SweepMeasures {
  private static final double CORNER = 20 * Math.log10(Math.sqrt(0.5));
  private static final int FEWEST = 4;
  private static final int ROUNDS = 6;

  private final MeasuredCurve curve;
  private final OptionalDouble signal;
  private final double[] frequency;
  private final List<CurveFigure> figures = new ArrayList<>();
  private final List<String> remarks = new ArrayList<>();

  SweepMeasures(MeasuredCurve curve, OptionalDouble signal) {
    this.curve = curve;
    this.signal = signal;
    this.frequency = curve.column(MeasuredCurve.FREQUENCY).orElseThrow().values();
  }

  CurveMeasures measures() {
    Optional<double[]> levels = levels(curve);
    if (levels.isEmpty() || frequency.length < FEWEST) {
      remarks.add("There is no gain, or it has fewer than " + FEWEST + " points.");
      return new CurveMeasures(figures, remarks);
    }
    double[] level = levels.get();
    double noise = noise(level);
    double middle = middle(level);
    double midband = at(level, middle);
    boolean isGain = isGain();
    if (isGain) {
      figures.add(
          CurveFigure.of(
              "closedLoopGainAtRest",
              ratio(midband),
              Unit.ONE,
              ratioStandard(midband, noise),
              "magnitude in the middle of the band, at "
                  + EngineeringFormat.format(middle, Unit.HERTZ)));
    }
    corner("bandwidth", level, noise, middle, midband, 1);
    corner("lowCorner", level, noise, middle, midband, -1);
    double peak = 0;
    for (double each : level) {
      peak = Math.max(peak, each - midband);
    }
    figures.add(
        CurveFigure.of(
            "peaking",
            peak < noise ? 0 : peak,
            Unit.DECIBEL,
            Math.sqrt(2) * noise,
            "largest rise above the middle of the band"));
    atSignal(level, noise, isGain);
    return new CurveMeasures(figures, remarks);
  }

  /** Magnitudes in dB: of the gain, of out over generator, or of out alone. */
  static Optional<double[]> levels(MeasuredCurve curve) {
    Optional<MeasuredCurve.Column> gain = curve.column(MeasuredCurve.GAIN);
    if (gain.isPresent()) {
      return Optional.of(
          gain.get().unit() == Unit.DECIBEL
              ? gain.get().values()
              : decibels(gain.get().values(), null));
    }
    Optional<double[]> out = curve.volts("out");
    double[] generator = curve.volts(MeasuredCurve.GENERATOR).orElse(null);
    return out.map(volts -> decibels(volts, generator));
  }

  private boolean isGain() {
    return curve.column(MeasuredCurve.GAIN).isPresent()
        || curve.volts(MeasuredCurve.GENERATOR).isPresent();
  }

  private static double[] decibels(double[] values, double[] over) {
    double[] levels = new double[values.length];
    for (int i = 0; i < levels.length; i++) {
      levels[i] = 20 * Math.log10(Math.abs(values[i] / (over == null ? 1 : over[i])));
    }
    return levels;
  }

  /** In the middle between the corners, by ratio; where it has none, the end of the sweep. */
  private double middle(double[] level) {
    int best = 0;
    for (int i = 1; i < level.length; i++) {
      best = level[i] > level[best] ? i : best;
    }
    double middle = frequency[best];
    for (int round = 0; round < ROUNDS; round++) {
      double reference = at(level, middle);
      double upper = fall(level, middle, reference, 1).orElse(frequency[frequency.length - 1]);
      double lower = fall(level, middle, reference, -1).orElse(frequency[0]);
      middle = Math.sqrt(Math.max(lower, frequency[0]) * upper);
    }
    return middle;
  }

  private void corner(
      String key, double[] level, double noise, double middle, double midband, int way) {
    OptionalDouble corner = fall(level, middle, midband, way);
    if (corner.isEmpty()) {
      remarks.add(
          way > 0
              ? "The sweep ends before the gain has fallen by 3 dB."
              : "No lower corner: the sweep begins within the band.");
      return;
    }
    double near = corner.getAsDouble();
    double step = Math.pow(frequency[frequency.length - 1] / frequency[0], 1.0 / frequency.length);
    double slope = (at(level, near * step) - at(level, near / step)) / (2 * Math.log(step));
    figures.add(
        CurveFigure.of(
            key,
            near,
            Unit.HERTZ,
            near * Math.sqrt(2) * noise / Math.max(1e-9, Math.abs(slope)),
            "where the gain has fallen by 3 dB from that at "
                + EngineeringFormat.format(middle, Unit.HERTZ)));
  }

  /** First fall to −3 dB from a place on, going up or down. */
  private OptionalDouble fall(double[] level, double from, double reference, int way) {
    int last = frequency.length - 1;
    for (int i = way > 0 ? 1 : last - 1; i >= 0 && i <= last; i += way) {
      int before = i - way;
      boolean beyond = way > 0 ? frequency[i] > from : frequency[i] < from;
      double target = reference + CORNER;
      if (beyond && level[i] <= target && level[before] > target) {
        double share = (level[before] - target) / (level[before] - level[i]);
        return OptionalDouble.of(
            frequency[before] * Math.pow(frequency[i] / frequency[before], share));
      }
    }
    return OptionalDouble.empty();
  }

  private void atSignal(double[] level, double noise, boolean isGain) {
    if (signal.isEmpty()
        || signal.getAsDouble() < frequency[0]
        || signal.getAsDouble() > frequency[frequency.length - 1]) {
      return;
    }
    double at = signal.getAsDouble();
    if (isGain) {
      double there = at(level, at);
      figures.add(
          CurveFigure.of(
                  "gain",
                  ratio(there),
                  Unit.ONE,
                  ratioStandard(there, noise),
                  "magnitude at the signal frequency")
              .at(at, OptionalDouble.empty()));
    }
    curve
        .column(MeasuredCurve.PHASE)
        .ifPresent(
            phase ->
                figures.add(
                    CurveFigure.of(
                            "phase",
                            wrapped(at(phase.values(), at)),
                            Unit.DEGREE,
                            noise(phase.values()),
                            "phase at the signal frequency")
                        .at(at, OptionalDouble.empty())));
  }

  static double wrapped(double degrees) {
    return degrees - 360 * Math.rint(degrees / 360);
  }

  private static double ratio(double decibels) {
    return Math.pow(10, decibels / 20);
  }

  private static double ratioStandard(double decibels, double noise) {
    return ratio(decibels) * noise * Math.log(10) / 20;
  }

  /** Between two points along the logarithm of frequency; the end's value beyond an end. */
  private double at(double[] values, double place) {
    for (int i = 1; i < frequency.length; i++) {
      if (frequency[i] >= place) {
        double share =
            Math.log(place / frequency[i - 1]) / Math.log(frequency[i] / frequency[i - 1]);
        double within = Math.max(0, share);
        return values[i - 1] + within * (values[i] - values[i - 1]);
      }
    }
    return values[values.length - 1];
  }

  /**
   * Standard deviation of a point about its neighbours: the median of the second differences, which
   * the bends of the curve do not lift, over √6 times 0.6745 (the quartile of the normal).
   */
  static double noise(double[] values) {
    double[] second = new double[values.length - 2];
    for (int i = 0; i < second.length; i++) {
      second[i] = Math.abs(values[i] - 2 * values[i + 1] + values[i + 2]);
    }
    java.util.Arrays.sort(second);
    return second[second.length / 2] / Math.sqrt(6) / 0.6745;
  }
}
