package loopwright.view.study;

import java.awt.BorderLayout;
import java.util.List;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.JTabbedPane;
import loopwright.view.chart.ResultPane;
import loopwright.view.chart.ResultPlot;
import loopwright.view.theme.Theme;

/** What a study worked out: its plots a tab each, and before or after them a tab of its own. */
final class ResultTabs extends JPanel {
  private final JTabbedPane tabs = new JTabbedPane();
  private final JComponent own;
  private final String ownTab;

  /**
   * @param ownTab the word on the study's own tab
   * @param own what it shows
   */
  ResultTabs(String ownTab, JComponent own) {
    super(new BorderLayout());
    this.own = own;
    this.ownTab = ownTab;
    Theme.style(this, "plain");
    tabs.setName("results");
    tabs.getAccessibleContext().setAccessibleName("Results");
    tabs.setTabLayoutPolicy(JTabbedPane.SCROLL_TAB_LAYOUT);
    tabs.addTab(ownTab, own);
    add(tabs);
  }

  /** Shows the plots of another result; the same tab stays in front where there is one. */
  void show(List<ResultPlot> plots) {
    int front = tabs.getSelectedIndex();
    tabs.removeAll();
    plots.forEach(plot -> tabs.addTab(plot.tab(), new ResultPane(plot)));
    tabs.addTab(ownTab, own);
    if (front > 0 && front < tabs.getTabCount()) {
      tabs.setSelectedIndex(front);
    }
  }
}
