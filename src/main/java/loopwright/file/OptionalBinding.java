package loopwright.file;

import java.util.Optional;

/** A value that may be absent. */
record OptionalBinding<T>(Binding<T> inner) implements Binding<Optional<T>> {
  @Override
  public Optional<T> read(Json json, Spot spot) {
    return Optional.of(inner.read(json, spot));
  }

  /** Writes a present value; what is absent is not written at all. */
  @Override
  public Json write(Optional<T> value) {
    return inner.write(value.orElseThrow());
  }

  @Override
  public Json rewrite(Optional<T> value, Before<Optional<T>> before) {
    return inner.write(
        value.orElseThrow(), before.value().map(old -> new Before<>(old, before.json())));
  }

  @Override
  public String expected() {
    return inner.expected();
  }
}
