package loopwright.view.study;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.awt.Rectangle;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import javax.swing.JButton;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.UIManager;
import loopwright.check.Findings;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.Prediction;
import loopwright.predict.Predictor;
import loopwright.session.Assessment;
import loopwright.session.Session;
import loopwright.task.SameThreadRunner;
import loopwright.view.Lookup;
import loopwright.view.OnEventThread;
import loopwright.view.Painting;
import loopwright.view.theme.Theme;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** The bench sheet is made, looked at and saved from the window. */
@ExtendWith(OnEventThread.class)
class SheetStudyTest {
  @TempDir Path folder;

  private static Session session() {
    DesignFile files =
        new DesignFile(
            new ShelfFile().shipped(),
            Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)));
    return new Session(
        files,
        (design, hookups, progress) -> {
          Prediction prediction = Predictor.predict(design, hookups, new double[0], progress);
          return new Assessment(prediction, Findings.of(prediction));
        },
        new SameThreadRunner(),
        Path.of("examples", "measured-amplifier.json"));
  }

  private static SheetStudy study(Session session, Path target) {
    Desk desk = new Desk(session::snapshot, session::edit, SameThreadRunner::new);
    return new SheetStudy(desk, name -> Optional.of(target));
  }

  private static JButton button(SheetStudy study, String name) {
    return Lookup.named(study, name, JButton.class);
  }

  private static String says(SheetStudy study) {
    return Lookup.named(study, "says", JLabel.class).getText();
  }

  @Test
  void whatIsSavedIsWhatWasMade() throws Exception {
    Path pdf = folder.resolve("sheet.pdf");
    SheetStudy study = study(session(), pdf);
    assertThat(button(study, "save").isEnabled()).isFalse();

    button(study, "start").doClick();
    assertThat(Lookup.named(study, "pages", PagesView.class).count()).isBetween(1, 2);
    button(study, "save").doClick();

    assertThat(Files.readAllBytes(pdf)).startsWith("%PDF".getBytes());
    assertThat(says(study)).isEqualTo("Saved sheet.pdf.");
  }

  @Test
  void htmlIsSavedForTheChosenPaper() throws Exception {
    Path html = folder.resolve("sheet.html");
    SheetStudy study = study(session(), html);
    Lookup.named(study, "paper", JComboBox.class).setSelectedItem("Letter");
    button(study, "start").doClick();
    button(study, "save").doClick();

    assertThat(Files.readString(html)).contains("size: Letter").contains("Strain-gauge amplifier");
  }

  @Test
  void aFolderThatIsNotThereIsSaid() {
    SheetStudy study = study(session(), folder.resolve("none").resolve("sheet.pdf"));
    button(study, "start").doClick();
    button(study, "save").doClick();

    assertThat(says(study)).contains("the folder to write it into does not exist");
  }

  @Test
  void anotherHookupNeedsAnotherSheet() {
    Session session = session();
    SheetStudy study = study(session, folder.resolve("sheet.pdf"));
    button(study, "start").doClick();
    assertThat(button(study, "print").isEnabled()).isTrue();
    session.choose("inverting");
    study.show(session.snapshot());

    assertThat(button(study, "print").isEnabled()).isFalse();
    assertThat(button(study, "save").isEnabled()).isFalse();
    assertThat(Lookup.named(study, "pages", PagesView.class).count()).isZero();
  }

  @Test
  void namesOfFilesFollowTheDesignAndTheChosenKind() {
    assertThat(SheetPlace.fileName("River: level / 2")).isEqualTo("river-level-2-sheet.pdf");
    assertThat(SheetPlace.fileName("<>")).isEqualTo("design-sheet.pdf");
    assertThat(SheetPlace.withSuffix(Path.of("a.pdf"), "html")).isEqualTo(Path.of("a.html"));
    assertThat(SheetPlace.withSuffix(Path.of("a.PDF"), "pdf")).isEqualTo(Path.of("a.PDF"));
    assertThat(SheetPlace.withSuffix(Path.of("a.b"), "pdf")).isEqualTo(Path.of("a.b.pdf"));
  }

  @ParameterizedTest
  @EnumSource(Theme.class)
  void itIsPainted(Theme theme) {
    theme.apply();
    SheetStudy study = study(session(), folder.resolve("sheet.pdf"));
    button(study, "start").doClick();
    Painting painting =
        Painting.of(study, 980, 560)
            .save("study.bench-sheet-" + theme.name().toLowerCase(Locale.ROOT));
    Color ground = UIManager.getColor("Panel.background");
    assertThat(painting.countOther(ground, new Rectangle(0, 0, 980, 560))).isGreaterThan(5000);
  }
}
