package loopwright.command;

import java.util.concurrent.Callable;
import loopwright.design.Design;
import loopwright.file.TrimJson;
import loopwright.propose.TrimAdvice;
import loopwright.task.Progress;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Which resistor trims offset and gain. */
@Command(
    name = TrimCommand.NAME,
    description = {
      "Which resistor trims the output offset and the gain, which way and how much per cent, the"
          + " strongest first; and the single change in preferred values that leaves the least"
          + " offset."
    })
final class TrimCommand implements Callable<Integer> {
  static final String NAME = "trim";

  private final CommandServices services;
  private final Console console;

  @Parameters(paramLabel = "FILE", description = "A design file, or - for standard input.")
  private String file;

  @Option(
      names = "--hookup",
      paramLabel = "NAME",
      description = "Which hookup; the first one if not given.")
  private String hookup;

  @Option(names = "--json", description = "Print JSON in SI units, for a script.")
  private boolean json;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  @Spec private CommandSpec spec;

  TrimCommand(CommandServices services, Console console) {
    this.services = services;
    this.console = console;
  }

  @Override
  public Integer call() {
    Design design = new DesignArgument(file).read(services.designs(), console.in());
    if (hookup != null) {
      HookupOption.require(design, hookup, spec);
    }
    String chosen = hookup == null ? design.hookups().get(0).name() : hookup;
    TrimAdvice advice = TrimAdvice.of(design, chosen, Progress.none());
    console.out().print(json ? TrimJson.write(advice) : TrimText.of(design, chosen, advice));
    return ExitStatus.DONE;
  }
}
