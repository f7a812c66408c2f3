package loopwright.command;

import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.concurrent.Callable;
import loopwright.design.Drawer;
import loopwright.file.FileException;
import loopwright.file.FirstDesignJson;
import loopwright.propose.FirstDesign;
import loopwright.propose.FirstDesigns;
import loopwright.propose.Preference;
import loopwright.propose.Specification;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Quantity;
import loopwright.quantity.QuantityException;
import loopwright.quantity.Unit;
import loopwright.task.Progress;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** A first design from a specification. */
@Command(
    name = FirstCommand.NAME,
    description = {
      "Make a first design from a specification, with the reason of every value, and check it by its"
          + " own prediction. Where a demand cannot be met, say which, by how much, and what would"
          + " have to give; the exit status is then 1 and no file is written."
    })
final class FirstCommand implements Callable<Integer> {
  static final String NAME = "first";

  private final CommandServices services;
  private final Console console;

  @Option(
      names = "--rails",
      paramLabel = "V,V",
      required = true,
      description = "Positive and negative rail in volts, for example 12,-12; 9,0 is one supply.")
  private String rails;

  @Option(
      names = "--gain",
      paramLabel = "G",
      required = true,
      description = "Gain from generator to output; below zero it inverts.")
  private String gain;

  @Option(
      names = "--load",
      paramLabel = "OHMS",
      description = "Load resistance; none if not given.")
  private String load;

  @Option(
      names = "--load-capacitance",
      paramLabel = "FARADS",
      description = "Load and cable capacitance; 100p if not given.")
  private String loadCapacitance = "100p";

  @Option(
      names = "--swing",
      paramLabel = "V",
      required = true,
      description = "Peak of the output in volts.")
  private String swing;

  @Option(
      names = "--bandwidth",
      paramLabel = "HZ",
      description = "Closed-loop bandwidth; 100k if not given.")
  private String bandwidth = "100k";

  @Option(
      names = "--source",
      paramLabel = "OHMS",
      description = "Source resistance; 50 if not given.")
  private String source = "50";

  @Option(
      names = "--frequency",
      paramLabel = "HZ",
      description = "Frequency of the signal; 1k if not given.")
  private String frequency = "1k";

  @Option(
      names = "--parts",
      paramLabel = "NAMES",
      split = ",",
      description = "Transistors and diodes at hand, by comma; the whole shelf if not given.")
  private List<String> parts = new ArrayList<>();

  @Option(
      names = "--resistors",
      paramLabel = "VALUES",
      description = "A series, or the values in the drawer by comma; E24 if not given.")
  private String resistors = "E24";

  @Option(
      names = "--capacitors",
      paramLabel = "VALUES",
      description = "A series, or the values in stock by comma; E6 if not given.")
  private String capacitors = "E6";

  @Option(
      names = "--margin",
      paramLabel = "DEGREES",
      description = "Phase margin wanted at every level of the swing; 60 if not given.")
  private String margin = "60";

  @Option(
      names = "--gain-tolerance",
      paramLabel = "SHARE",
      description = "How far the predicted gain may be off; 2%% if not given.")
  private String gainTolerance = "2%";

  @Option(
      names = "--prefer",
      paramLabel = "WORDS",
      split = ",",
      description = "Of quiet, cool and simple, by comma, where the demands leave room.")
  private List<String> prefer = new ArrayList<>();

  @Option(
      names = {"-o", "--output"},
      paramLabel = "FILE",
      description = "Design file to write; one that is there already stays.")
  private String output;

  @Option(names = "--json", description = "Print JSON in SI units, for a script.")
  private boolean json;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  @Spec private CommandSpec spec;

  FirstCommand(CommandServices services, Console console) {
    this.services = services;
    this.console = console;
  }

  @Override
  public Integer call() {
    Specification wanted = specification();
    Optional<Path> file = Optional.ofNullable(output).map(FirstCommand::path);
    FirstDesign first = FirstDesigns.of(wanted, services.designs().shelf(), Progress.none());
    file.ifPresent(
        path ->
            first
                .design()
                .ifPresent(made -> services.designs().save(path, made, Optional.empty())));
    console
        .out()
        .print(json ? FirstDesignJson.write(first, services.designs()) : FirstText.of(first, file));
    return first.design().isPresent() ? ExitStatus.DONE : ExitStatus.INPUT_WRONG;
  }

  private static Path path(String name) {
    try {
      Path path = Path.of(name);
      if (Files.exists(path)) {
        throw new FileException(
            name + ": found a file there already, expected a name for a new one");
      }
      return path;
    } catch (InvalidPathException e) {
      throw new FileException(name + ": found a name that no file can have", e);
    }
  }

  private Specification specification() {
    String[] both = rails.split(",", -1);
    if (both.length != 2) {
      throw wrong("--rails", rails, "two voltages with a comma between, for example 12,-12");
    }
    double signed = number("--gain", gain, Unit.ONE);
    return new Specification(
        number("--rails", both[0], Unit.VOLT),
        number("--rails", both[1], Unit.VOLT),
        Math.abs(signed),
        signed < 0,
        load == null ? OptionalDouble.empty() : OptionalDouble.of(number("--load", load, Unit.OHM)),
        number("--load-capacitance", loadCapacitance, Unit.FARAD),
        number("--swing", swing, Unit.VOLT),
        number("--bandwidth", bandwidth, Unit.HERTZ),
        number("--source", source, Unit.OHM),
        number("--frequency", frequency, Unit.HERTZ),
        parts.stream().map(String::strip).toList(),
        stock("--resistors", resistors, Unit.OHM),
        stock("--capacitors", capacitors, Unit.FARAD),
        number("--margin", margin, Unit.DEGREE),
        number("--gain-tolerance", gainTolerance, Unit.ONE),
        preferences());
  }

  private Set<Preference> preferences() {
    Set<Preference> found = EnumSet.noneOf(Preference.class);
    for (String word : prefer) {
      found.add(
          Arrays.stream(Preference.values())
              .filter(one -> one.name().toLowerCase(Locale.ROOT).equals(word.strip()))
              .findFirst()
              .orElseThrow(() -> wrong("--prefer", word, "quiet, cool or simple")));
    }
    return found;
  }

  private Drawer.Stock stock(String option, String text, Unit unit) {
    if (PreferredValues.named(text.strip()).isPresent()) {
      return new Drawer.Stock.Series(text.strip());
    }
    List<Quantity> values = new ArrayList<>();
    for (String one : text.split(",", -1)) {
      double value = number(option, one, unit);
      if (!(value > 0)) {
        throw wrong(option, one, "a value above zero");
      }
      values.add(Quantity.parse(one.strip(), unit));
    }
    return new Drawer.Stock.Values(values);
  }

  private double number(String option, String text, Unit unit) {
    try {
      double value = Quantity.parse(text.strip(), unit).value();
      if (Double.isFinite(value)) {
        return value;
      }
    } catch (QuantityException e) {
      throw new ParameterException(spec.commandLine(), option + ": " + e.getMessage() + ".");
    }
    throw wrong(option, text, "a finite number");
  }

  private ParameterException wrong(String option, String found, String expected) {
    return new ParameterException(
        spec.commandLine(), option + ": found \"" + found + "\", expected " + expected + ".");
  }
}
