package loopwright.command;

import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** What a call of the program asks for. */
public sealed interface Invocation {
  /**
   * The window.
   *
   * @param file the design to open; empty for the worked example
   */
  record Window(Optional<Path> file) implements Invocation {}

  /**
   * The command line.
   *
   * @param arguments as they were given
   */
  record Line(List<String> arguments) implements Invocation {
    /** Keeps its own copy. */
    public Line {
      arguments = List.copyOf(arguments);
    }
  }

  /**
   * No arguments, or the name of a design file alone, ask for the window; all else is for the
   * command line, a mistyped sub-command included.
   */
  static Invocation of(List<String> arguments) {
    if (arguments.isEmpty()) {
      return new Window(Optional.empty());
    }
    if (arguments.size() == 1 && namesADesign(arguments.get(0))) {
      return new Window(Optional.of(Path.of(arguments.get(0))));
    }
    return new Line(arguments);
  }

  private static boolean namesADesign(String word) {
    if (word.startsWith("-") || CommandLineProgram.subCommands().contains(word)) {
      return false;
    }
    try {
      return Files.isRegularFile(Path.of(word)) || word.toLowerCase(Locale.ROOT).endsWith(".json");
    } catch (InvalidPathException e) {
      return false;
    }
  }
}
