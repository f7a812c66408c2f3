package loopwright.command;

import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** The program as a whole: only its sub-commands do something. */
@Command(
    name = "loopwright",
    description = {
      "A workbench for feedback amplifiers built out of single transistors.",
      "",
      "Without arguments, or with the name of a design file alone, it opens the window."
    },
    footer = {
      "",
      "Exit status: 0 done; what could not be solved has its reason in the result.",
      "1 the design, its data or the file is wrong or missing. 2 the call is wrong."
    })
final class TopCommand implements Callable<Integer> {
  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  @Spec private CommandSpec spec;

  @Override
  public Integer call() {
    throw new ParameterException(spec.commandLine(), "No sub-command was given.");
  }
}
