package loopwright.view.form;

import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;
import java.util.stream.Collectors;
import javax.swing.JComponent;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;
import loopwright.view.theme.Theme;

/** Edits a count, or several values with semicolons between them. */
final class TextEditor implements RowEditor {
  private final CommitField field;
  private final Function<Row, String> text;
  private Row row;

  private TextEditor(
      Row row,
      Function<Row, String> text,
      Function<RowEdits, Function<Row, Committing>> commit,
      RowEdits edits) {
    this.row = row;
    this.text = text;
    this.field = new CommitField(typed -> commit.apply(edits).apply(this.row).take(typed));
  }

  /** Takes a typed text over. */
  private interface Committing {
    Optional<String> take(String typed);
  }

  /** For a whole number. */
  static TextEditor count(Row row, RowEdits edits) {
    return new TextEditor(
        row,
        shown -> shown.value().map(Object::toString).orElse(""),
        to -> shown -> typed -> to.typed(shown, typed),
        edits);
  }

  /** For several values. */
  static TextEditor list(Row row, RowEdits edits) {
    TextEditor editor =
        new TextEditor(
            row, TextEditor::values, to -> shown -> typed -> to.typedList(shown, typed), edits);
    Theme.placeholder(editor.field, "none; 1 kHz; 1 MHz");
    return editor;
  }

  private static String values(Row row) {
    Unit unit =
        row.field().unit().or(() -> row.field().element().orElseThrow().unit()).orElse(Unit.ONE);
    return ((List<?>) row.value().orElse(List.of()))
        .stream()
            .map(Quantity.class::cast)
            .map(
                value ->
                    value.bare() ? EngineeringFormat.full(value.value(), unit) : value.spelling())
            .collect(Collectors.joining("; "));
  }

  @Override
  public JComponent component() {
    return field;
  }

  @Override
  public void show(Row shown) {
    row = shown;
    field.show(text.apply(row));
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
