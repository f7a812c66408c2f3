package loopwright.view;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.design.Feedback;
import loopwright.design.Hookup;
import loopwright.predict.Catalogue;
import loopwright.predict.ComplexPoint;
import loopwright.predict.DeviceState;
import loopwright.predict.DeviceState.TransistorState;
import loopwright.predict.Figure;
import loopwright.predict.FigureResult;
import loopwright.predict.FigureValue;
import loopwright.predict.HookupPrediction;
import loopwright.predict.OffsetShare;
import loopwright.predict.RestState;
import loopwright.predict.Root;
import loopwright.predict.SwingLevel;
import loopwright.predict.Waveform;

/**
 * Predictions made up for the tests of views. Their shapes are plausible, their values belong to no
 * circuit: an amplifier of gain 1100 and three poles in a loop of a given noise gain, a follower
 * with a dead zone, growth that begins off the middle of the swing.
 */
public final class SamplePredictions {
  private static final double GAIN = 1100;
  private static final double[] POLES = {100e3, 30e6, 90e6};
  private static final double DEAD_ZONE = 0.54;
  private static final int WAVE_POINTS = 1024;
  private static final int LEVELS = 41;

  private SamplePredictions() {}

  /** A hookup that was solved, quiet over its whole swing. */
  public static HookupPrediction stable(Hookup hookup) {
    return solved(hookup, 11, 0);
  }

  /** A hookup that was solved, quiet at rest and growing when it swings. */
  public static HookupPrediction growing(Hookup hookup) {
    return solved(hookup, 4, 0.2);
  }

  /** A hookup that grows at rest already. */
  public static HookupPrediction growingAtRest(Hookup hookup) {
    HookupPrediction quiet = solved(hookup, 1, 1.2);
    return new HookupPrediction(
        hookup,
        quiet.rest(),
        "",
        quiet.figures(),
        quiet.response(),
        quiet.loopGain(),
        List.of(new Root(1e6, 8e7)),
        quiet.overSwing(),
        "",
        quiet.offsetContributions(),
        quiet.harmonics(),
        quiet.waveform(),
        List.of());
  }

  /** A hookup that could not be solved. */
  public static HookupPrediction failed(Hookup hookup) {
    return new HookupPrediction(
        hookup,
        Optional.empty(),
        "the gain stage saturates: gainOut stands 0.1 V below the positive rail",
        figures(hookup, 11, true),
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        "",
        List.of(),
        List.of(),
        Optional.empty(),
        List.of());
  }

  /** A hookup of which only the circuit at rest is solved. */
  public static HookupPrediction atRest(Hookup hookup, RestState rest) {
    return new HookupPrediction(
        hookup,
        Optional.of(rest),
        "",
        figures(hookup, 11, false),
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        "",
        List.of(),
        List.of(),
        Optional.empty(),
        List.of());
  }

  private static HookupPrediction solved(Hookup hookup, double noiseGain, double excess) {
    boolean isOpen = hookup.feedback() instanceof Feedback.Open;
    double amplitude = hookup.source().amplitude().value();
    return new HookupPrediction(
        hookup,
        Optional.of(rest()),
        "",
        figures(hookup, noiseGain, false),
        response(noiseGain, isOpen),
        isOpen ? List.of() : loopGain(noiseGain),
        List.of(),
        overSwing(amplitude * noiseGain, noiseGain, excess, isOpen),
        "",
        offset(),
        amplitude == 0 ? List.of() : List.of(0.0057, amplitude * noiseGain, 0.0, 0.0003),
        amplitude == 0 ? Optional.empty() : Optional.of(waveform(amplitude, noiseGain)),
        List.of());
  }

