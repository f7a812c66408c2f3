package loopwright.view.frame;

import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import loopwright.design.Design;
import loopwright.file.Recovery;

/** Answers as the test has said, and keeps what it was told. */
final class SilentDialogs implements Dialogs {
  final Deque<Path> files = new ArrayDeque<>();
  final Deque<Answer> answers = new ArrayDeque<>();
  final List<String> said = new ArrayList<>();

  @Override
  public Optional<Path> fileToOpen(Optional<Path> present) {
    return Optional.ofNullable(files.poll());
  }

  @Override
  public Optional<Path> fileToSave(Optional<Path> present, String name) {
    return Optional.ofNullable(files.poll());
  }

  @Override
  public Answer unsaved(String name) {
    said.add("unsaved " + name);
    return answers.remove();
  }

  final Deque<Kept> kept = new ArrayDeque<>();
  boolean overwrite;

  @Override
  public Kept left(Recovery.Left left) {
    said.add("left " + left.design().name());
    return kept.remove();
  }

  @Override
  public boolean mayOverwrite(Path file) {
    said.add("overwrite " + file.getFileName());
    return overwrite;
  }

  @Override
  public void complain(String what, String why) {
    said.add(what + ": " + why);
  }

  @Override
  public void about() {
    said.add(About.TEXT);
  }

  @Override
  public void parts(Design design) {
    said.add("parts of " + design.name());
  }
}
