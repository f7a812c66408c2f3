package loopwright.view.chart;

import java.awt.BorderLayout;
import java.awt.Graphics;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javax.swing.JComponent;
import javax.swing.JTabbedPane;
import loopwright.predict.HookupPrediction;
import loopwright.view.theme.Palette;

/** The plots of one hookup, a tab each. */
public final class PlotDeck extends JComponent {
  private final JTabbedPane tabs = new JTabbedPane();
  private final transient Map<PlotPane, PlotSubject> subjects = new LinkedHashMap<>();
  private transient Optional<HookupPrediction> shown = Optional.empty();
  private boolean current = true;
  private String message = "";

  /** A deck with nothing to show yet. */
  public PlotDeck() {
    setLayout(new BorderLayout());
    for (PlotSubject subject :
        List.of(
            new ResponsePlot(),
            new LoopGainPlot(),
            new WaveformPlot(),
            new SwingPlot(),
            new OffsetPlot(),
            new NyquistPlot(),
            new RootsPlot())) {
      subjects.put(new PlotPane(subject.tab()), subject);
    }
    tabs.setName("plots");
    tabs.getAccessibleContext().setAccessibleName("Plots");
    tabs.setTabLayoutPolicy(JTabbedPane.SCROLL_TAB_LAYOUT);
    subjects.keySet().forEach(pane -> tabs.addTab(pane.tab(), pane));
    tabs.addChangeListener(event -> refresh());
    setOpaque(true);
    add(tabs);
    refresh();
  }

  @Override
  protected void paintComponent(Graphics g) {
    g.setColor(getBackground());
    g.fillRect(0, 0, getWidth(), getHeight());
  }

  /**
   * Shows what a hookup should show.
   *
   * @param prediction of the hookup; empty where there is none
   * @param isCurrent whether it belongs to the design as it stands; if not it is drawn faded
   * @param says why there is nothing, or why it is out of date; may be empty
   */
  public void show(Optional<HookupPrediction> prediction, boolean isCurrent, String says) {
    shown = prediction;
    current = isCurrent;
    message = says;
    refresh();
  }

  @Override
  public void updateUI() {
    super.updateUI();
    // Called by the constructor of the superclass too, when there is nothing to colour yet.
    if (subjects != null) {
      refresh();
    }
  }

  /** Draws the tab that is in front; the others when they come to the front. */
  private void refresh() {
    setBackground(Palette.card());
    tabs.setBackground(Palette.card());
    if (tabs.getSelectedComponent() instanceof PlotPane pane) {
      shown.ifPresentOrElse(
          prediction -> pane.show(subjects.get(pane), prediction, current, message),
          () -> pane.showNone(message));
    }
  }
}
