package loopwright.bench;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.numeric.LinearFit;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/**
 * From a waveform: gain, phase, offset, distortion, what is left of the crossover, clip levels, or
 * for a step rise time and slew rate; and whether something oscillates.
 */
final class WaveformMeasures {
  private static final String OUT = "out";
  private static final int MOST_HARMONICS = 50;
  private static final int FEW_HARMONICS = 5;
  private static final int FEWEST_SAMPLES = 16;

  /** More than so many between 10 % and 90 % are no step. */
  private static final double STEP_BETWEEN = 0.15;

  /** Share of the samples of a sine in the outer 2 % of its range: acos(0.96)/π is 0.09. */
  private static final double FLAT_BAND = 0.02;

  private static final double FLAT_SHARE = 0.14;

  /** Departure of the frequency from that of the generator that no generator's dial explains. */
  private static final double OTHER_FREQUENCY = 0.1;

  private final MeasuredCurve curve;
  private final OptionalDouble signal;
  private final double[] times;
  private final List<CurveFigure> figures = new ArrayList<>();
  private final List<String> remarks = new ArrayList<>();

  WaveformMeasures(MeasuredCurve curve, OptionalDouble signal) {
    this.curve = curve;
    this.signal = signal;
    this.times = curve.column(MeasuredCurve.TIME).orElseThrow().values();
  }

  CurveMeasures measures() {
    Optional<double[]> measured =
        curve
            .volts(OUT)
            .or(
                () ->
                    curve.nodes().stream()
                        .filter(node -> !node.equals(MeasuredCurve.GENERATOR))
                        .findFirst()
                        .flatMap(curve::volts));
    if (measured.isEmpty() || times.length < FEWEST_SAMPLES) {
      remarks.add(
          "There is no voltage beside the time, or fewer than " + FEWEST_SAMPLES + " samples.");
      return new CurveMeasures(figures, remarks);
    }
    double[] out = measured.get();
    Optional<double[]> generator = curve.volts(MeasuredCurve.GENERATOR);
    StepShape shape = StepShape.of(times, out);
    if (shape.isStep(STEP_BETWEEN)) {
      step(shape);
      return new CurveMeasures(figures, remarks);
    }
    try {
      sine(out, generator);
    } catch (ArithmeticException e) {
      remarks.add("No sine could be laid through the samples: " + e.getMessage() + ".");
    }
    return new CurveMeasures(figures, remarks);
  }

  private void sine(double[] out, Optional<double[]> generator) {
    Optional<SineFit> driven = generator.map(volts -> SineFit.ofFour(times, volts));
    SineFit found =
        driven.isPresent()
            ? SineFit.ofThree(times, out, driven.get().frequency())
            : SineFit.ofFour(times, out);
    double frequency = found.frequency();
    String place =
        " of the sine laid through "
            + times.length
            + " samples at "
            + EngineeringFormat.format(frequency, Unit.HERTZ);
    driven.ifPresent(input -> ratio(input, found, place));
    boolean isOther =
        driven.isEmpty()
            && signal.isPresent()
            && Math.abs(frequency / signal.getAsDouble() - 1) > OTHER_FREQUENCY;
    if (isOther) {
      figures.add(
          CurveFigure.of(
              "oscillationFrequency",
              frequency,
              Unit.HERTZ,
              found.frequencyStandard(),
              "frequency"
                  + place
                  + "; the generator is set to "
                  + EngineeringFormat.format(signal.getAsDouble(), Unit.HERTZ)));
    } else if (driven.isEmpty()) {
      figures.add(
          CurveFigure.of(
              "signalFrequency",
              frequency,
              Unit.HERTZ,
              found.frequencyStandard(),
              "frequency" + place));
    }
    OptionalDouble amplitude =
        driven.map(input -> OptionalDouble.of(input.amplitude())).orElse(OptionalDouble.empty());
    figures.add(
        CurveFigure.of(
            "signalAmplitude",
            found.amplitude(),
            Unit.VOLT,
            found.amplitudeStandard(),
            "peak" + place));
    if (isOther) {
      return;
    }
    figures.add(
        CurveFigure.of(
                "outputMean", found.offset(), Unit.VOLT, found.offsetStandard(), "mean" + place)
            .at(frequency, amplitude));
    double fine = driven.isPresent() ? frequency : refined(out, frequency);
    double[] rest = harmonics(out, fine, amplitude);
    crossover(out, found, fine, amplitude);
    clipping(out);
    riding(rest, frequency, found.amplitude());
  }

