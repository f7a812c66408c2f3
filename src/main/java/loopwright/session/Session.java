package loopwright.session;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.time.Duration;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.function.Consumer;
import loopwright.design.Design;
import loopwright.file.DesignDocument;
import loopwright.file.DesignFile;
import loopwright.predict.Figure;
import loopwright.quantity.Quantity;
import loopwright.task.Receiver;
import loopwright.task.TaskRunner;

/**
 * The open design. Views show its {@link Snapshot}s and send it {@link Edit}s; nothing else changes
 * the design. Used from one thread only, the one that the task runner delivers to.
 */
public final class Session implements AutoCloseable {
  private final DesignFile files;
  private final PredictionSource source;
  private final TaskRunner runner;
  private final List<Consumer<Snapshot>> listeners = new ArrayList<>();
  private final Map<String, Solved> solved = new LinkedHashMap<>();

  private Optional<Path> path = Optional.empty();
  private Optional<FileTime> stamp = Optional.empty();
  private Optional<DesignDocument> document = Optional.empty();
  private Optional<Design> saved = Optional.empty();
  private History history;
  private String hookup;
  private Optional<Failure> failure = Optional.empty();
  private boolean solving;
  private String doing = "";

  /**
   * A session on a design that is in no file yet.
   *
   * @param files reads and writes design files
   * @param source solves designs
   * @param runner carries that out; delivers on the thread that uses this session
   * @param design shown until another is opened
   */
  public Session(DesignFile files, PredictionSource source, TaskRunner runner, Design design) {
    this(files, source, runner);
    start(design);
  }

  /**
   * A session on a design file.
   *
   * @param files reads and writes design files
   * @param source solves designs
   * @param runner carries that out; delivers on the thread that uses this session
   * @param file opened at once
   * @throws loopwright.file.FileException when it cannot be read
   * @throws loopwright.design.DesignException when values in it do not fit
   */
  public Session(DesignFile files, PredictionSource source, TaskRunner runner, Path file) {
    this(files, source, runner);
    take(file, files.read(file));
  }

  private Session(DesignFile files, PredictionSource source, TaskRunner runner) {
    this.files = files;
    this.source = source;
    this.runner = runner;
  }

  /** What there is to show now. */
  public Snapshot snapshot() {
    return new Snapshot(
        path,
        history.design(),
        !saved.equals(Optional.of(history.design())),
        hookup,
        solved,
        failure,
        solving,
        doing,
        history.undoable(),
        history.redoable());
  }

  /** Calls the listener with a new snapshot after every change. */
  public void onChange(Consumer<Snapshot> listener) {
    listeners.add(Objects.requireNonNull(listener));
  }

  /**
   * Opens another design in place of this one, whose unsaved edits are lost.
   *
   * @throws loopwright.file.FileException when it cannot be read; the present design then stays
   * @throws loopwright.design.DesignException when values in it do not fit; likewise
   */
  public void open(Path file) {
    take(file, files.read(file));
    tell();
  }

  /** Begins with a design that is in no file yet, in place of this one, whose edits are lost. */
  public void begin(Design design) {
    path = Optional.empty();
    document = Optional.empty();
    saved = Optional.empty();
    stamp = Optional.empty();
    start(design);
    tell();
  }

  /** Whether the file was changed by something else since it was opened or saved here. */
  public boolean changedOnDisk() {
    return path.isPresent() && !modified(path.get()).equals(stamp);
  }

  private static Optional<FileTime> modified(Path file) {
    try {
      return Optional.of(Files.getLastModifiedTime(file));
    } catch (IOException e) {
      return Optional.empty();
    }
  }

  /**
   * Saves the present design; what was not changed stays as its author wrote it.
   *
   * @param file where to; becomes the file of this session
   * @throws loopwright.file.FileException when it cannot be written; the old file is then whole
   * @throws loopwright.design.DesignException when the design could not be read again
   */
  public void save(Path file) {
    files.save(file, history.design(), document);
    saved = Optional.of(history.design());
    path = Optional.of(file);
    stamp = modified(file);
    tell();
  }

  /** Makes an edit; one that changes nothing is none. */
  public void edit(Edit edit) {
    if (!edit.after().equals(history.design())) {
      moveTo(history.with(edit));
    }
  }

