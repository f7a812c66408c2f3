package loopwright.view.study;

import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import loopwright.view.theme.Theme;
import net.miginfocom.swing.MigLayout;

/** A row of labelled fields. */
final class Inputs extends JPanel {
  Inputs() {
    super(new MigLayout("insets 0, gapx 6"));
    Theme.style(this, "plain");
  }

  /**
   * Adds a field behind its label.
   *
   * @param mnemonic that takes the keyboard there
   * @param width of the field
   */
  Inputs field(String label, char mnemonic, JComponent field, int width) {
    JLabel before = new JLabel(label);
    before.setDisplayedMnemonic(mnemonic);
    before.setLabelFor(field);
    field.getAccessibleContext().setAccessibleName(label);
    add(before, getComponentCount() == 0 ? "" : "gapleft 14");
    add(field, "w " + width + "!");
    return this;
  }

  /** Adds something that carries its own label. */
  Inputs own(JComponent component) {
    add(component, getComponentCount() == 0 ? "" : "gapleft 14");
    return this;
  }
}
