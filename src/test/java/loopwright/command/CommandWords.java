package loopwright.command;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import loopwright.file.DesignFile;
import loopwright.part.Shelf;
import loopwright.predict.Predictor;
import picocli.CommandLine;
import picocli.CommandLine.Model.OptionSpec;

/** Every option of the command line by its longest name. */
public final class CommandWords {
  private CommandWords() {}

  /** The options of all sub-commands. */
  public static List<String> options() {
    CommandLine line =
        new CommandLineProgram(
                new CommandServices(
                    new DesignFile(Shelf.empty(), Map.of()),
                    Predictor::predict,
                    prediction -> List.of()))
            .line(new Console(System.in, System.out, System.err));
    List<String> options = new ArrayList<>();
    line.getSubcommands()
        .values()
        .forEach(
            command ->
                command.getCommandSpec().options().stream()
                    .map(OptionSpec::longestName)
                    .filter(name -> !options.contains(name))
                    .forEach(options::add));
    return options;
  }
}
