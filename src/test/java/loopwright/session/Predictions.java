package loopwright.session;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.design.CurrentSource;
import loopwright.design.Design;
import loopwright.design.StagesAmplifier;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.FigureResult;
import loopwright.predict.FigureValue;
import loopwright.predict.HookupPrediction;
import loopwright.predict.Prediction;

/** Predictions that cost nothing: one figure that follows the gain stage's load. */
public final class Predictions {
  /** The one figure. */
  public static final Figure LOAD = Catalogue.find("closedLoopGain").orElseThrow();

  private Predictions() {}

  /** Assesses a design in some hookups. */
  public static Assessment assess(Design design, List<String> hookups) {
    return new Assessment(
        new Prediction(design, hookups.stream().map(name -> predict(design, name)).toList()),
        List.of());
  }

  private static HookupPrediction predict(Design design, String hookup) {
    CurrentSource.Resistor load =
        (CurrentSource.Resistor) ((StagesAmplifier) design.amplifier()).gainStage().load();
    FigureValue value = FigureValue.of(load.resistance().effective() / 1000);
    Map<String, FigureResult> figures = new LinkedHashMap<>();
    figures.put(LOAD.key(), new FigureResult(LOAD, value, value));
    return new HookupPrediction(
        design.hookup(hookup).orElseThrow(),
        Optional.empty(),
        "",
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
}
