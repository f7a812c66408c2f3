package loopwright.command;

import java.util.List;
import java.util.concurrent.Callable;
import loopwright.check.Finding;
import loopwright.design.Design;
import loopwright.file.PredictionJson;
import loopwright.predict.Prediction;
import loopwright.task.Progress;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Predicts what a design should show at the bench. */
@Command(
    name = PredictCommand.NAME,
    description = {
      "Predict what a design should show at the bench: operating point, figures by hand formula and"
          + " solved, stability over the swing, offset and its causes, findings."
    })
final class PredictCommand implements Callable<Integer> {
  static final String NAME = "predict";

  private static final FrequencyList.Wanted OWN_GRID = new FrequencyList.Wanted(new double[0]);

  private final CommandServices services;
  private final Console console;

  @Parameters(paramLabel = "FILE", description = "A design file, or - for standard input.")
  private String file;

  @Option(
      names = "--hookup",
      paramLabel = "NAME",
      description = "Only the hookup of this name; otherwise all of them.")
  private String hookup;

  @Option(
      names = "--frequencies",
      paramLabel = "f1,f2,…",
      converter = FrequencyList.class,
      description =
          "Response and loop gain at these frequencies, such as 20,1k,2.5MHz; otherwise on a grid"
              + " of the program's own.")
  private FrequencyList.Wanted frequencies = OWN_GRID;

  @Option(names = "--json", description = "Print JSON in SI units, for a script.")
  private boolean json;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  @Spec private CommandSpec spec;

  PredictCommand(CommandServices services, Console console) {
    this.services = services;
    this.console = console;
  }

  @Override
  public Integer call() {
    Design design = new DesignArgument(file).read(services.designs(), console.in());
    Prediction prediction =
        services
            .predictions()
            .predict(design, wantedHookups(design), frequencies.hertz(), Progress.none());
    List<Finding> findings = services.findings().apply(prediction);
    console
        .out()
        .print(
            json
                ? PredictionJson.write(prediction, findings)
                : PredictionText.of(prediction, findings, frequencies.hertz().length > 0));
    return ExitStatus.DONE;
  }

  private List<String> wantedHookups(Design design) {
    if (hookup == null) {
      return List.of();
    }
    HookupOption.require(design, hookup, spec);
    return List.of(hookup);
  }
}
