package loopwright.view.form;

import java.util.MissingResourceException;
import java.util.ResourceBundle;
import loopwright.design.Field;

/** What a person reads for the fields, kinds and choices of a design. */
final class Labels {
  private final ResourceBundle texts = ResourceBundle.getBundle("loopwright.view.form.labels");

  /** The label of a field of a record. */
  String field(Class<?> owner, String name) {
    return text(typeName(owner) + "." + name);
  }

  /** The word for a variant of a family. */
  String kind(Class<?> variant) {
    return text("kind." + typeName(variant));
  }

  /** The word for a member of a choice. */
  String choice(Enum<?> constant) {
    return text("choice." + typeName(constant.getDeclaringClass()) + "." + Field.word(constant));
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
