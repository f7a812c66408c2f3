package loopwright.view.chart;

import loopwright.predict.HookupPrediction;

/** What one tab of the deck shows. */
interface PlotSubject {
  /** The word on the tab. */
  String tab();

  /** The picture of a prediction whose rest state was found. */
  Picture picture(HookupPrediction prediction, PlotTheme theme);
}
