package loopwright.file;

import java.util.List;
import java.util.Optional;

/**
 * A JSON value that remembers how its author wrote it: the order of members, the spelling of every
 * number and text, and where it stood.
 */
public sealed interface Json {
  /** Where it starts in the text. */
  Position position();

  /** What was found, shortened for a message. */
  String found();

  /** A JSON object: members in the author's order, no name twice. */
  record Block(List<Member> members, Position position) implements Json {
    /** Keeps its own copy of the members. */
    public Block {
      members = List.copyOf(members);
    }

    /** The value of the member of that name, if there is one. */
    public Optional<Json> get(String name) {
      return members.stream()
          .filter(member -> member.name().equals(name))
          .map(Member::value)
          .findFirst();
    }

    /** The text of the member of that name; empty when there is none or it is no text. */
    public Optional<String> text(String name) {
      return get(name).filter(Text.class::isInstance).map(value -> ((Text) value).value());
    }

    @Override
    public String found() {
      return members.isEmpty() ? "an empty block {}" : "a block {…}";
    }
  }

  /**
   * A member of a block.
   *
   * @param name its name
   * @param literal the name as it was written, quotes and escapes included
   * @param value its value
   */
  record Member(String name, String literal, Json value) {
    /** A member that the program makes. */
    public static Member of(String name, Json value) {
      return new Member(name, JsonText.quoted(name), value);
    }

    /** The same name with another value. */
    public Member with(Json other) {
      return new Member(name, literal, other);
    }
  }

  /** A JSON array. */
  record Items(List<Json> items, Position position) implements Json {
    /** Keeps its own copy of the items. */
    public Items {
      items = List.copyOf(items);
    }

    @Override
    public String found() {
      return items.isEmpty() ? "an empty list []" : "a list […]";
    }
  }

  /**
   * A JSON string.
   *
   * @param value the characters that are meant
   * @param literal what was written, quotes and escapes included
   */
  record Text(String value, String literal, Position position) implements Json {
    @Override
    public String found() {
      return JsonText.quoted(JsonText.shortened(value));
    }
  }

  /**
   * A JSON number.
   *
   * @param literal what was written
   */
  record Number(String literal, Position position) implements Json {
    @Override
    public String found() {
      return JsonText.shortened(literal);
    }
  }

  /** {@code true} or {@code false}. */
  record Truth(boolean value, Position position) implements Json {
    @Override
    public String found() {
      return Boolean.toString(value);
    }
  }

  /** {@code null}. */
  record Null(Position position) implements Json {
    @Override
    public String found() {
      return "null";
    }
  }

  /** A block that the program makes. */
  static Block block(List<Member> members) {
    return new Block(members, Position.NONE);
  }

  /** A list that the program makes. */
  static Items items(List<Json> items) {
    return new Items(items, Position.NONE);
  }

  /** A text that the program makes. */
  static Text text(String value) {
    return new Text(value, JsonText.quoted(value), Position.NONE);
  }

  /**
   * A number that the program makes.
   *
   * @param literal in the spelling of JSON
   * @throws IllegalArgumentException when it is not
   */
  static Number number(String literal) {
    if (!JsonText.isNumber(literal)) {
      throw new IllegalArgumentException("not a JSON number: " + literal);
    }
    return new Number(literal, Position.NONE);
  }

  /** A switch that the program makes. */
  static Truth truth(boolean value) {
    return new Truth(value, Position.NONE);
  }
}
