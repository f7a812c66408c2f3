package loopwright.command;

import java.util.List;
import java.util.concurrent.Callable;
import loopwright.design.Design;
import loopwright.file.TimeJson;
import loopwright.predict.SteadyDistortion;
import loopwright.task.Progress;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Distortion of hookups in a steady state. */
@Command(
    name = DistortionCommand.NAME,
    description = {
      "Harmonics and total distortion at each hookup's frequency and amplitude, in a steady state in"
          + " time, beside those of the static waveform."
    })
final class DistortionCommand implements Callable<Integer> {
  static final String NAME = "distortion";

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

  DistortionCommand(CommandServices services, Console console) {
    this.services = services;
    this.console = console;
  }

  @Override
  public Integer call() {
    Design design = new DesignArgument(file).read(services.designs(), console.in());
    if (hookup != null) {
      HookupOption.require(design, hookup, spec);
    }
    List<SteadyDistortion> results =
        design.hookups().stream()
            .filter(each -> hookup == null || each.name().equals(hookup))
            .map(each -> SteadyDistortion.of(design, each, Progress.none()))
            .toList();
    console
        .out()
        .print(
            json
                ? TimeJson.distortion(design.name(), results)
                : TimeText.distortion(design.name(), results));
    return ExitStatus.DONE;
  }
}
