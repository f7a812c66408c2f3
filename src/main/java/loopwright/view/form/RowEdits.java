package loopwright.view.form;

import java.util.Arrays;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Supplier;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.design.DesignPath;
import loopwright.design.DesignValidation;
import loopwright.design.Drawer;
import loopwright.design.Field;
import loopwright.design.FieldText;
import loopwright.design.Problem;
import loopwright.part.Shelf;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Quantity;
import loopwright.quantity.QuantityException;
import loopwright.quantity.Unit;
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
  private final Map<String, Object> left = new HashMap<>();

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

  /** One of several forms was typed: a word, a value, or values with semicolons between them. */
  Optional<String> typedAlternative(Row row, String text) {
    return attempt(
        () -> {
          Object value =
              row.field().type() == Drawer.Stock.class ? stock(row, text) : plain(row, text);
          return Edit.of(what(row, text), DesignPath.set(present.get(), row.path(), value));
        });
  }

  private static Object plain(Row row, String text) {
    return text.isBlank() ? null : FieldText.parse(row.field(), text, row.path());
  }

  private static Object stock(Row row, String text) {
    if (text.isBlank() || PreferredValues.named(text.strip()).isPresent()) {
      return plain(row, text.strip());
    }
    Unit unit = row.field().unit().orElse(Unit.ONE);
    try {
      return new Drawer.Stock.Values(
          Arrays.stream(text.split(";"))
              .map(String::strip)
              .filter(part -> !part.isEmpty())
              .map(part -> Quantity.parse(part, unit, row.field().range()))
              .toList());
    } catch (QuantityException e) {
      throw new DesignException(row.path(), e.getMessage());
    }
  }

  /** Pairs of name and text were typed, {@code name: text} with semicolons between them. */
  Optional<String> typedPairs(Row row, String text) {
    return attempt(
        () -> {
          Map<String, String> pairs = new LinkedHashMap<>();
          for (String pair : text.split(";")) {
            int colon = pair.indexOf(':');
            if (!pair.isBlank() && colon <= 0) {
              throw new DesignException(
                  row.path(), "found \"" + pair.strip() + "\", expected name: text");
            }
            if (!pair.isBlank()) {
              pairs.put(pair.substring(0, colon).strip(), pair.substring(colon + 1).strip());
            }
          }
          return Edit.of(what(row, text), DesignPath.set(present.get(), row.path(), pairs));
        });
  }

  /** Another variant was chosen; what had been typed into it before comes back. */
  Optional<String> chosen(Row row, Class<?> variant) {
    row.value().ifPresent(old -> left.put(row.path() + " " + old.getClass().getName(), old));
    Object before = left.get(row.path() + " " + variant.getName());
    return attempt(
        () ->
            Edit.of(
                what(row, labels.kind(variant)),
                before == null
                    ? with(row, variant)
                    : DesignPath.set(present.get(), row.path(), before)));
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

  /** Whether a text names a part record. */
  boolean namesPart(Row row) {
    return row.path().startsWith("amplifier.")
        || (row.path().startsWith("devices.") && row.path().endsWith(".part"));
  }

  /** The key data of a part, for whoever chooses among several. */
  String about(String part) {
    return PartData.of(new PartRole(present.get(), shelf).find(part));
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

  /** What would be wrong with the design that is not wrong with it now. */
  private Optional<Problem> freshProblem(Design after) {
    List<Problem> known = DesignValidation.check(present.get());
    return DesignValidation.check(after).stream()
        .filter(problem -> !known.contains(problem))
        .findFirst();
  }

  private Optional<String> attempt(Supplier<Edit> edit) {
    try {
      Edit wanted = edit.get();
      Optional<Problem> fresh = freshProblem(wanted.after());
      if (fresh.isPresent()) {
        return Optional.of(fresh.get().message());
      }
      listener.accept(wanted);
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
