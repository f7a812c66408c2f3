package loopwright.view.path;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import loopwright.check.Finding;

/** Which block a finding belongs to. */
final class FindingPlace {
  private static final String HOOKUPS = "hookups.";

  private final SignalPath path;
  private final String ownHookup;

  FindingPlace(SignalPath path) {
    this.path = path;
    this.ownHookup = HOOKUPS + path.hookup();
  }

  /** The worst finding of a block. */
  Optional<Finding> worst(List<Finding> findings, Block block) {
    return findings.stream()
        .filter(finding -> block(finding.where()).filter(block.id()::equals).isPresent())
        .min(Comparator.comparing(Finding::severity));
  }

  /**
   * The id of the block that a place in the design belongs to. What concerns the hookup as a whole
   * belongs to the feedback, which makes it one.
   */
  private Optional<String> block(String where) {
    if (where.equals(ownHookup)) {
      return Optional.of(BlockIds.FEEDBACK);
    }
    boolean isOwn = where.startsWith(ownHookup + ".");
    if (where.startsWith(HOOKUPS) && !isOwn) {
      return Optional.empty();
    }
    return longest(isOwn ? where.substring(ownHookup.length() + 1) : where);
  }

  private Optional<String> longest(String where) {
    Predicate<String> holds = prefix -> where.equals(prefix) || where.startsWith(prefix + ".");
    return path.walk().stream()
        .map(Block::id)
        .filter(id -> prefixes(id).stream().anyMatch(holds))
        .max(
            Comparator.comparingInt(
                id ->
                    prefixes(id).stream().filter(holds).mapToInt(String::length).max().orElse(0)));
  }

  /** Paths, device roles and nodes that belong to a block. */
  private static List<String> prefixes(String id) {
    return switch (id) {
      case BlockIds.AMPLIFIER -> List.of(id, "in+", "in-", "gainOut", "out");
      case BlockIds.INPUT_PAIR -> List.of(id, "pair", "in+", "in-", "pairOut", "pairOther");
      case BlockIds.TAIL -> List.of(id, "tail");
      case BlockIds.GAIN_STAGE -> List.of(id, "gain", "gainOut", "gainBase", "gainEmitter");
      case BlockIds.GAIN_LOAD -> List.of(id, "gainLoad");
      case BlockIds.OUTPUT_STAGE -> List.of(id, "out", "bias", "driver", "driveHigh", "driveLow");
      default -> List.of(id);
    };
  }
}
