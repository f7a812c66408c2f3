package loopwright.session;

import java.io.IOException;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.function.Consumer;
import loopwright.design.Design;
import loopwright.predict.Figure;
import loopwright.quantity.Quantity;
import loopwright.task.Receiver;
import loopwright.task.TaskRunner;

/**
 * The open design. Views show its {@link Snapshot}s and send it {@link Edit}s; nothing else changes
 * the design. Used from one thread only, the one that the task runner delivers to.
 */
public final class Session implements AutoCloseable {
  private final DesignStore store;
  private final PredictionSource source;
  private final TaskRunner runner;
  private final List<Consumer<Snapshot>> listeners = new ArrayList<>();
  private final Map<String, Solved> solved = new LinkedHashMap<>();

  private Optional<Path> path = Optional.empty();
  private Optional<DesignStore.Stored> stored = Optional.empty();
  private History history;
  private String hookup;
  private Optional<Failure> failure = Optional.empty();
  private boolean solving;
  private String doing = "";

  /**
   * @param store reads and writes design files
   * @param source solves designs
   * @param runner carries that out; delivers on the thread that uses this session
   * @param design shown until another is opened; not stored yet
   */
  public Session(DesignStore store, PredictionSource source, TaskRunner runner, Design design) {
    this.store = store;
    this.source = source;
    this.runner = runner;
    this.history = History.of(design);
    this.hookup = firstHookup(design);
    solveWhereNeeded();
  }

  /** What there is to show now. */
  public Snapshot snapshot() {
    return new Snapshot(
        path,
        history.design(),
        !stored.map(DesignStore.Stored::design).equals(Optional.of(history.design())),
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
   * @throws IOException when it cannot be read; the present design then stays
   */
  public void open(Path file) throws IOException {
    DesignStore.Stored opened = store.open(file);
    path = Optional.of(file);
    stored = Optional.of(opened);
    history = History.of(opened.design());
    hookup = firstHookup(opened.design());
    solved.clear();
    failure = Optional.empty();
    solveWhereNeeded();
    tell();
  }

  /**
   * Saves the present design.
   *
   * @param file where to; becomes the file of this session
   * @throws IOException when it cannot be written; the design then stays unsaved
   */
  public void save(Path file) throws IOException {
    Design design = history.design();
    stored =
        Optional.of(
            stored.isPresent() ? stored.get().save(file, design) : store.create(file, design));
    path = Optional.of(file);
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
