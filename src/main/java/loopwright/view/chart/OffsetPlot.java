package loopwright.view.chart;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import loopwright.design.Feedback;
import loopwright.predict.HookupPrediction;
import loopwright.predict.OffsetShare;

/** What makes the output offset: one bar a cause, and the offset that they add up to. */
final class OffsetPlot implements PlotSubject {
  /** The bar of what no cause explains. */
  static final String REMAINDER = "remainder";

  /** A share so much smaller than the whole is rounding, or a cause that this design lacks. */
  private static final double ROUNDING = 1e-9;

  @Override
  public String tab() {
    return "Offset";
  }

  @Override
  public Picture picture(HookupPrediction prediction, PlotTheme theme) {
    if (prediction.hookup().feedback() instanceof Feedback.Open) {
      return Picture.none(
          "No loop",
          "Without feedback nothing holds the output to its reference. Choose a hookup with feedback"
              + " to see which cause moves it by how much.");
    }
    Figures figures = new Figures(prediction);
    OptionalDouble solved = figures.solved("outputOffset");
    if (solved.isEmpty() || prediction.offsetContributions().isEmpty()) {
      return Picture.none("No output offset", Words.sentences(figures.says("outputOffset")));
    }
    List<OffsetShare> shares = toShow(prediction.offsetContributions(), solved);
    if (shares.isEmpty()) {
      return Picture.none("Output rests at its reference", "No cause moves it.");
    }
    return Picture.of(
        "Output rests " + Words.volts(solved.getAsDouble()) + " from its reference",
        sentence(shares),
        OffsetBars.of(shares, solved.getAsDouble(), theme));
  }

  private static List<OffsetShare> toShow(List<OffsetShare> contributions, OptionalDouble solved) {
    double sum = contributions.stream().mapToDouble(OffsetShare::output).sum();
    double size = contributions.stream().mapToDouble(share -> Math.abs(share.output())).sum();
    double least = ROUNDING * Math.max(size, Math.abs(solved.getAsDouble()));
    List<OffsetShare> shares = new ArrayList<>(contributions);
    shares.add(new OffsetShare(REMAINDER, solved.getAsDouble() - sum));
    shares.removeIf(share -> Math.abs(share.output()) <= least);
    return shares;
  }

  private static String sentence(List<OffsetShare> shares) {
    OffsetShare largest =
        shares.stream()
            .max(Comparator.comparingDouble(share -> Math.abs(share.output())))
            .orElseThrow();
    return Words.sentences(
        "The largest part is "
            + largest.cause()
            + " with "
            + Words.volts(largest.output())
            + "; all bars add up to the last");
  }
}
