package loopwright.command;

import loopwright.bench.Explanation;
import loopwright.bench.Explanations;
import loopwright.design.Design;
import loopwright.quantity.EngineeringFormat;

/** Explanations as text for a person. */
final class ExplanationText {
  private static final double LEAST = 1e-4;

  private ExplanationText() {}

  static String of(Design design, Explanations explanations) {
    TextPage page = new TextPage().title(design.name() + ", what explains the readings");
    page.paragraph(explanations.says());
    for (Explanation explanation : explanations.explanations()) {
      page.hanging(
          String.format("%8s  ", percent(explanation.probability())),
          explanation.says()
              + (explanation.alike().isEmpty()
                  ? ""
                  : "; these readings cannot tell it from a fault of "
                      + String.join(", ", explanation.alike())));
    }
    explanations
        .next()
        .ifPresent(
            next -> {
              page.heading("What to read next");
              page.paragraph(next.says());
            });
    return page.toString();
  }

  private static String percent(double probability) {
    return probability < LEAST ? "< 0.01 %" : EngineeringFormat.percent(probability);
  }
}
