package loopwright.command;

import loopwright.design.Design;
import loopwright.design.Hookup;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;

/** The option that names a hookup. */
final class HookupOption {
  private HookupOption() {}

  /**
   * Checks that the design has such a hookup.
   *
   * @throws ParameterException that names those there are
   */
  static void require(Design design, String hookup, CommandSpec spec) {
    if (design.hookup(hookup).isEmpty()) {
      throw new ParameterException(
          spec.commandLine(),
          "Unknown hookup \""
              + hookup
              + "\": "
              + design.name()
              + " has "
              + String.join(", ", design.hookups().stream().map(Hookup::name).toList()));
    }
  }
}
