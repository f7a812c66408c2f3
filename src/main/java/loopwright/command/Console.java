package loopwright.command;

import java.io.InputStream;
import java.io.PrintStream;

/**
 * The streams of a call. All text in them is UTF-8.
 *
 * @param in read where a file is called {@code -}
 * @param out results
 * @param err diagnostics
 */
public record Console(InputStream in, PrintStream out, PrintStream err) {}
