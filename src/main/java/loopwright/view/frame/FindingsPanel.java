package loopwright.view.frame;

import java.awt.BorderLayout;
import java.awt.Dimension;
import java.awt.EventQueue;
import java.awt.Rectangle;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTextArea;
import javax.swing.ScrollPaneConstants;
import javax.swing.Scrollable;
import javax.swing.text.DefaultCaret;
import loopwright.check.Finding;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.session.Edit;
import loopwright.session.Snapshot;
import loopwright.view.theme.Theme;
import net.miginfocom.swing.MigLayout;

/** What is wrong or risky, in sentences, worst first. */
final class FindingsPanel extends JPanel {
  private final JLabel title = Theme.style(new JLabel("Findings"), "caption");
  private final JPanel list = new Entries();
  private final transient Function<String, Optional<String>> blockAt;
  private final transient Consumer<String> onShow;
  private final transient Consumer<Edit> onEdit;
  private final transient RemedyWords words = new RemedyWords();
  private transient Optional<Design> design = Optional.empty();
  private transient List<Finding> findings = List.of();
  private String says = "";

  /**
   * @param blockAt finds the block that a place belongs to
   * @param onShow shows a block
   * @param onEdit makes the edit that a finding's remedy is
   */
  FindingsPanel(
      Function<String, Optional<String>> blockAt, Consumer<String> onShow, Consumer<Edit> onEdit) {
    super(new BorderLayout(0, 6));
    Theme.style(this, "card");
    this.blockAt = blockAt;
    this.onShow = onShow;
    this.onEdit = onEdit;
    list.setName("findings");
    add(title, BorderLayout.NORTH);
    JScrollPane scroll =
        new JScrollPane(
            list,
            ScrollPaneConstants.VERTICAL_SCROLLBAR_AS_NEEDED,
            ScrollPaneConstants.HORIZONTAL_SCROLLBAR_NEVER);
    scroll.setBorder(null);
    scroll.getVerticalScrollBar().setUnitIncrement(16);
    add(scroll, BorderLayout.CENTER);
  }

  /**
   * Shows the findings of the newest result, if it is of this edit; else says why there are none.
   */
  void show(Snapshot snapshot) {
    List<Finding> wanted = snapshot.current() ? snapshot.findings() : List.of();
    String instead = instead(snapshot);
    design = Optional.of(snapshot.design());
    if (!wanted.equals(findings) || !instead.equals(says)) {
      findings = wanted;
      says = instead;
      rebuild();
    }
  }

  private static String instead(Snapshot snapshot) {
    if (snapshot.failure().isPresent()) {
      return "Not checked: " + snapshot.failure().get().says();
    }
    if (!snapshot.current()) {
      return "Being checked…";
    }
    return snapshot.findings().isEmpty() ? "Nothing was found wrong or risky." : "";
  }

  private void rebuild() {
    title.setText(findings.isEmpty() ? "Findings" : "Findings (" + findings.size() + ")");
    list.removeAll();
    if (!says.isEmpty()) {
      list.add(text(says, "note"), "span 3, growx, wmin 0");
    }
    findings.forEach(this::lay);
    list.revalidate();
    list.repaint();
    // The worst stands first; where it stands is known only after the layout.
    EventQueue.invokeLater(() -> list.scrollRectToVisible(new Rectangle(0, 0, 1, 1)));
  }

  private void lay(Finding finding) {
    String severity =
        switch (finding.severity()) {
          case FAILS -> "fails";
          case RISKY -> "risky";
          case REMARK -> "note";
        };
    JLabel mark = Theme.style(new JLabel(severity), "mark " + severity);
    list.add(mark, "newline, top");
    list.add(text(finding.says(), "says"), "growx, wmin 0");
    Optional<String> block = blockAt.apply(finding.where());
    list.add(block.map(id -> showButton(finding, id)).orElseGet(JLabel::new), "top");
    if (!finding.remedy().isEmpty()) {
      list.add(text(finding.remedy(), "note"), "newline, skip 1, growx, wmin 0, gaptop 0");
      if (!finding.changes().isEmpty()) {
        list.add(applyButton(finding), "newline, skip 1, span 2, left, wmin 0, gaptop 0");
      }
    }
  }

  private JComponent showButton(Finding finding, String block) {
    JButton button = Theme.style(new JButton("Show"), "pill");
    button.setName("show." + finding.where());
    button.setToolTipText(finding.where());
    button.getAccessibleContext().setAccessibleName("Show " + finding.where());
    button.addActionListener(event -> onShow.accept(block));
    return button;
  }

  private JComponent applyButton(Finding finding) {
    String what = words.button(design.orElseThrow(), finding);
    JButton button = Theme.style(new JButton(what), "pill");
    button.setName("remedy." + finding.where());
    button.setToolTipText(RemedyWords.changes(finding.changes()));
    button.getAccessibleContext().setAccessibleDescription(finding.says());
    button.addActionListener(
        event ->
            onEdit.accept(Edit.of(what, Change.applyAll(design.orElseThrow(), finding.changes()))));
    return button;
  }

  private static JTextArea text(String says, String style) {
    JTextArea area = Theme.style(new JTextArea(says), style);
    // Else every text would scroll itself into view, and the last would win over the worst.
    ((DefaultCaret) area.getCaret()).setUpdatePolicy(DefaultCaret.NEVER_UPDATE);
    area.setCaretPosition(0);
    area.setEditable(false);
    area.setFocusable(false);
    area.setLineWrap(true);
    area.setWrapStyleWord(true);
    return area;
  }

  /** The findings one below the other, as wide as there is room. */
  private static final class Entries extends JPanel implements Scrollable {
    Entries() {
      super(new MigLayout("insets 0 0 0 4, fillx, gapy 6", "[44!,left][grow,fill][]"));
      Theme.style(this, "plain");
    }

    @Override
    public Dimension getPreferredScrollableViewportSize() {
      return getPreferredSize();
    }

    @Override
    public int getScrollableUnitIncrement(Rectangle visible, int orientation, int direction) {
      return 16;
    }

    @Override
    public int getScrollableBlockIncrement(Rectangle visible, int orientation, int direction) {
      return visible.height;
    }

    @Override
    public boolean getScrollableTracksViewportWidth() {
      return true;
    }

    @Override
    public boolean getScrollableTracksViewportHeight() {
      return false;
    }
  }
}
