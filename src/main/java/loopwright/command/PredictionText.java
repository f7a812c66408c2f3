package loopwright.command;

import static loopwright.quantity.EngineeringFormat.format;

import java.util.List;
import loopwright.check.Finding;
import loopwright.predict.HookupPrediction;
import loopwright.predict.OffsetShare;
import loopwright.predict.Prediction;
import loopwright.quantity.Unit;

/** A prediction as a text for a person at a terminal. */
final class PredictionText {
  private PredictionText() {}

  /**
   * @param responseAskedFor whether frequencies were given; the program's own grid is too long to
   *     read
   */
  static String of(Prediction prediction, List<Finding> findings, boolean responseAskedFor) {
    TextPage page = new TextPage();
    for (HookupPrediction hookup : prediction.hookups()) {
      page.title(prediction.design().name() + ", hookup '" + hookup.hookup().name() + "'");
      if (hookup.rest().isEmpty()) {
        page.heading("Not solved").paragraph(hookup.failure());
      }
      StabilityText.print(hookup, page);
      FiguresText.print(hookup, page);
      printOffset(hookup.offsetContributions(), page);
      ResponseText.print(hookup.harmonics(), page);
      if (responseAskedFor) {
        ResponseText.print(hookup, page);
      }
      hookup.rest().ifPresent(rest -> RestText.print(rest, page));
    }
    printFindings(findings, page);
    return page.toString();
  }

  private static void printOffset(List<OffsetShare> shares, TextPage page) {
    if (shares.isEmpty()) {
      return;
    }
    TextTable table = new TextTable();
    double sum = 0;
    for (OffsetShare share : shares) {
      table.row(share.cause(), format(share.output(), Unit.VOLT));
      sum += share.output();
    }
    page.heading("What makes the output offset")
        .table(table.row("together", format(sum, Unit.VOLT)));
  }

  private static void printFindings(List<Finding> findings, TextPage page) {
    page.title("Findings");
    if (findings.isEmpty()) {
      page.paragraph("None.");
    }
    for (Finding finding : findings) {
      String mark = finding.severity().name().toLowerCase(java.util.Locale.ROOT) + ": ";
      page.hanging(
          mark,
          (finding.where().isBlank() ? "" : finding.where() + ": ")
              + finding.says()
              + (finding.remedy().isBlank() ? "" : " Remedy: " + finding.remedy()));
    }
  }
}
