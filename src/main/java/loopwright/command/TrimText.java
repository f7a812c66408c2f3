package loopwright.command;

import java.util.List;
import loopwright.design.Design;
import loopwright.predict.FigureValue;
import loopwright.propose.Trim;
import loopwright.propose.TrimAdvice;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** Trim advice as text for a person. */
final class TrimText {
  private static final int SHOWN = 8;

  private TrimText() {}

  static String of(Design design, String hookup, TrimAdvice advice) {
    TextPage page = new TextPage().title(design.name() + ", hookup '" + hookup + "'");
    page.heading("Output offset: " + value(advice.offset(), Unit.VOLT));
    trims(page, advice.offsetTrims());
    page.paragraph(
        advice
            .best()
            .map(best -> "Best single change: " + best.says())
            .orElse("No single change of a resistor leaves less offset without moving the gain."));
    page.heading("Gain: " + value(advice.gain(), Unit.ONE));
    trims(page, advice.gainTrims());
    return page.toString();
  }

  private static void trims(TextPage page, List<Trim> trims) {
    if (trims.isEmpty()) {
      page.paragraph("No resistor moves it.");
    }
    trims.stream().limit(SHOWN).forEach(trim -> page.paragraph(trim.says()));
  }

  private static String value(FigureValue value, Unit unit) {
    return value.number().isPresent()
        ? EngineeringFormat.format(value.number().getAsDouble(), unit)
        : value.says();
  }
}
