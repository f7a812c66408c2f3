package loopwright.view.form;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import java.util.function.Supplier;
import java.util.stream.IntStream;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JTextArea;
import loopwright.design.Design;
import loopwright.part.Shelf;
import loopwright.session.Edit;
import loopwright.view.theme.Theme;
import net.miginfocom.swing.MigLayout;

/**
 * The rows of one block. As long as the same fields stand in the block their editors stay and only
 * show new values, so that the focus stays where it is.
 */
final class RowsPanel extends JPanel {
  private static final int INDENT = 14;

  private final transient Labels labels;
  private final transient RowEdits edits;
  private transient List<Row> rows = List.of();
  private transient List<RowEditor> editors = List.of();

  RowsPanel(Supplier<Design> design, Shelf shelf, Labels labels, Consumer<Edit> listener) {
    super(new MigLayout("insets 0, fillx, wrap 2, hidemode 3, gapy 6", "[138!,left][grow,fill]"));
    Theme.style(this, "plain");
    this.labels = labels;
    this.edits = new RowEdits(design, shelf, labels, listener);
  }

  /** Shows the rows. */
  void show(List<Row> wanted) {
    if (!areSamePlaces(wanted)) {
      rebuild(wanted);
    }
    rows = wanted;
    for (int i = 0; i < rows.size(); i++) {
      editors.get(i).show(rows.get(i));
    }
  }

  private boolean areSamePlaces(List<Row> wanted) {
    return wanted.size() == rows.size()
        && IntStream.range(0, wanted.size()).allMatch(i -> wanted.get(i).isSamePlace(rows.get(i)));
  }

  private void rebuild(List<Row> wanted) {
    editors.forEach(RowEditor::revert);
    String focused =
        editors.stream()
            .map(RowEditor::component)
            .filter(JComponent::isFocusOwner)
            .map(JComponent::getName)
            .findFirst()
            .orElse("");
    removeAll();
    List<RowEditor> fresh = new ArrayList<>();
    for (Row row : wanted) {
      RowEditor editor = editor(row);
      fresh.add(editor);
      lay(row, editor);
    }
    editors = fresh;
    revalidate();
    repaint();
    editors.stream()
        .map(RowEditor::component)
        .filter(component -> focused.equals(component.getName()))
        .forEach(JComponent::requestFocusInWindow);
  }

  private RowEditor editor(Row row) {
    return switch (row.field().shape()) {
      case QUANTITY, PART_VALUE -> new ValueEditor(row, edits);
      case COUNT -> TextEditor.count(row, edits);
      case LIST -> TextEditor.list(row, edits);
      case FAMILY -> ChoiceEditor.variants(row, edits, labels);
      case CHOICE -> ChoiceEditor.words(row, edits, labels);
      case TEXT ->
          edits.namesPart(row) ? ChoiceEditor.parts(row, edits) : TextEditor.text(row, edits);
      case FLAG -> SwitchEditor.flag(row, edits);
      case BLOCK -> SwitchEditor.block(row, edits);
      case ALTERNATIVES -> TextEditor.alternative(row, edits);
      case MAP -> TextEditor.pairs(row, edits);
    };
  }

  private void lay(Row row, RowEditor editor) {
    String name = edits.name(row);
    JComponent component = editor.component();
    component.setName(row.path());
    component.getAccessibleContext().setAccessibleName(name);
    JLabel label = new JLabel(name);
    label.setToolTipText(name);
    label.setLabelFor(component);
    add(label, "gapleft " + row.depth() * INDENT + ", wmin 0");
    add(component, "wmin 60");
    JTextArea complaint = Theme.style(new JTextArea(), "fail");
    complaint.setName(row.path() + ".complaint");
    complaint.setEditable(false);
    complaint.setFocusable(false);
    complaint.setLineWrap(true);
    complaint.setWrapStyleWord(true);
    complaint.setVisible(false);
    add(complaint, "span 2, growx, wmin 0");
    editor.onComplaint(
        says -> {
          complaint.setText(says);
          complaint.setVisible(!says.isEmpty());
          revalidate();
        });
  }
}
