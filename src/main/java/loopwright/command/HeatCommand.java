package loopwright.command;

import java.util.concurrent.Callable;
import loopwright.design.Design;
import loopwright.file.HeatJson;
import loopwright.predict.HeatReport;
import loopwright.predict.HeatSolver;
import loopwright.task.Progress;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Heat in a hookup: against ambient temperature, over the swing, short-circuited. */
@Command(
    name = HeatCommand.NAME,
    description = {
      "Idle current, hottest junction and thermal runaway against ambient temperature, dissipation"
          + " over the swing, and what a short circuit does."
    })
final class HeatCommand implements Callable<Integer> {
  static final String NAME = "heat";

  private final CommandServices services;
  private final Console console;

  @Parameters(paramLabel = "FILE", description = "A design file, or - for standard input.")
  private String file;

  @Option(
      names = "--hookup",
      paramLabel = "NAME",
      description = "Which hookup; otherwise the first.")
  private String hookup;

  @Option(names = "--json", description = "Print JSON in SI units, for a script.")
  private boolean json;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  @Spec private CommandSpec spec;

  HeatCommand(CommandServices services, Console console) {
    this.services = services;
    this.console = console;
  }

  @Override
  public Integer call() {
    Design design = new DesignArgument(file).read(services.designs(), console.in());
    String name = hookup == null ? design.hookups().get(0).name() : hookup;
    HookupOption.require(design, name, spec);
    HeatReport report = HeatSolver.solve(design, name, Progress.none());
    console.out().print(json ? HeatJson.write(report) : HeatText.of(design, report));
    return ExitStatus.DONE;
  }
}
