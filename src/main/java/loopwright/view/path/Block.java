package loopwright.view.path;

import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/**
 * One block of the signal path, in words.
 *
 * @param id what it is called
 * @param kind what it looks like
 * @param title its name
 * @param says what it is made of, a line each
 * @param headline the number that matters most; empty for none
 */
record Block(String id, Kind kind, String title, List<String> says, String headline) {
  /** What a block looks like. */
  enum Kind {
    /** Source or load: where the signal comes from and goes to. */
    END,
    /** A stage of the amplifier, or the whole of it. */
    STAGE,
    /** A stage that this amplifier lacks. */
    ABSENT,
    /** A resistor that hangs from a stage. */
    RESISTOR,
    /** A current source that hangs from a stage and draws its current out of it. */
    CURRENT_SINK,
    /** A current source that hangs from a stage and feeds its current into it. */
    CURRENT_SOURCE,
    /** The way back. */
    FEEDBACK
  }

  /** Leaves out what is empty. */
  Block {
    says = says.stream().filter(line -> !line.isBlank()).toList();
  }

  /** All that stands under the title, in one line. */
  String description() {
    return Stream.concat(says.stream(), Stream.of(headline))
        .filter(line -> !line.isBlank())
        .collect(Collectors.joining("; "));
  }

  /** Whether it hangs from a stage instead of standing in the row. */
  boolean hangs() {
    return switch (kind) {
      case RESISTOR, CURRENT_SINK, CURRENT_SOURCE -> true;
      default -> false;
    };
  }
}
