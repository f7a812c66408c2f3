package loopwright.file;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Iterator;

/** The path, as people address it, of the value that a reader is inside of. */
final class OpenPath {
  private final Deque<String> steps = new ArrayDeque<>();

  void enter(String name) {
    steps.addLast(name);
  }

  void enterItem(int index) {
    steps.addLast("[" + index + "]");
  }

  /** The entry of a list that the reader is in turns out to have a name. */
  void call(String name) {
    if (!steps.isEmpty() && steps.getLast().startsWith("[")) {
      steps.removeLast();
      steps.addLast(name);
    }
  }

  void leave() {
    steps.removeLast();
  }

  int depth() {
    return steps.size();
  }

  /** For messages: {@code " in amplifier.gainStage"}, or nothing outside of everything. */
  String says() {
    return steps.isEmpty() ? "" : " in " + this;
  }

  /** For messages: {@code "amplifier.gainStage: "}, or nothing outside of everything. */
  String prefix() {
    return steps.isEmpty() ? "" : this + ": ";
  }

  @Override
  public String toString() {
    StringBuilder path = new StringBuilder();
    Iterator<String> each = steps.iterator();
    while (each.hasNext()) {
      String step = each.next();
      if (path.length() > 0 && !step.startsWith("[")) {
        path.append('.');
      }
      path.append(step);
    }
    return path.toString();
  }
}
