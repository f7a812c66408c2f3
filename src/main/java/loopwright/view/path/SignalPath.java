package loopwright.view.path;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;

/**
 * What the signal path shows, in words and in order; knows no pixels.
 *
 * @param hookup name of the hookup
 * @param row blocks from source to load
 * @param wires between each of them and the next
 * @param hanging current sources by the id of the stage that they hang from
 * @param feedback the way back
 * @param route how the signal comes in and goes back
 * @param otherInput the input that the source does not drive
 */
record SignalPath(
    String hookup,
    List<Block> row,
    List<Wire> wires,
    Map<String, Block> hanging,
    Block feedback,
    Route route,
    Wire otherInput) {
  /**
   * A node between two blocks.
   *
   * @param node its name
   * @param volts its voltage at rest; empty where there is none
   */
  record Wire(String node, String volts) {}

  /**
   * How the signal comes in and goes back.
   *
   * @param way whether the source drives the inverting input, and whether there is a loop at all
   * @param fromLoad whether the feedback is taken behind the load's isolation
   */
  record Route(Way way, boolean fromLoad) {}

  /** Ways around the amplifier. */
  enum Way {
    NON_INVERTING,
    INVERTING,
    OPEN
  }

  /** Every block in the order in which the arrow keys walk them. */
  List<Block> walk() {
    List<Block> all = new ArrayList<>();
    for (Block block : row) {
      all.add(block);
      Optional.ofNullable(hanging.get(block.id())).ifPresent(all::add);
    }
    all.add(feedback);
    return all;
  }

  /** The block of that name, if this path has it. */
  Optional<Block> find(String id) {
    return walk().stream().filter(block -> block.id().equals(id)).findFirst();
  }

  /** The id of the block that the arrow keys reach from another; the same where they reach none. */
  String next(String from, Direction direction) {
    List<Block> walk = walk();
    Block first = walk.get(0);
    Block last = walk.get(walk.size() - 1);
    OptionalInt place = place(walk, from);
    if (place.isEmpty()) {
      return direction == Direction.LAST ? last.id() : first.id();
    }
    int at = place.getAsInt();
    return switch (direction) {
      case ONWARD -> walk.get(Math.min(at + 1, walk.size() - 1)).id();
      case BACK -> walk.get(Math.max(at - 1, 0)).id();
      case FIRST -> first.id();
      case LAST -> last.id();
      case DOWN -> below(from);
      case UP -> above(from);
    };
  }

  private static OptionalInt place(List<Block> walk, String id) {
    for (int i = 0; i < walk.size(); i++) {
      if (walk.get(i).id().equals(id)) {
        return OptionalInt.of(i);
      }
    }
    return OptionalInt.empty();
  }

  private String below(String from) {
    Block hung = hanging.get(from);
    return hung == null ? feedback.id() : hung.id();
  }

  private String above(String from) {
    if (from.equals(feedback.id())) {
      return row.get(1).id();
    }
    return hanging.entrySet().stream()
        .filter(entry -> entry.getValue().id().equals(from))
        .map(Map.Entry::getKey)
        .findFirst()
        .orElse(from);
  }

  /** Where a key leads. */
  enum Direction {
    ONWARD,
    BACK,
    UP,
    DOWN,
    FIRST,
    LAST
  }
}
