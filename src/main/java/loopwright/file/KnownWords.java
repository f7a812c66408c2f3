package loopwright.file;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** The words that may stand somewhere, and the one that a misspelled word was meant to be. */
record KnownWords(List<String> words) {
  KnownWords {
    words = List.copyOf(words);
  }

  boolean contains(String word) {
    return words.contains(word);
  }

  /** For messages: {@code one of npn, pnp}. */
  String says() {
    return words.size() == 1 ? words.get(0) : "one of " + String.join(", ", words);
  }

  /** For messages: what was expected instead of a word, the one that was meant first. */
  String insteadOf(String word) {
    return says() + closest(word).map(close -> "; did you mean " + close + "?").orElse("");
  }

  /** The known word that takes the fewest slips of the finger, where few enough. */
  Optional<String> closest(String word) {
    return words.stream()
        .filter(known -> slips(word, known) <= Math.max(1, known.length() / 3))
        .min(Comparator.comparingInt(known -> slips(word, known)));
  }

  /**
   * The least number of letters to put in, leave out, replace or swap with their neighbour
   * (Damerau, 1964), upper and lower case being one.
   */
  private static int slips(String word, String known) {
    String a = word.toLowerCase(Locale.ROOT);
    String b = known.toLowerCase(Locale.ROOT);
    if (Math.abs(a.length() - b.length()) > b.length()) {
      return a.length();
    }
    int[][] least = new int[a.length() + 1][b.length() + 1];
    for (int i = 0; i <= a.length(); i++) {
      for (int j = 0; j <= b.length(); j++) {
        if (i == 0 || j == 0) {
          least[i][j] = i + j;
          continue;
        }
        int replaced = least[i - 1][j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
        least[i][j] = Math.min(replaced, 1 + Math.min(least[i - 1][j], least[i][j - 1]));
        if (i > 1
            && j > 1
            && a.charAt(i - 1) == b.charAt(j - 2)
            && a.charAt(i - 2) == b.charAt(j - 1)) {
          least[i][j] = Math.min(least[i][j], least[i - 2][j - 2] + 1);
        }
      }
    }
    return least[a.length()][b.length()];
  }
}
