package loopwright.command;

import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;
import loopwright.sizing.DividerProposal;

/** Dividers as text for a person. */
final class DividerText {
  private static final int SHOWN = 10;

  private DividerText() {}

  static String of(Design design, String hookup, double wanted, List<DividerProposal> dividers) {
    TextPage page = new TextPage().title(design.name() + ", hookup '" + hookup + "'");
    page.heading(
        "Dividers for a gain of " + EngineeringFormat.format(wanted, Unit.ONE) + ", best first");
    TextTable table =
        new TextTable()
            .row("divider", "gain", "low", "high", "offset", "noise", "current", "margin", "score");
    dividers.stream().limit(SHOWN).forEach(divider -> row(table, divider));
    page.table(table);
    page.heading("What the first gives up");
    page.paragraph(dividers.get(0).says());
    page.paragraph(
        "Changes: "
            + dividers.get(0).changes().stream()
                .map(change -> change.path() + " = " + change.value())
                .collect(Collectors.joining(", ")));
    return page.toString();
  }

  private static void row(TextTable table, DividerProposal divider) {
    table.row(
        divider.changes().stream()
            .map(Change::value)
            .filter(value -> !value.isBlank())
            .map(value -> EngineeringFormat.format(ohms(value), Unit.OHM))
            .collect(Collectors.joining(" / ")),
        text(divider.gain().number(), Unit.ONE),
        text(divider.gainLow().number(), Unit.ONE),
        text(divider.gainHigh().number(), Unit.ONE),
        text(divider.outputOffset().number(), Unit.VOLT),
        text(divider.inputNoise().number(), Unit.VOLT_PER_ROOT_HERTZ),
        text(OptionalDouble.of(divider.dividerCurrent()), Unit.AMPERE),
        text(divider.phaseMargin().number(), Unit.DEGREE),
        text(OptionalDouble.of(divider.score()), Unit.ONE));
  }

  private static double ohms(String value) {
    return Quantity.parse(value, Unit.OHM).value();
  }

  private static String text(OptionalDouble value, Unit unit) {
    return value.isPresent() ? EngineeringFormat.format(value.getAsDouble(), unit, 3) : "–";
  }
}
