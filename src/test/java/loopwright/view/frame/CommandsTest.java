package loopwright.view.frame;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.util.List;
import java.util.Optional;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.file.Recovery;
import loopwright.file.UserFolder;
import loopwright.session.Edit;
import loopwright.session.KeptWork;
import loopwright.session.SampleDesigns;
import loopwright.session.Session;
import loopwright.view.frame.Dialogs.Answer;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Opening, saving and leaving, with a person's answers given beforehand. */
class CommandsTest {
  @TempDir private Path folder;

  private final SilentDialogs dialogs = new SilentDialogs();
  private final Session session = SampleSessions.quick();
  private final Commands commands = new Commands(session, dialogs, () -> {});

  @Test
  void savesWhereAPersonSaysAndThenWithoutAsking() {
    Path file = folder.resolve("coil.json");
    dialogs.files.add(file);
    assertThat(commands.save()).isTrue();
    assertThat(session.snapshot().path()).contains(file);
    assertThat(session.snapshot().unsaved()).isFalse();
    edit("10k");
    assertThat(session.snapshot().unsaved()).isTrue();
    assertThat(commands.save()).isTrue();
    assertThat(SampleSessions.files().read(file).design()).isEqualTo(session.snapshot().design());
    assertThat(dialogs.said).isEmpty();
  }

  @Test
  void aDesignOfTheProgramsMakingTakesThePlaceOfThePresentOneAndCanBeUndone() {
    Design before = session.snapshot().design();
    Design made = Change.applyAll(before, List.of(new Change("rails.positive", "15")));
    commands.take(made);
    assertThat(session.snapshot().design()).isEqualTo(made);
    assertThat(session.snapshot().path()).isEmpty();
    commands.undo();
    assertThat(session.snapshot().design()).isEqualTo(before);
  }

  @Test
  void aSaveThatIsGivenUpSavesNothing() {
    assertThat(commands.save()).isFalse();
    assertThat(session.snapshot().path()).isEmpty();
    assertThat(dialogs.said).isEmpty();
  }

  @Test
  void aFileThatCannotBeOpenedIsSaidInTheWordsOfTheReader() throws IOException {
    Path file = Files.writeString(folder.resolve("list.json"), "[1, 2]");
    dialogs.files.add(file);
    commands.open();
    assertThat(dialogs.said).hasSize(1);
    assertThat(dialogs.said.get(0))
        .startsWith("Cannot open the design: ")
        .contains("list.json")
        .contains("expected a design")
        .doesNotContain("Exception");
    assertThat(session.snapshot().path()).isEmpty();
  }

  @Test
  void everyProblemOfADesignIsSaid() throws IOException {
    Path good = folder.resolve("good.json");
    SampleSessions.files().save(good, session.snapshot().design(), Optional.empty());
    String text =
        Files.readString(good).replace("\"8k2\"", "\"8 volts\"").replace("\"1k5\"", "\"-3\"");
    dialogs.files.add(Files.writeString(folder.resolve("bad.json"), text));
    commands.open();
    assertThat(dialogs.said).hasSize(1);
    assertThat(dialogs.said.get(0))
        .contains("amplifier.gainStage.load.resistance: found \"8 volts\"")
        .contains("amplifier.inputPair.load.output: found \"-3\"");
  }

  @Test
  void aFolderThatIsNotThereCannotBeSavedInto() {
    dialogs.files.add(folder.resolve("missing").resolve("coil.json"));
    assertThat(commands.save()).isFalse();
    assertThat(dialogs.said).hasSize(1);
    assertThat(dialogs.said.get(0)).startsWith("Cannot save the design: ").contains("missing");
    assertThat(session.snapshot().unsaved()).isTrue();
  }

