package loopwright.command;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import loopwright.design.Design;
import loopwright.file.DividerJson;
import loopwright.quantity.Quantity;
import loopwright.quantity.QuantityException;
import loopwright.quantity.Unit;
import loopwright.sizing.DividerProposal;
import loopwright.sizing.DividerSizing;
import loopwright.task.Progress;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Feedback dividers for a wanted gain. */
@Command(
    name = SizeCommand.NAME,
    description = {
      "Rank the feedback dividers that a series of preferred values, or the drawer, can make for a"
          + " wanted gain: error, tolerance band, load, offset, noise, phase."
    })
final class SizeCommand implements Callable<Integer> {
  static final String NAME = "size";

  private static final List<String> SERIES = List.of("E12", "E24", "E96", "drawer");

  private final CommandServices services;
  private final Console console;

  @Parameters(paramLabel = "FILE", description = "A design file, or - for standard input.")
  private String file;

  @Option(names = "--hookup", paramLabel = "NAME", required = true, description = "Which hookup.")
  private String hookup;

  @Option(
      names = "--gain",
      paramLabel = "G",
      required = true,
      description = "Wanted gain from generator to output.")
  private String gain;

  @Option(
      names = "--series",
      paramLabel = "NAME",
      description = "E12, E24, E96 or drawer; E24 if not given.")
  private String series = "E24";

  @Option(
      names = "--two-parts",
      description = "One of the two resistors may be two parts in series or in parallel.")
  private boolean twoParts;

  @Option(names = "--json", description = "Print JSON in SI units, for a script.")
  private boolean json;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  @Spec private CommandSpec spec;

  SizeCommand(CommandServices services, Console console) {
    this.services = services;
    this.console = console;
  }

  @Override
  public Integer call() {
    if (!SERIES.contains(series)) {
      throw new ParameterException(
          spec.commandLine(),
          "Found the series \"" + series + "\", expected " + String.join(", ", SERIES) + ".");
    }
    double wanted = wantedGain();
    Design design = new DesignArgument(file).read(services.designs(), console.in());
    HookupOption.require(design, hookup, spec);
    List<DividerProposal> dividers =
        DividerSizing.of(design, hookup, wanted, series, twoParts, Progress.none());
    console
        .out()
        .print(
            json ? DividerJson.write(dividers) : DividerText.of(design, hookup, wanted, dividers));
    return ExitStatus.DONE;
  }

  private double wantedGain() {
    Optional<Double> value = Optional.empty();
    try {
      value = Optional.of(Quantity.parse(gain, Unit.ONE).value()).filter(Double::isFinite);
    } catch (QuantityException e) {
      // Said below, with the option's name.
    }
    return value.orElseThrow(
        () ->
            new ParameterException(
                spec.commandLine(), "Found the gain \"" + gain + "\", expected a number."));
  }
}