  /** Takes back the last edit, if there is one. */
  public void undo() {
    moveTo(history.undone());
  }

  /** Makes the edit again that was taken back last, if there is one. */
  public void redo() {
    moveTo(history.redone());
  }

  /**
   * Chooses the hookup to look at.
   *
   * @throws IllegalArgumentException when the design has no hookup of that name
   */
  public void choose(String name) {
    if (history.design().hookup(name).isEmpty()) {
      throw new IllegalArgumentException("no hookup is called " + name);
    }
    if (!name.equals(hookup)) {
      hookup = name;
      solveWhereNeeded();
      tell();
    }
  }

  /**
   * Notes what was measured of a figure in the chosen hookup.
   *
   * @param figure what was measured
   * @param value in the figure's unit; empty to take the newest reading away
   */
  public void measure(Figure figure, Optional<Quantity> value) {
    Design design = history.design();
    if (value.isPresent()) {
      edit(
          Edit.of(
              "Measured " + figure.label() + " " + value.get().spelling(),
              Readings.with(design, hookup, figure.key(), value.get())));
    } else {
      edit(
          Edit.of(
              "Clear measured " + figure.label(), Readings.without(design, hookup, figure.key())));
    }
  }

  /** Gives up what is under way. */
  @Override
  public void close() {
    runner.close();
  }

  private void take(Path file, DesignDocument opened) {
    path = Optional.of(file);
    stamp = modified(file);
    document = Optional.of(opened);
    saved = Optional.of(opened.design());
    start(opened.design());
  }

  private void start(Design design) {
    history = History.of(design);
    hookup = firstHookup(design);
    solved.clear();
    failure = Optional.empty();
    solveWhereNeeded();
  }

  private void moveTo(History next) {
    if (next == history) {
      return;
    }
    history = next;
    if (next.design().hookup(hookup).isEmpty()) {
      hookup = firstHookup(next.design());
    }
    solveWhereNeeded();
    tell();
  }

  private void solveWhereNeeded() {
    Design design = history.design();
    String wanted = hookup;
    solved.keySet().removeIf(name -> design.hookup(name).isEmpty());
    Snapshot now = snapshot();
    if (now.current() || now.failure().isPresent()) {
      runner.cancel();
      solving = false;
      complete();
      return;
    }
    solving = true;
    doing = "";
    runner.run(
        progress -> {
          long start = System.nanoTime();
          Assessment assessment = source.assess(design, List.of(wanted), progress);
          return new Solved(assessment, Duration.ofNanos(System.nanoTime() - start));
        },
        new Receiver<Solved>() {
          @Override
          public void progressed(double share, String says) {
            doing = says;
            tell();
          }

          @Override
          public void finished(Solved result) {
            solved.put(wanted, result);
            ended(Optional.empty());
            complete();
          }

          @Override
          public void failed(RuntimeException cause) {
            String says = cause.getMessage() == null ? cause.toString() : cause.getMessage();
            ended(Optional.of(new Failure(design, wanted, says)));
          }
        });
  }

  /** Solves the figures that the present result leaves out, once that is shown. */
  private void complete() {
    Design design = history.design();
    String wanted = hookup;
    Solved first = solved.get(wanted);
    if (first == null || !first.design().equals(design) || !source.leavesOut(first.assessment())) {
      return;
    }
    runner.run(
        progress -> new Solved(source.complete(first.assessment(), progress), first.took()),
        new Receiver<Solved>() {
          @Override
          public void finished(Solved result) {
            solved.put(wanted, result);
            tell();
          }

          @Override
          public void failed(RuntimeException cause) {
            String says = cause.getMessage() == null ? cause.toString() : cause.getMessage();
            ended(Optional.of(new Failure(design, wanted, says)));
          }
        });
  }

  private void ended(Optional<Failure> why) {
    failure = why;
    solving = false;
    doing = "";
    tell();
  }

  private void tell() {
    Snapshot now = snapshot();
    List.copyOf(listeners).forEach(listener -> listener.accept(now));
  }

  private static String firstHookup(Design design) {
    if (design.hookups().isEmpty()) {
      throw new IllegalArgumentException("a design has at least one hookup");
    }
    return design.hookups().get(0).name();
  }
}
