package loopwright.file;

import java.util.Arrays;
import java.util.stream.Collectors;
import loopwright.quantity.Unit;

/** The symbol of a unit; an empty text for a ratio. */
record UnitSymbolBinding() implements Binding<String> {
  @Override
  public String read(Json json, Spot spot) {
    if (json instanceof Json.Text text && Unit.fromSymbol(text.value()).isPresent()) {
      return text.value();
    }
    throw spot.misfit(json, expected());
  }

  @Override
  public Json write(String value) {
    return Json.text(value);
  }

  @Override
  public String expected() {
    return Arrays.stream(Unit.values())
        .map(Unit::symbol)
        .filter(symbol -> !symbol.isEmpty())
        .collect(
            Collectors.joining(", ", "the symbol of a unit, one of ", ", or \"\" for a ratio"));
  }
}
