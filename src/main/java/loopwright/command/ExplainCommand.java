package loopwright.command;

import java.util.concurrent.Callable;
import loopwright.bench.Explanations;
import loopwright.bench.FaultSearch;
import loopwright.design.Design;
import loopwright.file.ExplanationJson;
import loopwright.task.Progress;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** What explains the readings of a design's bench. */
@Command(
    name = ExplainCommand.NAME,
    description = {
      "Explain all readings in a design file together: no fault, one part that has drifted, one"
          + " fault, or none of these, each with its probability, and what to read next."
    })
final class ExplainCommand implements Callable<Integer> {
  static final String NAME = "explain";

  private final CommandServices services;
  private final Console console;

  @Parameters(paramLabel = "FILE", description = "A design file, or - for standard input.")
  private String file;

  @Option(names = "--json", description = "Print JSON in SI units, for a script.")
  private boolean json;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  ExplainCommand(CommandServices services, Console console) {
    this.services = services;
    this.console = console;
  }

  @Override
  public Integer call() {
    Design design = new DesignArgument(file).read(services.designs(), console.in());
    Explanations explanations = FaultSearch.of(design, Progress.none());
    console
        .out()
        .print(
            json ? ExplanationJson.write(explanations) : ExplanationText.of(design, explanations));
    return ExitStatus.DONE;
  }
}