  private void ratio(SineFit input, SineFit output, String place) {
    double gain = output.amplitude() / input.amplitude();
    double relative =
        Math.hypot(
            output.amplitudeStandard() / output.amplitude(),
            input.amplitudeStandard() / input.amplitude());
    OptionalDouble amplitude = OptionalDouble.of(input.amplitude());
    figures.add(
        CurveFigure.of("gain", gain, Unit.ONE, gain * relative, "ratio of the amplitudes" + place)
            .at(input.frequency(), amplitude));
    double degrees = SweepMeasures.wrapped(Math.toDegrees(output.phase() - input.phase()));
    figures.add(
        CurveFigure.of(
                "phase",
                degrees,
                Unit.DEGREE,
                Math.toDegrees(Math.hypot(output.phaseStandard(), input.phaseStandard())),
                "difference of the phases" + place)
            .at(input.frequency(), amplitude));
  }

  /** Distortion by a fit of the harmonics; returns what they leave. */
  private double[] harmonics(double[] out, double frequency, OptionalDouble amplitude) {
    double perPeriod = (times.length - 1) / ((times[times.length - 1] - times[0]) * frequency);
    int count =
        (int)
            Math.min(
                MOST_HARMONICS, Math.min(Math.ceil(perPeriod / 2) - 1, (times.length - 8) / 8.0));
    if (count < 2) {
      remarks.add("No distortion: too few samples in a period.");
      return new double[0];
    }
    LinearFit fit = series(out, frequency, count);
    double fundamental = Math.hypot(fit.weights()[1], fit.weights()[2]);
    double power = 0;
    double noise = 0;
    double variance = 0;
    for (int j = 3; j < fit.weights().length; j++) {
      power += fit.weights()[j] * fit.weights()[j];
      noise += fit.covariance()[j][j];
      variance += Math.pow(fit.covariance()[j][j], 2);
      variance += 2 * fit.weights()[j] * fit.weights()[j] * fit.covariance()[j][j];
    }
    // The noise in the harmonics adds its power to theirs; its mean is taken off again.
    double own = Math.max(0, power - noise);
    double thd = Math.sqrt(own) / fundamental;
    double ofSquare = Math.sqrt(2 * variance) / (fundamental * fundamental);
    double standard = thd * thd > ofSquare ? ofSquare / (2 * thd) : Math.sqrt(ofSquare);
    figures.add(
        CurveFigure.of(
                "thd",
                thd,
                Unit.ONE,
                standard,
                "harmonics 2 to "
                    + count
                    + " over the fundamental, laid through the samples together; the noise in them"
                    + " is taken off")
            .at(frequency, amplitude));
    return fit.residuals();
  }

  private LinearFit series(double[] out, double frequency, int count) {
    double[][] functions = new double[times.length][2 * count + 1];
    for (int i = 0; i < times.length; i++) {
      functions[i][0] = 1;
      for (int h = 1; h <= count; h++) {
        double angle = 2 * Math.PI * frequency * h * (times[i] - times[0]);
        functions[i][2 * h - 1] = Math.cos(angle);
        functions[i][2 * h] = Math.sin(angle);
      }
    }
    return LinearFit.of(functions, out);
  }

  /** The frequency at which a few harmonics together leave least: distortion pulls a sine alone. */
  private double refined(double[] out, double first) {
    double best = first;
    double step = 0.02 / (times[times.length - 1] - times[0]);
    for (int round = 0; round < 4; round++) {
      double below = Math.pow(series(out, best - step, FEW_HARMONICS).deviation(), 2);
      double at = Math.pow(series(out, best, FEW_HARMONICS).deviation(), 2);
      double above = Math.pow(series(out, best + step, FEW_HARMONICS).deviation(), 2);
      double bend = below - 2 * at + above;
      if (!(bend > 0)) {
        return best;
      }
      best += Math.max(-1, Math.min(1, (below - above) / (2 * bend))) * step;
      step /= 4;
    }
    return best;
  }

