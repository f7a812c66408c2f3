package loopwright.view.frame;

import java.awt.BorderLayout;
import java.util.Optional;
import java.util.function.BiConsumer;
import javax.swing.BorderFactory;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTextArea;
import loopwright.predict.Figure;
import loopwright.quantity.Quantity;
import loopwright.session.Snapshot;
import loopwright.view.theme.Theme;

/** The figures in three columns: formula, solved, measured. */
final class FiguresPanel extends JPanel {
  private final FiguresModel model;
  private final FiguresTable table;
  private final JTextArea note = Theme.style(new JTextArea(), "note");
  private final JTextArea complaint = Theme.style(new JTextArea(), "fail");

  /**
   * @param listener takes what a person measured of a figure, or that it is taken away
   */
  FiguresPanel(BiConsumer<Figure, Optional<Quantity>> listener) {
    super(new BorderLayout(0, 6));
    Theme.style(this, "card");
    model = new FiguresModel(listener);
    table = new FiguresTable(model, this::complain);
    add(Theme.style(new JLabel("Figures"), "caption"), BorderLayout.NORTH);
    JScrollPane scroll = new JScrollPane(table);
    scroll.setBorder(BorderFactory.createEmptyBorder());
    add(scroll, BorderLayout.CENTER);
    JPanel foot = Theme.style(new JPanel(new BorderLayout(0, 2)), "plain");
    foot.add(wrapping(complaint, "figures.complaint"), BorderLayout.NORTH);
    foot.add(wrapping(note, "figures.note"), BorderLayout.SOUTH);
    add(foot, BorderLayout.SOUTH);
  }

  private static JTextArea wrapping(JTextArea area, String name) {
    area.setName(name);
    area.setEditable(false);
    area.setFocusable(false);
    area.setLineWrap(true);
    area.setWrapStyleWord(true);
    area.setVisible(false);
    return area;
  }

  /** Shows the figures of the chosen hookup. */
  void show(Snapshot snapshot) {
    model.show(snapshot);
    table.doLayout();
    say(note, age(snapshot));
  }

  /** Makes a value being typed count, if it can be. */
  void commit() {
    if (table.isEditing()) {
      table.getCellEditor().stopCellEditing();
    }
  }

  private static String age(Snapshot snapshot) {
    if (snapshot.unsolved().isPresent()) {
      return "Not solved: " + snapshot.unsolved().get();
    }
    return snapshot.current() || snapshot.prediction().isEmpty()
        ? ""
        : "Grey figures are of an earlier edit; new ones are being solved.";
  }

  private void complain(String says) {
    say(complaint, says);
  }

  private static void say(JTextArea area, String text) {
    area.setText(text);
    area.setVisible(!text.isEmpty());
  }
}
