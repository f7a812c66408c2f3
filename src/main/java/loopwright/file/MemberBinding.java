package loopwright.file;

import java.util.Optional;
import loopwright.design.Field;
import loopwright.design.Schema;

/**
 * A member of a block that stands for a field of a record.
 *
 * @param schema of the record
 * @param field the field, whose name is the member's
 * @param binding how its value is read and written, optionals included
 */
record MemberBinding(Schema schema, Field field, Binding<Object> binding) {
  String name() {
    return field.name();
  }

  /** Reads this member of a block that stands at a spot. */
  Object read(Json.Block block, Spot spot) {
    Spot here = spot.member(name(), block);
    Optional<Json> json = block.get(name());
    if (json.isPresent()) {
      return binding.read(json.get(), here);
    }
    if (field.isNeeded()) {
      throw here.misfit("found nothing, expected " + binding.expected());
    }
    return field.absent();
  }

  /** The member in a block that the program makes; empty where its default says the same. */
  Optional<Json.Member> write(Object owner) {
    Object value = of(owner);
    return !field.isNeeded() && field.absent().equals(value)
        ? Optional.empty()
        : Optional.of(Json.Member.of(name(), binding.write(value)));
  }

  /** The member in place of one that the author wrote; empty where there is nothing to write. */
  Optional<Json.Member> rewrite(Object owner, Object before, Json.Member member) {
    Object value = of(owner);
    return value.equals(Optional.empty())
        ? Optional.empty()
        : Optional.of(
            member.with(
                binding.write(value, Optional.of(new Before<>(of(before), member.value())))));
  }

  private Object of(Object owner) {
    return schema.value(owner, name());
  }
}
