package loopwright.command;

import java.util.stream.Collectors;
import loopwright.design.Design;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import loopwright.sizing.Cure;
import loopwright.sizing.Cures;

/** Cures as text for a person. */
final class CureText {
  private CureText() {}

  static String of(Design design, String hookup, double margin, Cures cures) {
    String wanted = EngineeringFormat.format(margin, Unit.DEGREE);
    TextPage page = new TextPage().title(design.name() + ", hookup '" + hookup + "'");
    if (!cures.needed()) {
      page.paragraph("The design holds " + wanted + " at every level and corner as it is.");
    }
    page.heading("Cures for a phase margin of " + wanted + ", the least costly first");
    if (cures.cures().isEmpty()) {
      page.paragraph("None of the ways below leads there.");
    }
    for (Cure cure : cures.cures()) {
      page.paragraph(cure.says());
      page.hanging(
          "  ",
          cure.changes().stream()
              .map(change -> change.path() + " = " + change.value())
              .collect(Collectors.joining(", ")));
    }
    if (!cures.cannot().isEmpty()) {
      page.heading("Ways that do not lead there");
      cures.cannot().forEach(cannot -> page.paragraph(cannot.kind() + ": " + cannot.says() + "."));
    }
    return page.toString();
  }
}
