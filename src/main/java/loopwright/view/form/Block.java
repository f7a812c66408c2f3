package loopwright.view.form;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import loopwright.design.Design;
import loopwright.design.StagesAmplifier;

/**
 * A part of the design that has a form of its own.
 *
 * @param id its name on the signal path
 * @param path where it stands in the design
 * @param roles beginnings of the roles of its devices
 */
record Block(String id, String path, List<String> roles) {
  /** The blocks of a design in one of its hookups, in signal order, then what surrounds them. */
  static List<Block> of(Design design, String hookup) {
    String set = "hookups." + hookup + ".";
    Stream<Block> amplifier =
        design.amplifier() instanceof StagesAmplifier
            ? Stream.of(
                block("amplifier.inputPair", "pair.", "tail."),
                block("amplifier.inputPair.tail", "tail."),
                block("amplifier.gainStage", "gain.", "gainLoad."),
                block("amplifier.gainStage.load", "gainLoad."),
                block("amplifier.outputStage", "bias.", "driver.", "out."))
            : Stream.of(block("amplifier"));
    return Stream.of(
            Stream.of(new Block("source", set + "source", List.of())),
            amplifier,
            Stream.of(
                new Block("feedback", set + "feedback", List.of()),
                new Block("load", set + "load", List.of()),
                block("rails"),
                block("surroundings")))
        .flatMap(blocks -> blocks)
        .toList();
  }

  private static Block block(String path, String... roles) {
    return new Block(path, path, List.of(roles));
  }

  /**
   * The block that a place belongs to, if any.
   *
   * @param where a path of the design, the role of a device, or the name of a block
   */
  static Optional<Block> holding(List<Block> blocks, String where) {
    return blocks.stream()
        .filter(
            block ->
                where.equals(block.id())
                    || (where + ".").startsWith(block.path() + ".")
                    || block.holds(where))
        .max(Comparator.comparingInt(block -> block.path().length()));
  }

  /** Whether a device belongs to this block. */
  boolean holds(String role) {
    return roles.stream().anyMatch(role::startsWith);
  }
}
