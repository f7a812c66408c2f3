package loopwright.command;

import java.util.List;
import java.util.concurrent.Callable;
import loopwright.design.Design;
import loopwright.file.TimeJson;
import loopwright.predict.StepResponses;
import loopwright.task.Progress;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** What hookups do in time when their generator steps. */
@Command(
    name = StepCommand.NAME,
    description = {
      "Steps in time: overshoot, settling, slew rates by hand formula and solved, recovery from"
          + " clipping; and where something grows, the oscillation that it becomes."
    })
final class StepCommand implements Callable<Integer> {
  static final String NAME = "step";

  private final CommandServices services;
  private final Console console;

  @Parameters(paramLabel = "FILE", description = "A design file, or - for standard input.")
  private String file;

  @Option(
      names = "--hookup",
      paramLabel = "NAME",
      description = "Only the hookup of this name; otherwise all of them.")
  private String hookup;

  @Option(names = "--json", description = "Print JSON in SI units, for a script.")
  private boolean json;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  @Spec private CommandSpec spec;

  StepCommand(CommandServices services, Console console) {
    this.services = services;
    this.console = console;
  }

  @Override
  public Integer call() {
    Design design = new DesignArgument(file).read(services.designs(), console.in());
    if (hookup != null) {
      HookupOption.require(design, hookup, spec);
    }
    List<StepResponses> results =
        design.hookups().stream()
            .filter(each -> hookup == null || each.name().equals(hookup))
            .map(each -> StepResponses.of(design, each, Progress.none()))
            .toList();
    console
        .out()
        .print(
            json ? TimeJson.step(design.name(), results) : TimeText.step(design.name(), results));
    return ExitStatus.DONE;
  }
}
