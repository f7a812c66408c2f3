package loopwright.sheet;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import loopwright.design.Design;

/**
 * What stands on the sheet for the bench.
 *
 * @param design what it is about
 * @param hookup name of the hookup that is drawn and powered first
 * @param date day it was made
 * @param checksum of the design, see {@link loopwright.file.DesignChecksum}
 * @param bands what low and high rest on, or why there are none, a sentence
 * @param failure why the first hookup finds no rest; empty where it does
 * @param pinouts of every type that is used
 * @param parts by value
 * @param unpowered checks before power
 * @param powerUp steps of first power
 * @param nodes of the first hookup, in the order in which to measure them
 * @param hookups set-ups to build
 * @param cautions that apply
 */
public record BenchSheet(
    Design design,
    String hookup,
    LocalDate date,
    String checksum,
    String bands,
    Optional<String> failure,
    List<SheetPinout> pinouts,
    List<SheetPart> parts,
    List<String> unpowered,
    List<String> powerUp,
    List<SheetNode> nodes,
    List<SheetHookup> hookups,
    List<String> cautions) {
  /** Keeps its own copies. */
  public BenchSheet {
    pinouts = List.copyOf(pinouts);
    parts = List.copyOf(parts);
    unpowered = List.copyOf(unpowered);
    powerUp = List.copyOf(powerUp);
    nodes = List.copyOf(nodes);
    hookups = List.copyOf(hookups);
    cautions = List.copyOf(cautions);
  }

  /** What its author calls the design. */
  public String title() {
    return design.name();
  }

  /** Who builds it, where the design's record says so. */
  public Optional<String> author() {
    return design.bench().record().flatMap(record -> record.who());
  }
}
