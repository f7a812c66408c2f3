package loopwright.view.frame;

import java.util.List;
import java.util.Locale;
import java.util.MissingResourceException;
import java.util.ResourceBundle;
import java.util.stream.Collectors;
import loopwright.check.Finding;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.Field;
import loopwright.design.FieldText;
import loopwright.design.PartValue;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Quantity;

/** What the button of a remedy says, and what undoing it is called. */
final class RemedyWords {
  private final ResourceBundle names = ResourceBundle.getBundle("loopwright.view.frame.remedies");

  /** In short, for example {@code Set compensation capacitor to 47 pF}. */
  String button(Design design, Finding finding) {
    return "Set "
        + finding.changes().stream()
            .map(change -> name(change.path()) + " to " + value(design, change))
            .collect(Collectors.joining(", "));
  }

  /** In full: every path and its value. */
  static String changes(List<Change> changes) {
    return changes.stream()
        .map(change -> change.path() + " = " + change.value())
        .collect(Collectors.joining(", "));
  }

  /** The part as the trade calls it, whatever its hookup; else the last word of its path. */
  private String name(String path) {
    try {
      return names.getString(path.replaceFirst("^hookups\\.[^.]+\\.", ""));
    } catch (MissingResourceException e) {
      return path.substring(path.lastIndexOf('.') + 1)
          .replaceAll("([a-z])([A-Z])", "$1 $2")
          .toLowerCase(Locale.ROOT);
    }
  }

  /** With its unit, where it has one. */
  private static String value(Design design, Change change) {
    Field field = DesignPath.field(design, change.path());
    Object value = FieldText.parse(field, change.value(), change.path());
    Object plain = value instanceof PartValue part ? part.value() : value;
    return plain instanceof Quantity quantity && field.unit().isPresent()
        ? EngineeringFormat.format(quantity.value(), field.unit().get())
        : change.value();
  }
}
