package loopwright.file;

import java.util.Optional;
import loopwright.design.Field;

/** One of the constants of an enumeration, written as a camelCase word. */
final class WordBinding implements Binding<Object> {
  private final Field field;
  private final KnownWords words;

  /**
   * @param field a choice
   */
  WordBinding(Field field) {
    this.field = field;
    this.words = new KnownWords(field.choices());
  }

  @Override
  public Object read(Json json, Spot spot) {
    if (!(json instanceof Json.Text text)) {
      throw spot.misfit(json, expected());
    }
    Optional<Object> constant = field.choice(text.value());
    return constant.orElseThrow(() -> spot.misfit(json, words.insteadOf(text.value())));
  }

  @Override
  public Json write(Object value) {
    return Json.text(Field.word((Enum<?>) value));
  }

  @Override
  public String expected() {
    return words.says();
  }
}
