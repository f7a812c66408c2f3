package loopwright.file;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import loopwright.design.Schema;

/**
 * A record as a block: one member for each component, none that is unknown.
 *
 * @param <R> the record
 */
final class BlockBinding<R> implements Binding<R> {
  /** The member that tells the variants of a family apart. */
  static final String KIND = "kind";

  private final Schema schema;
  private final List<MemberBinding> fields;
  private final Optional<String> kind;
  private final KnownWords known;

  /**
   * @param schema of the record
   * @param fields one for each of its fields, in order
   * @param kind the word for this variant of a family, where no component holds it
   */
  BlockBinding(Schema schema, List<MemberBinding> fields, Optional<String> kind) {
    this.schema = schema;
    this.fields = List.copyOf(fields);
    this.kind = kind;
    this.known =
        new KnownWords(
            Stream.concat(kind.stream().map(word -> KIND), fields.stream().map(MemberBinding::name))
                .toList());
  }

  @Override
  public R read(Json json, Spot spot) {
    if (!(json instanceof Json.Block block)) {
      throw spot.misfit(json, expected());
    }
    Faults faults = new Faults();
    for (Json.Member member : block.members()) {
      if (!known.contains(member.name())) {
        faults.add(
            spot.member(member.name(), block)
                .misfit("found an unknown field, expected " + known.insteadOf(member.name())));
      }
    }
    Map<String, Object> values = new HashMap<>();
    for (MemberBinding field : fields) {
      faults
          .collect(() -> field.read(block, spot))
          .ifPresent(value -> values.put(field.name(), value));
    }
    faults.throwAny();
    return build(values);
  }

  @SuppressWarnings("unchecked")
  private R build(Map<String, Object> values) {
    return (R) schema.build(values);
  }

  @Override
  public Json write(R value) {
    List<Json.Member> members = new ArrayList<>();
    kind.ifPresent(word -> members.add(Json.Member.of(KIND, Json.text(word))));
    fields.forEach(field -> field.write(value).ifPresent(members::add));
    return Json.block(members);
  }

  @Override
  public Json rewrite(R value, Before<R> before) {
    if (!(before.json() instanceof Json.Block block)) {
      return write(value);
    }
    List<Json.Member> members = new ArrayList<>();
    for (Json.Member member : block.members()) {
      Optional<MemberBinding> field = field(member.name());
      if (field.isPresent()) {
        field.get().rewrite(value, before.value(), member).ifPresent(members::add);
      } else {
        members.add(member);
      }
    }
    for (MemberBinding field : fields) {
      if (block.get(field.name()).isEmpty()) {
        field.write(value).ifPresent(member -> members.add(placeFor(field, members), member));
      }
    }
    return Json.block(members);
  }

  private Optional<MemberBinding> field(String name) {
    return fields.stream().filter(field -> field.name().equals(name)).findFirst();
  }

  /** Behind the members that come before it in the record. */
  private int placeFor(MemberBinding field, List<Json.Member> members) {
    List<String> earlier = known.words().subList(0, known.words().indexOf(field.name()));
    for (int i = members.size(); i > 0; i--) {
      if (earlier.contains(members.get(i - 1).name())) {
        return i;
      }
    }
    return 0;
  }

  @Override
  public String expected() {
    return known.words().isEmpty()
        ? "an empty block {}"
        : "a block {…} of " + String.join(", ", known.words());
  }

  @Override
  public boolean isNamed() {
    return field("name").isPresent();
  }
}
