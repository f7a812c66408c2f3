package loopwright.view.study;

import java.awt.BorderLayout;
import java.awt.Component;
import java.awt.event.ActionEvent;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import javax.swing.AbstractAction;
import javax.swing.DefaultCellEditor;
import javax.swing.JComboBox;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTable;
import javax.swing.JTextArea;
import javax.swing.JTextField;
import javax.swing.KeyStroke;
import javax.swing.ListSelectionModel;
import javax.swing.SwingConstants;
import javax.swing.table.DefaultTableCellRenderer;
import loopwright.design.Design;
import loopwright.quantity.Quantity;
import loopwright.quantity.QuantityException;
import loopwright.quantity.Unit;
import loopwright.session.NodeReadings;
import loopwright.sheet.BenchSheet;
import loopwright.view.theme.Theme;

/**
 * Takes what a person wrote on the sheet back in: its nodes in its order; a value, Enter, the next
 * value, Enter. Each becomes a reading of the bench, and one that is off names its suspects.
 */
final class SheetReadings extends JPanel {
  private static final String NONE = "none";
  private static final String TEACH =
      "Type what stands in the column Read of the sheet: a value, Enter, the next value, Enter. An empty"
          + " cell takes a reading away; every value can be undone.";

  private final transient Desk desk;
  private final SheetRows rows = new SheetRows(this::read);
  private final JTable table = new JTable(rows);
  private final JComboBox<String> instrument = new JComboBox<>();
  private final JTextArea says = Theme.style(new JTextArea(), "says");

  SheetReadings(Desk desk) {
    super(new BorderLayout(0, 8));
    Theme.style(this, "plain");
    this.desk = desk;
    table.setName("readings");
    table.getAccessibleContext().setAccessibleName("Readings of the sheet");
    table.setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
    table.setCellSelectionEnabled(true);
    table.setSurrendersFocusOnKeystroke(true);
    table.putClientProperty("terminateEditOnFocusLost", true);
    table.setFillsViewportHeight(true);
    table.setDefaultEditor(Object.class, new FreshEditor());
    DefaultTableCellRenderer right = new DefaultTableCellRenderer();
    right.setHorizontalAlignment(SwingConstants.RIGHT);
    for (int column = SheetRows.EXPECTED; column <= SheetRows.READ; column++) {
      table.getColumnModel().getColumn(column).setCellRenderer(right);
    }
    KeyStroke enter = KeyStroke.getKeyStroke("ENTER");
    table.getInputMap(WHEN_ANCESTOR_OF_FOCUSED_COMPONENT).put(enter, "next value");
    table.getActionMap().put("next value", new Next());
    table.getSelectionModel().addListSelectionListener(event -> showChosen());
    instrument.setName("instrument");
    says.setName("suspects");
    says.setEditable(false);
    says.setLineWrap(true);
    says.setWrapStyleWord(true);
    says.setRows(3);
    add(new Inputs().field("Read by", 'D', instrument, 150), BorderLayout.NORTH);
    add(new JScrollPane(table), BorderLayout.CENTER);
    add(says, BorderLayout.SOUTH);
    show(Optional.empty());
  }

  /** Shows the nodes of a sheet, with what was read of them so far; empty for none. */
  void show(Optional<BenchSheet> sheet) {
    Design design = desk.now().get().design();
    boolean same = sheet.map(BenchSheet::nodes).equals(rows.sheet().map(BenchSheet::nodes));
    rows.show(sheet, design);
    List<String> names =
        Stream.concat(Stream.of(NONE), design.bench().instruments().keySet().stream()).toList();
    Object chosen = instrument.getSelectedItem();
    instrument.removeAllItems();
    names.forEach(instrument::addItem);
    instrument.setSelectedItem(names.contains(chosen) ? chosen : NONE);
    if (!same && rows.getRowCount() > 0) {
      table.changeSelection(0, SheetRows.READ, false, false);
    }
    showChosen();
  }

  private void read(int row, String text) {
    BenchSheet sheet = rows.sheet().orElseThrow();
    String node = sheet.nodes().get(row).name();
    try {
      Optional<Quantity> value =
          text.isBlank() ? Optional.empty() : Optional.of(volts(text.strip()));
      Object by = instrument.getSelectedItem();
      desk.edit()
          .accept(
              NodeReadings.edit(
                  desk.now().get().design(),
                  sheet.hookup(),
                  node,
                  value,
                  NONE.equals(by) ? Optional.empty() : Optional.ofNullable((String) by)));
      rows.show(rows.sheet(), desk.now().get().design());
      says.setText(rows.says(row).isEmpty() ? TEACH : rows.says(row));
    } catch (QuantityException e) {
      says.setText(node + ": " + e.getMessage() + ".");
    }
  }

  private static Quantity volts(String text) {
    Quantity read = Quantity.parse(text, Unit.VOLT);
    if (!Double.isFinite(read.value())) {
      throw new QuantityException("found \"" + text + "\", expected what an instrument can show");
    }
    return read;
  }

  private void showChosen() {
    if (rows.getRowCount() == 0) {
      says.setText("Make the sheet that was filled in, to type its readings here.");
      return;
    }
    int row = table.getSelectedRow();
    String chosen = row < 0 ? "" : rows.says(row);
    String off =
        rows.off().isEmpty()
            ? ""
            : "Off so far: " + rows.off().stream().collect(Collectors.joining(", ")) + ". ";
    says.setText(chosen.isEmpty() ? off + TEACH : chosen);
  }

  /** Goes to the value below; the last one stays. */
  private final class Next extends AbstractAction {
    @Override
    public void actionPerformed(ActionEvent event) {
      int row = Math.max(0, table.isEditing() ? table.getEditingRow() : table.getSelectedRow());
      if (table.isEditing() && !table.getCellEditor().stopCellEditing()) {
        return;
      }
      String told = says.getText();
      int next = Math.min(row + 1, table.getRowCount() - 1);
      table.changeSelection(next, SheetRows.READ, false, false);
      // What was just read matters more than the node that comes next.
      says.setText(told);
    }
  }

  /** Typing replaces what was read before. */
  private static final class FreshEditor extends DefaultCellEditor {
    FreshEditor() {
      super(new JTextField());
      JTextField field = (JTextField) getComponent();
      field.setName("value");
      field.setHorizontalAlignment(SwingConstants.RIGHT);
      field.getAccessibleContext().setAccessibleName("Value read");
    }

    @Override
    public Component getTableCellEditorComponent(
        JTable table, Object value, boolean selected, int row, int column) {
      JTextField field =
          (JTextField) super.getTableCellEditorComponent(table, value, selected, row, column);
      field.selectAll();
      return field;
    }
  }
}
