package loopwright.command;

import java.util.List;

/** A page of text that grows downward: headings, paragraphs and tables, at most 96 columns wide. */
final class TextPage {
  private static final int WIDTH = 96;
  private static final String INDENT = "  ";

  private final StringBuilder text = new StringBuilder();

  TextPage title(String title) {
    return blankLine().line(title).line("=".repeat(Math.min(title.length(), WIDTH)));
  }

  TextPage heading(String heading) {
    return blankLine().line(heading);
  }

  /** A paragraph, indented and broken between words. */
  TextPage paragraph(String words) {
    return hanging("", words);
  }

  /**
   * A paragraph whose first line begins with a mark, and whose other lines stand behind it. A
   * number keeps its unit on its own line.
   */
  TextPage hanging(String mark, String words) {
    int room = WIDTH - INDENT.length() - mark.length();
    StringBuilder line = new StringBuilder();
    String lead = mark;
    for (String word : words.strip().split("(?<![\\d\\s])\\s+")) {
      if (!line.isEmpty() && line.length() + 1 + word.length() > room) {
        line(INDENT + lead + line);
        lead = " ".repeat(mark.length());
        line.setLength(0);
      }
      line.append(line.isEmpty() ? "" : " ").append(word);
    }
    return line(INDENT + lead + line);
  }

  TextPage table(TextTable table) {
    table.lines().forEach(row -> line(INDENT + row));
    return this;
  }

  /** Cells in as many columns as there is room for, to be read downward. */
  TextPage columns(List<String> cells) {
    int cellWidth = cells.stream().mapToInt(String::length).max().orElse(0) + 4;
    int count = Math.max(1, (WIDTH - INDENT.length() + 4) / cellWidth);
    int depth = (cells.size() + count - 1) / count;
    for (int row = 0; row < depth; row++) {
      StringBuilder line = new StringBuilder(INDENT);
      for (int i = row; i < cells.size(); i += depth) {
        line.append(cells.get(i)).append(" ".repeat(cellWidth - cells.get(i).length()));
      }
      line(line.toString().stripTrailing());
    }
    return this;
  }

  private TextPage line(String line) {
    text.append(line).append('\n');
    return this;
  }

  private TextPage blankLine() {
    return text.isEmpty() ? this : line("");
  }

  @Override
  public String toString() {
    return text.toString();
  }
}
