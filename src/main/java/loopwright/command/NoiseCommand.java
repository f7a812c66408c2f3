package loopwright.command;

import java.util.concurrent.Callable;
import loopwright.design.Design;
import loopwright.file.NoiseJson;
import loopwright.predict.HookupFigures;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Noise of a hookup, its contributors ranked. */
@Command(
    name = NoiseCommand.NAME,
    description = {
      "Noise at the output of a hookup at rest: density at given frequencies, rms from 10 Hz to"
          + " 100 kHz, and what makes it, the loudest first."
    })
final class NoiseCommand implements Callable<Integer> {
  static final String NAME = "noise";

  private final CommandServices services;
  private final Console console;

  @Parameters(paramLabel = "FILE", description = "A design file, or - for standard input.")
  private String file;

  @Option(
      names = "--hookup",
      paramLabel = "NAME",
      description = "Which hookup; otherwise the first.")
  private String hookup;

  @Option(
      names = "--frequencies",
      paramLabel = "f1,f2,…",
      converter = FrequencyList.class,
      description = "Density at these frequencies; otherwise at the signal's.")
  private FrequencyList.Wanted frequencies = new FrequencyList.Wanted(new double[0]);

  @Option(names = "--json", description = "Print JSON in SI units, for a script.")
  private boolean json;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  @Spec private CommandSpec spec;

  NoiseCommand(CommandServices services, Console console) {
    this.services = services;
    this.console = console;
  }

  @Override
  public Integer call() {
    Design design = new DesignArgument(file).read(services.designs(), console.in());
    String name = hookup == null ? design.hookups().get(0).name() : hookup;
    HookupOption.require(design, name, spec);
    HookupFigures figures = HookupFigures.of(design, name);
    double[] wanted =
        frequencies.hertz().length > 0
            ? frequencies.hertz()
            : new double[] {figures.hookup().source().frequency().value()};
    console.out().print(json ? NoiseJson.write(figures, wanted) : NoiseText.of(figures, wanted));
    return ExitStatus.DONE;
  }
}
