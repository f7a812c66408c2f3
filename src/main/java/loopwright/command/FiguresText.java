package loopwright.command;

import java.util.Collection;
import loopwright.predict.FigureResult;
import loopwright.predict.FigureValue;
import loopwright.predict.HookupPrediction;
import loopwright.quantity.EngineeringFormat;

/** The figures of a hookup: by hand formula and solved, side by side, with notes. */
final class FiguresText {
  private FiguresText() {}

  static void print(HookupPrediction hookup, TextPage page) {
    print(hookup.figures().values(), page);
  }

  /** Some figures only. */
  static void print(Collection<FigureResult> figures, TextPage page) {
    TextTable table = new TextTable().row("Figure", "formula", "", "solved", "");
    FootNotes notes = new FootNotes();
    for (FigureResult result : figures) {
      boolean alike = result.formula().equals(result.solved());
      table.row(
          result.figure().label(),
          formula(result),
          hasFormula(result) && !alike ? notes.mark(result.formula().says()) : "",
          shown(result, result.solved()),
          notes.mark(result.solved().says()));
    }
    page.heading("Figures").table(table);
    notes.print(page);
  }

  /** Nothing where the trade has no hand formula: that needs no reason. */
  private static String formula(FigureResult result) {
    return hasFormula(result) ? shown(result, result.formula()) : "";
  }

  private static boolean hasFormula(FigureResult result) {
    return result.formula().number().isPresent() || !result.figure().handFormula().isBlank();
  }

  private static String shown(FigureResult result, FigureValue value) {
    if (value.number().isEmpty()) {
      return "–";
    }
    return EngineeringFormat.format(value.number().getAsDouble(), result.figure().unit());
  }
}
