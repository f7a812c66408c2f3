package loopwright.session;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
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

  /** Assesses a design in some hookups; the formula gives what the solution gives. */
  public static Assessment assess(Design design, List<String> hookups) {
    return assess(design, hookups, solved -> solved);
  }

  /**
   * Assesses a design in some hookups.
   *
   * @param formula what the formula gives where the solution gives this
   */
  public static Assessment assess(
      Design design, List<String> hookups, DoubleUnaryOperator formula) {
    return new Assessment(
        new Prediction(
            design, hookups.stream().map(name -> predict(design, name, formula)).toList()),
        List.of());
  }

  private static HookupPrediction predict(
      Design design, String hookup, DoubleUnaryOperator formula) {
    CurrentSource.Resistor load =
        (CurrentSource.Resistor) ((StagesAmplifier) design.amplifier()).gainStage().load();
    double solved = load.resistance().effective() / 1000;
    FigureResult gain =
        new FigureResult(
            LOAD, FigureValue.of(formula.applyAsDouble(solved)), FigureValue.of(solved));
    Map<String, FigureResult> figures = new LinkedHashMap<>();
    figures.put(LOAD.key(), gain);
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
