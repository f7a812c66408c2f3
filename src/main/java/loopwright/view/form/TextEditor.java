package loopwright.view.form;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;
import java.util.stream.Collectors;
import javax.swing.JComponent;
import loopwright.design.Drawer;
import loopwright.design.Field;
import loopwright.design.Tolerances;
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

  /** For free text. */
  static TextEditor text(Row row, RowEdits edits) {
    return new TextEditor(
        row,
        shown -> shown.value().map(Object::toString).orElse(""),
        to -> shown -> typed -> to.typed(shown, typed),
        edits);
  }

  /** For what is written in one of several forms: a series or values, a word or a share. */
  static TextEditor alternative(Row row, RowEdits edits) {
    TextEditor editor =
        new TextEditor(
            row,
            TextEditor::alternative,
            to -> shown -> typed -> to.typedAlternative(shown, typed),
            edits);
    Theme.placeholder(
        editor.field,
        row.field().type() == Drawer.Stock.class ? "E24, or 1k; 2k2; 10k" : "datasheet, or 30%");
    return editor;
  }

  /** For pairs of name and text. */
  static TextEditor pairs(Row row, RowEdits edits) {
    TextEditor editor =
        new TextEditor(
            row,
            shown ->
                ((Map<?, ?>) shown.value().orElse(Map.of()))
                    .entrySet().stream()
                        .map(entry -> entry.getKey() + ": " + entry.getValue())
                        .collect(Collectors.joining("; ")),
            to -> shown -> typed -> to.typedPairs(shown, typed),
            edits);
    Theme.placeholder(editor.field, "name: text; name: text");
    return editor;
  }

  private static String alternative(Row row) {
    Object value = row.value().orElse(null);
    if (value instanceof Drawer.Stock.Series series) {
      return series.series();
    }
    if (value instanceof Drawer.Stock.Values values) {
      return joined(values.values(), row.field().unit().orElse(Unit.ONE));
    }
    if (value instanceof Tolerances.BetaSpread.ByFraction fraction) {
      return text(fraction.fraction(), Unit.ONE);
    }
    return value == null ? "" : "datasheet";
  }

  private static String values(Row row) {
    Unit unit =
        row.field().unit().or(() -> row.field().element().orElseThrow().unit()).orElse(Unit.ONE);
    return joined((List<?>) row.value().orElse(List.of()), unit);
  }

  private static String joined(List<?> values, Unit unit) {
    return values.stream().map(value -> text(value, unit)).collect(Collectors.joining("; "));
  }

  private static String text(Object value, Unit unit) {
    if (value instanceof Quantity quantity) {
      return quantity.bare() ? EngineeringFormat.full(quantity.value(), unit) : quantity.spelling();
    }
    return value instanceof Enum<?> word ? Field.word(word) : value.toString();
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
