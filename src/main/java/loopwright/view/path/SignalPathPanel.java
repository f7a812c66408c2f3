package loopwright.view.path;

import java.awt.Dimension;
import java.awt.FontMetrics;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.Rectangle;
import java.awt.RenderingHints;
import java.awt.event.ActionEvent;
import java.awt.event.KeyEvent;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import javax.accessibility.AccessibleContext;
import javax.accessibility.AccessibleRole;
import javax.swing.AbstractAction;
import javax.swing.JComponent;
import javax.swing.KeyStroke;
import loopwright.check.Finding;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.predict.HookupPrediction;
import loopwright.view.path.SignalPath.Direction;

/**
 * The amplifier as a map: blocks in signal order, the feedback beneath, voltages on the wires. One
 * block is selected, by mouse or by arrow keys: left and right walk all blocks in their order, up
 * and down lead to what hangs below and to the feedback.
 */
public final class SignalPathPanel extends JComponent {
  private final transient Map<String, BlockButton> buttons = new LinkedHashMap<>();
  private transient Optional<SignalPath> path = Optional.empty();
  private transient List<Finding> findings = List.of();
  private transient List<Consumer<String>> listeners = new ArrayList<>();
  private String selected = "";

  /** A panel with nothing to show yet. */
  public SignalPathPanel() {
    bind(KeyEvent.VK_RIGHT, Direction.ONWARD);
    bind(KeyEvent.VK_LEFT, Direction.BACK);
    bind(KeyEvent.VK_DOWN, Direction.DOWN);
    bind(KeyEvent.VK_UP, Direction.UP);
    bind(KeyEvent.VK_HOME, Direction.FIRST);
    bind(KeyEvent.VK_END, Direction.LAST);
    getAccessibleContext().setAccessibleName("Signal path");
  }

  /**
   * Shows a design in one of its hookups; what was selected stays so where it still exists.
   *
   * @param prediction of that hookup; without one there are no voltages and currents
   */
  public void show(Design design, Hookup hookup, Optional<HookupPrediction> prediction) {
    SignalPath shown = PathReader.read(design, hookup, prediction);
    path = Optional.of(shown);
    if (!buttons.keySet().equals(ids(shown))) {
      rebuild(shown);
    }
    refresh();
    revalidate();
    repaint();
  }

  /** Marks each block with the worst of its findings; a finding of no block marks none. */
  public void mark(List<Finding> newFindings) {
    findings = List.copyOf(newFindings);
    refresh();
  }

  /** Is told the id of a block that the user selects. */
  public void onSelect(Consumer<String> listener) {
    listeners.add(listener);
  }

  /** Shows a block as selected, without telling the listeners; an unknown id selects none. */
  public void select(String blockId) {
    selected = blockId;
    refresh();
  }

  private static Set<String> ids(SignalPath shown) {
    Set<String> ids = new LinkedHashSet<>();
    shown.walk().forEach(block -> ids.add(block.id()));
    return ids;
  }

  private void rebuild(SignalPath shown) {
    removeAll();
    buttons.clear();
    for (Block block : shown.walk()) {
      BlockButton button = new BlockButton(block);
      button.addActionListener(event -> choose(block.id()));
      buttons.put(block.id(), button);
      add(button);
    }
  }

  private void refresh() {
    path.ifPresent(
        shown -> {
          FindingPlace places = new FindingPlace(shown);
          for (Block block : shown.walk()) {
            BlockButton button = buttons.get(block.id());
            button.show(block, places.worst(findings, block));
            button.setSelected(block.id().equals(selected));
          }
          // One stop for the tab key; the arrow keys do the rest.
          String stop = buttons.containsKey(selected) ? selected : shown.walk().get(0).id();
          buttons.forEach((id, button) -> button.setFocusable(id.equals(stop)));
        });
  }

  private void choose(String id) {
    boolean isNew = !id.equals(selected);
    select(id);
    buttons.get(id).requestFocusInWindow();
    if (isNew) {
      listeners.forEach(listener -> listener.accept(id));
    }
  }

  private void bind(int key, Direction direction) {
    getInputMap(WHEN_ANCESTOR_OF_FOCUSED_COMPONENT).put(KeyStroke.getKeyStroke(key, 0), direction);
    getActionMap()
        .put(
            direction,
            new AbstractAction() {
              @Override
              public void actionPerformed(ActionEvent event) {
                path.ifPresent(shown -> choose(shown.next(selected, direction)));
              }
            });
  }

  @Override
  public void doLayout() {
    path.ifPresent(
        shown -> {
          PathLayout layout = new PathLayout(shown, getWidth(), getHeight());
          buttons.forEach(
              (id, button) -> {
                button.setScale(layout.scale());
                button.setBounds(
                    id.equals(BlockIds.FEEDBACK) ? feedback(shown, layout) : layout.bounds(id));
              });
        });
  }

  private Rectangle feedback(SignalPath shown, PathLayout layout) {
    FontMetrics metrics = getFontMetrics(PathFonts.at(layout.scale()).line());
    return layout.feedback(metrics.stringWidth(shown.feedback().says().get(0)));
  }

  @Override
  protected void paintComponent(Graphics g) {
    if (path.isEmpty()) {
      return;
    }
    Graphics2D g2 = (Graphics2D) g.create();
    try {
      g2.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
      g2.setRenderingHint(
          RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
      PathLayout layout = new PathLayout(path.get(), getWidth(), getHeight());
      new WirePainter(g2, path.get(), layout).paint(buttons.get(BlockIds.FEEDBACK).getBounds());
    } finally {
      g2.dispose();
    }
  }

  @Override
  public Dimension getPreferredSize() {
    return isPreferredSizeSet() ? super.getPreferredSize() : new Dimension(1000, 222);
  }

  @Override
  public Dimension getMinimumSize() {
    return isMinimumSizeSet() ? super.getMinimumSize() : new Dimension(720, 170);
  }

  @Override
  public AccessibleContext getAccessibleContext() {
    if (accessibleContext == null) {
      accessibleContext =
          new AccessibleJComponent() {
            @Override
            public AccessibleRole getAccessibleRole() {
              return AccessibleRole.PANEL;
            }
          };
    }
    return accessibleContext;
  }
}
