package loopwright.view.form;

import java.util.Optional;
import java.util.function.Consumer;
import javax.swing.JComponent;
import loopwright.design.PartValue;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;
import loopwright.view.theme.Theme;

/** Edits a value with a unit. */
final class ValueEditor implements RowEditor {
  private final QuantityField field;
  private final Unit unit;
  private Row row;

  ValueEditor(Row row, RowEdits edits) {
    this.row = row;
    unit = row.field().unit().orElse(Unit.ONE);
    field =
        new QuantityField(
            unit,
            (text, entry) ->
                entry == QuantityField.Entry.STEPPED
                    ? edits.stepped(this.row, text)
                    : edits.typed(this.row, text));
    if (row.field().optional()) {
      Theme.placeholder(field, "none");
    }
  }

  @Override
  public JComponent component() {
    return field;
  }

  @Override
  public void show(Row shown) {
    row = shown;
    field.show(row.value().map(ValueEditor::quantity));
    field.setToolTipText(row.value().flatMap(this::remark).orElse(null));
  }

  private static Quantity quantity(Object value) {
    return value instanceof PartValue part ? part.value() : (Quantity) value;
  }

  /** What is known of the part beyond its nominal value. */
  private Optional<String> remark(Object value) {
    if (!(value instanceof PartValue part)) {
      return Optional.empty();
    }
    Optional<String> measured =
        part.measured()
            .map(
                quantity ->
                    "measured "
                        + EngineeringFormat.full(quantity.value(), unit)
                        + ", which is what is solved with");
    Optional<String> tolerance =
        part.tolerance().map(quantity -> "± " + EngineeringFormat.percent(quantity.value()));
    if (measured.isPresent() && tolerance.isPresent()) {
      return Optional.of(tolerance.get() + "; " + measured.get());
    }
    return measured.or(() -> tolerance);
  }

  @Override
  public void onComplaint(Consumer<String> listener) {
    field.onComplaint(listener);
  }

  @Override
  public void revert() {
    field.revert();
  }
}
