package loopwright.session;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.util.List;
import java.util.Map;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.file.DesignFile;
import loopwright.file.Recovery;
import loopwright.file.UserFolder;
import loopwright.part.Shelf;
import loopwright.predict.Prediction;
import loopwright.task.SameThreadRunner;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What a run that ends badly leaves, the next run finds. */
class KeptWorkTest {
  private static final String DESIGN =
      """
      {"loopwright": 1, "name": "River gauge", "rails": {"positive": 12, "negative": -12},
       "amplifier": {"kind": "figures", "gain": 500},
       "hookups": [{"name": "divider", "feedback": {"kind": "nonInverting", "upper": "9k", "lower": "1k"}}]}
      """;

  @TempDir private Path folder;
  private final DesignFile files = new DesignFile(Shelf.empty(), Map.of());
  private Path file;
  private UserFolder user;

  @BeforeEach
  void writeDesign() throws IOException {
    file = Files.writeString(folder.resolve("gauge.json"), DESIGN);
    user = new UserFolder(folder.resolve("user"));
  }

  private Session session() {
    return new Session(
        files,
        (design, hookups, progress) -> new Assessment(new Prediction(design, List.of()), List.of()),
        new SameThreadRunner(),
        file);
  }

  private static void edit(Session session, String upper) {
    Design design = session.snapshot().design();
    session.edit(
        Edit.of("Set upper", new Change("hookups.divider.feedback.upper", upper).applyTo(design)));
  }

  private KeptWork work(Session session) {
    return new KeptWork(session, new Recovery(files, user));
  }

  @Test
  void unsavedWorkOfARunThatEndedBadlyIsFoundAndRestored() {
    Session first = session();
    edit(first, "22k");
    assertThat(work(first).keep()).isEmpty();

    Session second = session();
    KeptWork next = work(second);
    Recovery.Left left = next.left().get(0);
    assertThat(left.of()).contains(file.toAbsolutePath());
    assertThat(left.design()).isEqualTo(first.snapshot().design());

    next.restore(left);
    assertThat(second.snapshot().design()).isEqualTo(first.snapshot().design());
    assertThat(second.snapshot().path()).contains(file.toAbsolutePath());
    assertThat(second.snapshot().unsaved()).isTrue();
    assertThat(second.snapshot().undoable()).contains("Restore unsaved work");
    assertThat(work(session()).left()).as("kept anew for this run").hasSize(1);
  }

  @Test
  void savedWorkIsForgotten() {
    Session session = session();
    KeptWork work = work(session);
    edit(session, "22k");
    work.keep();
    assertThat(work(session()).left()).hasSize(1);
    session.save(file);
    work.keep();
    assertThat(work(session()).left()).isEmpty();
  }

  @Test
  void nothingIsKeptOfADesignThatWasOnlyLookedAt() {
    assertThat(work(session()).keep()).isEmpty();
    assertThat(work(session()).left()).isEmpty();
  }

  @Test
  void workWhoseFileIsGoneIsRestoredWithoutOne() throws IOException {
    Session first = session();
    edit(first, "22k");
    work(first).keep();
    Session second = session();
    Files.delete(file);
    KeptWork next = work(second);
    next.restore(next.left().get(0));
    assertThat(second.snapshot().path()).isEmpty();
    assertThat(second.snapshot().design()).isEqualTo(first.snapshot().design());
  }

  @Test
  void workThatIsDiscardedIsGone() {
    Session first = session();
    edit(first, "22k");
    work(first).keep();
    KeptWork next = work(session());
    next.discard(next.left().get(0));
    assertThat(next.left()).isEmpty();
  }

  @Test
  void aFolderThatCannotBeWrittenIsSaidInWords() throws IOException {
    Path plain = Files.writeString(folder.resolve("plain"), "");
    Session session = session();
    edit(session, "22k");
    KeptWork work = new KeptWork(session, new Recovery(files, new UserFolder(plain)));
    assertThat(work.keep()).hasValueSatisfying(says -> assertThat(says).contains("plain"));
  }

  @Test
  void aFileChangedBySomethingElseIsNoticed() throws IOException {
    Session session = session();
    assertThat(session.changedOnDisk()).isFalse();
    Files.setLastModifiedTime(file, FileTime.fromMillis(1));
    assertThat(session.changedOnDisk()).isTrue();
    session.save(file);
    assertThat(session.changedOnDisk()).isFalse();
  }

  @Test
  void recentFilesLookAndSizeAreFoundAgain() {
    Preferences preferences = new Preferences(user);
    for (int i = 0; i < 12; i++) {
      preferences.opened(folder.resolve("design" + i + ".json"));
    }
    preferences.opened(folder.resolve("design5.json"));
    preferences.choose("DARK");
    preferences.closed(new Preferences.Size(1200, 800));

    Preferences again = new Preferences(user);
    assertThat(again.recent()).hasSize(10).doesNotHaveDuplicates();
    assertThat(again.recent().get(0)).isEqualTo(folder.resolve("design5.json").toAbsolutePath());
    assertThat(again.recent().get(1)).isEqualTo(folder.resolve("design11.json").toAbsolutePath());
    assertThat(again.look()).contains("DARK");
    assertThat(again.size()).contains(new Preferences.Size(1200, 800));
  }

  @Test
  void preferencesThatAreNoneAreAsIfThereWereNone() throws IOException {
    Files.createDirectories(user.path());
    Files.writeString(user.path().resolve("preferences.properties"), "window.width=\\uZZZZ");
    Preferences preferences = new Preferences(user);
    assertThat(preferences.recent()).isEmpty();
    assertThat(preferences.size()).isEmpty();
  }
}
