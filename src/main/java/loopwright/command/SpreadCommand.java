package loopwright.command;

import java.util.List;
import java.util.concurrent.Callable;
import loopwright.design.Design;
import loopwright.file.SpreadJson;
import loopwright.spread.HookupSpread;
import loopwright.spread.Sampling;
import loopwright.spread.Spread;
import loopwright.task.Progress;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** The bands of all nodes and figures for the tolerances of a design. */
@Command(
    name = SpreadCommand.NAME,
    description = {
      "Band of every node and figure for the tolerances of a design, by sampling builds; which parts"
          + " matter; how many builds meet the limits."
    })
final class SpreadCommand implements Callable<Integer> {
  static final String NAME = "spread";

  private static final int MOST = 1_000_000;

  private final CommandServices services;
  private final Console console;

  @Parameters(paramLabel = "FILE", description = "A design file, or - for standard input.")
  private String file;

  @Option(
      names = "--samples",
      paramLabel = "N",
      description =
          "How many builds are sampled, ${DEFAULT-VALUE} if not given; figures of waveform and swing"
              + " take a tenth of them.")
  private int samples = Sampling.usual().samples();

  @Option(
      names = "--seed",
      paramLabel = "S",
      description = "Equal seeds give equal builds; ${DEFAULT-VALUE} if not given.")
  private long seed = Sampling.usual().seed();

  @Option(names = "--json", description = "Print JSON in SI units, for a script.")
  private boolean json;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  @Spec private CommandSpec spec;

  SpreadCommand(CommandServices services, Console console) {
    this.services = services;
    this.console = console;
  }

  @Override
  public Integer call() {
    if (samples < 1 || samples > MOST) {
      throw new ParameterException(
          spec.commandLine(), "Found " + samples + " samples, expected 1 to " + MOST + ".");
    }
    Design design = new DesignArgument(file).read(services.designs(), console.in());
    List<HookupSpread> spreads = Spread.of(design, Sampling.of(samples, seed), Progress.none());
    console.out().print(json ? SpreadJson.write(spreads) : SpreadText.of(design, spreads));
    return ExitStatus.DONE;
  }
}
