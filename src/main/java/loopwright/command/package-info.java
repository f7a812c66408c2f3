/**
 * The command line: reads a call, does it, prints the result as JSON or as a text for a person, and
 * says how it ended. Uses the streams that it is given and no others. The only package that imports
 * picocli. May import every package before it in the order, but no AWT and no Swing.
 */
package loopwright.command;