  private void crossover(double[] out, SineFit sine, double frequency, OptionalDouble amplitude) {
    double[] residual = new double[out.length];
    for (int i = 0; i < out.length; i++) {
      residual[i] = out[i] - sine.at(times[i]);
    }
    Folded folded = Folded.of(times, residual, frequency);
    figures.add(
        CurveFigure.of(
                "crossoverError",
                folded.halfRange(),
                Unit.VOLT,
                folded.halfRangeStandard(),
                "half the range of out less its mean and fundamental, folded onto one period in "
                    + folded.means().length
                    + " parts")
            .at(frequency, amplitude));
    Optional<double[]> before = curve.volts("gainOut");
    if (before.isPresent() && curve.volts(OUT).isPresent()) {
      double[] difference = new double[out.length];
      for (int i = 0; i < out.length; i++) {
        difference[i] = before.get()[i] - out[i];
      }
      Folded zone = Folded.of(times, difference, frequency);
      figures.add(
          CurveFigure.of(
                  "deadZone",
                  zone.halfRange(),
                  Unit.VOLT,
                  zone.halfRangeStandard(),
                  "half the range of gainOut less out, folded onto one period in "
                      + zone.means().length
                      + " parts")
              .at(frequency, amplitude));
    }
  }

  private void clipping(double[] out) {
    double high = Arrays.stream(out).max().orElse(0);
    double low = Arrays.stream(out).min().orElse(0);
    double band = FLAT_BAND * (high - low);
    clip("clipHigh", Arrays.stream(out).filter(value -> value >= high - band).toArray());
    clip("clipLow", Arrays.stream(out).filter(value -> value <= low + band).toArray());
  }

  private void clip(String key, double[] flat) {
    double share = flat.length / (double) times.length;
    if (share < FLAT_SHARE) {
      return;
    }
    double mean = Arrays.stream(flat).average().orElse(0);
    double square = Arrays.stream(flat).map(value -> (value - mean) * (value - mean)).sum();
    figures.add(
        CurveFigure.of(
            key,
            mean,
            Unit.VOLT,
            Math.sqrt(square / (flat.length - 1)),
            "level that "
                + EngineeringFormat.percent(Math.rint(100 * share) / 100)
                + " of the samples rest at; of a sine 9 % would lie so near its end"));
  }

  /** Something faster than the signal in what the harmonics leave. */
  private void riding(double[] rest, double frequency, double amplitude) {
    if (rest.length == 0) {
      return;
    }
    try {
      SineFit fit = SineFit.ofFour(times, rest);
      boolean isSine = fit.amplitude() / Math.sqrt(2) > fit.deviation();
      if (isSine && fit.frequency() > 3 * frequency && fit.amplitude() > 1e-3 * amplitude) {
        figures.add(
            CurveFigure.of(
                "oscillationFrequency",
                fit.frequency(),
                Unit.HERTZ,
                fit.frequencyStandard(),
                "a sine of "
                    + EngineeringFormat.format(fit.amplitude(), Unit.VOLT, 2)
                    + " peak rides on the signal and is none of its harmonics"));
      }
    } catch (ArithmeticException e) {
      // What is left is noise: no sine goes through it, and none is claimed.
      return;
    }
  }

  private void step(StepShape shape) {
    double travel = 0.8 * (shape.high() - shape.low());
    edges("riseTime", "slewRising", shape.rising(), travel, shape.standard());
    edges("fallTime", "slewFalling", shape.falling(), travel, shape.standard());
  }

  private void edges(
      String key, String slew, List<Double> edges, double travel, double standardOfOne) {
    if (edges.isEmpty()) {
      return;
    }
    double mean = edges.stream().mapToDouble(Double::doubleValue).average().orElse(0);
    double standard = standardOfOne / Math.sqrt(edges.size());
    String says =
        "10 % to 90 % between the two levels that it rests at, mean of "
            + (edges.size() == 1 ? "one edge" : edges.size() + " edges");
    figures.add(CurveFigure.of(key, mean, Unit.SECOND, standard, says));
    figures.add(
        CurveFigure.of(
            slew,
            travel / mean,
            Unit.VOLT_PER_SECOND,
            travel / mean * standard / mean,
            "0.8 of the step over that time: " + says));
  }
}
