package loopwright.part;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class RecordShelfTest {
  private static final PartRecord OWN = record("own");
  private static final PartRecord SHIPPED = record("shipped");

  @Test
  void keepsItsRecordsInOrder() {
    Map<String, PartRecord> records = new LinkedHashMap<>();
    records.put("z", OWN);
    records.put("a", SHIPPED);
    RecordShelf shelf = new RecordShelf(records);
    records.clear();

    assertThat(shelf.names()).containsExactly("z", "a");
    assertThat(shelf.find("z")).contains(OWN);
    assertThat(shelf.find("b")).isEmpty();
  }

  @Test
  void looksHereBeforeAnotherShelf() {
    RecordShelf shelf =
        new RecordShelf(Map.of("both", OWN))
            .before(new RecordShelf(Map.of("both", SHIPPED, "shipped", SHIPPED)));

    assertThat(shelf.names()).containsExactly("both", "shipped");
    assertThat(shelf.find("both")).contains(OWN);
    assertThat(shelf.find("shipped")).contains(SHIPPED);
  }

  private static PartRecord record(String source) {
    return new DiodeRecord(
        Optional.empty(), Optional.empty(), Optional.empty(), Optional.of(source), List.of());
  }
}
