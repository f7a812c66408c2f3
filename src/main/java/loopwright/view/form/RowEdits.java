package loopwright.view.form;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Supplier;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.design.DesignPath;
import loopwright.design.Field;
import loopwright.design.FieldText;
import loopwright.part.Shelf;
import loopwright.session.Edit;

/**
 * Turns what a person does to a row into edits of the present design. Each method returns why it
 * cannot be done, or empty when it was.
 */
final class RowEdits {
  private final Supplier<Design> present;
  private final Shelf shelf;
  private final Labels labels;
  private final Consumer<Edit> listener;

  RowEdits(Supplier<Design> present, Shelf shelf, Labels labels, Consumer<Edit> listener) {
    this.present = present;
    this.shelf = shelf;
    this.labels = labels;
    this.listener = listener;
  }

  /** A single value was typed, or chosen by its word in the file. */
  Optional<String> typed(Row row, String text) {
    return attempt(
        () -> Edit.of(what(row, text), new Change(row.path(), text).applyTo(present.get())));
  }

  /** A value was stepped to. */
  Optional<String> stepped(Row row, String text) {
    return attempt(
        () ->
            new Edit(
                what(row, text),
                new Change(row.path(), text).applyTo(present.get()),
                Optional.of(row.path())));
  }

  /** Several values were typed, with semicolons or spaces between them. */
  Optional<String> typedList(Row row, String text) {
    Field element = row.field().element().orElseThrow();
    return attempt(
        () -> {
          List<Object> values =
              Arrays.stream(text.split(";"))
                  .map(String::strip)
                  .filter(part -> !part.isEmpty())
                  .map(part -> FieldText.parse(element, part, row.path()))
                  .toList();
          return Edit.of(what(row, text), DesignPath.set(present.get(), row.path(), values));
        });
  }

  /** Another variant was chosen. */
  Optional<String> chosen(Row row, Class<?> variant) {
    return attempt(() -> Edit.of(what(row, labels.kind(variant)), with(row, variant)));
  }

  /** An optional block was put in, or taken out. */
  Optional<String> fitted(Row row, boolean present) {
    return attempt(
        () ->
            present
                ? Edit.of("Fit " + name(row).toLowerCase(), with(row, row.field().type()))
                : Edit.of(
                    "Take out " + name(row).toLowerCase(),
                    DesignPath.set(this.present.get(), row.path(), null)));
  }

  /** Another part was chosen; its record comes into the design, so that it is whole by itself. */
  Optional<String> part(Row row, String name) {
    return attempt(
        () ->
            Edit.of(
                what(row, name),
                new PartRole(present.get(), shelf)
                    .complete(DesignPath.set(present.get(), row.path(), name))));
  }

  /** The names of the parts that fit a row. */
  List<String> parts(Row row) {
    return new PartRole(present.get(), shelf).candidates(row.path());
  }

  /** What the row is called. */
  String name(Row row) {
    return row.owner().isSealed()
        ? labels.block(blockOf(row.path()))
        : labels.field(row.owner(), row.field().name());
  }

  private Design with(Row row, Class<?> type) {
    Design design = present.get();
    PartRole parts = new PartRole(design, shelf);
    Object fresh = new Beginnings(parts).begin(type, row.value(), row.path());
    return parts.complete(DesignPath.set(design, row.path(), fresh));
  }

  private String what(Row row, String text) {
    return name(row) + " " + (text.isBlank() ? "taken out" : text);
  }

  private Optional<String> attempt(Supplier<Edit> edit) {
    try {
      listener.accept(edit.get());
      return Optional.empty();
    } catch (DesignException e) {
      return Optional.of(e.problems().get(0).says());
    }
  }

  /** A hookup's blocks are called the same whatever the hookup. */
  private static String blockOf(String path) {
    return path.startsWith("hookups.") ? path.substring(path.lastIndexOf('.') + 1) : path;
  }
}
