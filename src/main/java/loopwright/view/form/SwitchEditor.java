package loopwright.view.form;

import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.Consumer;
import java.util.function.Predicate;
import javax.swing.JCheckBox;
import javax.swing.JComponent;

/** Edits what is so or not: a flag, or a block that is fitted or left out. */
final class SwitchEditor implements RowEditor {
  private final JCheckBox box = new JCheckBox();
  private final Predicate<Row> on;
  private Consumer<String> onComplaint = says -> {};
  private Row row;

  private SwitchEditor(
      Row row, Predicate<Row> on, BiFunction<Row, Boolean, Optional<String>> change, String says) {
    this.row = row;
    this.on = on;
    box.setText(says);
    box.addActionListener(
        event -> {
          Optional<String> wrong = change.apply(this.row, box.isSelected());
          box.setSelected(on.test(this.row));
          onComplaint.accept(wrong.orElse(""));
        });
  }

  /** For a flag. */
  static SwitchEditor flag(Row row, RowEdits edits) {
    return new SwitchEditor(
        row,
        shown -> shown.value().equals(Optional.of(true)),
        (at, wanted) -> edits.typed(at, Boolean.toString(wanted)),
        "yes");
  }

  /** For an optional block. */
  static SwitchEditor block(Row row, RowEdits edits) {
    SwitchEditor editor =
        new SwitchEditor(row, shown -> shown.value().isPresent(), edits::fitted, "fitted");
    editor.box.setEnabled(row.field().optional());
    return editor;
  }

  @Override
  public JComponent component() {
    return box;
  }

  @Override
  public void show(Row shown) {
    row = shown;
    box.setSelected(on.test(shown));
  }

  @Override
  public void onComplaint(Consumer<String> listener) {
    onComplaint = listener;
  }
}
