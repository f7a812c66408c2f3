package loopwright.design;

/**
 * A change to a design as a value: what shall stand at a path.
 *
 * @param path a path of the file, for example {@code amplifier.gainStage.compensation.resistance}
 * @param value as a person would write it in the file, for example {@code 4k7}; an empty text takes
 *     something optional away
 */
public record Change(String path, String value) {
  /**
   * A copy of the design with the change made. A part value keeps its own tolerance; what was
   * measured is dropped, since another part is fitted now.
   *
   * @throws DesignException when the design has no such place or the text does not fit it
   */
  public Design applyTo(Design design) {
    Field field = DesignPath.field(design, path);
    if (value.isBlank() && !field.isNeeded()) {
      return DesignPath.set(design, path, null);
    }
    Object parsed = FieldText.parse(field, value, path);
    if (parsed instanceof PartValue part) {
      parsed =
          DesignPath.find(design, path)
              .map(PartValue.class::cast)
              .map(old -> new PartValue(part.value(), old.tolerance(), part.measured()))
              .orElse(part);
    }
    return DesignPath.set(design, path, parsed);
  }
}
