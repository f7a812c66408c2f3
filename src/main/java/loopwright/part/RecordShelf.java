package loopwright.part;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** A shelf that holds its records in memory, in the order in which they were given. */
public final class RecordShelf implements Shelf {
  private final Map<String, PartRecord> records;

  /**
   * A shelf of these records.
   *
   * @param records by name; copied
   */
  public RecordShelf(Map<String, PartRecord> records) {
    this.records = Collections.unmodifiableMap(new LinkedHashMap<>(records));
  }

  @Override
  public Optional<PartRecord> find(String name) {
    return Optional.ofNullable(records.get(name));
  }

  @Override
  public List<String> names() {
    return List.copyOf(records.keySet());
  }

  /**
   * A shelf that looks here first and then on another; names that both have appear once, where this
   * shelf has them.
   */
  public RecordShelf before(Shelf other) {
    Map<String, PartRecord> both = new LinkedHashMap<>(records);
    for (String name : other.names()) {
      other.find(name).ifPresent(record -> both.putIfAbsent(name, record));
    }
    return new RecordShelf(both);
  }
}
