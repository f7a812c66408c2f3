package loopwright.view.chart;

import java.awt.BorderLayout;
import javax.swing.JComponent;

/** Shows one plot of something that was worked out, in whatever theme is in force. */
public final class ResultPane extends JComponent {
  private final PlotPane pane;
  private transient ResultPlot plot;

  /** A pane that shows a plot. */
  public ResultPane(ResultPlot plot) {
    setLayout(new BorderLayout());
    pane = new PlotPane(plot.tab());
    add(pane);
    show(plot);
  }

  /** Shows another one in its place. */
  public void show(ResultPlot other) {
    plot = other;
    pane.show(other);
  }

  @Override
  public void updateUI() {
    super.updateUI();
    // Called by the constructor of the superclass too, when there is nothing to draw yet.
    if (plot != null) {
      pane.show(plot);
    }
  }
}
