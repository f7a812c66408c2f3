package loopwright.command;

import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.Set;
import picocli.CommandLine;
import picocli.CommandLine.Help.Ansi;

/** The command line: does one call and says how it ended. */
public final class CommandLineProgram {
  private static final int HELP_WIDTH = 96;

  private final CommandServices services;

  /**
   * @param services what the sub-commands work with
   */
  public CommandLineProgram(CommandServices services) {
    this.services = services;
  }

  /**
   * Does a call.
   *
   * @param arguments a sub-command and what belongs to it
   * @param console where results and diagnostics go
   * @return exit status: 0 done, 1 the design, its data or the file is wrong or missing, 2 the call
   *     is wrong
   */
  public int run(String[] arguments, Console console) {
    CommandLine line = line(console);
    int status = line.execute(arguments);
    console.out().flush();
    console.err().flush();
    return status;
  }

  /** All commands and their options. */
  CommandLine line(Console console) {
    CommandLine line = new CommandLine(new TopCommand());
    line.addSubcommand(new PredictCommand(services, console));
    line.addSubcommand(new FirstCommand(services, console));
    line.addSubcommand(new TrimCommand(services, console));
    line.addSubcommand(new SizeCommand(services, console));
    line.addSubcommand(new CompareCommand(services, console));
    line.addSubcommand(new ExplainCommand(services, console));
    line.addSubcommand(new SpreadCommand(services, console));
    line.addSubcommand(new CureCommand(services, console));
    line.addSubcommand(new NoiseCommand(services, console));
    line.addSubcommand(new HeatCommand(services, console));
    line.addSubcommand(new StabilityCommand(services, console));
    line.addSubcommand(new StepCommand(services, console));
    line.addSubcommand(new DistortionCommand(services, console));
    line.addSubcommand(new SheetCommand(services, console));
    line.addSubcommand(new SchematicCommand(services, console));
    line.setOut(writer(console.out()));
    line.setErr(writer(console.err()));
    line.setColorScheme(CommandLine.Help.defaultColorScheme(Ansi.OFF));
    line.setExpandAtFiles(false);
    line.setUsageHelpWidth(HELP_WIDTH);
    line.setParameterExceptionHandler(new WrongCall());
    line.setExecutionExceptionHandler(new WrongInput());
    return line;
  }

  /** The words that a call may begin with. */
  public static Set<String> subCommands() {
    return Set.of(
        PredictCommand.NAME,
        FirstCommand.NAME,
        TrimCommand.NAME,
        SizeCommand.NAME,
        CompareCommand.NAME,
        ExplainCommand.NAME,
        SpreadCommand.NAME,
        CureCommand.NAME,
        NoiseCommand.NAME,
        HeatCommand.NAME,
        StabilityCommand.NAME,
        StepCommand.NAME,
        DistortionCommand.NAME,
        SchematicCommand.NAME,
        SheetCommand.NAME);
  }

  private static PrintWriter writer(java.io.PrintStream stream) {
    return new PrintWriter(stream, true, StandardCharsets.UTF_8);
  }
}
