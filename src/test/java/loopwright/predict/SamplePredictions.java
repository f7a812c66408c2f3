package loopwright.predict;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.predict.DeviceState.DiodeState;
import loopwright.predict.DeviceState.TransistorState;

/** Made-up predictions that have every kind of entry, for tests of what prints and writes them. */
public final class SamplePredictions {
  private SamplePredictions() {}

  /** One solved entry for each hookup of the design. */
  public static Prediction solved(Design design) {
    return new Prediction(
        design, design.hookups().stream().map(SamplePredictions::solved).toList());
  }

  /** One entry without an operating point for each hookup of the design. */
  public static Prediction failed(Design design) {
    return new Prediction(
        design, design.hookups().stream().map(SamplePredictions::failed).toList());
  }

  /** A hookup that oscillates over part of its swing. */
  public static HookupPrediction solved(Hookup hookup) {
    return new HookupPrediction(
        hookup,
        Optional.of(rest()),
        "",
        figures(),
        List.of(new ComplexPoint(1000, 9.8, -0.1)),
        List.of(new ComplexPoint(1000, 50, -3)),
        List.of(),
        List.of(
            level(-1, true, -2e6, 45),
            level(0, true, -9e6, 60),
            level(0.5, false, 1e6, -4),
            level(1, false, 4e6, -20)),
        "",
        List.of(new OffsetShare("input offset", -0.0067), new OffsetShare("base current", 0.0007)),
        List.of(0.001, 2.0, 0.0, 3e-4),
        Optional.empty(),
        List.of());
  }

  private static HookupPrediction failed(Hookup hookup) {
    String why = "no operating point: gainOut stands at 31 V";
    Map<String, FigureResult> figures = new LinkedHashMap<>();
    figures()
        .forEach(
            (key, result) ->
                figures.put(
                    key,
                    new FigureResult(
                        result.figure(), FigureValue.none(why), FigureValue.none(why))));
    return new HookupPrediction(
        hookup,
        Optional.empty(),
        why,
        figures,
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

  private static RestState rest() {
    Map<String, Double> nodes = new LinkedHashMap<>();
    nodes.put("in+", -0.001);
    nodes.put("out", 0.0057);
    nodes.put("gainOut", 1.0 / 3);
    Map<String, DeviceState> devices = new LinkedHashMap<>();
    devices.put(
        "pair.q1", new TransistorState(0.5e-3, 2e-6, 0.62, 11.2, 5.6e-3, OptionalDouble.of(26.1)));
    devices.put("bias.d1", new DiodeState(1.5e-3, 0.65, 0.98e-3, OptionalDouble.empty()));
    return new RestState(nodes, devices, 5.3e-3, 5.2e-3);
  }

  private static Map<String, FigureResult> figures() {
    Map<String, FigureResult> figures = new LinkedHashMap<>();
    put(figures, "openLoopGain", FigureValue.of(1104), FigureValue.of(1064.25));
    put(
        figures,
        "outputOffset",
        FigureValue.of(0.0075, "with A and the input offset as solved"),
        FigureValue.of(0.0057));
    put(figures, "worstPhaseMargin", FigureValue.none("no hand formula"), FigureValue.of(-20));
    put(
        figures,
        "bandwidth",
        FigureValue.none("no unity frequency"),
        FigureValue.none("something grows"));
    put(figures, "noiseGain", FigureValue.of(10), FigureValue.none("has no solved value"));
    return figures;
  }

  private static void put(
      Map<String, FigureResult> figures, String key, FigureValue formula, FigureValue solved) {
    figures.put(key, new FigureResult(Catalogue.find(key).orElseThrow(), formula, solved));
  }

  private static SwingLevel level(double output, boolean stable, double growth, double margin) {
    return new SwingLevel(
        output / 10,
        output,
        stable,
        OptionalDouble.of(13e6),
        OptionalDouble.of(growth),
        OptionalDouble.of(margin),
        9.8);
  }
}
