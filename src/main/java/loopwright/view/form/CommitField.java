package loopwright.view.form;

import java.awt.event.ActionEvent;
import java.awt.event.FocusAdapter;
import java.awt.event.FocusEvent;
import java.util.Objects;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;
import javax.swing.AbstractAction;
import javax.swing.JTextField;
import javax.swing.KeyStroke;
import loopwright.view.theme.Theme;

/**
 * A text field whose text counts only once it is committed, by Enter or by leaving the field.
 * Escape brings back what counts. A text that cannot be stays, marked, with the reason.
 */
public class CommitField extends JTextField {
  private final transient Function<String, Optional<String>> commit;
  private transient Consumer<String> onComplaint = says -> {};
  private String shown = "";

  /**
   * @param commit takes a new text over, and has {@link #show(String)} called with what counts
   *     then; returns why the text cannot be, or empty
   */
  public CommitField(Function<String, Optional<String>> commit) {
    this.commit = Objects.requireNonNull(commit);
    addActionListener(event -> commit());
    addFocusListener(
        new FocusAdapter() {
          @Override
          public void focusGained(FocusEvent event) {
            selectAll();
          }

          @Override
          public void focusLost(FocusEvent event) {
            if (!event.isTemporary()) {
              commit();
            }
          }
        });
    getInputMap().put(KeyStroke.getKeyStroke("ESCAPE"), "revert");
    getActionMap()
        .put(
            "revert",
            new AbstractAction() {
              @Override
              public void actionPerformed(ActionEvent event) {
                revert();
              }
            });
  }

  /** Who shows what is wrong with the text; called with an empty text when nothing is. */
  void onComplaint(Consumer<String> listener) {
    onComplaint = Objects.requireNonNull(listener);
  }

  /** Shows what counts now; a text being typed stays as long as that does not change. */
  public final void show(String text) {
    if (!text.equals(shown)) {
      shown = text;
      revert();
    }
  }

  /** Whether something was typed that does not count yet. */
  public final boolean isPending() {
    return !getText().equals(shown);
  }

  /** Makes the text count, if it can be. */
  public final void commit() {
    if (!isPending()) {
      complain("");
      return;
    }
    Optional<String> wrong = commit.apply(getText().strip());
    if (wrong.isPresent()) {
      complain(wrong.get());
    } else {
      revert();
    }
  }

  /** Goes back to what counts. */
  public final void revert() {
    setText(shown);
    complain("");
    if (isFocusOwner()) {
      selectAll();
    }
  }

  private void complain(String says) {
    Theme.markWrong(this, !says.isEmpty());
    onComplaint.accept(says);
  }
}
