package loopwright.view.frame;

import java.util.List;
import java.util.function.Consumer;
import javax.swing.ButtonGroup;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JToggleButton;
import loopwright.design.Hookup;
import loopwright.session.Snapshot;
import loopwright.view.theme.Theme;
import net.miginfocom.swing.MigLayout;

/** The hookups of the design, one of which is looked at. */
final class HookupChooser extends JPanel {
  private final transient Consumer<String> listener;
  private transient List<String> names = List.of();
  private transient ButtonGroup group = new ButtonGroup();

  /**
   * @param listener takes the name of the hookup that a person chooses
   */
  HookupChooser(Consumer<String> listener) {
    super(new MigLayout("insets 0, gapx 6"));
    Theme.style(this, "plain");
    setName("hookups");
    this.listener = listener;
  }

  /** Shows the hookups and which one is chosen. */
  void show(Snapshot snapshot) {
    List<String> wanted = snapshot.design().hookups().stream().map(Hookup::name).toList();
    if (!wanted.equals(names)) {
      names = wanted;
      rebuild();
    }
    for (java.awt.Component component : getComponents()) {
      if (component instanceof JToggleButton button) {
        button.setSelected(button.getText().equals(snapshot.hookup()));
      }
    }
  }

  private void rebuild() {
    removeAll();
    group = new ButtonGroup();
    add(Theme.style(new JLabel("Hookup"), "quiet"));
    for (String name : names) {
      JToggleButton button = Theme.style(new JToggleButton(name), "pill");
      button.setName("hookup." + name);
      button.getAccessibleContext().setAccessibleName("Hookup " + name);
      button.addActionListener(event -> listener.accept(name));
      group.add(button);
      add(button);
    }
    revalidate();
    repaint();
  }
}
