package loopwright.command;

import java.nio.file.Path;
import java.util.Optional;
import loopwright.check.Finding;
import loopwright.propose.Demand;
import loopwright.propose.FirstDesign;
import loopwright.propose.Reason;
import loopwright.quantity.EngineeringFormat;

/** A first design as text for a person. */
final class FirstText {
  private FirstText() {}

  static String of(FirstDesign first, Optional<Path> file) {
    TextPage page =
        new TextPage().title(first.design().map(made -> made.name()).orElse("First design"));
    page.paragraph(first.says());
    page.heading("Demands");
    TextTable table = new TextTable().row("", "wanted", "predicted", "");
    for (Demand demand : first.demands()) {
      table.row(
          demand.name(),
          EngineeringFormat.format(demand.wanted(), demand.unit()),
          demand.predicted().isPresent()
              ? EngineeringFormat.format(demand.predicted().getAsDouble(), demand.unit())
              : "—",
          demand.met() ? "met" : "not met");
    }
    page.table(table);
    if (!first.reasons().isEmpty()) {
      page.heading("Choices and reasons");
      for (Reason reason : first.reasons()) {
        page.paragraph(reason.path() + " = " + reason.value());
        page.hanging("    ", reason.says());
      }
    }
    if (!first.findings().isEmpty()) {
      page.heading("Findings");
      for (Finding finding : first.findings()) {
        page.hanging("! ", finding.where() + ": " + finding.says() + " " + finding.remedy());
      }
    }
    first
        .design()
        .flatMap(made -> file)
        .ifPresent(path -> page.heading("Written to " + path + "."));
    return page.toString();
  }
}
