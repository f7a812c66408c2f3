package loopwright.command;

import java.util.List;
import picocli.CommandLine;
import picocli.CommandLine.IParameterExceptionHandler;
import picocli.CommandLine.MissingParameterException;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.UnmatchedArgumentException;

/** Says in a sentence why a call cannot be understood. */
final class WrongCall implements IParameterExceptionHandler {
  @Override
  public int handleParseException(ParameterException wrong, String[] arguments) {
    CommandLine command = wrong.getCommandLine();
    String help = "see " + command.getCommandSpec().qualifiedName() + " --help";
    command.getErr().println(sentence(wrong, command) + " (" + help + ")");
    return ExitStatus.CALL_WRONG;
  }

  private static String sentence(ParameterException wrong, CommandLine command) {
    if (wrong instanceof UnmatchedArgumentException unmatched) {
      return unknown(unmatched.getUnmatched().get(0), command);
    }
    if (wrong instanceof MissingParameterException missing
        && missing.getMissing().stream().anyMatch(argument -> argument.isPositional())) {
      return command.getCommandName()
          + " needs "
          + missing.getMissing().get(0).paramLabel()
          + ": the name of a design file, or - for standard input";
    }
    return wrong.getMessage();
  }

  private static String unknown(String word, CommandLine command) {
    if (word.startsWith("-") && word.length() > 1) {
      return "Unknown option "
          + word
          + ": "
          + command.getCommandName()
          + " knows "
          + options(command);
    }
    if (command.getSubcommands().isEmpty()) {
      return "One argument too many: \"" + word + "\"";
    }
    return "Unknown sub-command \""
        + word
        + "\": there is "
        + String.join(", ", command.getSubcommands().keySet());
  }

  private static String options(CommandLine command) {
    List<String> names =
        command.getCommandSpec().options().stream().map(option -> option.longestName()).toList();
    return String.join(", ", names);
  }
}
