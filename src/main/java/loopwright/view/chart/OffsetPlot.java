package loopwright.view.chart;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import loopwright.predict.HookupPrediction;
import loopwright.predict.OffsetShare;

/** What makes the output offset: one bar a cause, and the offset that they add up to. */
final class OffsetPlot implements PlotSubject {
  /** The bar of what no cause explains. */
  static final String REMAINDER = "remainder";

  private static final double ROUNDING = 1e-9;

  @Override
  public String tab() {
    return "Offset";
  }

  @Override
  public Picture picture(HookupPrediction prediction, PlotTheme theme) {
    Figures figures = new Figures(prediction);
    OptionalDouble solved = figures.solved("outputOffset");
    if (solved.isEmpty() || prediction.offsetContributions().isEmpty()) {
      return Picture.none(
          "No output offset to split",
          Words.sentences(
              figures.says("outputOffset").isBlank()
                  ? "This hookup has no causes of offset to show"
                  : figures.says("outputOffset")));
    }
    List<OffsetShare> shares = withRemainder(prediction.offsetContributions(), solved);
    return Picture.of(
        "Output rests " + Words.volts(solved.getAsDouble()) + " from its reference",
        sentence(shares),
        OffsetBars.of(shares, solved.getAsDouble(), theme));
  }

  private static List<OffsetShare> withRemainder(
      List<OffsetShare> contributions, OptionalDouble solved) {
    double sum = contributions.stream().mapToDouble(OffsetShare::output).sum();
    double size = contributions.stream().mapToDouble(share -> Math.abs(share.output())).sum();
    double rest = solved.getAsDouble() - sum;
    List<OffsetShare> shares = new ArrayList<>(contributions);
    if (Math.abs(rest) > ROUNDING * Math.max(size, Math.abs(solved.getAsDouble()))) {
      shares.add(new OffsetShare(REMAINDER, rest));
    }
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
