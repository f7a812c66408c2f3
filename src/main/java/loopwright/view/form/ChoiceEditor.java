package loopwright.view.form;

import java.awt.Component;
import java.awt.Dimension;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;
import javax.swing.JComboBox;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.ListCellRenderer;
import loopwright.design.Field;

/** Edits what is one of several: a variant, a word, a part. */
final class ChoiceEditor implements RowEditor {
  /** One of the choices: what it says, and how to make it so. */
  private record Option(Object value, String says, Function<Row, Optional<String>> choose) {
    @Override
    public String toString() {
      return says;
    }
  }

  private final JComboBox<Option> box = new JComboBox<>();
  private final Function<Row, List<Option>> options;
  private final Function<Row, Object> current;
  private Consumer<String> onComplaint = says -> {};
  private boolean showing;
  private Row row;

  private ChoiceEditor(
      Row row, Function<Row, List<Option>> options, Function<Row, Object> current) {
    this.row = row;
    this.options = options;
    this.current = current;
    // A combo box asks for room for its longest choice; a form has only so much.
    box.setMinimumSize(new Dimension(40, box.getMinimumSize().height));
    box.addActionListener(event -> choose());
  }

  /** For the variants of a family. */
  static ChoiceEditor variants(Row row, RowEdits edits, Labels labels) {
    return new ChoiceEditor(
        row,
        shown ->
            shown.field().variants().stream()
                .map(
                    variant ->
                        new Option(variant, labels.kind(variant), at -> edits.chosen(at, variant)))
                .toList(),
        shown -> shown.value().map(value -> (Object) value.getClass()).orElse(null));
  }

  /** For the words of an enum; an optional one may be left to the file format's own rule. */
  static ChoiceEditor words(Row row, RowEdits edits, Labels labels) {
    return new ChoiceEditor(
        row,
        shown -> {
          List<Option> choices = new ArrayList<>();
          if (shown.field().optional()) {
            choices.add(new Option(null, "as usual", at -> edits.typed(at, "")));
          }
          for (Object constant : shown.field().type().getEnumConstants()) {
            String word = Field.word((Enum<?>) constant);
            choices.add(
                new Option(
                    constant, labels.choice((Enum<?>) constant), at -> edits.typed(at, word)));
          }
          return choices;
        },
        shown -> shown.value().orElse(null));
  }

  /** For the parts that fit. */
  static ChoiceEditor parts(Row row, RowEdits edits) {
    ChoiceEditor editor =
        new ChoiceEditor(
            row,
            shown -> {
              List<String> names = new ArrayList<>(edits.parts(shown));
              shown
                  .value()
                  .map(Object::toString)
                  .filter(name -> !names.contains(name))
                  .ifPresent(name -> names.add(0, name));
              return names.stream()
                  .map(name -> new Option(name, name, at -> edits.part(at, name)))
                  .toList();
            },
            shown -> shown.value().orElse(null));
    editor.describe(edits::about);
    return editor;
  }

  /** Shows what is known of each choice in the list that drops down. */
  private void describe(Function<String, String> about) {
    ListCellRenderer<? super Option> plain = box.getRenderer();
    box.setRenderer(
        (list, option, index, selected, focused) -> {
          Component drawn =
              plain.getListCellRendererComponent(list, option, index, selected, focused);
          if (index >= 0 && option != null && drawn instanceof JLabel label) {
            label.setText(option.says() + "   " + about.apply(option.says()));
          }
          return drawn;
        });
  }

  @Override
  public JComponent component() {
    return box;
  }

  @Override
  public void show(Row shown) {
    row = shown;
    showing = true;
    List<Option> wanted = options.apply(shown);
    if (!says(wanted).equals(says(present()))) {
      box.removeAllItems();
      wanted.forEach(box::addItem);
    }
    Object value = current.apply(shown);
    for (Option option : present()) {
      if (Objects.equals(option.value(), value)) {
        box.setSelectedItem(option);
      }
    }
    showing = false;
  }

  private List<Option> present() {
    List<Option> present = new ArrayList<>();
    for (int i = 0; i < box.getItemCount(); i++) {
      present.add(box.getItemAt(i));
    }
    return present;
  }

  private static List<String> says(List<Option> choices) {
    return choices.stream().map(Option::says).toList();
  }

  private void choose() {
    Option chosen = (Option) box.getSelectedItem();
    if (!showing && chosen != null && !Objects.equals(chosen.value(), current.apply(row))) {
      Optional<String> wrong = chosen.choose().apply(row);
      if (wrong.isPresent()) {
        show(row);
      }
      onComplaint.accept(wrong.orElse(""));
    }
  }

  @Override
  public void onComplaint(Consumer<String> listener) {
    onComplaint = listener;
  }
}
