package loopwright.view.chart;

import java.util.function.Function;

/** A plot of something that was worked out, with the words that say what it means. */
public final class ResultPlot {
  private final String tab;
  private final Function<PlotTheme, Picture> maker;

  /**
   * @param tab a word or two that tell it from others
   * @param maker draws it in a theme
   */
  ResultPlot(String tab, Function<PlotTheme, Picture> maker) {
    this.tab = tab;
    this.maker = maker;
  }

  /** The word on its tab. */
  public String tab() {
    return tab;
  }

  Picture picture(PlotTheme theme) {
    return maker.apply(theme);
  }
}
