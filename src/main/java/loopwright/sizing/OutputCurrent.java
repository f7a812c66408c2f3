package loopwright.sizing;

import loopwright.design.FiguresAmplifier;
import loopwright.design.OutputStage;
import loopwright.design.StagesAmplifier;
import loopwright.part.TransistorParameters;
import loopwright.predict.DeviceState.TransistorState;
import loopwright.predict.HookupFigures;

/**
 * The output current that a divider may be measured by, by hand: what the tail can make the gain
 * stage give, what the gain stage carries, each times the current gain of the follower behind it;
 * but not more than ten times what the load takes, nor 10 mA without a load, since a divider that
 * takes more than the load does is out of proportion (common practice, no source).
 */
final class OutputCurrent {
  private static final double TIMES_LOAD = 10;
  private static final double WITHOUT_LOAD = 10e-3;

  private OutputCurrent() {}

  /**
   * That current, A, above zero.
   *
   * @param peak of the output, V
   */
  static double of(HookupFigures figures, double peak) {
    double proportion =
        figures
            .hookup()
            .load()
            .resistance()
            .map(load -> TIMES_LOAD * peak / load.effective())
            .orElse(WITHOUT_LOAD);
    double given =
        figures.design().amplifier() instanceof FiguresAmplifier stated
            ? ofFigures(figures, stated)
            : ofStages(figures);
    return given > 0 ? Math.min(given, proportion) : proportion;
  }

  private static double ofFigures(HookupFigures figures, FiguresAmplifier stated) {
    double resistance = stated.outputResistance().value();
    double high = stated.outputHigh().orElse(figures.design().rails().positive()).value();
    return resistance > 0 ? Math.abs(high) / resistance : Double.POSITIVE_INFINITY;
  }

  private static double ofStages(HookupFigures figures) {
    StagesAmplifier stages = (StagesAmplifier) figures.design().amplifier();
    double gainStage = current(figures, "gain.q1");
    if (gainStage == 0) {
      return 0;
    }
    double tail =
        (current(figures, "pair.q1") + current(figures, "pair.q2")) / 2 * beta(figures, "gain.q1");
    double drive = stages.gainStage().buffer().isPresent() ? gainStage : Math.min(gainStage, tail);
    if (!(stages.outputStage() instanceof OutputStage.PushPull pushPull)) {
      return drive;
    }
    double follower = Math.min(beta(figures, "out.upper"), beta(figures, "out.lower"));
    return pushPull.drivers().isPresent()
        ? drive * follower * Math.min(beta(figures, "driver.upper"), beta(figures, "driver.lower"))
        : drive * follower;
  }

  private static double current(HookupFigures figures, String role) {
    return figures.devices().get(role) instanceof TransistorState state
        ? Math.abs(state.collectorCurrent())
        : 0;
  }

  private static double beta(HookupFigures figures, String role) {
    TransistorParameters parameters = figures.transistor(role);
    return parameters.forwardBeta();
  }
}
