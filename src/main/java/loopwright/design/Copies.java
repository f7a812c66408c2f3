package loopwright.design;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/** Unmodifiable copies that keep the author's order, which {@link Map#copyOf} does not. */
final class Copies {
  private Copies() {}

  static <V> Map<String, V> ordered(Map<String, V> map) {
    return Collections.unmodifiableMap(new LinkedHashMap<>(map));
  }
}
