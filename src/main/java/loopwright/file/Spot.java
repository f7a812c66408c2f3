package loopwright.file;

import java.util.Optional;
import loopwright.design.DesignException;

/**
 * A place in a file while it is read.
 *
 * @param path as people address it: {@code amplifier.gainStage.emitterResistance}; empty for the
 *     whole file
 * @param around the block that the value is a member of, directly or as an item of a member
 */
record Spot(String path, Optional<Json.Block> around) {
  /** The whole file. */
  static final Spot WHOLE = new Spot("", Optional.empty());

  /** A name as a step of a path: on one line, and not longer than a message can bear. */
  static String step(String name) {
    return JsonText.shortened(name.replaceAll("\\p{Cntrl}", "?"));
  }

  /** Whether a name can be a step of a path. */
  static boolean isAddress(String name) {
    return !name.isBlank() && !name.contains(".");
  }

  /** A member of a block that stands here. */
  Spot member(String name, Json.Block block) {
    return new Spot(path.isEmpty() ? step(name) : path + "." + step(name), Optional.of(block));
  }

  /** An entry of a list or map that stands here, by its name. */
  Spot entry(String name) {
    return new Spot(path + "." + step(name), around);
  }

  /** An entry of a list that stands here and has no name, by its index from 0. */
  Spot entry(int index) {
    return entry(Integer.toString(index));
  }

  /** What is wrong here. */
  DesignException misfit(String says) {
    return new DesignException(path, says);
  }

  /** Something else stands here than is wanted. */
  DesignException misfit(Json found, String expected) {
    return misfit("found " + found.found() + ", expected " + expected);
  }
}
