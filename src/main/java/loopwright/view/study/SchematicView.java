package loopwright.view.study;

import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.event.KeyAdapter;
import java.awt.event.KeyEvent;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.awt.geom.Rectangle2D;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;
import javax.accessibility.AccessibleContext;
import javax.accessibility.AccessibleRole;
import javax.swing.JComponent;
import javax.swing.ToolTipManager;
import loopwright.sheet.SchematicDrawing;
import loopwright.sheet.SchematicInk;
import loopwright.sheet.SchematicOverlay;
import loopwright.view.theme.Palette;

/** A schematic at the size that there is, walked part by part with the arrow keys. */
final class SchematicView extends JComponent {
  private static final int MARGIN = 8;

  private final transient Function<String, String> says;
  private final transient Consumer<String> onPart;
  private transient Optional<SchematicDrawing> drawing = Optional.empty();
  private transient Optional<SchematicOverlay> overlay = Optional.empty();
  private int chosen = -1;

  /**
   * @param says what to say of a part
   * @param onPart told of the part that is chosen
   */
  SchematicView(Function<String, String> says, Consumer<String> onPart) {
    this.says = says;
    this.onPart = onPart;
    setName("schematic");
    setFocusable(true);
    ToolTipManager.sharedInstance().registerComponent(this);
    addMouseListener(
        new MouseAdapter() {
          @Override
          public void mousePressed(MouseEvent event) {
            requestFocusInWindow();
            partAt(event).ifPresent(SchematicView.this::choose);
          }
        });
    addKeyListener(
        new KeyAdapter() {
          @Override
          public void keyPressed(KeyEvent event) {
            switch (event.getKeyCode()) {
              case KeyEvent.VK_RIGHT, KeyEvent.VK_DOWN -> step(1);
              case KeyEvent.VK_LEFT, KeyEvent.VK_UP -> step(-1);
              default -> {
                // Other keys are not ours.
              }
            }
          }
        });
  }

  void show(Optional<SchematicDrawing> shown, Optional<SchematicOverlay> laidOver) {
    drawing = shown;
    overlay = laidOver;
    chosen = -1;
    repaint();
  }

  /** Chooses the next part, or the one before. */
  void step(int by) {
    List<String> parts = drawing.map(SchematicDrawing::parts).orElse(List.of());
    if (!parts.isEmpty()) {
      choose(parts.get(Math.floorMod(chosen + by, parts.size())));
    }
  }

  private void choose(String part) {
    chosen = drawing.map(shown -> shown.parts().indexOf(part)).orElse(-1);
    getAccessibleContext().setAccessibleDescription(says.apply(part));
    onPart.accept(part);
    repaint();
  }

  private double scale() {
    return drawing
        .map(
            shown ->
                Math.min(
                    (getWidth() - 2.0 * MARGIN) / shown.width(),
                    (getHeight() - 2.0 * MARGIN) / shown.height()))
        .orElse(1.0);
  }

  private double left() {
    return (getWidth() - scale() * drawing.map(SchematicDrawing::width).orElse(0.0)) / 2;
  }

  private double top() {
    return (getHeight() - scale() * drawing.map(SchematicDrawing::height).orElse(0.0)) / 2;
  }

  private Optional<String> partAt(MouseEvent event) {
    double scale = scale();
    return drawing.flatMap(
        shown -> shown.partAt((event.getX() - left()) / scale, (event.getY() - top()) / scale));
  }

  @Override
  public String getToolTipText(MouseEvent event) {
    return partAt(event).map(says).orElse(null);
  }

  @Override
  protected void paintComponent(Graphics g) {
    g.setColor(Palette.card());
    g.fillRect(0, 0, getWidth(), getHeight());
    if (drawing.isEmpty() || getWidth() < 4 * MARGIN || getHeight() < 4 * MARGIN) {
      return;
    }
    Graphics2D g2 = (Graphics2D) g.create();
    try {
      g2.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
      g2.setRenderingHint(
          RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
      g2.translate(left(), top());
      g2.scale(scale(), scale());
      SchematicDrawing shown = drawing.get();
      if (chosen >= 0) {
        Rectangle2D area = shown.area(shown.parts().get(chosen)).orElseThrow();
        g2.setColor(Palette.accentGround());
        g2.fill(area);
      }
      shown.paint(g2, ink(), overlay);
    } finally {
      g2.dispose();
    }
  }

  private static SchematicInk ink() {
    return new SchematicInk(
        Palette.text(),
        Palette.text(),
        Palette.quiet(),
        Palette.accent(),
        Palette.fails(),
        Palette.risky());
  }

  @Override
  public Dimension getPreferredSize() {
    return new Dimension(900, 440);
  }

  @Override
  public AccessibleContext getAccessibleContext() {
    if (accessibleContext == null) {
      accessibleContext =
          new AccessibleJComponent() {
            @Override
            public AccessibleRole getAccessibleRole() {
              return AccessibleRole.CANVAS;
            }
          };
      accessibleContext.setAccessibleName("Schematic");
    }
    return accessibleContext;
  }
}
