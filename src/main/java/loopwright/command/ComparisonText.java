package loopwright.command;

import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import loopwright.bench.Comparison;
import loopwright.bench.ReadingUnit;
import loopwright.bench.ReadingVerdict;
import loopwright.design.Design;
import loopwright.design.Reading;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** A comparison as text for a person. */
final class ComparisonText {
  private ComparisonText() {}

  static String of(Design design, Comparison comparison) {
    TextPage page = new TextPage().title(design.name() + ", readings");
    if (comparison.readings().isEmpty()) {
      return page.paragraph(
              "The design file holds no readings: type them in the window, or write"
                  + " them under bench.readings.")
          .toString();
    }
    TextTable table = new TextTable().row("reading", "measured", "±", "predicted", "±", "E_n");
    for (ReadingVerdict verdict : comparison.readings()) {
      Unit unit = ReadingUnit.of(verdict.reading());
      table.row(
          what(verdict.reading()),
          EngineeringFormat.format(verdict.measured(), unit),
          EngineeringFormat.format(verdict.measuredUncertainty(), unit, 2),
          text(verdict.predicted().number(), unit, EngineeringFormat.DIGITS),
          text(verdict.predictedUncertainty(), unit, 2),
          text(verdict.en(), Unit.ONE, 3));
    }
    page.heading("Readings beside the prediction, 95 %").table(table);
    page.heading("Verdicts");
    comparison
        .readings()
        .forEach(verdict -> page.paragraph(what(verdict.reading()) + ": " + verdict.says()));
    page.paragraph(comparison.set().says());
    if (!comparison.implied().isEmpty()) {
      page.heading("Implied");
      comparison.implied().forEach(page::paragraph);
    }
    if (!comparison.suspects().isEmpty()) {
      page.heading("Look at the bench first");
      comparison.suspects().forEach(page::paragraph);
    }
    return page.toString();
  }

  private static String what(Reading reading) {
    return Stream.of(
            reading.hookup(),
            Optional.of(reading.quantity()),
            reading.node(),
            reading.device(),
            reading.part(),
            reading.rail().map(rail -> rail.name().toLowerCase(Locale.ROOT)))
        .flatMap(Optional::stream)
        .collect(Collectors.joining(" "));
  }

  private static String text(OptionalDouble value, Unit unit, int digits) {
    return value.isPresent() ? EngineeringFormat.format(value.getAsDouble(), unit, digits) : "–";
  }
}
