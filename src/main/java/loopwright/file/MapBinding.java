package loopwright.file;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Entries by name, in the author's order. */
record MapBinding<T>(Binding<T> entry) implements Binding<Map<String, T>> {
  @Override
  public Map<String, T> read(Json json, Spot spot) {
    if (!(json instanceof Json.Block block)) {
      throw spot.misfit(json, expected());
    }
    Faults faults = new Faults();
    Map<String, T> entries = new LinkedHashMap<>();
    for (Json.Member member : block.members()) {
      faults
          .collect(() -> entry.read(member.value(), spot.entry(member.name())))
          .ifPresent(value -> entries.put(member.name(), value));
    }
    faults.throwAny();
    return entries;
  }

  @Override
  public Json write(Map<String, T> value) {
    return rewrite(value, new Before<>(Map.of(), Json.block(List.of())));
  }

  @Override
  public Json rewrite(Map<String, T> value, Before<Map<String, T>> before) {
    Json.Block old = (Json.Block) before.json();
    List<Json.Member> members = new ArrayList<>();
    value.forEach(
        (name, now) -> {
          Optional<Json.Member> was =
              old.members().stream().filter(member -> member.name().equals(name)).findFirst();
          members.add(
              was.map(
                      member ->
                          member.with(
                              entry.write(
                                  now,
                                  Optional.of(
                                      new Before<>(before.value().get(name), member.value())))))
                  .orElseGet(() -> Json.Member.of(name, entry.write(now))));
        });
    return Json.block(members);
  }

  @Override
  public String expected() {
    return "a block of names, each with " + entry.expected();
  }
}
