package loopwright.view.path;

import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.util.Optional;
import javax.swing.JToggleButton;
import loopwright.check.Finding;

/** A block as a button: chosen by mouse or keyboard, and read out by its words. */
final class BlockButton extends JToggleButton {
  private transient Block block;
  private transient Optional<Finding> worst = Optional.empty();
  private double scale = 1;

  BlockButton(Block block) {
    setName(block.id());
    setOpaque(false);
    setContentAreaFilled(false);
    setBorderPainted(false);
    setFocusPainted(false);
    setBorder(null);
    setRolloverEnabled(true);
    show(block, Optional.empty());
  }

  /** Shows the block as it is now, with its worst finding. */
  void show(Block shown, Optional<Finding> finding) {
    block = shown;
    worst = finding;
    String says = shown.description();
    String found = finding.map(Finding::says).orElse("");
    setToolTipText(says + (found.isEmpty() ? "" : ". " + found));
    getAccessibleContext().setAccessibleName(shown.title());
    getAccessibleContext().setAccessibleDescription(getToolTipText());
    repaint();
  }

  /** The block that it stands for. */
  Block block() {
    return block;
  }

  /** The worst finding of the block. */
  Optional<Finding> worst() {
    return worst;
  }

  /** Size of the drawing against its normal size. */
  void setScale(double newScale) {
    scale = newScale;
  }

  @Override
  protected void paintComponent(Graphics g) {
    Graphics2D g2 = (Graphics2D) g.create();
    try {
      g2.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
      g2.setRenderingHint(
          RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
      BlockFrame.Look look =
          new BlockFrame.Look(isSelected(), isFocusOwner(), getModel().isRollover(), worst);
      new BlockPainter(g2, block, scale, getWidth(), getHeight(), look).paint();
    } finally {
      g2.dispose();
    }
  }
}
