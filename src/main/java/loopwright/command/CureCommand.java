package loopwright.command;

import java.util.concurrent.Callable;
import loopwright.design.Design;
import loopwright.file.CureJson;
import loopwright.sizing.CureSearch;
import loopwright.sizing.Cures;
import loopwright.task.Progress;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Values that give a wanted phase margin at every level of the swing. */
@Command(
    name = CureCommand.NAME,
    description = {
      "Gentlest values that give a wanted phase margin at every level of the swing and at the"
          + " tolerance corners, one way after the other, and what each costs."
    })
final class CureCommand implements Callable<Integer> {
  static final String NAME = "cure";

  private static final double MOST = 90;

  private final CommandServices services;
  private final Console console;

  @Parameters(paramLabel = "FILE", description = "A design file, or - for standard input.")
  private String file;

  @Option(names = "--hookup", paramLabel = "NAME", required = true, description = "Which hookup.")
  private String hookup;

  @Option(
      names = "--margin",
      paramLabel = "DEGREES",
      required = true,
      description = "Phase margin wanted at every level, above 0 and at most 90 degrees.")
  private double margin;

  @Option(names = "--json", description = "Print JSON in SI units, for a script.")
  private boolean json;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  @Spec private CommandSpec spec;

  CureCommand(CommandServices services, Console console) {
    this.services = services;
    this.console = console;
  }

  @Override
  public Integer call() {
    if (!(margin > 0 && margin <= MOST)) {
      throw new ParameterException(
          spec.commandLine(),
          "Found a margin of " + margin + ", expected degrees above 0 and at most 90.");
    }
    Design design = new DesignArgument(file).read(services.designs(), console.in());
    HookupOption.require(design, hookup, spec);
    Cures cures = CureSearch.of(design, hookup, margin, Progress.none());
    console.out().print(json ? CureJson.write(cures) : CureText.of(design, hookup, margin, cures));
    return ExitStatus.DONE;
  }
}