  private static RestState rest() {
    Map<String, Double> nodes = new LinkedHashMap<>();
    nodes.put("ground", 0.0);
    nodes.put("positive", 12.0);
    nodes.put("negative", -12.0);
    nodes.put("in+", -0.0011);
    nodes.put("in-", 0.0057);
    nodes.put("pairOut", 11.195);
    nodes.put("gainOut", 0.503);
    nodes.put("driveHigh", 0.503);
    nodes.put("driveLow", 0.503);
    nodes.put("out", 0.0057);
    nodes.put("load", 0.0057);
    Map<String, DeviceState> devices = new LinkedHashMap<>();
    devices.put("pair.q1", transistor(0.49e-3));
    devices.put("pair.q2", transistor(0.63e-3));
    devices.put("tail.q1", transistor(1.13e-3));
    devices.put("gain.q1", transistor(1.52e-3));
    devices.put("gainLoad.q1", transistor(1.52e-3));
    devices.put("out.upper", transistor(3.1e-9));
    devices.put("out.lower", transistor(2.2e-12));
    return new RestState(nodes, devices, 4.1e-3, 4.3e-3);
  }

  private static TransistorState transistor(double current) {
    return new TransistorState(
        current, current / 200, 0.65, 11.3, current * 11.3, OptionalDouble.of(28));
  }

  private static Map<String, FigureResult> figures(
      Hookup hookup, double noiseGain, boolean failed) {
    boolean isOpen = hookup.feedback() instanceof Feedback.Open;
    boolean hasSignal = hookup.source().amplitude().value() > 0;
    Map<String, FigureResult> figures = new LinkedHashMap<>();
    put(figures, "idealGain", noiseGain, Double.NaN);
    put(figures, "closedLoopGainAtRest", Double.NaN, noiseGain * 0.991);
    put(figures, "bandwidth", Double.NaN, isOpen ? Double.NaN : 4.4e7 / noiseGain);
    put(figures, "peaking", Double.NaN, isOpen ? Double.NaN : 1.74);
    put(figures, "loopGainDc", GAIN / noiseGain, isOpen ? Double.NaN : GAIN / noiseGain);
    double unity = unity(noiseGain);
    put(figures, "unityFrequency", Double.NaN, isOpen ? Double.NaN : unity);
    put(figures, "phaseMargin", Double.NaN, isOpen ? Double.NaN : 180 + phase(unity));
    double reversal = reversal();
    put(
        figures,
        "gainMargin",
        Double.NaN,
        isOpen ? Double.NaN : noiseGain / GAIN * attenuation(reversal));
    put(figures, "deadZone", 0.55, hasSignal ? DEAD_ZONE : Double.NaN);
    put(figures, "crossoverError", Double.NaN, hasSignal ? 5.2e-3 : Double.NaN);
    put(figures, "thd", Double.NaN, hasSignal ? 1.234e-3 : Double.NaN);
    put(figures, "outputOffset", -0.058, -0.0598);
    if (failed) {
      figures.replaceAll(
          (key, result) ->
              new FigureResult(
                  result.figure(),
                  FigureValue.none("no rest state"),
                  FigureValue.none("no rest state")));
    }
    return figures;
  }

  private static void put(
      Map<String, FigureResult> figures, String key, double formula, double solved) {
    Figure figure = Catalogue.find(key).orElseThrow();
    figures.put(key, new FigureResult(figure, FigureValue.of(formula), FigureValue.of(solved)));
  }

  private static List<ComplexPoint> loopGain(double noiseGain) {
    List<ComplexPoint> points = new ArrayList<>();
    for (double frequency : frequencies()) {
      double size = GAIN / noiseGain / attenuation(frequency);
      double angle = Math.toRadians(phase(frequency));
      points.add(new ComplexPoint(frequency, size * Math.cos(angle), size * Math.sin(angle)));
    }
    return points;
  }

  /** Ideal gain times T/(1 + T), or the amplifier alone. */
  private static List<ComplexPoint> response(double noiseGain, boolean isOpen) {
    return loopGain(noiseGain).stream()
        .map(
            t -> {
              if (isOpen) {
                return t;
              }
              double square = (1 + t.re()) * (1 + t.re()) + t.im() * t.im();
              double re = (t.re() * (1 + t.re()) + t.im() * t.im()) / square;
              return new ComplexPoint(t.frequency(), noiseGain * re, noiseGain * t.im() / square);
            })
        .toList();
  }