  @Test
  void unsavedEditsAreAskedAbout() {
    assertThat(commands.mayLeave()).isTrue();
    edit("10k");
    dialogs.answers.add(Answer.CANCEL);
    assertThat(commands.mayLeave()).isFalse();
    dialogs.answers.add(Answer.DISCARD);
    assertThat(commands.mayLeave()).isTrue();
    dialogs.answers.add(Answer.SAVE);
    dialogs.files.add(folder.resolve("coil.json"));
    assertThat(commands.mayLeave()).isTrue();
    assertThat(folder.resolve("coil.json")).exists();
    assertThat(commands.mayLeave()).isTrue();
    assertThat(dialogs.said).hasSize(3).containsOnly("unsaved Seismometer coil amplifier");
  }

  @Test
  void openingAsksAboutUnsavedEditsFirst() {
    Path file = folder.resolve("coil.json");
    SampleSessions.files().save(file, session.snapshot().design(), Optional.empty());
    edit("10k");
    dialogs.answers.add(Answer.CANCEL);
    dialogs.files.add(file);
    commands.open();
    assertThat(session.snapshot().path()).isEmpty();
    dialogs.answers.add(Answer.DISCARD);
    commands.open();
    assertThat(session.snapshot().path()).contains(file);
    assertThat(session.snapshot().unsaved()).isFalse();
  }

  @Test
  void undoAndRedo() {
    edit("10k");
    commands.undo();
    assertThat(session.snapshot().redoable()).contains("Load 10k");
    commands.redo();
    assertThat(session.snapshot().undoable()).contains("Load 10k");
  }

  @Test
  void aFileNameIsMadeOfTheDesignsName() {
    assertThat(SwingDialogs.fileName("Seismometer coil: ×11!"))
        .isEqualTo("seismometer-coil-11.json");
    assertThat(SwingDialogs.fileName("?")).isEqualTo("design.json");
    assertThat(SwingDialogs.withSuffix(Path.of("coil"))).isEqualTo(Path.of("coil.json"));
    assertThat(SwingDialogs.withSuffix(Path.of("coil.txt"))).isEqualTo(Path.of("coil.txt"));
  }

  @Test
  void theCautionIsInTheAbout() {
    commands.about();
    assertThat(dialogs.said.get(0)).contains("does not make a build safe").contains("Local codes");
  }

  private void edit(String load) {
    session.edit(
        Edit.of("Load " + load, SampleDesigns.withGainLoad(session.snapshot().design(), load)));
  }

  @Test
  void aFileThatSomethingElseChangedIsNotOverwrittenUnasked() throws IOException {
    Path file = folder.resolve("coil.json");
    dialogs.files.add(file);
    commands.save();
    Files.setLastModifiedTime(file, FileTime.fromMillis(1));
    String before = Files.readString(file);
    edit("10k");
    assertThat(commands.save()).isFalse();
    assertThat(dialogs.said).containsExactly("overwrite coil.json");
    assertThat(Files.readString(file)).isEqualTo(before);

    dialogs.overwrite = true;
    assertThat(commands.save()).isTrue();
    assertThat(session.snapshot().unsaved()).isFalse();
  }

  @Test
  void aDesignToBeginWithIsInNoFileYet() {
    Design other = SampleSessions.quick().snapshot().design();
    commands.begin(other);
    assertThat(session.snapshot().path()).isEmpty();
    assertThat(session.snapshot().design()).isEqualTo(other);
  }

  @Test
  void workThatWasLeftIsOfferedAndTakenUp() {
    UserFolder user = new UserFolder(folder.resolve("user"));
    Session ended = SampleSessions.quick();
    ended.edit(
        Edit.of(
            "Set",
            new Change("hookups.divider.feedback.upper", "33k")
                .applyTo(ended.snapshot().design())));
    new KeptWork(ended, new Recovery(SampleSessions.files(), user)).keep();
    KeptWork work = new KeptWork(session, new Recovery(SampleSessions.files(), user));

    dialogs.kept.add(Dialogs.Kept.LATER);
    commands.offer(work);
    assertThat(session.snapshot().design()).isNotEqualTo(ended.snapshot().design());
    dialogs.kept.add(Dialogs.Kept.RESTORE);
    commands.offer(work);
    assertThat(session.snapshot().design()).isEqualTo(ended.snapshot().design());
  }
}
