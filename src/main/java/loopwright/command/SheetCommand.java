package loopwright.command;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.concurrent.Callable;
import loopwright.design.Design;
import loopwright.file.SheetJson;
import loopwright.sheet.BenchSheet;
import loopwright.sheet.Paper;
import loopwright.sheet.SheetFile;
import loopwright.sheet.SheetMaker;
import loopwright.task.Progress;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** The sheet for the bench, as a file. */
@Command(
    name = SheetCommand.NAME,
    description = {
      "The sheet for the bench: schematic, parts, pinouts, first power, what every node and hookup"
          + " should show with room to write what it does, and cautions."
    })
final class SheetCommand implements Callable<Integer> {
  static final String NAME = "sheet";

  private final CommandServices services;
  private final Console console;

  @Parameters(paramLabel = "FILE", description = "A design file, or - for standard input.")
  private String file;

  @Option(
      names = {"-o", "--output"},
      paramLabel = "FILE",
      required = true,
      description = "Where to write it; the name ends in .pdf or .html.")
  private String output;

  @Option(
      names = "--paper",
      paramLabel = "SIZE",
      description = "A4 or Letter; ${DEFAULT-VALUE} if not given.")
  private String paper = "A4";

  @Option(
      names = "--hookup",
      paramLabel = "NAME",
      description = "The hookup that is drawn and powered first; the first one if not given.")
  private String hookup;

  @Option(
      names = "--json",
      description = "Print file, checksum and nodes as JSON in SI units, for a script.")
  private boolean json;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  @Spec private CommandSpec spec;

  SheetCommand(CommandServices services, Console console) {
    this.services = services;
    this.console = console;
  }

  @Override
  public Integer call() {
    Path target = target();
    SheetFile kind = SheetFile.of(target).orElseThrow(() -> wrongName());
    Paper size =
        Paper.find(paper)
            .orElseThrow(() -> wrong("Found paper \"" + paper + "\", expected A4 or Letter."));
    Design design = new DesignArgument(file).read(services.designs(), console.in());
    String first = hookup == null ? design.hookups().get(0).name() : hookup;
    HookupOption.require(design, first, spec);
    BenchSheet sheet = new SheetMaker(LocalDate.now()).make(design, first, Progress.none());
    kind.write(sheet, size, target);
    sheet
        .failure()
        .ifPresent(reason -> console.err().println("No node voltages on the sheet: " + reason));
    if (json) {
      console.out().print(json(sheet));
    }
    return ExitStatus.DONE;
  }

  private String json(BenchSheet sheet) {
    return SheetJson.write(
        output,
        sheet.checksum(),
        sheet.hookup(),
        sheet.nodes().stream()
            .map(
                node ->
                    new SheetJson.Node(
                        node.name(),
                        node.volts().value().number(),
                        node.volts().low(),
                        node.volts().high()))
            .toList(),
        sheet.failure());
  }

  private Path target() {
    try {
      return Path.of(output);
    } catch (InvalidPathException e) {
      throw wrongName();
    }
  }

  private ParameterException wrongName() {
    return wrong(
        "Found \"" + output + "\" to write to, expected a name that ends in .pdf or .html.");
  }

  private ParameterException wrong(String says) {
    return new ParameterException(spec.commandLine(), says);
  }
}
