package loopwright.view.frame;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Component;
import java.awt.Container;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.ResourceBundle;
import java.util.Set;
import java.util.stream.Collectors;
import javax.swing.AbstractButton;
import javax.swing.JLabel;
import javax.swing.JMenu;
import javax.swing.JTabbedPane;
import javax.swing.JTable;
import loopwright.command.CommandLineProgram;
import loopwright.command.CommandWords;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.part.Shelf;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.session.Session;
import loopwright.task.SameThreadRunner;
import loopwright.view.OnEventThread;
import loopwright.view.study.BenchStudy;
import loopwright.view.study.CureStudy;
import loopwright.view.study.Desk;
import loopwright.view.study.DividerStudy;
import loopwright.view.study.FirstDesignStudy;
import loopwright.view.study.SheetStudy;
import loopwright.view.study.SpreadStudy;
import loopwright.view.study.StabilityStudy;
import loopwright.view.study.TrimStudy;
import loopwright.view.study.WholeStudy;
import loopwright.view.theme.Theme;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;

/** {@code docs/words.md} has every word that a person reads, with where it comes from. */
@ExtendWith(OnEventThread.class)
class WordsPageTest {
  private static final Set<String> ORIGINS = Set.of("trade", "standard", "ours", "plain");

  private static List<String[]> rows() throws Exception {
    return Files.readAllLines(Path.of("docs", "words.md")).stream()
        .filter(line -> line.startsWith("| ") && !line.startsWith("| word |"))
        .map(line -> line.substring(1, line.lastIndexOf('|')).split("\\|"))
        .map(
            cells -> {
              for (int i = 0; i < cells.length; i++) {
                cells[i] = cells[i].strip();
              }
              return cells;
            })
        .toList();
  }

  @Test
  void everyRowSaysWhereItsWordComesFrom() throws Exception {
    assertThat(rows()).hasSizeGreaterThan(200);
    assertThat(rows())
        .allSatisfy(
            row -> {
              assertThat(row).as(String.join(" | ", row)).hasSize(3);
              assertThat(ORIGINS).as(row[0]).contains(row[2].split(" ")[0].replace(",", ""));
            });
  }

  @Test
  void everyWordOfTheProgramHasARow() throws Exception {
    Set<String> known = rows().stream().map(row -> row[0]).collect(Collectors.toSet());
    assertThat(words()).hasSizeGreaterThan(200);
    assertThat(words().stream().filter(word -> !known.contains(word)).toList()).isEmpty();
  }

  private static Set<String> words() throws Exception {
    Set<String> words = new LinkedHashSet<>();
    words.addAll(CommandLineProgram.subCommands());
    words.addAll(CommandWords.options());
    Catalogue.figures().stream().map(Figure::label).forEach(words::add);
    ResourceBundle labels = ResourceBundle.getBundle("loopwright.view.form.labels");
    labels.keySet().forEach(key -> words.add(labels.getString(key)));
    Shelf shelf = new ShelfFile().shipped();
    Session session =
        new Session(
            new DesignFile(
                shelf,
                Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit))),
            Screenshots.SOURCE,
            new SameThreadRunner(),
            Path.of("examples", "measured-amplifier.json"));
    WindowPicture picture = new WindowPicture(session, shelf, Theme.LIGHT, 1440, 900);
    MainMenu menu = (MainMenu) picture.root().getComponent(0);
    for (int i = 0; i < menu.getMenuCount(); i++) {
      menuWords(menu.getMenu(i), words);
    }
    tabs(picture.root(), words);
    Desk desk = new Desk(session::snapshot, session::edit, SameThreadRunner::new);
    for (Container study :
        List.of(
            new DividerStudy(desk),
            new FirstDesignStudy(desk, shelf, design -> {}),
            new TrimStudy(desk),
            new CureStudy(desk),
            new SpreadStudy(desk),
            new StabilityStudy(desk),
            new SheetStudy(desk),
            new BenchStudy(desk),
            new WholeStudy(desk, shelf))) {
      studyWords(study, words);
    }
    picture.close();
    words.removeIf(word -> word.isBlank() || word.equals("times 22") || word.equals("inverting"));
    words.removeIf(word -> word.startsWith("in hookup ") || word.startsWith("hookup "));
    return words;
  }

  private static void menuWords(JMenu menu, Set<String> words) {
    words.add(menu.getText());
    for (Component item : menu.getMenuComponents()) {
      if (item instanceof JMenu inner) {
        menuWords(inner, words);
      } else if (item instanceof AbstractButton button) {
        words.add(button.getText());
      }
    }
  }

  private static void tabs(Container root, Set<String> words) {
    for (Component component : root.getComponents()) {
      if (component instanceof JTabbedPane tabs) {
        for (int i = 0; i < tabs.getTabCount(); i++) {
          words.add(tabs.getTitleAt(i));
        }
      }
      if (component instanceof Container container) {
        tabs(container, words);
      }
    }
  }

  private static void studyWords(Container root, Set<String> words) {
    for (Component component : root.getComponents()) {
      if (component instanceof JTable table) {
        for (int i = 0; i < table.getColumnCount(); i++) {
          words.add(table.getColumnName(i));
        }
      } else if (component instanceof JLabel label && label.getText() != null) {
        words.add(label.getText().strip());
      } else if (component instanceof AbstractButton button && button.getText() != null) {
        words.add(button.getText());
      } else if (component instanceof Container container) {
        studyWords(container, words);
      }
    }
  }
}
