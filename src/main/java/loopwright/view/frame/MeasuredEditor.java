package loopwright.view.frame;

import java.awt.Component;
import java.util.Optional;
import java.util.function.Consumer;
import javax.swing.AbstractCellEditor;
import javax.swing.JTable;
import javax.swing.JTextField;
import javax.swing.SwingConstants;
import javax.swing.table.TableCellEditor;
import loopwright.predict.Figure;
import loopwright.quantity.Quantity;
import loopwright.quantity.QuantityException;
import loopwright.view.theme.Theme;

/** Takes a measured value in the figure's unit; an empty text takes the reading away. */
final class MeasuredEditor extends AbstractCellEditor implements TableCellEditor {
  private final JTextField field = new JTextField();
  private final FiguresModel model;
  private final transient Consumer<String> complaint;
  private transient Optional<Quantity> before = Optional.empty();
  private transient Optional<Quantity> value = Optional.empty();
  private Figure figure;

  /**
   * @param model whose cells are edited
   * @param complaint shows what is wrong with a text; called with an empty text when nothing is
   */
  MeasuredEditor(FiguresModel model, Consumer<String> complaint) {
    this.model = model;
    this.complaint = complaint;
    field.setName("measured");
    field.setHorizontalAlignment(SwingConstants.RIGHT);
    field.addActionListener(event -> stopCellEditing());
  }

  @Override
  public Component getTableCellEditorComponent(
      JTable table, Object cell, boolean selected, int row, int column) {
    figure = model.figure(row);
    before = model.reading(row).map(reading -> reading.value());
    field.setText(before.map(Quantity::spelling).orElse(""));
    field.selectAll();
    field.getAccessibleContext().setAccessibleName("Measured " + figure.label());
    complain("");
    return field;
  }

  @Override
  public Object getCellEditorValue() {
    return value;
  }

  @Override
  public boolean stopCellEditing() {
    String text = field.getText().strip();
    if (text.equals(before.map(Quantity::spelling).orElse(""))) {
      cancelCellEditing();
      return true;
    }
    try {
      value = text.isEmpty() ? Optional.empty() : Optional.of(finite(text));
    } catch (QuantityException e) {
      complain(figure.label() + ": " + e.getMessage());
      return false;
    }
    complain("");
    return super.stopCellEditing();
  }

  @Override
  public void cancelCellEditing() {
    complain("");
    super.cancelCellEditing();
  }

  private Quantity finite(String text) {
    Quantity quantity = Quantity.parse(text, figure.unit());
    if (Double.isInfinite(quantity.value())) {
      throw new QuantityException("found \"" + text + "\", expected what an instrument can show");
    }
    return quantity;
  }

  private void complain(String says) {
    Theme.markWrong(field, !says.isEmpty());
    complaint.accept(says);
  }
}
