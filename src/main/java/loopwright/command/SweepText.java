package loopwright.command;

import java.util.List;
import java.util.OptionalDouble;
import loopwright.design.Design;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import loopwright.sizing.StabilitySweep;

/** Stability against one value after the other as text for a person. */
final class SweepText {
  private SweepText() {}

  static String of(Design design, String hookup, List<StabilitySweep> sweeps) {
    TextPage page = new TextPage().title(design.name() + ", hookup '" + hookup + "', stability");
    sweeps.forEach(sweep -> page.paragraph(sweep.says() + "."));
    for (StabilitySweep sweep : sweeps) {
      page.heading(sweep.what() + ", worst of the whole swing");
      TextTable table = new TextTable().row("value", "", "margin", "growth", "at");
      for (StabilitySweep.Point point : sweep.points()) {
        table.row(
            EngineeringFormat.format(point.value(), sweep.unit(), 3)
                + (point.present() ? " (present)" : ""),
            point.stable() ? "stable" : "grows",
            text(point.phaseMargin(), Unit.DEGREE),
            text(point.growth(), Unit.PER_SECOND),
            text(point.frequency(), Unit.HERTZ));
      }
      page.table(table);
    }
    return page.toString();
  }

  private static String text(OptionalDouble value, Unit unit) {
    return value.isPresent() ? EngineeringFormat.format(value.getAsDouble(), unit, 3) : "–";
  }
}
