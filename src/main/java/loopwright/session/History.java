package loopwright.session;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import loopwright.design.Design;

/**
 * What was done, step by step, and where in it the person stands. Immutable.
 *
 * @param steps the first is the design as it was opened
 * @param position index of the present step
 */
record History(List<Edit> steps, int position) {
  /** Keeps its own copy of the steps. */
  History {
    steps = List.copyOf(steps);
    if (position < 0 || position >= steps.size()) {
      throw new IllegalArgumentException("step " + position + " of " + steps.size());
    }
  }

  /** Nothing done yet. */
  static History of(Design design) {
    return new History(List.of(Edit.of("Open", design)), 0);
  }

  /** The present design. */
  Design design() {
    return steps.get(position).after();
  }

  /**
   * The edit made on the present design; what had been undone is forgotten. An edit of the same
   * gesture as the one before takes its place.
   */
  History with(Edit edit) {
    boolean continues =
        edit.gesture().isPresent()
            && position > 0
            && edit.gesture().equals(steps.get(position).gesture());
    List<Edit> kept = new ArrayList<>(steps.subList(0, continues ? position : position + 1));
    kept.add(edit);
    return new History(kept, kept.size() - 1);
  }

  /** What would be undone, if anything can be. */
  Optional<String> undoable() {
    return position > 0 ? Optional.of(steps.get(position).what()) : Optional.empty();
  }

  /** What would be done again, if anything can be. */
  Optional<String> redoable() {
    return position + 1 < steps.size()
        ? Optional.of(steps.get(position + 1).what())
        : Optional.empty();
  }

  /** One step back, if there is one. */
  History undone() {
    return position > 0 ? new History(steps, position - 1) : this;
  }

  /** One step forward, if there is one. */
  History redone() {
    return position + 1 < steps.size() ? new History(steps, position + 1) : this;
  }
}
