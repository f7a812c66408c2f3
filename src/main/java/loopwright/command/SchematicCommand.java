package loopwright.command;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import loopwright.design.Design;
import loopwright.predict.CostClass;
import loopwright.predict.Predictor;
import loopwright.sheet.SchematicDrawing;
import loopwright.sheet.SchematicFile;
import loopwright.sheet.SchematicOverlay;
import loopwright.task.Progress;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Draws the schematic of a hookup. */
@Command(
    name = SchematicCommand.NAME,
    description = {
      "Draws the schematic of a hookup with the symbols of IEC 60617, reference designators and"
          + " values, as SVG or PNG."
    })
final class SchematicCommand implements Callable<Integer> {
  static final String NAME = "schematic";

  private final CommandServices services;
  private final Console console;

  @Parameters(paramLabel = "FILE", description = "A design file, or - for standard input.")
  private String file;

  @Option(
      names = {"-o", "--output"},
      paramLabel = "FILE",
      required = true,
      description = "Where to write it; the name ends in .svg or .png.")
  private String output;

  @Option(
      names = "--hookup",
      paramLabel = "NAME",
      description = "Which hookup; otherwise the first.")
  private String hookup;

  @Option(
      names = "--overlay",
      description = "Lay node voltages and device currents at rest over it.")
  private boolean overlay;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  @Spec private CommandSpec spec;

  SchematicCommand(CommandServices services, Console console) {
    this.services = services;
    this.console = console;
  }

  @Override
  public Integer call() {
    Path target = target();
    SchematicFile kind = SchematicFile.of(target).orElseThrow(this::wrongName);
    Design design = new DesignArgument(file).read(services.designs(), console.in());
    String name = hookup == null ? design.hookups().get(0).name() : hookup;
    HookupOption.require(design, name, spec);
    kind.write(SchematicDrawing.of(design, name), overlay(design, name), target);
    return ExitStatus.DONE;
  }

  private Optional<SchematicOverlay> overlay(Design design, String name) {
    if (!overlay) {
      return Optional.empty();
    }
    Optional<SchematicOverlay> over =
        SchematicOverlay.of(
            Predictor.predict(
                    design, List.of(name), new double[] {1}, CostClass.LINEAR, Progress.none())
                .hookups()
                .get(0));
    if (over.isEmpty()) {
      console.err().println("No voltages in the schematic: the circuit finds no operating point.");
    }
    return over;
  }

  private Path target() {
    try {
      return Path.of(output);
    } catch (InvalidPathException e) {
      throw wrongName();
    }
  }

  private ParameterException wrongName() {
    return new ParameterException(
        spec.commandLine(),
        "Found \"" + output + "\" to write to, expected a name that ends in .svg or .png.");
  }
}
