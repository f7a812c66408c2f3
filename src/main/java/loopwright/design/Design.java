package loopwright.design;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.part.PartRecord;
import loopwright.quantity.Otherwise;

/**
 * A whole design: one amplifier, its rails and parts, and the test set-ups around it.
 *
 * @param loopwright version of the format
 * @param name what the author calls it
 * @param notes free text
 * @param rails supply
 * @param surroundings temperature, strays, heat
 * @param parts part records that the design brings along, by name
 * @param amplifier the amplifier
 * @param devices devices whose part or tester readings differ from their twin's, by role
 * @param extras resistors and capacitors beyond the stage library
 * @param hookups test set-ups, at least one
 * @param tolerances spread of the parts
 * @param limits what this build must meet
 * @param drawer values in stock
 * @param bench instruments, readings, curves and the record
 */
public record Design(
    int loopwright,
    String name,
    Optional<String> notes,
    Rails rails,
    @Otherwise("{}") Surroundings surroundings,
    Map<String, PartRecord> parts,
    Amplifier amplifier,
    Map<String, DeviceChoice> devices,
    List<Extra> extras,
    List<Hookup> hookups,
    @Otherwise("{}") Tolerances tolerances,
    List<Limit> limits,
    @Otherwise("{}") Drawer drawer,
    @Otherwise("{}") Bench bench) {
  /** The version of the format that this program writes. */
  public static final int VERSION = 1;

  /** Keeps its own copies of the collections, in their order. */
  public Design {
    parts = Copies.ordered(parts);
    devices = Copies.ordered(devices);
    extras = List.copyOf(extras);
    hookups = List.copyOf(hookups);
    limits = List.copyOf(limits);
  }

  /** The hookup of that name, if there is one. */
  public Optional<Hookup> hookup(String hookupName) {
    return hookups.stream().filter(hookup -> hookup.name().equals(hookupName)).findFirst();
  }

  /** The same design in other surroundings. */
  public Design withSurroundings(Surroundings other) {
    return new Design(
        loopwright,
        name,
        notes,
        rails,
        other,
        parts,
        amplifier,
        devices,
        extras,
        hookups,
        tolerances,
        limits,
        drawer,
        bench);
  }
}
