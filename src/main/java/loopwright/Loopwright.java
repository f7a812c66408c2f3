package loopwright;

import java.awt.EventQueue;
import java.awt.GraphicsEnvironment;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.PrintStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import loopwright.check.Findings;
import loopwright.command.CommandLineProgram;
import loopwright.command.CommandServices;
import loopwright.command.Console;
import loopwright.command.Invocation;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.file.DesignDocument;
import loopwright.file.DesignFile;
import loopwright.file.FileException;
import loopwright.file.Recovery;
import loopwright.file.Shelves;
import loopwright.file.UserFolder;
import loopwright.part.Shelf;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.predict.Predictor;
import loopwright.quantity.Unit;
import loopwright.session.KeptWork;
import loopwright.session.PredictionSource;
import loopwright.session.Preferences;
import loopwright.session.Session;
import loopwright.task.BackgroundRunner;
import loopwright.task.TaskRunner;
import loopwright.view.frame.Keeping;
import loopwright.view.frame.MainWindow;
import loopwright.view.theme.Theme;

/** Composition root: the one place that knows every package. */
public final class Loopwright {
  /** Designs to begin with; the window opens with the first when none is named. */
  private static final List<String> EXAMPLES =
      List.of(
          "seismometer-coil",
          "hydrophone-follower",
          "measured-amplifier",
          "nine-volt-preamplifier",
          "everything-fitted");

  private static final int INPUT_WRONG = 1;

  /** No exit status: the window goes on. */
  private static final int WINDOW_OPEN = -1;

  private final Shelf shelf;
  private final DesignFile designs;
  private final Console console;

  private Loopwright(Console console) {
    Shelves shelves = Shelves.load(Shelves.usersFolder());
    Map<String, Unit> units =
        Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit));
    this.console = console;
    this.shelf = shelves.shelf();
    this.designs = new DesignFile(shelf, units);
    shelves.problems().forEach(console.err()::println);
  }

  /**
   * Starts the program.
   *
   * @param arguments none, or the name of a design file alone, for the window; a sub-command for
   *     the command line
   */
  public static void main(String[] arguments) {
    Console console = new Console(System.in, utf8(FileDescriptor.out), utf8(FileDescriptor.err));
    int status = new Loopwright(console).run(List.of(arguments));
    if (status != WINDOW_OPEN) {
      System.exit(status);
    }
  }

  private static PrintStream utf8(FileDescriptor descriptor) {
    return new PrintStream(new FileOutputStream(descriptor), true, StandardCharsets.UTF_8);
  }

  /** Does what was asked for; a negative status while the window goes on. */
  private int run(List<String> arguments) {
    Invocation invocation = Invocation.of(arguments);
    if (invocation instanceof Invocation.Line line) {
      return command(line.arguments(), console);
    }
    Optional<Path> file = ((Invocation.Window) invocation).file();
    if (GraphicsEnvironment.isHeadless()) {
      return withoutDisplay(file);
    }
    DesignDocument document;
    try {
      document = file.map(designs::read).orElseGet(() -> example(EXAMPLES.get(0)));
    } catch (FileException | DesignException e) {
      console.err().println(e.getMessage());
      return INPUT_WRONG;
    }
    EventQueue.invokeLater(() -> openWindow(file, document));
    return WINDOW_OPEN;
  }

  private int withoutDisplay(Optional<Path> file) {
    console
        .err()
        .println(
            "There is no display to open the window on; this is the prediction of "
                + file.map(Path::toString).orElse("the worked example")
                + ".");
    if (file.isPresent()) {
      return command(List.of("predict", file.get().toString()), console);
    }
    return command(
        List.of("predict", "-"),
        new Console(
            Loopwright.class.getResourceAsStream(
                "/loopwright/examples/" + EXAMPLES.get(0) + ".json"),
            console.out(),
            console.err()));
  }

  private int command(List<String> arguments, Console streams) {
    CommandServices services = new CommandServices(designs, Predictor::predict, Findings::of);
    return new CommandLineProgram(services).run(arguments.toArray(String[]::new), streams);
  }

  private void openWindow(Optional<Path> file, DesignDocument document) {
    PredictionSource source = new WindowPredictions();
    TaskRunner runner = new BackgroundRunner(EventQueue::invokeLater);
    Session session =
        file.map(path -> new Session(designs, source, runner, path))
            .orElseGet(() -> new Session(designs, source, runner, document.design()));
    UserFolder folder = UserFolder.usual();
    Preferences preferences = new Preferences(folder);
    KeptWork work = new KeptWork(session, new Recovery(designs, folder));
    new MainWindow(session, shelf, look(preferences), new Keeping(preferences, work, beginnings()))
        .open();
  }

  private static Theme look(Preferences preferences) {
    return preferences.look().filter(Theme.DARK.name()::equals).isPresent()
        ? Theme.DARK
        : Theme.LIGHT;
  }

  private Map<String, Design> beginnings() {
    Map<String, Design> beginnings = new LinkedHashMap<>();
    for (String name : EXAMPLES) {
      beginnings.put(name, example(name).design());
    }
    return beginnings;
  }

  private DesignDocument example(String name) {
    String resource = "/loopwright/examples/" + name + ".json";
    try (InputStream stream = Loopwright.class.getResourceAsStream(resource)) {
      return designs.read(new String(stream.readAllBytes(), StandardCharsets.UTF_8), name);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
