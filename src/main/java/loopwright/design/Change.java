package loopwright.design;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * A change to a design as a value: what shall stand at a path.
 *
 * @param path a path of the file, for example {@code amplifier.gainStage.compensation.resistance}
 * @param value as a person would write it in the file, for example {@code 4k7}; an empty text takes
 *     something optional away
 */
public record Change(String path, String value) {
  /**
   * A copy of the design with all changes made together, so that they may make a block that none of
   * them would complete alone.
   *
   * @param changes that set values, or take something optional away
   * @throws DesignException when the design has no such place or a text does not fit it
   */
  public static Design applyAll(Design design, List<Change> changes) {
    Map<String, Object> values = new LinkedHashMap<>();
    List<String> taken = new ArrayList<>();
    for (Change change : changes) {
      Object value = change.parsed(design);
      if (value == null) {
        taken.add(change.path());
      } else {
        values.put(change.path(), value);
      }
    }
    Design changed = DesignPath.setAll(design, values);
    for (String path : taken) {
      changed = DesignPath.set(changed, path, null);
    }
    return changed;
  }

  /**
   * A copy of the design with the change made. A part value keeps its own tolerance; what was
   * measured is dropped, since another part is fitted now.
   *
   * @throws DesignException when the design has no such place or the text does not fit it
   */
  public Design applyTo(Design design) {
    return DesignPath.set(design, path, parsed(design));
  }

  /** What the text stands for there; null for nothing. */
  private Object parsed(Design design) {
    Field field = DesignPath.field(design, path);
    if (value.isBlank() && !field.isNeeded()) {
      return null;
    }
    Object parsed = FieldText.parse(field, value, path);
    if (parsed instanceof PartValue part) {
      parsed =
          DesignPath.find(design, path)
              .map(PartValue.class::cast)
              .map(old -> new PartValue(part.value(), old.tolerance(), part.measured()))
              .orElse(part);
    }
    return parsed;
  }
}
