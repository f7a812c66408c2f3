package loopwright.quantity;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;

/** What may stand behind a number: a prefix, a unit, or both. */
final class Suffixes {
  /** Powers of ten of the prefixes that the trade uses; case decides between milli and mega. */
  private static final Map<String, Integer> PREFIXES =
      Map.of(
          "f", -15, "p", -12, "n", -9, "u", -6, "\u00B5", -6, "m", -3, "k", 3, "K", 3, "M", 6, "G",
          9);

  private static final Map<String, Meaning> WITH_UNIT = withUnit();

  private Suffixes() {}

  /**
   * What a suffix says.
   *
   * @param exponent power of ten that the number is multiplied by
   * @param unit the unit that was written; empty when only a prefix was
   */
  record Meaning(int exponent, Optional<Unit> unit) {}

  /** The power of ten of a prefix. */
  static Optional<Integer> prefix(String letter) {
    return Optional.ofNullable(PREFIXES.get(letter));
  }

  /** The unit of a suffix without prefix, as in {@code 4k7 ohm}; never the bare letter code R. */
  static Optional<Unit> unitAlone(String suffix) {
    return Optional.ofNullable(WITH_UNIT.get(suffix))
        .filter(meaning -> meaning.exponent() == 0)
        .flatMap(Meaning::unit);
  }

  /**
   * The meaning of a suffix.
   *
   * @param suffix in normal spelling, without spaces around it; may be empty
   */
  static Optional<Meaning> meaning(String suffix) {
    if (suffix.isEmpty()) {
      return Optional.of(new Meaning(0, Optional.empty()));
    }
    Integer exponent = PREFIXES.get(suffix);
    if (exponent != null) {
      return Optional.of(new Meaning(exponent, Optional.empty()));
    }
    return Optional.ofNullable(WITH_UNIT.get(suffix));
  }

  private static Map<String, Meaning> withUnit() {
    Map<String, Meaning> meanings = new HashMap<>();
    for (Unit unit : Unit.values()) {
      for (String spelling : unit.spellings()) {
        meanings.put(spelling, new Meaning(0, Optional.of(unit)));
        if (unit.isPrefixed()) {
          PREFIXES.forEach(
              (prefix, exponent) ->
                  meanings.putIfAbsent(
                      prefix + spelling, new Meaning(exponent, Optional.of(unit))));
        }
      }
    }
    meanings.put("R", new Meaning(0, Optional.of(Unit.OHM)));
    meanings.put("%", new Meaning(-2, Optional.of(Unit.ONE)));
    // The trade states slew rates per microsecond.
    meanings.put("V/us", new Meaning(6, Optional.of(Unit.VOLT_PER_SECOND)));
    meanings.put("V/\u00B5s", new Meaning(6, Optional.of(Unit.VOLT_PER_SECOND)));
    meanings.put("V/ms", new Meaning(3, Optional.of(Unit.VOLT_PER_SECOND)));
    return Map.copyOf(meanings);
  }
}
