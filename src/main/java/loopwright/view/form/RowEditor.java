package loopwright.view.form;

import java.util.function.Consumer;
import javax.swing.JComponent;

/** What a person edits one row with. */
interface RowEditor {
  /** The component to lay out; it has the focus while the row is edited. */
  JComponent component();

  /** Shows what stands in the row now. */
  void show(Row row);

  /** Who shows why an edit could not be made; called with an empty text when it could. */
  void onComplaint(Consumer<String> listener);

  /** Drops what was typed and does not count. */
  default void revert() {
    // Most editors have nothing in between.
  }
}
