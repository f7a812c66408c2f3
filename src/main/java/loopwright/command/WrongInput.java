package loopwright.command;

import loopwright.assembly.AssemblyException;
import loopwright.characterise.FitException;
import loopwright.design.DesignException;
import loopwright.file.FileException;
import picocli.CommandLine;
import picocli.CommandLine.IExecutionExceptionHandler;
import picocli.CommandLine.ParseResult;

/** Says in a sentence why a call that was understood could not be done. */
final class WrongInput implements IExecutionExceptionHandler {
  @Override
  public int handleExecutionException(Exception wrong, CommandLine command, ParseResult parsed) {
    if (wrong instanceof DesignException design) {
      design.problems().forEach(problem -> command.getErr().println(problem.message()));
    } else {
      command.getErr().println(sentence(wrong));
    }
    return ExitStatus.INPUT_WRONG;
  }

  private static String sentence(Exception wrong) {
    if (wrong instanceof FileException
        || wrong instanceof AssemblyException
        || wrong instanceof FitException) {
      return wrong.getMessage();
    }
    return "This is a fault of the program and not of the design; please report it with the design: "
        + wrong;
  }
}
