package loopwright.file;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.stream.Collectors;

/** The path, as people address it, of the value that a reader is inside of. */
final class OpenPath {
  private final Deque<Step> steps = new ArrayDeque<>();

  private record Step(String says, boolean item) {}

  void enter(String name) {
    steps.addLast(new Step(Spot.step(name), false));
  }

  void enterItem(int index) {
    steps.addLast(new Step(Integer.toString(index), true));
  }

  /** The entry of a list that the reader is in turns out to have a name. */
  void call(String name) {
    if (!steps.isEmpty() && steps.getLast().item() && Spot.isAddress(name)) {
      steps.removeLast();
      steps.addLast(new Step(Spot.step(name), true));
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
    return steps.stream().map(Step::says).collect(Collectors.joining("."));
  }
}
