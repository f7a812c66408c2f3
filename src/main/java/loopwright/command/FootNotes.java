package loopwright.command;

import java.util.ArrayList;
import java.util.List;

/** Numbered notes under a table; the same words get the same number. */
final class FootNotes {
  private final List<String> notes = new ArrayList<>();

  /** The mark that refers to these words, such as {@code (3)}; empty for no words. */
  String mark(String words) {
    if (words.isBlank()) {
      return "";
    }
    if (!notes.contains(words)) {
      notes.add(words);
    }
    return "(" + (notes.indexOf(words) + 1) + ")";
  }

  void print(TextPage page) {
    int markWidth = ("(" + notes.size() + ") ").length();
    for (String words : notes) {
      String mark = mark(words);
      page.hanging(mark + " ".repeat(markWidth - mark.length()), words);
    }
  }
}
