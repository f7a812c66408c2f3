package loopwright.view.form;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JTextArea;
import javax.swing.JTextField;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.Field;
import loopwright.design.Hookup;
import loopwright.design.Shape;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.part.Shelf;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.Prediction;
import loopwright.session.Assessment;
import loopwright.session.Session;
import loopwright.task.SameThreadRunner;
import loopwright.view.Lookup;
import loopwright.view.OnEventThread;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Every field of a design has a field in the form of the whole design. */
@ExtendWith(OnEventThread.class)
class WholePanelTest {
  private static final Set<Shape> BLOCKS = Set.of(Shape.BLOCK, Shape.LIST, Shape.MAP);
  private final Shelf shelf = new ShelfFile().shipped();

  private Session session(String example) {
    DesignFile files =
        new DesignFile(
            shelf,
            Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)));
    return new Session(
        files,
        (design, hookups, progress) -> new Assessment(new Prediction(design, List.of()), List.of()),
        new SameThreadRunner(),
        Path.of("examples", example + ".json"));
  }

  private WholePanel panel(Session session) {
    WholePanel panel = new WholePanel(session::snapshot, shelf, session::edit);
    session.onChange(panel::show);
    return panel;
  }

  private static JTextField field(WholePanel panel, String place, String path) {
    panel.select(place);
    return Lookup.named(panel, path, JTextField.class);
  }

  private static void type(WholePanel panel, String place, String path, String text) {
    JTextField field = field(panel, place, path);
    field.setText(text);
    field.postActionEvent();
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "everything-fitted",
        "seismometer-coil",
        "hydrophone-follower",
        "measured-amplifier",
        "nine-volt-preamplifier"
      })
  void everyFieldThatStandsInADesignHasAnEditor(String example) {
    Session session = session(example);
    WholePanel panel = panel(session);
    Design design = session.snapshot().design();
    List<String> missing = new ArrayList<>(DesignPath.all(design));
    missing.removeIf(
        path -> {
          Field field = DesignPath.field(design, path);
          return path.equals("loopwright")
              || path.startsWith("bench.curves")
              || (BLOCKS.contains(field.shape()) && !field.optional())
              || field.shape() == Shape.FAMILY
              || panel.places().contains(path);
        });
    assertThat(missing).hasSizeGreaterThan(20);
    for (String place : panel.places()) {
      panel.select(place);
      Lookup.all(panel, JComponent.class).stream()
          .map(JComponent::getName)
          .forEach(missing::remove);
    }
    missing.removeIf(
        path -> {
          Field field = DesignPath.field(design, path);
          return field.name().equals("value") && isPartValue(design, path);
        });
    // Elements of lists of plain values are edited in the row of their list.
    missing.removeIf(path -> path.matches(".*\\.\\d+"));
    // A stock or spread that is written in one of several forms is one row.
    missing.removeIf(path -> path.matches("(drawer|tolerances)\\..*"));
    assertThat(missing).isEmpty();
  }

  private static boolean isPartValue(Design design, String path) {
    String owner = path.substring(0, path.lastIndexOf('.'));
    return DesignPath.field(design, owner).shape() == Shape.PART_VALUE;
  }

  @Test
  void textsTolerancesAndLimitsAreTyped() {
    Session session = session("seismometer-coil");
    WholePanel panel = panel(session);
    type(panel, "", "notes", "for the vault");
    assertThat(session.snapshot().design().notes()).contains("for the vault");
    type(panel, "tolerances", "tolerances.beta", "20%");
    type(panel, "drawer", "drawer.resistors", "1k; 2k2; 10k");
    type(panel, "amplifier", "amplifier.inputPair.load.output.measured", "1.497k");
    Design design = session.snapshot().design();
    assertThat(DesignPath.get(design, "amplifier.inputPair.load.output.measured")).isNotNull();
    assertThat(design.drawer().resistors()).isPresent();
    assertThat(session.snapshot().undoable()).isPresent();
  }

  @Test
  void entriesAreAddedCopiedRenamedAndRemoved() {
    Session session = session("seismometer-coil");
    WholePanel panel = panel(session);
    panel.select("hookups.divider");
    Lookup.named(panel, "whole.copy", JButton.class).doClick();
    assertThat(names(session)).containsExactly("divider", "follower", "open", "divider 2");

    panel.select("hookups.divider");
    Lookup.named(panel, "whole.name", JTextField.class).setText("times eleven");
    Lookup.named(panel, "whole.rename", JButton.class).doClick();
    assertThat(names(session)).contains("times eleven").doesNotContain("divider");
    assertThat(session.snapshot().design().bench().readings())
        .allSatisfy(reading -> assertThat(reading.hookup()).isEqualTo(Optional.of("times eleven")));

    panel.select("hookups.divider 2");
    Lookup.named(panel, "whole.remove", JButton.class).doClick();
    assertThat(names(session)).hasSize(3);

    panel.select("bench.instruments");
    Lookup.named(panel, "whole.add", JButton.class).doClick();
    assertThat(session.snapshot().design().bench().instruments()).containsKey("instrument");
    panel.select("limits");
    Lookup.named(panel, "whole.add", JButton.class).doClick();
    assertThat(session.snapshot().design().limits()).hasSize(1);
  }

  @Test
  void theLastHookupStays() {
    Session session = session("hydrophone-follower");
    WholePanel panel = panel(session);
    panel.select("hookups.line");
    Lookup.named(panel, "whole.remove", JButton.class).doClick();
    assertThat(names(session)).containsExactly("line");
    assertThat(Lookup.named(panel, "whole.complaint", JLabel.class).getText())
        .contains("expected another to remain");
  }

  @Test
  void aValueThatDoesNotFitIsSaidInTheWordsOfTheFileReaderAndChangesNothing() {
    Session session = session("seismometer-coil");
    WholePanel panel = panel(session);
    Design before = session.snapshot().design();
    type(panel, "rails", "rails.positive", "12 Hz");
    assertThat(session.snapshot().design()).isEqualTo(before);
    assertThat(Lookup.named(panel, "rails.positive.complaint", JTextArea.class).getText())
        .contains("found \"12 Hz\"");
  }

  private static List<String> names(Session session) {
    return session.snapshot().design().hookups().stream().map(Hookup::name).toList();
  }
}
