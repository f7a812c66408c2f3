package loopwright.command;

import java.util.concurrent.Callable;
import loopwright.bench.BenchComparison;
import loopwright.bench.Comparison;
import loopwright.design.Design;
import loopwright.file.ComparisonJson;
import loopwright.task.Progress;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** The readings of a design's bench beside its prediction. */
@Command(
    name = CompareCommand.NAME,
    description = {
      "Compare the readings in a design file with its prediction: band of the tolerances, uncertainty"
          + " of the instruments, agreement of each reading and of all together."
    })
final class CompareCommand implements Callable<Integer> {
  static final String NAME = "compare";

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

  CompareCommand(CommandServices services, Console console) {
    this.services = services;
    this.console = console;
  }

  @Override
  public Integer call() {
    Design design = new DesignArgument(file).read(services.designs(), console.in());
    Comparison comparison = BenchComparison.of(design, Progress.none());
    console
        .out()
        .print(json ? ComparisonJson.write(comparison) : ComparisonText.of(design, comparison));
    return ExitStatus.DONE;
  }
}
