package loopwright.view.form;

import java.util.Locale;
import java.util.MissingResourceException;
import java.util.ResourceBundle;
import loopwright.design.Field;

/** What a person reads for the fields, kinds and choices of a design. */
final class Labels {
  private final ResourceBundle texts = ResourceBundle.getBundle("loopwright.view.form.labels");

  /** The label of a field of a record. */
  String field(Class<?> owner, String name) {
    String key = typeName(owner) + "." + name;
    return texts.containsKey(key) ? text(key) : humanised(name);
  }

  /**
   * The words of a name of the file: {@code collectorEmitterVoltage} is Collector emitter voltage.
   */
  static String humanised(String name) {
    String words = name.replaceAll("([a-z])([A-Z])", "$1 $2").toLowerCase(Locale.ROOT);
    return words.isEmpty() ? "" : Character.toUpperCase(words.charAt(0)) + words.substring(1);
  }

  /** The word for a variant of a family. */
  String kind(Class<?> variant) {
    String key = "kind." + typeName(variant);
    return texts.containsKey(key) ? text(key) : humanised(variant.getSimpleName());
  }

  /** The word for a member of a choice. */
  String choice(Enum<?> constant) {
    String key = "choice." + typeName(constant.getDeclaringClass()) + "." + Field.word(constant);
    return texts.containsKey(key) ? text(key) : humanised(Field.word(constant));
  }

  /** The title of a block of the design. */
  String block(String name) {
    return text("block." + name);
  }

  /** The name of a device by its role. */
  String device(String role) {
    return text("device." + role.replaceAll("\\d+$", ""))
        .replace("{0}", role.replaceAll("^.*?(\\d*)$", "$1"));
  }

  private String text(String key) {
    try {
      return texts.getString(key);
    } catch (MissingResourceException e) {
      throw new IllegalStateException("no label for " + key, e);
    }
  }

  /** Simple name, with that of the enclosing type before it where there is one. */
  static String typeName(Class<?> type) {
    Class<?> outer = type.getEnclosingClass();
    return outer == null
        ? type.getSimpleName()
        : outer.getSimpleName() + "." + type.getSimpleName();
  }
}
