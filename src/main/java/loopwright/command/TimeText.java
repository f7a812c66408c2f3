package loopwright.command;

import static loopwright.quantity.EngineeringFormat.format;

import java.util.List;
import loopwright.predict.FigureValue;
import loopwright.predict.Oscillation;
import loopwright.predict.SteadyDistortion;
import loopwright.predict.StepResponses;
import loopwright.quantity.Unit;

/** What was solved in time, for a person to read. */
final class TimeText {
  private static final int HARMONICS_SHOWN = 9;

  private TimeText() {}

  static String step(String design, List<StepResponses> hookups) {
    TextPage page = new TextPage();
    for (StepResponses hookup : hookups) {
      page.title(design + ", hookup '" + hookup.hookup() + "'");
      FiguresText.print(hookup.figures().values(), page);
      page.heading("Oscillation");
      if (hookup.oscillation().isPresent()) {
        oscillation(hookup.oscillation().get(), page);
      } else {
        page.paragraph(
            hookup.says().isEmpty()
                ? "Nothing oscillates at any level of the swing."
                : "Not solved: " + hookup.says() + ".");
      }
    }
    return page.toString();
  }

  private static void oscillation(Oscillation oscillation, TextPage page) {
    page.paragraph(
        "Fastest where the output stands at "
            + format(oscillation.output(), Unit.VOLT)
            + ": "
            + format(oscillation.early().frequency(), Unit.HERTZ)
            + " while it is small, growing by "
            + format(oscillation.early().growth(), Unit.PER_SECOND)
            + "; foretold "
            + format(oscillation.forecastFrequency(), Unit.HERTZ)
            + " and "
            + format(oscillation.forecastGrowth(), Unit.PER_SECOND)
            + ".");
    page.paragraph(
        oscillation
            .settled()
            .map(
                settled ->
                    "It settles to "
                        + format(settled.frequency(), Unit.HERTZ)
                        + ", from "
                        + format(settled.low(), Unit.VOLT)
                        + " to "
                        + format(settled.high(), Unit.VOLT)
                        + ".")
            .orElse("It does not settle: " + oscillation.says() + "."));
    for (Oscillation.Rides ride : oscillation.rides()) {
      page.paragraph(
          "It rides on the output from "
              + format(ride.lowOutput(), Unit.VOLT)
              + " to "
              + format(ride.highOutput(), Unit.VOLT)
              + ".");
    }
  }

  static String distortion(String design, List<SteadyDistortion> hookups) {
    TextPage page = new TextPage();
    for (SteadyDistortion hookup : hookups) {
      page.title(design + ", hookup '" + hookup.hookup() + "'");
      page.heading(
          "Distortion at "
              + format(hookup.frequency(), Unit.HERTZ)
              + ", "
              + format(hookup.amplitude(), Unit.VOLT)
              + " peak");
      if (hookup.thd().isEmpty()) {
        page.paragraph("Not solved: " + hookup.says() + ".");
        continue;
      }
      page.table(
          new TextTable()
              .row("Total harmonic distortion, 2 to 50", ratio(hookup.thd().getAsDouble()))
              .row("the same of the static waveform", still(hookup.staticThd())));
      TextTable harmonics = new TextTable().row("Harmonic", "peak", "of the fundamental");
      for (int n = 1; n <= HARMONICS_SHOWN; n++) {
        double peak = hookup.harmonics().get(n);
        harmonics.row(
            Integer.toString(n), format(peak, Unit.VOLT), ratio(peak / hookup.harmonics().get(1)));
      }
      page.table(harmonics);
      page.paragraph(
          "Steady: the last two of "
              + hookup.periods()
              + " periods differ by "
              + ratio(hookup.change().getAsDouble())
              + " of the fundamental at the most.");
    }
    return page.toString();
  }

  private static String ratio(double value) {
    return format(value, Unit.ONE);
  }

  private static String still(FigureValue value) {
    return value.number().isPresent() ? ratio(value.number().getAsDouble()) : value.says();
  }
}
