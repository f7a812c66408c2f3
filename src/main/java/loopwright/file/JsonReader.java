package loopwright.file;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import com.fasterxml.jackson.core.io.JsonEOFException;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** Reads a text as a JSON tree, and says in one sentence why it cannot. */
final class JsonReader {
  /** Deeper than any file of ours, and shallow enough to stop a hostile one. */
  static final int DEEPEST = 64;

  private static final int LONGEST_NUMBER = 400;

  private static final JsonFactory JSON =
      JsonFactory.builder()
          .streamReadConstraints(
              StreamReadConstraints.builder()
                  .maxNestingDepth(DEEPEST + 1)
                  .maxNumberLength(LONGEST_NUMBER)
                  .build())
          .build();

  private final String text;
  private final String where;
  private final JsonParser parser;
  private final OpenPath path = new OpenPath();

  private JsonReader(String text, String where) throws IOException {
    this.text = text;
    this.where = where;
    this.parser = JSON.createParser(text);
  }

  /**
   * Reads a text.
   *
   * @param text the whole of it, without byte order mark
   * @param where name of the file, for messages
   * @throws FileException when it is not one JSON value
   */
  static Json read(String text, String where) {
    try {
      JsonReader reader = new JsonReader(text, where);
      try (JsonParser open = reader.parser) {
        return reader.whole();
      }
    } catch (IOException e) {
      throw new UncheckedIOException("reading from memory failed", e);
    }
  }

  private Json whole() throws IOException {
    try {
      if (parser.nextToken() == null) {
        throw new FileException(where + ": found an empty file, expected a JSON text");
      }
      Json json = value();
      if (parser.nextToken() != null) {
        throw at(position(), "found more text behind the end, expected nothing there");
      }
      return json;
    } catch (JsonEOFException e) {
      throw cutShort(e);
    } catch (StreamConstraintsException e) {
      throw new FileException(
          where + ": found a number or text" + path.says() + " that is too long to be meant", e);
    } catch (JsonProcessingException e) {
      throw malformed(e);
    }
  }

  private Json value() throws IOException {
    Position position = position();
    return switch (parser.currentToken()) {
      case START_OBJECT -> block(position);
      case START_ARRAY -> items(position);
      case VALUE_STRING -> new Json.Text(parser.getText(), quotedLiteral(), position);
      case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> new Json.Number(parser.getText(), position);
      case VALUE_TRUE -> new Json.Truth(true, position);
      case VALUE_FALSE -> new Json.Truth(false, position);
      default -> new Json.Null(position);
    };
  }

  private Json.Block block(Position position) throws IOException {
    requireShallow(position);
    List<Json.Member> members = new ArrayList<>();
    Set<String> names = new HashSet<>();
    while (parser.nextToken() != JsonToken.END_OBJECT) {
      String name = parser.currentName();
      if (!names.add(name)) {
        throw at(position(), path.prefix() + "the key " + shown(name) + " is given twice");
      }
      String literal = quotedLiteral();
      path.enter(name);
      parser.nextToken();
      Json value = value();
      path.leave();
      if (name.equals("name") && value instanceof Json.Text called) {
        path.call(called.value());
      }
      members.add(new Json.Member(name, literal, value));
    }
    return new Json.Block(members, position);
  }

  private Json.Items items(Position position) throws IOException {
    requireShallow(position);
    List<Json> items = new ArrayList<>();
    while (parser.nextToken() != JsonToken.END_ARRAY) {
      path.enterItem(items.size());
      items.add(value());
      path.leave();
    }
    return new Json.Items(items, position);
  }

  private void requireShallow(Position position) {
    if (path.depth() >= DEEPEST) {
      throw at(position, "found brackets more than " + DEEPEST + " deep, expected a design");
    }
  }

  /** The quoted text that starts at the current token, exactly as it stands. */
  private String quotedLiteral() {
    int start = (int) parser.currentTokenLocation().getCharOffset();
    int end = start + 1;
    while (text.charAt(end) != '"') {
      end += text.charAt(end) == '\\' ? 2 : 1;
    }
    return text.substring(start, end + 1);
  }

  private Position position() {
    JsonLocation location = parser.currentTokenLocation();
    return new Position(location.getLineNr(), location.getColumnNr());
  }

  private FileException at(Position position, String says) {
    return new FileException(where + ", " + position.says() + ": " + says);
  }

  private FileException cutShort(JsonProcessingException e) {
    return new FileException(
        where + ": the text breaks off" + path.says() + ", expected the rest of it", e);
  }

  private FileException malformed(JsonProcessingException e) {
    Malformed slip = new Malformed(text, (int) e.getLocation().getCharOffset());
    if (slip.isCutShort()) {
      return cutShort(e);
    }
    return new FileException(
        where
            + ", "
            + slip.position().says()
            + ": found "
            + slip.found()
            + path.says()
            + ", expected "
            + slip.expected(),
        e);
  }

  private static String shown(String name) {
    return JsonText.quoted(JsonText.shortened(name));
  }
}
