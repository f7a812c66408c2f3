package loopwright.view.frame;

import java.awt.Dimension;
import java.util.List;
import java.util.Optional;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTable;
import javax.swing.JTextArea;
import javax.swing.SwingConstants;
import javax.swing.table.DefaultTableCellRenderer;
import javax.swing.table.DefaultTableModel;
import loopwright.characterise.DiodeFit;
import loopwright.characterise.FigureComparison;
import loopwright.characterise.FitException;
import loopwright.characterise.FittedDiode;
import loopwright.characterise.FittedTransistor;
import loopwright.characterise.TransistorFit;
import loopwright.design.Design;
import loopwright.part.DiodeRecord;
import loopwright.part.PartRecord;
import loopwright.part.TransistorRecord;
import loopwright.quantity.EngineeringFormat;
import loopwright.view.theme.Theme;
import net.miginfocom.swing.MigLayout;

/**
 * The records of a design: each printed figure beside what the model that was made of it returns.
 */
final class PartsPanel extends JPanel {
  private static final String[] COLUMNS = {"Figure", "at", "printed", "model returns"};
  private static final Dimension SIZE = new Dimension(720, 440);

  private final transient Design design;
  private final JComboBox<String> parts;
  private final DefaultTableModel rows =
      new DefaultTableModel(COLUMNS, 0) {
        @Override
        public boolean isCellEditable(int row, int column) {
          return false;
        }
      };
  private final JTextArea notes = Theme.style(new JTextArea(), "message");

  /**
   * @param design whose part records are shown
   */
  PartsPanel(Design design) {
    super(new MigLayout("insets 8, fill, wrap 2", "[][grow,fill]", "[][grow,fill][]"));
    this.design = design;
    setPreferredSize(SIZE);
    parts = new JComboBox<>(design.parts().keySet().toArray(String[]::new));
    parts.setName("parts");
    JLabel label = new JLabel("Part");
    label.setDisplayedMnemonic('P');
    label.setLabelFor(parts);
    JTable table = new JTable(rows);
    table.setName("comparison");
    DefaultTableCellRenderer right = new DefaultTableCellRenderer();
    right.setHorizontalAlignment(SwingConstants.RIGHT);
    table.getColumnModel().getColumn(2).setCellRenderer(right);
    table.getColumnModel().getColumn(3).setCellRenderer(right);
    table.getAccessibleContext().setAccessibleName("Printed figures and what the model returns");
    notes.setName("notes");
    notes.setEditable(false);
    notes.setLineWrap(true);
    notes.setWrapStyleWord(true);
    notes.setRows(5);
    add(label);
    add(parts, "w 220!");
    add(new JScrollPane(table), "span 2, grow");
    add(new JScrollPane(notes), "span 2, growx, h 120!");
    parts.addActionListener(event -> show((String) parts.getSelectedItem()));
    show((String) parts.getSelectedItem());
  }

  private void show(String name) {
    rows.setRowCount(0);
    if (name == null) {
      notes.setText("This design names no part.");
      return;
    }
    PartRecord record = design.parts().get(name);
    try {
      if (record instanceof TransistorRecord transistor) {
        FittedTransistor fitted = TransistorFit.fit(transistor, Optional.empty());
        show(record, fitted.comparison(), fitted.notes());
      } else {
        FittedDiode fitted = DiodeFit.fit((DiodeRecord) record);
        show(record, fitted.comparison(), fitted.notes());
      }
    } catch (FitException e) {
      notes.setText(e.getMessage());
    }
  }

  private void show(PartRecord record, List<FigureComparison> comparison, List<String> said) {
    for (FigureComparison figure : comparison) {
      rows.addRow(
          new Object[] {
            figure.figure(),
            figure.bias(),
            text(figure, figure.printed()),
            text(figure, figure.returned())
          });
    }
    String source = record.source().map(text -> "Source: " + text + "\n").orElse("");
    String none = comparison.isEmpty() ? "The record states model parameters only.\n" : "";
    notes.setText(source + none + String.join("\n", said));
    notes.setCaretPosition(0);
  }

  private static String text(FigureComparison figure, double value) {
    return Double.isNaN(value)
        ? "cannot be reached"
        : EngineeringFormat.format(value, figure.unit());
  }
}
