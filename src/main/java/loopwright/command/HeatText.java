package loopwright.command;

import java.util.OptionalDouble;
import loopwright.design.Design;
import loopwright.predict.AmbientHeat;
import loopwright.predict.HeatReport;
import loopwright.predict.RunawayEstimate;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** Heat as text for a person. */
final class HeatText {
  private static final int SHOWN = 8;

  private HeatText() {}

  static String of(Design design, HeatReport report) {
    TextPage page =
        new TextPage().title(design.name() + ", hookup '" + report.hookup() + "', heat");
    page.heading("At rest, against ambient temperature");
    page.paragraph(
        "Each junction is at the temperature that its dissipation gives it. The loop is how much more"
            + " heat a first bit of heat brings: from 1 on it runs away.");
    page.table(ambients(report));
    for (AmbientHeat ambient : report.ambients()) {
      if (!ambient.reason().isEmpty()) {
        page.paragraph(
            "At " + text(ambient.ambient(), Unit.CELSIUS) + ": " + ambient.reason() + ".");
      }
    }
    if (!report.estimates().isEmpty()) {
      page.heading("Runaway by hand, at the hottest ambient");
      page.table(estimates(report));
    }
    page.paragraph("Emitter resistors: " + report.resistanceSays() + ".");
    page.heading("Over the swing");
    if (report.devices().isEmpty()) {
      page.paragraph("Not solved: " + report.swingReason() + ".");
    } else {
      page.table(devices(report));
    }
    page.heading("Output short-circuited");
    page.paragraph(report.shortCircuit() + ".");
    page.heading("Cautions");
    HeatReport.CAUTIONS.forEach(page::paragraph);
    return page.toString();
  }

  private static TextTable ambients(HeatReport report) {
    TextTable table =
        new TextTable()
            .row(
                "ambient",
                "idle current of " + report.idleDevice(),
                "with junctions at ambient",
                "hottest junction",
                "",
                "loop");
    for (AmbientHeat ambient : report.ambients()) {
      table.row(
          text(ambient.ambient(), Unit.CELSIUS),
          text(ambient.idle(), Unit.AMPERE),
          text(ambient.idleUnheated(), Unit.AMPERE),
          text(ambient.celsius(), Unit.CELSIUS),
          ambient.hottest(),
          text(ambient.loop(), Unit.ONE));
    }
    return table;
  }

  private static TextTable estimates(HeatReport report) {
    TextTable table =
        new TextTable().row("device", "loop by hand", "solved, alone", "least emitter resistance");
    for (RunawayEstimate estimate : report.estimates()) {
      table.row(
          estimate.role(),
          text(estimate.formula(), Unit.ONE),
          text(estimate.solved(), Unit.ONE),
          text(estimate.leastResistance(), Unit.OHM));
    }
    return table;
  }

  private static TextTable devices(HeatReport report) {
    TextTable table =
        new TextTable()
            .row(
                "device",
                "at rest",
                "most",
                "at output",
                "worst mean",
                "of a sine of",
                "junction",
                "V²/(π²R)");
    report.devices().stream()
        .limit(SHOWN)
        .forEach(
            device ->
                table.row(
                    device.role(),
                    text(device.rest(), Unit.WATT),
                    text(device.most(), Unit.WATT),
                    text(device.at(), Unit.VOLT),
                    text(device.mean(), Unit.WATT),
                    device.amplitude() == 0
                        ? "no sine: at rest"
                        : text(device.amplitude(), Unit.VOLT) + " peak",
                    text(device.celsius(), Unit.CELSIUS),
                    text(device.classB(), Unit.WATT)));
    return table;
  }

  private static String text(OptionalDouble value, Unit unit) {
    return value.isPresent() ? text(value.getAsDouble(), unit) : "–";
  }

  private static String text(double value, Unit unit) {
    return EngineeringFormat.format(value, unit);
  }
}
