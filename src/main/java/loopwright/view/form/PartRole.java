package loopwright.view.form;

import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.Shape;
import loopwright.design.StagesAmplifier;
import loopwright.part.DiodeRecord;
import loopwright.part.PartRecord;
import loopwright.part.Polarity;
import loopwright.part.Shelf;
import loopwright.part.TransistorRecord;

/** What kind of part belongs at a place of the design, and which ones there are. */
final class PartRole {
  private final Design design;
  private final Shelf shelf;

  PartRole(Design design, Shelf shelf) {
    this.design = design;
    this.shelf = shelf;
  }

  /**
   * The names of the parts that fit a place: first those that the design brings along, then those
   * of the shelf.
   *
   * @param path of a field that names a part
   */
  List<String> candidates(String path) {
    Set<String> names = new LinkedHashSet<>(design.parts().keySet());
    names.addAll(shelf.names());
    return names.stream()
        .filter(name -> record(name).filter(part -> fits(path, part)).isPresent())
        .toList();
  }

  /**
   * A changed design with every record that its amplifier now names and that it did not bring
   * along: a design is whole by itself.
   */
  Design complete(Design changed) {
    Map<String, PartRecord> records = new LinkedHashMap<>(changed.parts());
    for (String path : DesignPath.all(changed)) {
      if (path.startsWith("amplifier.") && DesignPath.field(changed, path).shape() == Shape.TEXT) {
        String name = (String) DesignPath.get(changed, path);
        shelf.find(name).ifPresent(record -> records.putIfAbsent(name, record));
      }
    }
    return records.equals(changed.parts()) ? changed : DesignPath.set(changed, "parts", records);
  }

  private boolean fits(String path, PartRecord part) {
    if (path.endsWith(".diode")) {
      return part instanceof DiodeRecord;
    }
    return part instanceof TransistorRecord transistor
        && polarity(path).map(transistor.kind()::equals).orElse(true);
  }

  /** The polarity wanted at a place; empty when the pair's own transistor is not known. */
  private Optional<Polarity> polarity(String path) {
    if (path.endsWith(".upper") || path.contains(".bias.")) {
      return Optional.of(Polarity.NPN);
    }
    if (path.endsWith(".lower")) {
      return Optional.of(Polarity.PNP);
    }
    boolean likePair =
        path.equals("amplifier.inputPair.transistor")
            || path.startsWith("amplifier.inputPair.tail.")
            || path.startsWith("amplifier.gainStage.load.");
    return pairPolarity().map(pair -> likePair ? pair : pair.opposite());
  }

  private Optional<Polarity> pairPolarity() {
    return design.amplifier() instanceof StagesAmplifier stages
        ? record(stages.inputPair().transistor())
            .filter(TransistorRecord.class::isInstance)
            .map(part -> ((TransistorRecord) part).kind())
        : Optional.empty();
  }

  /** The record of a name, of the design or the shelf. */
  Optional<PartRecord> find(String name) {
    return record(name);
  }

  private Optional<PartRecord> record(String name) {
    return Optional.ofNullable(design.parts().get(name)).or(() -> shelf.find(name));
  }
}