  private static List<Double> frequencies() {
    List<Double> frequencies = new ArrayList<>();
    for (int i = 0; i <= 160; i++) {
      frequencies.add(10 * Math.pow(10, i / 20.0));
    }
    return frequencies;
  }

  private static double attenuation(double frequency) {
    double product = 1;
    for (double pole : POLES) {
      product *= Math.hypot(1, frequency / pole);
    }
    return product;
  }

  private static double phase(double frequency) {
    double degrees = 0;
    for (double pole : POLES) {
      degrees -= Math.toDegrees(Math.atan(frequency / pole));
    }
    return degrees;
  }

  private static double unity(double noiseGain) {
    double low = 1;
    double high = 1e9;
    for (int i = 0; i < 100; i++) {
      double middle = Math.sqrt(low * high);
      if (attenuation(middle) < GAIN / noiseGain) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return low;
  }

  private static double reversal() {
    double low = 1;
    double high = 1e9;
    for (int i = 0; i < 100; i++) {
      double middle = Math.sqrt(low * high);
      if (phase(middle) > -180) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return low;
  }

  /** Growth is a bowl over the output: least in the middle, and above 0 outside where asked for. */
  private static List<SwingLevel> overSwing(
      double peak, double noiseGain, double excess, boolean isOpen) {
    List<SwingLevel> levels = new ArrayList<>();
    int count = peak == 0 ? 1 : LEVELS;
    for (int i = 0; i < count; i++) {
      double share = count == 1 ? 0 : 2.0 * i / (count - 1) - 1;
      double bowl = Math.sqrt(Math.abs(share)) * (1 + 0.05 * share);
      double growth = (excess > 0 ? 30e6 : 4e6) * bowl - 10e6 + 12e6 * Math.max(0, excess - 0.2);
      boolean grows = growth > 0;
      levels.add(
          new SwingLevel(
              peak * share / noiseGain,
              peak * share,
              !grows,
              OptionalDouble.of(8.2e6 + 6e6 * bowl),
              OptionalDouble.of(growth),
              isOpen ? OptionalDouble.empty() : OptionalDouble.of(-growth * 2.3e-6 + 12),
              noiseGain * (0.985 + 0.012 * bowl)));
    }
    return levels;
  }

  /** Shares that add up to the solved offset, the last one what no cause explains. */
  private static List<OffsetShare> offset() {
    return List.of(
        new OffsetShare("input offset of the pair × noise gain", -0.0671),
        new OffsetShare("base current of in+ in the source resistance", -0.0062),
        new OffsetShare("base current of in− in the divider", 0.0093),
        new OffsetShare("common mode", 0.0011),
        new OffsetShare("curvature of the gain", 0.0004),
        new OffsetShare("crossover at rest", 0.0027));
  }

  private static Waveform waveform(double amplitude, double noiseGain) {
    double loop = GAIN / noiseGain;
    double[] generator = new double[WAVE_POINTS];
    double[] out = new double[WAVE_POINTS];
    double[] gainOut = new double[WAVE_POINTS];
    double[] error = new double[WAVE_POINTS];
    for (int i = 0; i < WAVE_POINTS; i++) {
      double sine = Math.sin(2 * Math.PI * i / WAVE_POINTS);
      generator[i] = amplitude * sine;
      double ideal = amplitude * noiseGain * sine * loop / (1 + loop);
      double zone = DEAD_ZONE / (1 + loop);
      out[i] = Math.abs(ideal) < zone ? 0 : ideal - Math.signum(ideal) * zone;
      gainOut[i] = out[i] == 0 ? ideal * (1 + loop) : out[i] + Math.signum(ideal) * DEAD_ZONE;
      error[i] = out[i] - ideal + zone * 4 / Math.PI * sine;
    }
    return new Waveform(generator, out, gainOut, error, Map.of(), Map.of());
  }
}
