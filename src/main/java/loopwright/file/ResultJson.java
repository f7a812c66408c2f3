package loopwright.file;

import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.function.Function;

/** The values of which results are made. */
final class ResultJson {
  private ResultJson() {}

  static Json.Member member(String name, Json value) {
    return Json.Member.of(name, value);
  }

  static Json text(String text) {
    return Json.text(text);
  }

  static Json nothing() {
    return new Json.Null(Position.NONE);
  }

  /** A number with all the digits that it takes to read the very same value back. */
  static Json number(double value) {
    if (!Double.isFinite(value)) {
      return nothing();
    }
    double unsignedZero = value + 0.0;
    return Json.number(Double.toString(unsignedZero).toLowerCase(Locale.ROOT));
  }

  static Json number(OptionalDouble value) {
    return value.isPresent() ? number(value.getAsDouble()) : nothing();
  }

  static <T> Json list(List<T> values, Function<T, Json> each) {
    return Json.items(values.stream().map(each).toList());
  }
}
