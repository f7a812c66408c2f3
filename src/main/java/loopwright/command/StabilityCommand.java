package loopwright.command;

import java.util.List;
import java.util.concurrent.Callable;
import loopwright.design.Design;
import loopwright.file.StabilityJson;
import loopwright.sizing.StabilitySweep;
import loopwright.task.Progress;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** How stable a hookup is while one of its surroundings is varied. */
@Command(
    name = StabilityCommand.NAME,
    description = {
      "Worst margin and growth over the whole swing against load capacitance, compensation, stray"
          + " capacitance and supply inductance, the present value marked; the lowest stable gain."
    })
final class StabilityCommand implements Callable<Integer> {
  static final String NAME = "stability";

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

  StabilityCommand(CommandServices services, Console console) {
    this.services = services;
    this.console = console;
  }

  @Override
  public Integer call() {
    Design design = new DesignArgument(file).read(services.designs(), console.in());
    String name = hookup == null ? design.hookups().get(0).name() : hookup;
    HookupOption.require(design, name, spec);
    List<StabilitySweep> sweeps = StabilitySweep.of(design, name, Progress.none());
    console
        .out()
        .print(json ? StabilityJson.write(name, sweeps) : SweepText.of(design, name, sweeps));
    return ExitStatus.DONE;
  }
}
