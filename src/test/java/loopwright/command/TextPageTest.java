package loopwright.command;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import org.junit.jupiter.api.Test;

class TextPageTest {
  @Test
  void breaksParagraphsBetweenWordsWithin96Columns() {
    String page = new TextPage().paragraph("twelve letters ".repeat(20)).toString();

    assertThat(page.lines()).hasSizeGreaterThan(3).allMatch(line -> line.length() <= 96);
    assertThat(page.replaceAll("\\s+", " ").strip())
        .isEqualTo("twelve letters ".repeat(20).strip());
  }

  @Test
  void setsTheLaterLinesOfANoteBehindItsMark() {
    List<String> lines =
        new TextPage().hanging("(1) ", "word ".repeat(30)).toString().lines().toList();

    assertThat(lines.get(0)).startsWith("  (1) word");
    assertThat(lines.get(1)).startsWith("      word");
  }

  @Test
  void keepsANumberAndItsUnitOnOneLine() {
    String page = new TextPage().paragraph("x".repeat(88) + " at 3.2 V.").toString();

    assertThat(page.lines()).containsExactly("  " + "x".repeat(88) + " at", "  3.2 V.");
  }

  @Test
  void keepsAWordThatIsLongerThanALine() {
    String word = "x".repeat(120);

    assertThat(new TextPage().paragraph("a " + word + " b").toString().lines())
        .containsExactly("  a", "  " + word, "  b");
  }

  @Test
  void putsABlankLineBetweenBlocksButNoneAtTheTop() {
    assertThat(new TextPage().title("Top").heading("Next").toString())
        .isEqualTo("Top\n===\n\nNext\n");
  }

  @Test
  void readsColumnsDownward() {
    String page = new TextPage().columns(List.of("a", "b", "c", "d".repeat(40))).toString();

    assertThat(page.lines().map(String::strip))
        .containsExactly("a" + " ".repeat(43) + "c", "b" + " ".repeat(43) + "d".repeat(40));
  }

  @Test
  void alignsTheFirstColumnLeftAndTheOthersRight() {
    TextTable table = new TextTable().row("node", "volts").row("out", "5.7 mV").row("x", "");

    assertThat(table.lines()).containsExactly("node   volts", "out   5.7 mV", "x");
  }

  @Test
  void refusesARowOfAnotherLength() {
    TextTable table = new TextTable().row("a", "b");

    assertThatThrownBy(() -> table.row("a")).hasMessageContaining("2 cells");
  }

  @Test
  void givesTheSameNoteTheSameNumber() {
    FootNotes notes = new FootNotes();

    assertThat(List.of(notes.mark("one"), notes.mark("two"), notes.mark("one"), notes.mark("")))
        .containsExactly("(1)", "(2)", "(1)", "");
    TextPage page = new TextPage();
    notes.print(page);
    assertThat(page.toString()).isEqualTo("  (1) one\n  (2) two\n");
  }
}
