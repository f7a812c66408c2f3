package loopwright.view.form;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.design.DesignPath;
import loopwright.design.Field;
import loopwright.design.Hookup;
import loopwright.design.Limit;
import loopwright.design.Schema;
import loopwright.design.Shape;
import loopwright.session.Edit;
import loopwright.view.form.Containers.Container;

/** Adds, copies, renames and removes entries of lists and maps, as edits of a design. */
final class WholeEdits {
  private WholeEdits() {}

  /** A new entry, or a copy of one. */
  static Edit add(Design design, Container container, Optional<String> copied) {
    List<String> keys = Containers.keys(design, container);
    Field element = container.field().element().orElseThrow();
    boolean isMap = container.field().shape() == Shape.MAP;
    String wanted = fresh(copied.orElse(word(container)), keys);
    Object entry =
        copied.isPresent()
            ? DesignPath.get(design, container.path() + "." + copied.get())
            : new EntryBeginnings(design, wanted).begin(element, container.path());
    boolean named = Containers.name(entry).isPresent();
    String key = isMap || named ? wanted : Integer.toString(keys.size());
    Design added =
        named && copied.isPresent()
            ? withList(design, container, entry, wanted)
            : DesignPath.set(design, container.path() + "." + key, entry);
    return Edit.of((copied.isPresent() ? "Copy " : "Add ") + container.path() + " " + key, added);
  }

  /** A list with a copy of an entry under another name at its end. */
  private static Design withList(Design design, Container container, Object entry, String name) {
    List<Object> entries = new ArrayList<>((List<?>) DesignPath.get(design, container.path()));
    entries.add(named(entry, name));
    return DesignPath.set(design, container.path(), entries);
  }

  private static Object named(Object entry, String name) {
    Schema schema = Schema.of(entry.getClass());
    Map<String, Object> values = new LinkedHashMap<>();
    schema.fields().forEach(field -> values.put(field.name(), schema.value(entry, field.name())));
    values.put("name", name);
    return schema.build(values);
  }

  /** Without an entry. */
  static Edit remove(Design design, Container container, String key) {
    if (container.path().equals("hookups") && design.hookups().size() == 1) {
      throw new DesignException(container.path(), "found one hookup, expected another to remain");
    }
    return Edit.of(
        "Remove " + container.path() + " " + key,
        DesignPath.set(design, container.path() + "." + key, null));
  }

  /** An entry under another name; what refers to it by its name follows. */
  static Edit rename(Design design, Container container, String key, String name) {
    if (name.isBlank() || name.contains(".")) {
      throw new DesignException(
          container.path() + "." + key, "found \"" + name + "\", expected a name without dots");
    }
    if (Containers.keys(design, container).contains(name)) {
      throw new DesignException(
          container.path() + "." + name, "found this name twice, expected names that differ");
    }
    String what = "Rename " + key + " to " + name;
    if (container.path().equals("hookups")) {
      return Edit.of(what, hookup(design, key, name));
    }
    if (container.field().shape() == Shape.MAP) {
      Map<Object, Object> entries = new LinkedHashMap<>();
      ((Map<?, ?>) DesignPath.get(design, container.path()))
          .forEach((old, entry) -> entries.put(old.equals(key) ? name : old, entry));
      Design renamed = DesignPath.set(design, container.path(), entries);
      return Edit.of(what, referring(renamed, container.path(), key, name));
    }
    return Edit.of(what, DesignPath.set(design, container.path() + "." + key + ".name", name));
  }

  private static Design hookup(Design design, String key, String name) {
    List<Object> hookups = new ArrayList<>();
    for (Hookup hookup : design.hookups()) {
      hookups.add(hookup.name().equals(key) ? named(hookup, name) : hookup);
    }
    Design renamed = DesignPath.set(design, "hookups", hookups);
    for (int i = 0; i < design.bench().readings().size(); i++) {
      if (design.bench().readings().get(i).hookup().filter(key::equals).isPresent()) {
        renamed = DesignPath.set(renamed, "bench.readings." + i + ".hookup", name);
      }
    }
    for (int i = 0; i < design.limits().size(); i++) {
      Limit limit = design.limits().get(i);
      if (limit.hookup().equals(key)) {
        renamed = DesignPath.set(renamed, "limits." + i + ".hookup", name);
      }
    }
    return renamed;
  }

  /** Texts that name a renamed part or instrument. */
  private static Design referring(Design design, String container, String key, String name) {
    Design changed = design;
    for (String path : DesignPath.all(design)) {
      boolean refers =
          container.equals("parts")
              ? path.startsWith("amplifier.")
                  || (path.startsWith("devices.") && path.endsWith(".part"))
              : container.equals("bench.instruments")
                  && path.startsWith("bench.readings.")
                  && path.endsWith(".instrument");
      if (refers
          && DesignPath.field(design, path).shape() == Shape.TEXT
          && key.equals(DesignPath.get(design, path))) {
        changed = DesignPath.set(changed, path, name);
      }
    }
    return changed;
  }

  private static String word(Container container) {
    if (container.path().equals("devices")) {
      return "pair.q1";
    }
    String last = container.path().substring(container.path().lastIndexOf('.') + 1);
    return last.endsWith("s") ? last.substring(0, last.length() - 1) : last;
  }

  private static String fresh(String wanted, List<String> taken) {
    String name = wanted;
    for (int i = 2; taken.contains(name); i++) {
      name = wanted + " " + i;
    }
    return name;
  }
}
