package loopwright.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;

/** Entries in a row; those that have names of their own are addressed by them. */
record ListBinding<T>(Binding<T> entry) implements Binding<List<T>> {
  @Override
  public List<T> read(Json json, Spot spot) {
    if (!(json instanceof Json.Items items)) {
      throw spot.misfit(json, expected());
    }
    Faults faults = new Faults();
    List<T> entries = new ArrayList<>();
    for (int i = 0; i < items.items().size(); i++) {
      Json item = items.items().get(i);
      Spot place = name(item).map(spot::entry).orElse(spot.entry(i));
      faults.collect(() -> entry.read(item, place)).ifPresent(entries::add);
    }
    faults.throwAny();
    return entries;
  }

  private Optional<String> name(Json item) {
    if (!entry.isNamed() || !(item instanceof Json.Block block)) {
      return Optional.empty();
    }
    return block.text("name").filter(Spot::isAddress);
  }

  @Override
  public Json write(List<T> value) {
    return Json.items(value.stream().map(entry::write).toList());
  }

  @Override
  public Json rewrite(List<T> value, Before<List<T>> before) {
    List<Before<T>> old = before(before);
    List<Optional<Before<T>>> matches = new ArrayList<>();
    for (T now : value) {
      Optional<Before<T>> same = old.stream().filter(was -> was.value().equals(now)).findFirst();
      same.ifPresent(old::remove);
      matches.add(same);
    }
    return Json.items(
        IntStream.range(0, value.size())
            .mapToObj(
                i ->
                    entry.write(
                        value.get(i),
                        matches.get(i).or(() -> edited(value.get(i), i, before, old))))
            .toList());
  }

  private List<Before<T>> before(Before<List<T>> before) {
    List<Json> items = ((Json.Items) before.json()).items();
    List<Before<T>> each = new ArrayList<>();
    for (int i = 0; i < items.size(); i++) {
      each.add(new Before<>(before.value().get(i), items.get(i)));
    }
    return each;
  }

  /** The entry that a changed one has come from: that of its name, or else of its place. */
  private Optional<Before<T>> edited(
      T now, int index, Before<List<T>> before, List<Before<T>> left) {
    if (entry.isNamed() && entry.write(now) instanceof Json.Block block) {
      return left.stream().filter(was -> name(was.json()).equals(block.text("name"))).findFirst();
    }
    return before(before).stream().skip(index).findFirst().filter(left::contains);
  }

  @Override
  public String expected() {
    return "a list";
  }
}
