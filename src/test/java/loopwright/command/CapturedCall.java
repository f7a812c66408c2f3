package loopwright.command;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;

/**
 * A call and what came of it.
 *
 * @param status exit status
 * @param out standard output
 * @param err standard error
 */
record CapturedCall(int status, String out, String err) {
  /** Does a call in this process. */
  static CapturedCall of(CommandLineProgram program, byte[] input, String... arguments) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    int status =
        program.run(
            arguments,
            new Console(
                new ByteArrayInputStream(input),
                new PrintStream(out, false, StandardCharsets.UTF_8),
                new PrintStream(err, false, StandardCharsets.UTF_8)));
    return new CapturedCall(
        status, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
  }
}
