package loopwright.file;

/** A text that must be one of the keys that the program knows. */
record KeyBinding(KnownWords keys) implements Binding<String> {
  @Override
  public String read(Json json, Spot spot) {
    if (!(json instanceof Json.Text text)) {
      throw spot.misfit(json, expected());
    }
    if (!keys.contains(text.value())) {
      throw spot.misfit(json, keys.insteadOf(text.value()));
    }
    return text.value();
  }

  @Override
  public Json write(String value) {
    return Json.text(value);
  }

  @Override
  public String expected() {
    return keys.says();
  }
}
