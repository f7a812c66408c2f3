package loopwright.file;

import java.util.ArrayList;
import java.util.List;

/**
 * Writes a tree as text: literals as they are, two spaces a level, short blocks and lists of plain
 * values on one line.
 */
final class JsonWriter {
  private static final int WIDTH = 100;
  private static final String STEP = "  ";

  private final StringBuilder text = new StringBuilder();

  private JsonWriter() {}

  /** The text, with a line break at its end. */
  static String write(Json json) {
    JsonWriter writer = new JsonWriter();
    writer.append(json, "", 0);
    return writer.text.append('\n').toString();
  }

  /**
   * @param indent what stands before the lines of this value
   * @param column how much of the first line is taken
   */
  private void append(Json json, String indent, int column) {
    if (json instanceof Json.Block block) {
      append(
          block.members().stream().map(member -> member.literal() + ": ").toList(),
          block.members().stream().map(Json.Member::value).toList(),
          "{",
          "}",
          indent,
          column);
    } else if (json instanceof Json.Items items) {
      if (items.items().stream().allMatch(JsonWriter::isPlain)) {
        appendFilled(items, indent, column);
      } else {
        append(items.items().stream().map(item -> "").toList(), items.items(), "[", "]", indent, 0);
      }
    } else {
      text.append(literal(json));
    }
  }

  private void append(
      List<String> names, List<Json> values, String open, String close, String indent, int column) {
    if (values.stream().allMatch(JsonWriter::isPlain)) {
      String line = open + onOneLine(names, values) + close;
      if (column + line.length() < WIDTH) {
        text.append(line);
        return;
      }
    }
    String inner = indent + STEP;
    text.append(open);
    for (int i = 0; i < values.size(); i++) {
      text.append(i == 0 ? "\n" : ",\n").append(inner).append(names.get(i));
      append(values.get(i), inner, inner.length() + names.get(i).length());
    }
    text.append('\n').append(indent).append(close);
  }

  /** A long list of plain values, such as a curve's, fills its lines. */
  private void appendFilled(Json.Items items, String indent, int column) {
    List<String> literals = items.items().stream().map(JsonWriter::literal).toList();
    String line = "[" + String.join(", ", literals) + "]";
    if (column + line.length() < WIDTH) {
      text.append(line);
      return;
    }
    String inner = indent + STEP;
    List<String> lines = new ArrayList<>();
    StringBuilder filling = new StringBuilder(inner);
    for (String literal : literals) {
      if (filling.length() > inner.length() && filling.length() + literal.length() + 2 > WIDTH) {
        lines.add(filling.toString().stripTrailing());
        filling.setLength(inner.length());
      }
      filling.append(literal).append(", ");
    }
    lines.add(filling.substring(0, filling.length() - 2));
    text.append("[\n").append(String.join("\n", lines)).append('\n').append(indent).append(']');
  }

  private static String onOneLine(List<String> names, List<Json> values) {
    List<String> parts = new ArrayList<>();
    for (int i = 0; i < values.size(); i++) {
      parts.add(names.get(i) + literal(values.get(i)));
    }
    return String.join(", ", parts);
  }

  private static boolean isPlain(Json json) {
    return !(json instanceof Json.Block) && !(json instanceof Json.Items);
  }

  private static String literal(Json json) {
    if (json instanceof Json.Text written) {
      return written.literal();
    }
    if (json instanceof Json.Number number) {
      return number.literal();
    }
    return json instanceof Json.Truth truth ? Boolean.toString(truth.value()) : "null";
  }
}
